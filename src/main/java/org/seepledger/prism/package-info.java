/**
 * A prism: a polygon with islands and parts, and a stack of layers or the space between two elevations; how it cuts the
 * grid; and what two prisms have in common: area, and parts of their sides.
 *
 * <p>Outer rings run counter-clockwise, islands clockwise, so that the inside is always on the left of a side and the
 * outward normal on its right. Plan coordinates are the map's.
 */
package org.seepledger.prism;
