/**
 * The import assistant: what loose files seem to be, and the aquifer folder that they make.
 *
 * <p><b>Walk.</b> {@link org.seepledger.intake.LooseFiles} looks at files and folders; {@link
 * org.seepledger.intake.Proposal} makes {@link org.seepledger.intake.Item}s of them, each with a guess and its reason, which
 * a person corrects by making another {@link org.seepledger.intake.Plan}; {@link org.seepledger.intake.Composition} works
 * out grid, layers and times, what is wrong or missing ({@link org.seepledger.intake.Finding}), the text of
 * {@code aquifer.json} and which file goes where.
 *
 * <p><b>Guesses.</b> A name's words and a column's heading weigh most, then its unit, then the range of its values. A guess
 * never says more than it knows: what nothing speaks for is left out and said so. Rasters whose names differ in numbers or
 * dates alone are one item; each such field of the name means a layer, a time or nothing.
 *
 * <p><b>Counting.</b> Layers from 1, the uppermost; instants from 0; intervals from 1, as in {@code aquifer.json}. Layers
 * that a name counts from 0 are counted on by one.
 *
 * <p>Files are read and never written; what is written is written by whoever holds a composition.
 */
package org.seepledger.intake;
