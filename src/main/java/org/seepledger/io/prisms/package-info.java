/**
 * Prisms from GeoJSON (RFC 7946): polygons with a name, a vertical range and, if the user likes, named boundaries.
 *
 * <p>A file is read in steps, each a class: {@code ShapesReader} takes the collection apart and finds the way to map
 * coordinates; {@code FeatureReader} makes a {@link org.seepledger.sketch.Shape} of each feature; {@code RingsReader} turns
 * the coordinates into closed rings without repeated vertices; {@link org.seepledger.sketch.PolygonCheck} finds what is no
 * polygon; sides are numbered by {@link org.seepledger.prism.SideNumbering}; {@code BoundariesReader} puts them under the
 * user's own names; {@code ReachReader} finds how far the shape reaches up and down. {@link
 * org.seepledger.io.prisms.PrismsReader} makes prisms on a grid of them, {@link org.seepledger.io.prisms.DrawingReader} a
 * drawing to go on with. {@link org.seepledger.io.prisms.DrawingWriter} is the way back.
 *
 * <p>Properties that the program does not know are other programs': prisms do without them, drawings keep them for the
 * way back; one that looks like one of ours is told. Third coordinates are ignored. At most a million vertices are read.
 */
package org.seepledger.io.prisms;
