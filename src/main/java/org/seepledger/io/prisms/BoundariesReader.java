package org.seepledger.io.prisms;

import com.fasterxml.jackson.databind.JsonNode;
import java.util.ArrayList;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.stream.Collectors;
import org.seepledger.fault.DataFault;
import org.seepledger.prism.Prism;
import org.seepledger.prism.Ring;
import org.seepledger.prism.Side;
import org.seepledger.prism.SideSelection;
import org.seepledger.sketch.Names;

/** Puts sides under the names that the property {@code boundaries} gives them. */
final class BoundariesReader {

    private static final String FORMS =
            "such as \"side 1-14\", \"island 1\", \"island 1 side 2-3\", \"part 2\" or \"part 2 island 1 side 3\"";

    private final List<Ring> rings;
    private final boolean parts;
    private final Spot spot;
    /** The group of each side that has one, by the side's own name. */
    private final Map<String, String> groups = new HashMap<>();

    private BoundariesReader(List<Ring> rings, boolean parts, Spot spot) {
        this.rings = rings;
        this.parts = parts;
        this.spot = spot;
    }

    /**
     * {@return the rings with sides under their boundaries' names}
     *
     * @param boundaries the property, perhaps missing
     * @param rings the numbered rings
     * @param parts whether the shape is made of parts
     * @param spot where the property stands
     */
    static List<Ring> apply(JsonNode boundaries, List<Ring> rings, boolean parts, Spot spot) {
        if (boundaries.isMissingNode() || boundaries.isNull()) {
            return rings;
        }
        if (!boundaries.isObject()) {
            throw spot.fault(
                    Spot.shown(boundaries),
                    "an object such as {\"river bank\": [\"side 1-14\"]}",
                    "Write names with arrays of sides.");
        }
        BoundariesReader reader = new BoundariesReader(rings, parts, spot);
        boundaries.properties().forEach(entry -> reader.add(entry.getKey(), entry.getValue()));
        return rings.stream().map(reader::grouped).toList();
    }

    private void add(String group, JsonNode selections) {
        checkName(group);
        Spot at = spot.in(Spot.quoted(group));
        if (!selections.isArray() || selections.isEmpty()) {
            throw at.fault(Spot.shown(selections), "an array of sides " + FORMS, "Write at least one side.");
        }
        for (JsonNode selection : selections) {
            SideSelection sides = SideSelection.of(selection.isTextual() ? selection.textValue() : "")
                    .orElseThrow(() -> at.fault(
                            Spot.shown(selection), "sides " + FORMS, "Write the sides in one of these forms."));
            add(group, sides, Spot.shown(selection), at);
        }
    }

    private void checkName(String group) {
        if (!Names.isBoundary(group)) {
            throw spot.fault(
                    Spot.quoted(group) + " as the name of a boundary",
                    "a name that is not empty and neither a side's, nor top, bottom or " + Prism.GRID_EDGE,
                    "Choose another name.");
        }
    }

    private void add(String group, SideSelection selection, String shown, Spot at) {
        List<Ring> selected = selection.rings(rings, parts);
        boolean reversed = selection.first().orElse(0) > selection.last().orElse(0);
        if (selected.isEmpty() || reversed) {
            throw unknown(shown, at);
        }
        for (Ring ring : selected) {
            if (selection.last().orElse(0) > ring.sides().size()) {
                throw unknown(shown, at);
            }
            for (Side side : selection.sides(ring).mapToObj(ring.sides()::get).toList()) {
                put(group, side.name(), at);
            }
        }
    }

    private void put(String group, String side, Spot at) {
        String other = groups.putIfAbsent(side, group);
        if (other != null && !other.equals(group)) {
            throw at.fault(
                    side + ", which is in " + Spot.quoted(other) + " already",
                    "each side in one boundary at most",
                    "Take it out of one of the two.");
        }
    }

    private DataFault unknown(String shown, Spot at) {
        String there = rings.stream().limit(8).map(BoundariesReader::shown).collect(Collectors.joining(", "));
        String more = rings.size() > 8 ? ", …" : "";
        return at.fault(shown + ", which names no sides", "some of " + there + more, "Correct the numbers.");
    }

    private static String shown(Ring ring) {
        String first = ring.sides().get(0).name();
        return "\"" + first + "-" + ring.sides().size() + "\"";
    }

    private Ring grouped(Ring ring) {
        List<Side> sides = new ArrayList<>(ring.sides().size());
        for (Side side : ring.sides()) {
            String item = groups.getOrDefault(side.name(), side.name());
            sides.add(new Side(side.name(), item, side.x(), side.y()));
        }
        return new Ring(ring.part(), ring.island(), sides);
    }
}
