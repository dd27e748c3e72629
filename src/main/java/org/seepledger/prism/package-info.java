/**
 * A prism: a polygon with islands and parts, and a stack of layers; and how it cuts the grid.
 *
 * <p>Outer rings run counter-clockwise, islands clockwise, so that the inside is always on the left of a side and the
 * outward normal on its right. Plan coordinates are the map's.
 */
package org.seepledger.prism;
