/**
 * The map: values of a layer laid over the plan, contours, arrows of flux, wells, prisms, and where the cursor is.
 *
 * <p>Screen places are logical pixels from the map's upper left corner, y down. Values are reduced to half the size again and
 * again ({@code Pyramid}), cut into tiles, and coloured beside the window's own thread; what has not come yet is shown
 * coarser.
 */
package org.seepledger.desktop.map;
