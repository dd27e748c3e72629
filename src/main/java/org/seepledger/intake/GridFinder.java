package org.seepledger.intake;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import java.util.Optional;
import java.util.function.Consumer;
import org.seepledger.aquifer.Axis;
import org.seepledger.aquifer.Grid;
import org.seepledger.fault.DataFault;
import org.seepledger.io.raster.Georeference;
import org.seepledger.io.table.TableLook;
import org.seepledger.unit.Figures;

/** Finds the grid: what a person said, else what most rasters share, else the cell centres of a table. */
final class GridFinder {

    private static final int MOST_POINTS = 2_000_000;

    /** How far, in cells, rasters of one grid may lie apart; the reader allows no more. */
    private static final double NEAR = 0.01;

    private final Plan plan;
    private final Consumer<Finding> findings;

    GridFinder(Plan plan, Consumer<Finding> findings) {
        this.plan = plan;
        this.findings = findings;
    }

    /** Rasters that lie on one grid. */
    private record Shape(LooseFile.Raster like, List<LooseFile.Raster> files) {}

    FoundGrid find() {
        List<Shape> shapes = shapes();
        Optional<FoundGrid> said = said();
        Optional<FoundGrid> found = said.or(() -> ofRasters(shapes)).or(this::ofTables);
        if (found.isPresent()) {
            checkRasters(found.get().grid().orElseThrow());
            return found.get();
        }
        findings.accept(Finding.fault(
                Wishes.Topic.X,
                "Nothing tells where the grid lies" + extent(shapes)
                        + ". Say where its edges are: corner, step and count along x and y."));
        return new FoundGrid(Optional.empty(), "Nothing tells it.");
    }

    private static String extent(List<Shape> shapes) {
        return shapes.isEmpty()
                ? ""
                : "; the rasters have " + shapes.get(0).like().rows() + " rows and "
                        + shapes.get(0).like().columns() + " columns";
    }

    private Optional<FoundGrid> said() {
        String x = plan.wishes().of(Wishes.Topic.X);
        String y = plan.wishes().of(Wishes.Topic.Y);
        if (x.isEmpty() || y.isEmpty()) {
            return Optional.empty();
        }
        Optional<Axis> alongX = axis(Wishes.Topic.X, x);
        Optional<Axis> alongY = axis(Wishes.Topic.Y, y);
        String turn = plan.wishes().of(Wishes.Topic.ROTATION);
        double rotation =
                turn.isEmpty() ? 0 : Numbers.of(turn).stream().findFirst().orElse(0.0);
        return alongX.isEmpty() || alongY.isEmpty()
                ? Optional.empty()
                : Optional.of(
                        new FoundGrid(Optional.of(new Grid(alongX.get(), alongY.get(), rotation, 1)), "You said so."));
    }

    private Optional<Axis> axis(Wishes.Topic topic, String text) {
        List<Double> numbers = Numbers.of(text);
        try {
            boolean even = numbers.size() == 3 && numbers.get(2) == Math.rint(numbers.get(2)) && numbers.get(2) >= 1;
            return Optional.of(
                    even
                            ? Axis.even(
                                    numbers.get(0),
                                    numbers.get(1),
                                    numbers.get(2).intValue())
                            : Axis.of(numbers.stream()
                                    .mapToDouble(Double::doubleValue)
                                    .toArray()));
        } catch (IllegalArgumentException e) {
            findings.accept(Finding.fault(
                    topic,
                    "\"" + text + "\" is neither corner, step and count, nor a list of edges" + " that grow ("
                            + e.getMessage() + ")."));
            return Optional.empty();
        }
    }

    private List<Shape> shapes() {
        List<Shape> shapes = new ArrayList<>();
        for (Item item : plan.items()) {
            if (item instanceof Item.Rasters rasters && item.isUsed()) {
                rasters.files().forEach(file -> sort(file, shapes));
            }
        }
        shapes.sort(
                Comparator.comparingInt((Shape shape) -> shape.files().size()).reversed());
        return shapes;
    }

    private static void sort(LooseFile.Raster file, List<Shape> shapes) {
        for (Shape shape : shapes) {
            if (isSame(shape.like(), file)) {
                shape.files().add(file);
                return;
            }
        }
        shapes.add(new Shape(file, new ArrayList<>(List.of(file))));
    }

    private static boolean isSame(LooseFile.Raster one, LooseFile.Raster other) {
        boolean shape = one.rows() == other.rows() && one.columns() == other.columns();
        if (!shape || one.place().isEmpty() || other.place().isEmpty()) {
            return shape && one.place().isEmpty() == other.place().isEmpty();
        }
        Georeference a = one.place().get();
        Georeference b = other.place().get();
        double near = NEAR * Math.hypot(a.columnX(), a.columnY());
        boolean same = true;
        for (int corner = 0; corner < 4; corner++) {
            double column = corner % 2 * one.columns();
            double row = corner / 2 * one.rows();
            same &= Math.abs(a.mapX(column, row) - b.mapX(column, row)) <= near
                    && Math.abs(a.mapY(column, row) - b.mapY(column, row)) <= near;
        }
        return same;
    }

    private Optional<FoundGrid> ofRasters(List<Shape> shapes) {
        for (Shape shape : shapes) {
            LooseFile.Raster like = shape.like();
            if (like.place().isPresent()) {
                try {
                    Grid grid = like.place().get().grid(like.rows(), like.columns(), 1);
                    String reason = shape.files().size() == 1
                            ? "It is the grid of " + like.shownName() + "."
                            : "It is the grid of " + shape.files().size() + " rasters.";
                    return Optional.of(new FoundGrid(Optional.of(grid), reason));
                } catch (IllegalArgumentException e) {
                    findings.accept(Finding.doubt(Wishes.Topic.X, like.shownName() + " has " + e.getMessage() + "."));
                }
            }
        }
        return Optional.empty();
    }

    /** The longest table that gives cells by their centres is the one most likely to have all of them. */
    private Optional<FoundGrid> ofTables() {
        return plan.items().stream()
                .filter(Item::isUsed)
                .filter(Item.Table.class::isInstance)
                .map(Item.Table.class::cast)
                .filter(table -> !table.arePoints() && table.places().containsAll(List.of(Place.X, Place.Y)))
                .sorted(Comparator.comparingLong(
                                (Item.Table table) -> table.file().look().lines())
                        .reversed())
                .map(table -> ofCentres(
                        table, table.places().indexOf(Place.X), table.places().indexOf(Place.Y)))
                .flatMap(Optional::stream)
                .findFirst();
    }

    private Optional<FoundGrid> ofCentres(Item.Table table, int x, int y) {
        try {
            double[][] centres = TableLook.numbers(table.file().path(), table.id(), new int[] {x, y}, MOST_POINTS);
            Optional<Grid> grid = CellCentres.grid(centres[0], centres[1]);
            if (grid.isEmpty()) {
                findings.accept(
                        Finding.doubt(table, "The places in " + table.id() + " are not those of a grid's cells."));
            }
            return grid.map(found -> new FoundGrid(
                    grid,
                    "It is worked out from the cell centres in " + table.id()
                            + (found.x().isEven() && found.y().isEven() ? "." : "; the cells are not evenly spaced.")));
        } catch (DataFault e) {
            findings.accept(Finding.fault(table, e.getMessage()));
            return Optional.empty();
        }
    }

    private void checkRasters(Grid grid) {
        for (Item item : plan.items()) {
            if (item instanceof Item.Rasters rasters && item.isUsed()) {
                rasters.files().stream()
                        .filter(file -> !lies(file, grid))
                        .findFirst()
                        .ifPresent(file -> findings.accept(Finding.fault(
                                item,
                                file.shownName() + " lies on another grid: "
                                        + shown(file) + "; the grid has " + shown(grid)
                                        + ". Resample it, for instance with gdalwarp -te -tr, or leave it out.")));
            }
        }
    }

    private static boolean lies(LooseFile.Raster file, Grid grid) {
        boolean shape = file.rows() == grid.rows() && file.columns() == grid.columns();
        boolean free = !grid.x().isEven() || !grid.y().isEven() || grid.rotation() != 0;
        if (!shape || free || file.place().isEmpty()) {
            return shape;
        }
        Georeference place = file.place().get();
        double near = NEAR * grid.x().smallest();
        return Math.abs(place.mapX(0, file.rows()) - grid.mapX(0, 0)) <= near
                && Math.abs(place.mapY(0, file.rows()) - grid.mapY(0, 0)) <= near
                && Math.abs(place.mapX(file.columns(), 0) - grid.mapX(grid.x().edge(grid.columns()), 0)) <= near
                && Math.abs(place.mapY(file.columns(), 0)
                                - grid.mapY(0, grid.y().edge(grid.rows())))
                        <= near;
    }

    private static String shown(LooseFile.Raster file) {
        String corner = file.place()
                .map(place -> ", corner (" + Figures.shown(place.mapX(0, file.rows())) + ", "
                        + Figures.shown(place.mapY(0, file.rows())) + "), step "
                        + Figures.shown(Math.hypot(place.columnX(), place.columnY())))
                .orElse("");
        return file.rows() + " rows × " + file.columns() + " columns" + corner;
    }

    private static String shown(Grid grid) {
        return grid.rows() + " rows × " + grid.columns() + " columns, corner ("
                + Figures.shown(grid.x().origin()) + ", "
                + Figures.shown(grid.y().origin()) + "), step "
                + Figures.shown(grid.x().size(0));
    }
}
