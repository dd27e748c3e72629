package org.seepledger.prism;

import java.util.List;

/**
 * Sides that follow one another within the grid's edge, from the place where they come in to where they go out.
 *
 * @param sides the sides, the first cut where it comes in
 * @param begin where the first begins, on the edge
 * @param second where the first ends
 * @param beforeLast where the last begins
 * @param end where the last ends, on the edge
 */
record Chain(List<Side> sides, Vertex begin, Vertex second, Vertex beforeLast, Vertex end) {}
