package org.seepledger.io.prisms;

import com.fasterxml.jackson.databind.JsonNode;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Locale;
import java.util.Set;
import java.util.function.Consumer;
import org.locationtech.jts.geom.Coordinate;
import org.seepledger.aquifer.Grid;
import org.seepledger.fault.DataFault;
import org.seepledger.io.DataFolder;
import org.seepledger.io.JsonFile;
import org.seepledger.io.crs.PlanCrs;
import org.seepledger.prism.GridEdge;
import org.seepledger.prism.Prism;
import org.seepledger.prism.Ring;
import org.seepledger.prism.Side;
import org.seepledger.prism.SideNumbering;

/**
 * Reads prisms from a GeoJSON file.
 *
 * @param crs the aquifer's plan coordinates
 * @param grid its grid
 * @param layers how many layers it has
 * @param clip whether prisms that reach beyond the grid are cut at its edge; else they are refused
 * @param surfaces reads the rasters that stand for a top or bottom
 * @param notes told what a user should know, a line each
 */
public record PrismsReader(
        PlanCrs crs, Grid grid, int layers, boolean clip, SurfaceReader surfaces, Consumer<String> notes) {

    /**
     * {@return the prisms of a file, in its order}
     *
     * @param file a FeatureCollection of Polygons and MultiPolygons, or one Feature
     * @param shownFile the file as the user named it, for messages
     * @throws DataFault if anything in it is wrong, with the feature and key or coordinates
     */
    public List<Prism> read(Path file, String shownFile) {
        GridEdge edge = GridEdge.of(grid);
        List<Prism> prisms = new ArrayList<>();
        for (Prism prism : asDrawn(file, shownFile)) {
            String place = "feature " + (prisms.size() + 1) + " " + Spot.quoted(prism.name());
            prisms.add(within(edge, prism, new Spot(shownFile, place)));
        }
        return prisms;
    }

    /**
     * {@return the prisms of a file as they stand there, even where they reach beyond the grid}
     *
     * @param file a FeatureCollection of Polygons and MultiPolygons, or one Feature
     * @param shownFile the file as the user named it, for messages
     * @throws DataFault if anything else in it is wrong, with the feature and key or coordinates
     */
    public List<Prism> asDrawn(Path file, String shownFile) {
        JsonNode root = JsonFile.read(file, shownFile);
        Spot whole = new Spot(shownFile, "");
        List<JsonNode> features = features(root, whole);
        FileCrs fileCrs = new FileCrs(crs, notes);
        DataFolder folder = DataFolder.holding(file, shownFile);
        FeatureReader reader = new FeatureReader(
                new RingsReader(fileCrs.transform(root, whole), fileCrs.remedyForDegrees()),
                new VerticalRangeReader(layers, folder, surfaces),
                new OwnKeys(notes));
        List<Prism> prisms = new ArrayList<>();
        for (JsonNode feature : features) {
            prisms.add(reader.read(feature, prisms.size() + 1, shownFile));
        }
        return prisms;
    }

    /**
     * {@return a prism that was drawn rather than read, as it would be read from a file}
     *
     * @param drawn the prism, in map coordinates
     * @throws DataFault if it is no polygon, or does not lie on the grid
     */
    public Prism admitted(Prism drawn) {
        Spot spot = new Spot(Spot.quoted(drawn.name()), "");
        RingNames names = new RingNames(new SideNumbering(drawn.parts().size() > 1));
        new PolygonCheck(names, spot, "")
                .check(drawn.parts().stream().map(PrismsReader::closed).toList());
        return within(GridEdge.of(grid), drawn, spot);
    }

    private static List<Coordinate[]> closed(List<Ring> part) {
        List<Coordinate[]> rings = new ArrayList<>();
        for (Ring ring : part) {
            int count = ring.sides().size();
            Coordinate[] vertices = new Coordinate[count + 1];
            for (int i = 0; i <= count; i++) {
                Side side = ring.sides().get(i % count);
                vertices[i] = new Coordinate(side.x(), side.y());
            }
            rings.add(vertices);
        }
        return rings;
    }

    private static List<JsonNode> features(JsonNode root, Spot spot) {
        String type = root.path("type").asText();
        if (type.equals("Feature")) {
            return List.of(root);
        }
        JsonNode features = root.path("features");
        if (!type.equals("FeatureCollection") || !features.isArray()) {
            throw spot.fault(
                    root.isObject() ? "a GeoJSON object of type " + Spot.shown(root.path("type")) : Spot.shown(root),
                    "a FeatureCollection of Polygons or MultiPolygons",
                    "Wrap the polygons in features, each with a property \"name\".");
        }
        if (features.isEmpty()) {
            throw spot.fault("no features", "at least one polygon", "Draw a prism.");
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

    private Prism within(GridEdge edge, Prism prism, Spot spot) {
        if (edge.holds(prism)) {
            return prism;
        }
        Prism left = clipped(edge, prism, spot);
        String share = String.format(Locale.ROOT, "%.3g %%", 100 * edge.shareOutside(prism, left));
        if (left.rings().isEmpty()) {
            throw spot.fault(
                    "a polygon that lies outside the grid",
                    "a polygon on the grid, which has " + extent(),
                    "Check the coordinates and the CRS of both.");
        }
        if (!clip) {
            throw spot.fault(
                    "a polygon with " + share + " of its area outside the grid",
                    "a polygon within the grid, which has " + extent(),
                    "Draw it within the grid, or cut it at the grid's edge with --clip.");
        }
        notes.accept(
                spot + ": " + share + " of its area lies outside the grid; the polygon was cut at the grid's edge");
        Set<String> lost = items(prism);
        lost.removeAll(items(left));
        if (!lost.isEmpty()) {
            notes.accept(spot + ": wholly outside the grid, and without rows, are " + String.join(", ", lost));
        }
        return left;
    }

    private static Set<String> items(Prism prism) {
        Set<String> items = new LinkedHashSet<>();
        prism.rings().forEach(ring -> ring.sides().forEach(side -> items.add(side.item())));
        return items;
    }

    private static Prism clipped(GridEdge edge, Prism prism, Spot spot) {
        try {
            return edge.clip(prism);
        } catch (IllegalArgumentException e) {
            throw spot.fault(
                    e.getMessage() + " where the polygon leaves the grid",
                    "sides that cross the grid's edge apart from each other",
                    "Simplify the polygon there.");
        }
    }

    private String extent() {
        double width = grid.x().edge(grid.columns());
        double height = grid.y().edge(grid.rows());
        return "corners at " + Spot.point(grid.mapX(0, 0), grid.mapY(0, 0)) + " and "
                + Spot.point(grid.mapX(width, height), grid.mapY(width, height))
                + (grid.rotation() == 0 ? "" : " opposite each other, turned by " + grid.rotation() + " degrees");
    }
}
