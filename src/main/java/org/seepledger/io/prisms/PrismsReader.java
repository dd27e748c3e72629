package org.seepledger.io.prisms;

import java.nio.file.Path;
import java.util.ArrayList;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Locale;
import java.util.Set;
import java.util.function.Consumer;
import org.locationtech.jts.geom.Coordinate;
import org.seepledger.aquifer.Grid;
import org.seepledger.aquifer.Layer;
import org.seepledger.fault.DataFault;
import org.seepledger.io.DataFolder;
import org.seepledger.io.crs.PlanCrs;
import org.seepledger.prism.GridEdge;
import org.seepledger.prism.Prism;
import org.seepledger.prism.Ring;
import org.seepledger.prism.Side;
import org.seepledger.prism.SideNumbering;
import org.seepledger.sketch.Drawing;
import org.seepledger.sketch.Limit;
import org.seepledger.sketch.Place;
import org.seepledger.sketch.PolygonCheck;
import org.seepledger.sketch.Shape;

/**
 * Reads prisms from a GeoJSON file.
 *
 * @param crs the aquifer's plan coordinates
 * @param grid its grid
 * @param layers its layers, from the top down
 * @param clip whether prisms that reach beyond the grid are cut at its edge; else they are refused
 * @param surfaces reads the rasters that stand for a top or bottom
 * @param warnings told what may make a number wrong, a line each
 * @param notes told what else a user should know, a line each
 */
public record PrismsReader(
        PlanCrs crs,
        Grid grid,
        List<Layer> layers,
        boolean clip,
        SurfaceReader surfaces,
        Consumer<String> warnings,
        Consumer<String> notes) {

    /**
     * {@return the prisms of a file, in its order}
     *
     * @param file a FeatureCollection of Polygons and MultiPolygons, or one Feature
     * @param shownFile the file as the user named it, for messages
     * @throws DataFault if anything in it is wrong, with the feature and key or coordinates
     */
    public List<Prism> read(Path file, String shownFile) {
        DataFolder folder = DataFolder.holding(file, shownFile);
        List<Prism> prisms = new ArrayList<>();
        new ShapesReader(crs, layers.size(), warnings, notes, PrismsReader::refuse)
                .read(file, shownFile, (shape, spot) -> prisms.add(onGrid(shape, folder, spot)));
        if (prisms.isEmpty()) {
            throw new Spot(shownFile, "").fault("no features", "at least one polygon", "Draw a prism.");
        }
        return prisms;
    }

    /**
     * {@return the prisms of a drawing, the same as if it were written to a file and read}
     *
     * @param drawing the drawing
     * @param file the file that it is or would be kept in; surfaces are looked for beside it
     * @param shownFile the file as the user named it, for messages
     * @throws DataFault if a shape is no polygon, reaches beyond the grid, or names a surface that cannot be read
     * @throws org.seepledger.sketch.Refusal if a shape names a layer that the grid has not
     */
    public List<Prism> of(Drawing drawing, Path file, String shownFile) {
        DataFolder folder = DataFolder.holding(file, shownFile);
        List<Prism> prisms = new ArrayList<>();
        for (Shape shape : drawing.shapes()) {
            Spot spot = new Spot(shownFile, Spot.quoted(shape.name()));
            RingNames ringNames = new RingNames(new SideNumbering(shape.byPart()));
            shape.flaw().ifPresent(flaw -> refuse(ringNames.fault(flaw, "", spot)));
            prisms.add(onGrid(shape, folder, spot));
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
        DataFolder folder = DataFolder.holding(file, shownFile);
        List<Prism> prisms = new ArrayList<>();
        new ShapesReader(crs, layers.size(), warnings, notes, PrismsReader::refuse)
                .read(file, shownFile, (shape, spot) -> prisms.add(prism(shape, folder, spot)));
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
        PolygonCheck.first(drawn.parts().stream().map(PrismsReader::closed).toList())
                .ifPresent(flaw -> refuse(names.fault(flaw, "", spot)));
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

    private static void refuse(DataFault flaw) {
        throw flaw;
    }

    private Prism onGrid(Shape shape, DataFolder folder, Spot spot) {
        return within(GridEdge.of(grid), prism(shape, folder, spot), spot);
    }

    private Prism prism(Shape shape, DataFolder folder, Spot spot) {
        return shape.prism(layers.size(), (limit, lid) -> {
            if (limit instanceof Limit.Layer layer) {
                return layer.among(layers, lid);
            }
            String path = ((Limit.Surface) limit).path();
            return surfaces.read(folder.resolve(path, spot.in(lid).place()), path);
        });
    }

    private Prism within(GridEdge edge, Prism prism, Spot spot) {
        if (edge.holds(prism)) {
            return prism;
        }
        Prism left = clipped(edge, prism, spot);
        String share = String.format(Locale.ROOT, "%.3g %%", 100 * edge.shareOutside(prism, left));
        if (left.rings().isEmpty()) {
            Side first = prism.rings().get(0).sides().get(0);
            throw spot.fault(
                    "a polygon that lies outside the grid, with a corner at " + Place.shown(first.x(), first.y()),
                    "a polygon on the grid, which has " + extent(),
                    crs.isLocal() ? remedyForLocal(prism) : "Check the coordinates and the CRS of both.");
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

    /** Where coordinates are local ones, a GIS's longitudes and latitudes are the likeliest mistake. */
    private static String remedyForLocal(Prism prism) {
        boolean degrees = prism.rings().stream()
                .flatMap(ring -> ring.sides().stream())
                .allMatch(side -> Math.abs(side.x()) <= 180 && Math.abs(side.y()) <= 90);
        return degrees
                ? "They look like longitude and latitude, but the aquifer's crs is null, so that they are taken as local"
                        + " coordinates: name the aquifer's crs in aquifer.json, or write the polygon in its coordinates."
                : "Check the coordinates: the aquifer's crs is null, so that both must be in the same local ones.";
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
        return "corners at " + Place.shown(grid.mapX(0, 0), grid.mapY(0, 0)) + " and "
                + Place.shown(grid.mapX(width, height), grid.mapY(width, height))
                + (grid.rotation() == 0 ? "" : " opposite each other, turned by " + grid.rotation() + " degrees");
    }
}
