package org.seepledger.io.prisms;

import com.fasterxml.jackson.databind.JsonNode;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.HashSet;
import java.util.List;
import java.util.Set;
import java.util.function.Consumer;
import org.locationtech.jts.geom.Coordinate;
import org.seepledger.aquifer.Grid;
import org.seepledger.fault.DataFault;
import org.seepledger.io.JsonFile;
import org.seepledger.io.crs.PlanCrs;
import org.seepledger.io.crs.PlanTransform;
import org.seepledger.prism.Transect;
import org.seepledger.sketch.Place;

/**
 * Reads transects from a GeoJSON file of LineStrings.
 *
 * @param crs the aquifer's plan coordinates
 * @param grid its grid
 * @param notes told what a user should know, a line each
 */
public record TransectsReader(PlanCrs crs, Grid grid, Consumer<String> notes) {

    /**
     * {@return the transects of a file, in its order}
     *
     * @param file a FeatureCollection of LineStrings, at least one, each with a {@code name}
     * @param shownFile the file as the user named it, for messages
     * @throws DataFault if anything in it is wrong
     */
    public List<Transect> read(Path file, String shownFile) {
        List<Transect> transects = asDrawn(file, shownFile);
        if (transects.isEmpty()) {
            throw noFeatures(new Spot(shownFile, ""));
        }
        return transects;
    }

    private static DataFault noFeatures(Spot whole) {
        return whole.fault("no features", "a FeatureCollection of LineStrings", "Draw a line and save it as GeoJSON.");
    }

    /**
     * {@return the transects of a file, in its order; none where all were deleted}
     *
     * @param file a FeatureCollection of LineStrings, each with a {@code name}
     * @param shownFile the file as the user named it, for messages
     * @throws DataFault if anything in it is wrong
     */
    public List<Transect> asDrawn(Path file, String shownFile) {
        JsonNode root = JsonFile.read(file, shownFile);
        Spot whole = new Spot(shownFile, "");
        JsonNode features = root.path("features");
        if (!features.isArray()) {
            throw noFeatures(whole);
        }
        FileCrs fileCrs = new FileCrs(crs, notes);
        PlanTransform transform = fileCrs.transform(root, whole);
        RingsReader places = new RingsReader(transform, fileCrs.remedyForDegrees());
        List<Transect> transects = new ArrayList<>();
        Set<String> names = new HashSet<>();
        for (int i = 0; i < features.size(); i++) {
            Spot spot = new Spot(shownFile, "feature " + (i + 1));
            String name = features.get(i).path("properties").path("name").asText();
            if (name.isEmpty() || !names.add(name)) {
                String found = name.isEmpty() ? "no name" : Spot.quoted(name) + " again";
                throw spot.fault(found, "a property \"name\" of its own", "Name each line.");
            }
            transects.add(new Transect(name, line(features.get(i).path("geometry"), places, transform, spot)));
        }
        return transects;
    }

    private List<double[]> line(JsonNode geometry, RingsReader places, PlanTransform transform, Spot spot) {
        JsonNode vertices = geometry.path("coordinates");
        if (!geometry.path("type").asText().equals("LineString") || !vertices.isArray()) {
            throw spot.fault(Spot.shown(geometry.path("type")) + " as geometry", "a LineString", "Draw a single line.");
        }
        List<double[]> line = new ArrayList<>();
        for (int i = 0; i < vertices.size(); i++) {
            Spot vertex = spot.in("vertex " + (i + 1));
            Coordinate place = places.vertex(vertices.get(i), vertex);
            double[] onMap = transform.apply(place.x, place.y);
            if (!grid.holds(onMap[0], onMap[1])) {
                throw vertex.fault(
                        Place.shown(onMap[0], onMap[1]) + ", outside the grid",
                        "a place on the grid",
                        "End the line at the grid's edge.");
            }
            if (line.isEmpty()
                    || line.get(line.size() - 1)[0] != onMap[0]
                    || line.get(line.size() - 1)[1] != onMap[1]) {
                line.add(onMap);
            }
        }
        if (line.size() < 2) {
            throw spot.fault("a line of one place", "at least two that differ", "Draw the line again.");
        }
        return line;
    }
}
