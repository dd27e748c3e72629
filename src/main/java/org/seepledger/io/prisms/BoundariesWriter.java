package org.seepledger.io.prisms;

import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import org.seepledger.prism.Ring;
import org.seepledger.prism.Side;
import org.seepledger.prism.SideNumbering;

/** Tells which sides are in boundaries, in the form of the property {@code boundaries}. */
final class BoundariesWriter {

    private final SideNumbering numbering;
    private final Map<String, List<String>> selections = new LinkedHashMap<>();

    private BoundariesWriter(SideNumbering numbering) {
        this.numbering = numbering;
    }

    /** {@return the sides of each boundary, neighbours together} */
    static Map<String, List<String>> of(List<Ring> rings, boolean byPart) {
        BoundariesWriter writer = new BoundariesWriter(new SideNumbering(byPart));
        rings.forEach(writer::add);
        return writer.selections;
    }

    private void add(Ring ring) {
        List<Side> sides = ring.sides();
        int begin = 0;
        while (begin < sides.size()) {
            int end = begin + 1;
            while (end < sides.size()
                    && sides.get(end).item().equals(sides.get(begin).item())) {
                end++;
            }
            if (!sides.get(begin).item().equals(sides.get(begin).name())) {
                selections
                        .computeIfAbsent(sides.get(begin).item(), item -> new ArrayList<>())
                        .add(selection(ring, begin + 1, end));
            }
            begin = end;
        }
    }

    /** First and last count from 1. */
    private String selection(Ring ring, int first, int last) {
        if (ring.island() > 0 && first == 1 && last == ring.sides().size()) {
            return numbering.ring(ring.part(), ring.island());
        }
        return numbering.side(ring.part(), ring.island(), first) + (first < last ? "-" + last : "");
    }
}
