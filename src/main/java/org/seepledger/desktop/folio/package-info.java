/** The side of the window that tells the budget: its pages, and the ribbon of time below. */
package org.seepledger.desktop.folio;
