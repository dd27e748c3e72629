package org.seepledger.sketch;

import java.util.Optional;

/**
 * What of a drawing lies under the pointer: a vertex before a side, a side before a body.
 *
 * <p>Of several vertices or sides within reach it is the nearest; of several equally near, and of several bodies, that of
 * the preferred shape, else the one on top.
 */
public sealed interface Hit {

    /**
     * {@return the name of the shape that is hit}
     */
    String shape();

    /**
     * A vertex.
     *
     * @param ring its ring
     * @param vertex its number there, from 0
     */
    record Vertex(RingAt ring, int vertex) implements Hit {
        @Override
        public String shape() {
            return ring.shape();
        }
    }

    /**
     * A side.
     *
     * @param ring its ring
     * @param side its number there, from 0
     * @param place the place on it that is nearest to the pointer
     */
    record Side(RingAt ring, int side, Place place) implements Hit {
        @Override
        public String shape() {
            return ring.shape();
        }
    }

    /**
     * The inside of a part.
     *
     * @param shape the shape
     * @param part the number of the part, from 1
     */
    record Body(String shape, int part) implements Hit {}

    /**
     * {@return what lies under the pointer, if anything}
     *
     * @param drawing the drawing
     * @param pointer the place that it points to
     * @param nearness how near counts
     * @param preferred the shape that is chosen, if one is
     */
    static Optional<Hit> at(Drawing drawing, Place pointer, Nearness nearness, Optional<String> preferred) {
        return new HitSearch(drawing, pointer, preferred).nearest(nearness);
    }
}
