package org.seepledger.prism;

import java.util.List;

/**
 * A volume of the user's own choosing: rings in plan and a vertical range.
 *
 * @param name its name, unique in a set of prisms
 * @param rings the outer ring of each part, each followed by its islands
 * @param range how far it reaches up and down
 */
public record Prism(String name, List<Ring> rings, VerticalRange range) {

    /** The item of the sides that clipping at the grid's edge makes. */
    public static final String GRID_EDGE = "grid edge";

    /** Copies the lists. */
    public Prism {
        rings = List.copyOf(rings);
    }

    /**
     * {@return the rings part by part: an outer ring, then its islands}
     */
    public List<List<Ring>> parts() {
        return Ring.byPart(rings);
    }
}
