package org.seepledger.io.prisms;

import com.fasterxml.jackson.databind.JsonNode;
import java.util.ArrayList;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.function.Consumer;
import org.locationtech.jts.geom.Coordinate;
import org.seepledger.fault.DataFault;
import org.seepledger.prism.Ring;
import org.seepledger.prism.SideNumbering;
import org.seepledger.sketch.Flaw;
import org.seepledger.sketch.Names;
import org.seepledger.sketch.PolygonCheck;
import org.seepledger.sketch.Shape;

/** Makes a shape of one feature. */
final class FeatureReader {

    private final RingsReader coordinates;
    private final ReachReader reaches;
    private final OwnKeys keys;
    private final Consumer<DataFault> flaws;
    private final Map<String, Integer> names = new HashMap<>();

    /**
     * Reads features of one file.
     *
     * @param coordinates reads their rings
     * @param reaches reads how far they reach
     * @param keys tells of properties that look like the program's own
     * @param flaws told what keeps rings from being a polygon; whoever wants none throws it
     */
    FeatureReader(RingsReader coordinates, ReachReader reaches, OwnKeys keys, Consumer<DataFault> flaws) {
        this.coordinates = coordinates;
        this.reaches = reaches;
        this.keys = keys;
        this.flaws = flaws;
    }

    /** {@return the shape of the feature with a number, from 1} */
    Shape read(JsonNode feature, int number, String file) {
        Spot bare = new Spot(file, "feature " + number);
        if (!"Feature".equals(feature.path("type").textValue())) {
            throw bare.fault(
                    "an object of type " + Spot.shown(feature.path("type")), "a Feature", "Correct the file there.");
        }
        JsonNode properties = feature.path("properties");
        keys.look(properties, bare);
        String name = name(properties, bare, number);
        Spot spot = new Spot(file, bare.place() + " " + Spot.quoted(name));
        JsonNode geometry = feature.path("geometry");
        boolean parts = isMadeOfParts(geometry, spot);
        RingNames ringNames = new RingNames(new SideNumbering(parts));
        List<Ring> plain = rings(geometry.path("coordinates"), parts, ringNames, spot);
        List<Ring> grouped = BoundariesReader.apply(properties.path("boundaries"), plain, parts, spot.in("boundaries"));
        return Shape.of(name, grouped, parts, reaches.read(properties, spot))
                .noted(OwnKeys.note(properties))
                .keeping(OwnKeys.others(properties));
    }

    private String name(JsonNode properties, Spot spot, int number) {
        JsonNode given = properties.path("name");
        String name = given.isTextual() ? given.textValue() : "";
        if (!Names.isPlain(name)) {
            throw spot.in("name")
                    .fault(
                            Spot.shown(given),
                            "a text that is not empty and has no blanks at its ends",
                            "Give the prism a property \"name\".");
        }
        if (Names.isReserved(name)) {
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

    private static boolean isMadeOfParts(JsonNode geometry, Spot spot) {
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
        return parts;
    }

    private List<Ring> rings(JsonNode given, boolean parts, RingNames ringNames, Spot spot) {
        List<List<Coordinate[]>> inFile = polygons(given, parts, ringNames, spot);
        Optional<Flaw> flaw = PolygonCheck.first(inFile);
        flaw.ifPresent(found -> flaws.accept(ringNames.fault(found, "", spot)));
        List<List<Coordinate[]>> onMap = onMap(inFile, ringNames, spot);
        if (flaw.isEmpty() && !coordinates.keepsPlaces()) {
            PolygonCheck.first(onMap)
                    .ifPresent(found -> flaws.accept(ringNames.fault(found, " of the aquifer's CRS", spot)));
        }
        return numbered(onMap, ringNames.numbering());
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
        for (int part = 1; part <= inFile.size(); part++) {
            List<Coordinate[]> rings = new ArrayList<>();
            for (Coordinate[] ring : inFile.get(part - 1)) {
                rings.add(coordinates.onMap(ring, spot.in(ringNames.of(part, rings.size()))));
            }
            onMap.add(rings);
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
