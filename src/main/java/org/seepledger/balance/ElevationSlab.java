package org.seepledger.balance;

import org.seepledger.aquifer.Block;
import org.seepledger.aquifer.CellGeometry;
import org.seepledger.aquifer.CellTerm;
import org.seepledger.aquifer.FaceFlows;
import org.seepledger.aquifer.IntervalState;
import org.seepledger.prism.Coverage;

/**
 * A range between two elevations or surfaces, which cut cells.
 *
 * <p>With low ≤ high the parts of a cell's saturated height below the prism's bottom and top, lateral flow counts by
 * high − low. The upward flow at an elevation grows evenly over the saturated height by all that the cell gains but areal
 * sources, which enter at the water table, and release from specific yield, which enters where the water table passes. A dry
 * cell uses its whole height. Where the parts of two neighbours differ, what flows between them crosses a step of the
 * lids, the riser.
 */
final class ElevationSlab implements Slab {

    private final Chart chart;
    private final Coverage coverage;
    private final Elevations elevations;
    private final IntervalState state;
    private final FaceFlows flows;
    private final Block block;
    private final CellGeometry geometry;

    ElevationSlab(Chart chart, Coverage coverage, Elevations elevations, IntervalState state) {
        this.chart = chart;
        this.coverage = coverage;
        this.elevations = elevations;
        this.state = state;
        this.flows = state.flows();
        this.block = flows.block();
        this.geometry = state.geometry();
    }

    private double low(int cell, int row, int column) {
        return partBelow(cell, elevations.bottom(row, column));
    }

    private double high(int cell, int row, int column) {
        return partBelow(cell, elevations.top(row, column));
    }

    /** The part of a cell's saturated height below an elevation. */
    private double partBelow(int cell, double elevation) {
        double above = elevation - geometry.bottom(cell);
        double height = height(cell);
        return above <= 0 ? 0 : above >= height ? 1 : above / height;
    }

    private double height(int cell) {
        double saturated = state.saturation().thickness(cell);
        return saturated > 0 ? saturated : geometry.thickness(cell);
    }

    @Override
    public double part(int layer, int row, int column) {
        int cell = block.cell(layer, row, column);
        return flows.active()[cell] ? high(cell, row, column) - low(cell, row, column) : 0;
    }

    @Override
    public double counted(CellTerm.Entry entry, int layer, int row, int column) {
        int cell = block.cell(layer, row, column);
        return countedBelow(entry, cell, elevations.top(row, column))
                - countedBelow(entry, cell, elevations.bottom(row, column));
    }

    private double countedBelow(CellTerm.Entry entry, int cell, double elevation) {
        return switch (entry) {
            case THROUGHOUT -> partBelow(cell, elevation);
            case AT_WATER_TABLE -> partBelow(cell, elevation) >= 1 ? 1 : 0;
            case WHERE_IT_PASSES -> state.saturation().partReleasedBelow(cell, elevation);
        };
    }

    @Override
    public double outflow(int layer, int row, int column) {
        double lateral = flows.x()[block.xFace(layer, row, column + 1)]
                - flows.x()[block.xFace(layer, row, column)]
                + (flows.y()[block.yFace(layer, row, column)] - flows.y()[block.yFace(layer, row + 1, column)]);
        return part(layer, row, column) * lateral
                + upward(layer, row, column, elevations.top(row, column))
                - upward(layer, row, column, elevations.bottom(row, column));
    }

    /** Upward flow through a cell at an elevation; through its top or bottom where that lies beyond it. */
    private double upward(int layer, int row, int column, double elevation) {
        int cell = block.cell(layer, row, column);
        double fromBelow = flows.z()[block.zFace(layer + 1, row, column)];
        double through = flows.z()[block.zFace(layer, row, column)];
        if (!(elevation > geometry.bottom(cell))) {
            return fromBelow;
        }
        if (elevation >= geometry.top(cell)) {
            return through;
        }
        double sheet = 0;
        double sheetBelow = 0;
        for (CellTerm term : state.terms()) {
            if (term.entry() != CellTerm.Entry.THROUGHOUT) {
                sheet += term.rates()[cell];
                sheetBelow += term.rates()[cell] * countedBelow(term.entry(), cell, elevation);
            }
        }
        return fromBelow + partBelow(cell, elevation) * (through - sheet - fromBelow) + sheetBelow;
    }

    @Override
    public void bookLids(int row, int column, double share, Bookings bookings) {
        double top = elevations.top(row, column);
        double bottom = elevations.bottom(row, column);
        if (top <= bottom) {
            return;
        }
        int upper = layerAt(row, column, top, true);
        int lower = layerAt(row, column, bottom, false);
        if (upper >= 0 && lower >= 0 && upper <= lower) {
            bookings.throughFace(chart.top(upper), share * upward(upper, row, column, top));
            bookings.throughFace(chart.bottom(lower), -share * upward(lower, row, column, bottom));
        }
    }

    /**
     * The layer in which a lid lies, as far as cells have thickness: for a top on an interface the one below it, for a
     * bottom the one above; -1 where the lid misses the column.
     */
    private int layerAt(int row, int column, double elevation, boolean top) {
        int found = -1;
        for (int layer = 0; layer < block.layers(); layer++) {
            int cell = block.cell(layer, row, column);
            if (!geometry.isPresent(cell)) {
                continue;
            }
            boolean below = top ? geometry.bottom(cell) < elevation : geometry.top(cell) > elevation;
            if (top && below) {
                return layer;
            }
            found = !top && below ? layer : found;
        }
        return found;
    }

    @Override
    public void bookRisers(int row, int column, Bookings bookings) {
        double toWest = coverage.westFace(row, column);
        double toNorth = coverage.northFace(row, column);
        for (int layer = chart.first(); layer <= chart.last(); layer++) {
            if (toWest != 0 && column > 0) {
                double flow = toWest * flows.x()[block.xFace(layer, row, column)];
                bookRiser(layer, flow, row, column - 1, row, column, bookings);
            }
            if (toNorth != 0 && row > 0) {
                double flow = toNorth * flows.y()[block.yFace(layer, row, column)];
                bookRiser(layer, flow, row, column, row - 1, column, bookings);
            }
        }
    }

    /** Books a flow from one cell to its neighbour, as far as it leaves or enters the prism through a step. */
    private void bookRiser(
            int layer, double flow, int row, int column, int nextRow, int nextColumn, Bookings bookings) {
        int cell = block.cell(layer, row, column);
        int next = block.cell(layer, nextRow, nextColumn);
        if (!flows.active()[cell] || !flows.active()[next]) {
            return;
        }
        double low = low(cell, row, column);
        double high = high(cell, row, column);
        double nextLow = low(next, nextRow, nextColumn);
        double nextHigh = high(next, nextRow, nextColumn);
        double throughTop = Math.max(high, nextLow) - Math.max(nextHigh, low);
        double throughBottom = Math.min(nextLow, high) - Math.min(low, nextHigh);
        if (throughTop != 0) {
            bookings.throughFace(chart.top(layer), flow * throughTop);
        }
        if (throughBottom != 0) {
            bookings.throughFace(chart.bottom(layer), flow * throughBottom);
        }
    }
}
