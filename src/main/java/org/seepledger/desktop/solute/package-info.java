/**
 * Solutes in the window: which one is looked at and how, their budgets kept up with the drawing, and how masses are read.
 */
package org.seepledger.desktop.solute;
