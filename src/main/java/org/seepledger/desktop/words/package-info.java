/** The words of the window: one resource bundle, faults as sentences, and how numbers and choices read. */
package org.seepledger.desktop.words;
