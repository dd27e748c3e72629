package org.seepledger.sketch;

import java.util.ArrayList;
import java.util.List;
import java.util.function.UnaryOperator;
import java.util.stream.Stream;

/**
 * One polygon of a shape.
 *
 * @param outer its outer ring
 * @param islands what is left out of it
 */
public record Part(Outline outer, List<Outline> islands) {

    /** Copies the list. */
    public Part {
        islands = List.copyOf(islands);
    }

    /**
     * {@return a polygon without islands}
     *
     * @param outer its outer ring
     */
    public static Part of(Outline outer) {
        return new Part(outer, List.of());
    }

    /**
     * {@return the outer ring, then the islands}
     */
    public List<Outline> outlines() {
        return Stream.concat(Stream.of(outer), islands.stream()).toList();
    }

    /**
     * {@return the outer ring or an island}
     *
     * @param island the number of the island, from 1; 0 for the outer ring
     */
    public Outline outline(int island) {
        return island == 0 ? outer : islands.get(island - 1);
    }

    /** {@return the part with one ring changed} */
    Part edit(int island, UnaryOperator<Outline> change) {
        if (island == 0) {
            return new Part(change.apply(outer), islands);
        }
        List<Outline> changed = new ArrayList<>(islands);
        changed.set(island - 1, change.apply(changed.get(island - 1)));
        return new Part(outer, changed);
    }

    /** {@return the part with every ring changed} */
    Part map(UnaryOperator<Outline> change) {
        return new Part(change.apply(outer), islands.stream().map(change).toList());
    }

    Part with(Outline island) {
        List<Outline> more = new ArrayList<>(islands);
        more.add(island);
        return new Part(outer, more);
    }

    Part without(int island) {
        List<Outline> fewer = new ArrayList<>(islands);
        fewer.remove(island - 1);
        return new Part(outer, fewer);
    }
}
