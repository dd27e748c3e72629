package org.seepledger.picture;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.TreeSet;
import org.seepledger.aquifer.Aquifer;
import org.seepledger.aquifer.Axis;
import org.seepledger.aquifer.Grid;
import org.seepledger.aquifer.GriddedValues;
import org.seepledger.aquifer.Window;
import org.seepledger.prism.Prism;
import org.seepledger.prism.Ring;
import org.seepledger.prism.Side;
import org.seepledger.prism.VerticalRange;

/**
 * An aquifer and a prism cut along a line: stretches that each lie in one cell, and wholly inside or outside the prism.
 *
 * @param stretches from the line's beginning to its end
 */
record Profile(List<Stretch> stretches) {

    /** More stretches than a picture has pixels are not looked at. */
    private static final int MOST = 2000;

    /** Copies the list. */
    Profile {
        stretches = List.copyOf(stretches);
    }

    /**
     * What stands in a column of cells.
     *
     * @param surfaces elevations between the layers, from the uppermost top down; NaN where there is none
     * @param levelAtStart the uppermost layer's head at the record's begin; NaN where there is none
     * @param levelAtEnd the same at its end
     */
    record Column(double[] surfaces, double levelAtStart, double levelAtEnd) {}

    /**
     * A piece of the line.
     *
     * @param from where it begins, as a share of the line
     * @param to where it ends
     * @param column what it cuts
     * @param top the elevation of the prism's top; NaN outside the prism
     * @param bottom the elevation of its bottom
     */
    record Stretch(double from, double to, Column column, double top, double bottom) {

        boolean isInPrism() {
            return top > bottom;
        }
    }

    /**
     * {@return the cut}
     *
     * @param line the line, on the grid
     * @param aquifer the aquifer
     * @param prism the prism
     */
    static Profile along(SectionLine line, Aquifer aquifer, Prism prism) {
        Grid grid = aquifer.grid();
        List<Stretch> stretches = new ArrayList<>();
        Window lastCell = null;
        Column column = null;
        double from = 0;
        for (double to : ends(line, grid, prism)) {
            double x = line.x((from + to) / 2);
            double y = line.y((from + to) / 2);
            int row = grid.flipped(grid.y().nearest(grid.localY(x, y)));
            Window cell = new Window(row, grid.x().nearest(grid.localX(x, y)), 1, 1);
            if (!cell.equals(lastCell)) {
                column = column(aquifer, cell);
                lastCell = cell;
            }
            boolean inside = isInside(prism, x, y);
            double top = inside ? top(prism.range(), column, cell) : Double.NaN;
            double bottom = inside ? bottom(prism.range(), column, cell) : Double.NaN;
            stretches.add(new Stretch(from, to, column, top, bottom));
            from = to;
        }
        return new Profile(stretches);
    }

    private static double top(VerticalRange range, Column column, Window cell) {
        if (range instanceof VerticalRange.Layers layers) {
            return column.surfaces()[layers.first()];
        }
        Optional<GriddedValues> top = ((VerticalRange.Elevations) range).top();
        return Math.min(
                top.map(surface -> read(surface, 0, 0, cell)).orElse(Double.POSITIVE_INFINITY), column.surfaces()[0]);
    }

    private static double bottom(VerticalRange range, Column column, Window cell) {
        if (range instanceof VerticalRange.Layers layers) {
            return column.surfaces()[layers.last() + 1];
        }
        Optional<GriddedValues> bottom = ((VerticalRange.Elevations) range).bottom();
        double lowest = column.surfaces()[column.surfaces().length - 1];
        return Math.max(bottom.map(surface -> read(surface, 0, 0, cell)).orElse(Double.NEGATIVE_INFINITY), lowest);
    }

    private static Column column(Aquifer aquifer, Window cell) {
        double[] surfaces = new double[aquifer.layers().size() + 1];
        for (int k = 0; k < surfaces.length; k++) {
            surfaces[k] = read(aquifer.surface(k), Math.max(0, k - 1), 0, cell);
        }
        int end = aquifer.times().intervals();
        return new Column(surfaces, level(aquifer, 0, cell), level(aquifer, end, cell));
    }

    /** The head of the uppermost layer that has one and is not dry. */
    private static double level(Aquifer aquifer, int instant, Window cell) {
        for (int layer = 0; layer < aquifer.layers().size() && aquifer.head().isPresent(); layer++) {
            GriddedValues head = aquifer.head().get();
            double level = read(head, layer, head.changes() ? instant : 0, cell);
            if (Double.isFinite(level)) {
                return level;
            }
        }
        return Double.NaN;
    }

    private static double read(GriddedValues values, int layer, int step, Window cell) {
        double[] target = new double[1];
        values.read(layer, step, cell, target, 0);
        return target[0];
    }

    /** Where stretches end: at grid lines, at the prism's sides, and at the end of the line. */
    private static Iterable<Double> ends(SectionLine line, Grid grid, Prism prism) {
        TreeSet<Double> ends = new TreeSet<>();
        double startX = grid.localX(line.fromX(), line.fromY());
        double startY = grid.localY(line.fromX(), line.fromY());
        addLines(ends, grid.x(), startX, grid.localX(line.toX(), line.toY()) - startX);
        addLines(ends, grid.y(), startY, grid.localY(line.toX(), line.toY()) - startY);
        if (ends.size() > MOST) {
            ends.clear();
            for (int i = 1; i < MOST; i++) {
                ends.add((double) i / MOST);
            }
        }
        for (Ring ring : prism.rings()) {
            for (int i = 0; i < ring.sides().size(); i++) {
                addCrossing(ends, line, ring.sides().get(i), ring.after(i));
            }
        }
        ends.add(1.0);
        return ends;
    }

    private static void addLines(TreeSet<Double> ends, Axis axis, double start, double way) {
        for (int i = 0; i <= axis.count(); i++) {
            addInside(ends, (axis.edge(i) - start) / way);
        }
    }

    private static void addCrossing(TreeSet<Double> ends, SectionLine line, Side from, Side to) {
        double wayX = line.toX() - line.fromX();
        double wayY = line.toY() - line.fromY();
        double before = wayX * (from.y() - line.fromY()) - wayY * (from.x() - line.fromX());
        double after = wayX * (to.y() - line.fromY()) - wayY * (to.x() - line.fromX());
        if (before > 0 != after > 0) {
            double part = before / (before - after);
            double x = from.x() + part * (to.x() - from.x()) - line.fromX();
            double y = from.y() + part * (to.y() - from.y()) - line.fromY();
            addInside(ends, (x * wayX + y * wayY) / (wayX * wayX + wayY * wayY));
        }
    }

    private static void addInside(TreeSet<Double> ends, double share) {
        if (share > 0 && share < 1) {
            ends.add(share);
        }
    }

    /** Whether a ray to the east crosses the rings an odd number of times. */
    private static boolean isInside(Prism prism, double x, double y) {
        boolean inside = false;
        for (Ring ring : prism.rings()) {
            for (int i = 0; i < ring.sides().size(); i++) {
                Side from = ring.sides().get(i);
                Side to = ring.after(i);
                boolean spans = from.y() > y != to.y() > y;
                inside ^= spans && x < from.x() + (y - from.y()) / (to.y() - from.y()) * (to.x() - from.x());
            }
        }
        return inside;
    }
}
