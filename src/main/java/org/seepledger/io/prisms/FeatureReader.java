package org.seepledger.io.prisms;

import com.fasterxml.jackson.databind.JsonNode;
import java.util.ArrayList;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import org.locationtech.jts.geom.Coordinate;
import org.seepledger.ledger.ExchangeFlow;
import org.seepledger.prism.Prism;
import org.seepledger.prism.Ring;
import org.seepledger.prism.SideNumbering;

/** Makes a prism of one feature. */
final class FeatureReader {

    private final RingsReader coordinates;
    private final VerticalRangeReader ranges;
    private final OwnKeys keys;
    private final Map<String, Integer> names = new HashMap<>();

    FeatureReader(RingsReader coordinates, VerticalRangeReader ranges, OwnKeys keys) {
        this.coordinates = coordinates;
        this.ranges = ranges;
        this.keys = keys;
    }

    /** {@return the prism of the feature with a number, from 1} */
    Prism read(JsonNode feature, int number, String file) {
        Spot bare = new Spot(file, "feature " + number);
        if (!"Feature".equals(feature.path("type").textValue())) {
            throw bare.fault(
                    "an object of type " + Spot.shown(feature.path("type")), "a Feature", "Correct the file there.");
        }
        JsonNode properties = feature.path("properties");
        keys.look(properties, bare);
        String name = name(properties, bare, number);
        Spot spot = new Spot(file, bare.place() + " " + Spot.quoted(name));
        List<Ring> rings = rings(feature.path("geometry"), properties.path("boundaries"), spot);
        return new Prism(name, rings, ranges.read(properties, spot));
    }

    private String name(JsonNode properties, Spot spot, int number) {
        JsonNode given = properties.path("name");
        String name = given.isTextual() ? given.textValue() : "";
        if (name.isBlank() || !name.equals(name.strip()) || name.matches("(?s).*\\p{Cntrl}.*")) {
            throw spot.in("name")
                    .fault(
                            Spot.shown(given),
                            "a text that is not empty and has no blanks at its ends",
                            "Give the prism a property \"name\".");
        }
        if (name.equals(ExchangeFlow.OUTSIDE)) {
            throw spot.in("name")
                    .fault(
                            Spot.quoted(name) + ", which stands for all that is in no prism",
                            "another name",
                            "Rename the prism.");
        }
        Integer other = names.putIfAbsent(name, number);
        if (other != null) {
            throw spot.in("name")
                    .fault(
                            Spot.quoted(name) + ", which feature " + other + " has already",
                            "names that differ",
                            "Rename one, or make the two one MultiPolygon.");
        }
        return name;
    }

    private List<Ring> rings(JsonNode geometry, JsonNode boundaries, Spot spot) {
        String type = geometry.path("type").asText();
        boolean parts = type.equals("MultiPolygon");
        if (!parts && !type.equals("Polygon")) {
            throw spot.fault(
                    geometry.isNull() || geometry.isMissingNode()
                            ? "no geometry"
                            : "a geometry of type " + Spot.shown(geometry.path("type")),
                    "a Polygon or MultiPolygon",
                    "Draw the prism as a polygon.");
        }
        RingNames ringNames = new RingNames(new SideNumbering(parts));
        List<List<Coordinate[]>> inFile = polygons(geometry.path("coordinates"), parts, ringNames, spot);
        new PolygonCheck(ringNames, spot, "").check(inFile);
        List<List<Coordinate[]>> onMap = onMap(inFile, ringNames, spot);
        List<Ring> numbered = numbered(onMap, ringNames.numbering());
        return BoundariesReader.apply(boundaries, numbered, parts, spot.in("boundaries"));
    }

    private List<List<Coordinate[]>> polygons(JsonNode given, boolean parts, RingNames ringNames, Spot spot) {
        if (!parts) {
            return List.of(coordinates.polygon(given, 1, ringNames, spot));
        }
        if (!given.isArray() || given.isEmpty()) {
            throw spot.fault(Spot.shown(given) + " as coordinates", "an array of polygons", "Draw at least one part.");
        }
        List<List<Coordinate[]>> polygons = new ArrayList<>();
        for (int i = 0; i < given.size(); i++) {
            polygons.add(coordinates.polygon(given.get(i), i + 1, ringNames, spot));
        }
        return polygons;
    }

    private List<List<Coordinate[]>> onMap(List<List<Coordinate[]>> inFile, RingNames ringNames, Spot spot) {
        List<List<Coordinate[]>> onMap = new ArrayList<>();
        boolean same = true;
        for (int part = 1; part <= inFile.size(); part++) {
            List<Coordinate[]> rings = new ArrayList<>();
            for (Coordinate[] ring : inFile.get(part - 1)) {
                rings.add(coordinates.onMap(ring, spot.in(ringNames.of(part, rings.size()))));
                same &= rings.get(rings.size() - 1) == ring;
            }
            onMap.add(rings);
        }
        if (!same) {
            new PolygonCheck(ringNames, spot, " of the aquifer's CRS").check(onMap);
        }
        return onMap;
    }

    private static List<Ring> numbered(List<List<Coordinate[]>> parts, SideNumbering numbering) {
        List<Ring> numbered = new ArrayList<>();
        for (int part = 1; part <= parts.size(); part++) {
            List<Coordinate[]> rings = parts.get(part - 1);
            for (int island = 0; island < rings.size(); island++) {
                numbered.add(numbering.number(part, island, rings.get(island)));
            }
        }
        return numbered;
    }
}
