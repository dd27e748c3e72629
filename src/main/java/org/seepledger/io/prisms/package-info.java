/**
 * Prisms from GeoJSON (RFC 7946): polygons with a name, a vertical range and, if the user likes, named boundaries.
 *
 * <p>A file is read in steps, each a class: {@link org.seepledger.io.prisms.PrismsReader} takes the collection apart and
 * finds the way to map coordinates; {@code FeatureReader} makes one prism; {@code RingsReader} turns the coordinates into
 * closed rings without repeated vertices; {@code PolygonCheck} refuses what is no polygon; sides are numbered by {@link
 * org.seepledger.prism.SideNumbering}; {@code BoundariesReader} puts them under the user's own names; {@code
 * VerticalRangeReader} finds how far the prism reaches up and down.
 *
 * <p>Properties that the program does not know are other programs' and are ignored; one that looks like one of ours is
 * told. Third coordinates are ignored. At most a million vertices are read.
 */
package org.seepledger.io.prisms;
