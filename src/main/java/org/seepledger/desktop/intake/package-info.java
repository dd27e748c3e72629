/**
 * The import assistant in the window: loose files in, an aquifer folder out, without a look at its JSON.
 *
 * <p>{@link org.seepledger.desktop.intake.IntakeModel} keeps an immutable {@link org.seepledger.intake.Plan}; each correction
 * makes another one, of which a {@link org.seepledger.intake.Composition} is worked out and checked beside the window.
 */
package org.seepledger.desktop.intake;
