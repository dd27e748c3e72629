package org.seepledger.prism;

import java.util.ArrayList;
import java.util.Collections;
import java.util.List;
import java.util.Optional;
import org.locationtech.jts.algorithm.Orientation;
import org.locationtech.jts.geom.Coordinate;

/**
 * Numbers the sides of a ring, so that a drawing and a file agree on what {@code side 3} is.
 *
 * <p>The ring is first made to run counter-clockwise where it is an outer ring and clockwise where it is an island; one
 * given the other way round keeps its first vertex. Sides then count from 1, from the first vertex on. An island's are
 * {@code island 1 side 1}; in a shape of several parts each is prefixed, as {@code part 2 island 1 side 3}.
 */
public final class SideNumbering {

    private final boolean parts;

    /**
     * Numbers the rings of one shape.
     *
     * @param parts whether the part is told: the shape is made of parts, even if it has just one
     */
    public SideNumbering(boolean parts) {
        this.parts = parts;
    }

    /**
     * {@return what stands before a side in its name, and names the ring: nothing for the outer ring of a shape
     * without parts}
     *
     * @param part the number of the part, from 1
     * @param island the number of the island in its part, from 1; 0 for the outer ring
     */
    public String ring(int part, int island) {
        String prefix = parts ? "part " + part : "";
        if (island == 0) {
            return prefix;
        }
        return (prefix.isEmpty() ? "" : prefix + " ") + "island " + island;
    }

    /**
     * {@return the name of a side}
     *
     * @param part the number of the part, from 1
     * @param island the number of the island in its part, from 1; 0 for the outer ring
     * @param number the number of the side, from 1
     */
    public String side(int part, int island, int number) {
        String ring = ring(part, island);
        return (ring.isEmpty() ? "" : ring + " ") + "side " + number;
    }

    /**
     * {@return the ring through the given vertices, each side counting under its own name}
     *
     * @param part the number of the part, from 1
     * @param island the number of the island in its part, from 1; 0 for the outer ring
     * @param closed at least three different vertices in map coordinates, none repeated, and the first again
     */
    public Ring number(int part, int island, Coordinate[] closed) {
        return number(part, island, closed, Collections.nCopies(closed.length - 1, Optional.empty()));
    }

    /**
     * {@return the ring through the given vertices, its sides under the boundaries that they are in}
     *
     * @param part the number of the part, from 1
     * @param island the number of the island in its part, from 1; 0 for the outer ring
     * @param closed at least three different vertices in map coordinates, none repeated, and the first again
     * @param boundaries for each side, in the order given, the boundary that it is in, if any
     */
    public Ring number(int part, int island, Coordinate[] closed, List<Optional<String>> boundaries) {
        int count = closed.length - 1;
        boolean turned = Orientation.isCCW(closed) != (island == 0);
        List<Side> sides = new ArrayList<>(count);
        for (int i = 0; i < count; i++) {
            Coordinate vertex = closed[turned ? count - i : i];
            String name = side(part, island, i + 1);
            String item = boundaries.get(turned ? count - 1 - i : i).orElse(name);
            sides.add(new Side(name, item, vertex.x, vertex.y));
        }
        return new Ring(part, island, sides);
    }
}
