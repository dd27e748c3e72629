package org.seepledger.io.prisms;

import com.fasterxml.jackson.databind.JsonNode;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.function.BiConsumer;
import java.util.function.Consumer;
import org.seepledger.fault.DataFault;
import org.seepledger.io.JsonFile;
import org.seepledger.io.crs.PlanCrs;
import org.seepledger.sketch.Shape;

/**
 * Reads shapes from a GeoJSON file, one after the other.
 *
 * @param crs the aquifer's plan coordinates
 * @param layers how many layers its grid has
 * @param warnings told what may make a number wrong, a line each
 * @param notes told what else a user should know, a line each
 * @param flaws told what keeps rings from being a polygon; whoever wants none throws it
 */
record ShapesReader(
        PlanCrs crs, int layers, Consumer<String> warnings, Consumer<String> notes, Consumer<DataFault> flaws) {

    /**
     * Reads a file.
     *
     * @param file a FeatureCollection of Polygons and MultiPolygons, or one Feature
     * @param shownFile the file as the user named it, for messages
     * @param shapes given each shape, and where it stands
     * @throws DataFault if anything in it is wrong, with the feature and key or coordinates
     */
    void read(Path file, String shownFile, BiConsumer<Shape, Spot> shapes) {
        JsonNode root = JsonFile.read(file, shownFile);
        Spot whole = new Spot(shownFile, "");
        List<JsonNode> features = features(root, whole);
        FileCrs fileCrs = new FileCrs(crs, notes);
        FeatureReader reader = new FeatureReader(
                new RingsReader(fileCrs.transform(root, whole), fileCrs.remedyForDegrees()),
                new ReachReader(layers),
                new OwnKeys(warnings, notes),
                flaws);
        for (int number = 1; number <= features.size(); number++) {
            Shape shape = reader.read(features.get(number - 1), number, shownFile);
            shapes.accept(shape, new Spot(shownFile, "feature " + number + " " + Spot.quoted(shape.name())));
        }
    }

    private static List<JsonNode> features(JsonNode root, Spot spot) {
        String type = root.path("type").asText();
        if (type.equals("Feature")) {
            return List.of(root);
        }
        JsonNode features = root.path("features");
        if (!type.equals("FeatureCollection") || !features.isArray()) {
            throw spot.fault(
                    root.has("type") ? "a GeoJSON object of type " + Spot.shown(root.path("type")) : Spot.shown(root),
                    "a FeatureCollection of Polygons or MultiPolygons",
                    "Wrap the polygons in features, each with a property \"name\".");
        }
        List<JsonNode> all = new ArrayList<>();
        for (JsonNode feature : features) {
            all.add(feature);
            if (feature.has("crs")) {
                throw spot.in("feature " + all.size())
                        .fault("a crs of its own", "one crs for the whole file", "Move it to the top of the file.");
            }
        }
        return all;
    }
}
