/**
 * Drawing prisms on the map: tools, gestures, undo, typed values, and the file that the prisms are kept in. The edits
 * themselves are values of {@code sketch}.
 */
package org.seepledger.desktop.draw;
