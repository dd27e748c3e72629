/**
 * The budget that follows the drawing: what was last worked out, which geometry and interval it belongs to, and how its
 * figures are to be read. The panes of the budget show it from their own side.
 */
package org.seepledger.desktop.budget;
