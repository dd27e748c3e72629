package org.seepledger.prism;

import java.util.ArrayList;
import java.util.List;

/**
 * A closed ring of sides: counter-clockwise where it is an outer ring, clockwise where it is an island.
 *
 * @param part the number of the part it belongs to, from 1
 * @param island the number of the island in its part, from 1; 0 for an outer ring
 * @param sides at least three, each ending where the next begins, the last where the first does
 */
public record Ring(int part, int island, List<Side> sides) {

    /** Copies the list. */
    public Ring {
        sides = List.copyOf(sides);
    }

    /**
     * {@return the side after a side}
     *
     * @param index a side, from 0
     */
    public Side after(int index) {
        return sides.get((index + 1) % sides.size());
    }

    /**
     * {@return rings part by part: an outer ring, then its islands}
     *
     * @param rings the outer ring of each part, each followed by its islands
     */
    public static List<List<Ring>> byPart(List<Ring> rings) {
        List<List<Ring>> parts = new ArrayList<>();
        int begin = 0;
        while (begin < rings.size()) {
            int end = begin + 1;
            while (end < rings.size() && rings.get(end).island > 0) {
                end++;
            }
            parts.add(rings.subList(begin, end));
            begin = end;
        }
        return parts;
    }
}
