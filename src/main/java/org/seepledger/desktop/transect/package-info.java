/** What crosses drawn transects and measured panels, as a table that follows the line while it is dragged. */
package org.seepledger.desktop.transect;
