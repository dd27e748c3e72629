package org.seepledger.picture;

import java.util.ArrayList;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.TreeSet;
import org.seepledger.aquifer.Aquifer;
import org.seepledger.aquifer.Axis;
import org.seepledger.aquifer.Grid;
import org.seepledger.aquifer.Window;
import org.seepledger.progress.Progress;

/**
 * An aquifer cut along a line: stretches that each lie in one cell. What lies off the grid has none.
 *
 * <p>A leg on a line between cells takes those to the east or north of it, on the grid's own edge those that there are.
 * Only the cells that the line crosses are read, in small windows, and each once.
 *
 * @param line the line
 * @param planUnit how many length units a plan unit has
 * @param stretches from the line's beginning to its end
 */
public record Profile(SectionLine line, double planUnit, List<Stretch> stretches) {

    /** More stretches than could be told apart, however far one zooms in, are sampled. */
    private static final int MOST = 20_000;

    /** A window around cells of the line may hold as many cells: few calls, and little read in vain. */
    private static final int CELLS_AT_ONCE = 64;

    /** Copies the list. */
    public Profile {
        stretches = List.copyOf(stretches);
    }

    /** Gives values to be shown as colour. */
    @FunctionalInterface
    public interface LayerValues {

        /**
         * {@return the values of a window's cells in a layer, row-major; NaN where there is none}
         *
         * @param layer the layer, from 0
         * @param window the window
         */
        double[] of(int layer, Window window);
    }

    /**
     * What stands in a column of cells.
     *
     * @param row its row in the grid
     * @param column its column in the grid
     * @param surfaces elevations between the layers, from the uppermost top down; NaN where there is none
     * @param before each layer's head at the begin; negative infinity where dry, NaN where there is none
     * @param heads each layer's head at the end
     * @param values each layer's value to be shown; empty where none was asked for
     */
    public record Column(int row, int column, double[] surfaces, double[] before, double[] heads, double[] values) {

        /** The head of the uppermost layer that has one and is not dry. */
        private static double level(double[] heads) {
            for (double head : heads) {
                if (Double.isFinite(head)) {
                    return head;
                }
            }
            return Double.NaN;
        }

        /** {@return the uppermost water level at the begin; NaN where there is none} */
        double levelBefore() {
            return level(before);
        }

        /** {@return the uppermost water level at the end; NaN where there is none} */
        double level() {
            return level(heads);
        }

        /**
         * {@return the layer that an elevation lies in, from 0; −1 for none}
         *
         * @param elevation in length units
         */
        public int layerAt(double elevation) {
            for (int layer = 0; layer + 1 < surfaces.length; layer++) {
                if (elevation <= surfaces[layer] && elevation > surfaces[layer + 1]) {
                    return layer;
                }
            }
            return -1;
        }
    }

    /**
     * A piece of the line.
     *
     * @param from how far along the line it begins, in length units
     * @param to where it ends
     * @param column what it cuts
     */
    public record Stretch(double from, double to, Column column) {}

    /** {@return how long the line is, in length units} */
    public double length() {
        return line.length() * planUnit;
    }

    /**
     * {@return the stretch at a distance along the line, if the line lies on the grid there}
     *
     * @param along in length units
     */
    public Optional<Stretch> at(double along) {
        return stretches.stream()
                .filter(stretch -> along >= stretch.from() && along <= stretch.to())
                .findFirst();
    }

    /**
     * Cuts an aquifer.
     *
     * @param line the line
     * @param aquifer the aquifer
     * @param begin the instant that water levels begin at, from 0
     * @param end the instant that they end at
     * @param values values to be shown as colour, if any
     * @param progress asked before each window is read
     * @return the cut
     * @throws org.seepledger.fault.DataFault if the data are wrong
     */
    public static Profile along(
            SectionLine line, Aquifer aquifer, int begin, int end, Optional<LayerValues> values, Progress progress) {
        Grid grid = aquifer.grid();
        List<Cell> cells = new ArrayList<>();
        for (SectionLine.Leg leg : line.legs()) {
            addCells(leg, grid, cells);
        }
        Map<Long, Column> columns = new HashMap<>();
        ColumnReading reading = new ColumnReading(aquifer, begin, end, values);
        for (int first = 0; first < cells.size(); ) {
            progress.step();
            Window window = cells.get(first).window();
            int next = first + 1;
            while (next < cells.size()
                    && joined(window, cells.get(next).window()).size() <= CELLS_AT_ONCE) {
                window = joined(window, cells.get(next).window());
                next++;
            }
            for (Cell cell : cells.subList(first, next)) {
                Window read = window;
                columns.computeIfAbsent(cell.key(), key -> reading.of(read, cell.row(), cell.column()));
            }
            first = next;
        }
        double unit = grid.planUnit();
        return new Profile(
                line,
                unit,
                cells.stream()
                        .map(cell -> new Stretch(unit * cell.from(), unit * cell.to(), columns.get(cell.key())))
                        .toList());
    }

    /** A piece of the line in a cell; distances in plan units. */
    private record Cell(double from, double to, int row, int column) {

        Window window() {
            return new Window(row, column, 1, 1);
        }

        long key() {
            return (long) row << 32 | column;
        }
    }

    private static Window joined(Window one, Window other) {
        int row = Math.min(one.row(), other.row());
        int column = Math.min(one.column(), other.column());
        int rowEnd = Math.max(one.rowEnd(), other.rowEnd());
        int columnEnd = Math.max(one.columnEnd(), other.columnEnd());
        return new Window(row, column, rowEnd - row, columnEnd - column);
    }

    private static void addCells(SectionLine.Leg leg, Grid grid, List<Cell> cells) {
        double from = 0;
        for (double to : ends(leg, grid)) {
            var middle = leg.at((from + to) / 2);
            if (grid.holds(middle.x(), middle.y())) {
                int column = grid.x().nearest(grid.snappedX(middle.x(), middle.y()));
                int row = grid.flipped(grid.y().nearest(grid.snappedY(middle.x(), middle.y())));
                cells.add(new Cell(leg.begin() + from * leg.length(), leg.begin() + to * leg.length(), row, column));
            }
            from = to;
        }
    }

    /** Where pieces of a leg end, as shares of it: at grid lines, and at its end. */
    private static Iterable<Double> ends(SectionLine.Leg leg, Grid grid) {
        TreeSet<Double> ends = new TreeSet<>();
        double startX = grid.localX(leg.from().x(), leg.from().y());
        double startY = grid.localY(leg.from().x(), leg.from().y());
        addLines(ends, grid.x(), startX, grid.localX(leg.to().x(), leg.to().y()) - startX);
        addLines(ends, grid.y(), startY, grid.localY(leg.to().x(), leg.to().y()) - startY);
        if (ends.size() > MOST) {
            ends.clear();
            for (int i = 1; i < MOST; i++) {
                ends.add((double) i / MOST);
            }
        }
        ends.add(1.0);
        return ends;
    }

    private static void addLines(TreeSet<Double> ends, Axis axis, double start, double way) {
        for (int i = 0; i <= axis.count(); i++) {
            double share = (axis.edge(i) - start) / way;
            if (share > 0 && share < 1) {
                ends.add(share);
            }
        }
    }
}
