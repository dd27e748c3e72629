/** The words of the window: one resource bundle, and faults as sentences. */
package org.seepledger.desktop.words;
