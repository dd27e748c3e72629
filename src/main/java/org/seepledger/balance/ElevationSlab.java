package org.seepledger.balance;

import org.seepledger.aquifer.Block;
import org.seepledger.aquifer.CellGeometry;
import org.seepledger.aquifer.CellTerm;
import org.seepledger.aquifer.FaceFlows;
import org.seepledger.aquifer.IntervalState;

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

    private final Elevations elevations;
    private final IntervalState state;
    private final FaceFlows flows;
    private final Block block;
    private final CellGeometry geometry;

    ElevationSlab(Elevations elevations, IntervalState state) {
        this.elevations = elevations;
        this.state = state;
        this.flows = state.flows();
        this.block = flows.block();
        this.geometry = state.geometry();
    }

    @Override
    public double low(int layer, int row, int column) {
        return partBelow(block.cell(layer, row, column), elevations.bottom(row, column));
    }

    @Override
    public double high(int layer, int row, int column) {
        return partBelow(block.cell(layer, row, column), elevations.top(row, column));
    }

    /** The part of a cell's saturated height below an elevation. */
    private double partBelow(int cell, double elevation) {
        if (!flows.active()[cell]) {
            return 0;
        }
        double above = elevation - geometry.bottom(cell);
        double height = height(cell);
        return above <= 0 ? 0 : above >= height ? 1 : above / height;
    }

    private double height(int cell) {
        double saturated = state.saturation().thickness(cell);
        return saturated > 0 ? saturated : geometry.thickness(cell);
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

    /** Beside the faces' flows, what enters in a sheet: it may leave through a lid alone. */
    @Override
    public double gross(int layer, int row, int column) {
        int cell = block.cell(layer, row, column);
        double gross = flows.gross(layer, row, column);
        for (CellTerm term : state.terms()) {
            if (term.entry() != CellTerm.Entry.THROUGHOUT) {
                gross += Math.abs(term.rates()[cell]);
            }
        }
        return gross;
    }

    /** Upward flow through a cell at an elevation; through its top or bottom where that lies beyond it. */
    private double upward(int layer, int row, int column, double elevation) {
        int cell = block.cell(layer, row, column);
        double fromBelow = flows.z()[block.zFace(layer + 1, row, column)];
        double through = flows.z()[block.zFace(layer, row, column)];
        if (!flows.active()[cell] || elevation <= geometry.bottom(cell)) {
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
    public double top(int row, int column) {
        int layer = lids(row, column)[0];
        return layer < 0
                ? Double.NaN
                : Math.min(elevations.top(row, column), geometry.top(block.cell(layer, row, column)));
    }

    @Override
    public double bottom(int row, int column) {
        int layer = lids(row, column)[1];
        return layer < 0
                ? Double.NaN
                : Math.max(elevations.bottom(row, column), geometry.bottom(block.cell(layer, row, column)));
    }

    @Override
    public int topLayer(int row, int column) {
        return lids(row, column)[0];
    }

    @Override
    public int bottomLayer(int row, int column) {
        return lids(row, column)[1];
    }

    @Override
    public double upwardAtTop(int row, int column) {
        return upward(topLayer(row, column), row, column, elevations.top(row, column));
    }

    @Override
    public double upwardAtBottom(int row, int column) {
        return upward(bottomLayer(row, column), row, column, elevations.bottom(row, column));
    }

    @Override
    public int cellBelowTop(int row, int column) {
        return block.cell(topLayer(row, column), row, column);
    }

    @Override
    public int cellAboveTop(int row, int column) {
        int cell = cellBelowTop(row, column);
        boolean cut = elevations.top(row, column) < geometry.top(cell);
        return cut ? cell : geometry.next(topLayer(row, column), -1, row, column);
    }

    @Override
    public int cellAboveBottom(int row, int column) {
        return block.cell(bottomLayer(row, column), row, column);
    }

    @Override
    public int cellBelowBottom(int row, int column) {
        int cell = cellAboveBottom(row, column);
        boolean cut = elevations.bottom(row, column) > geometry.bottom(cell);
        return cut ? cell : geometry.next(bottomLayer(row, column), 1, row, column);
    }

    @Override
    public double floor(int row, int column) {
        return elevations.bottom(row, column);
    }

    @Override
    public double ceiling(int row, int column) {
        return elevations.top(row, column);
    }

    @Override
    public boolean hasRisers() {
        return true;
    }

    /**
     * The layers in which top and bottom lie, as far as cells have thickness: for a top on an interface the one below it,
     * for a bottom the one above; -1 where the range misses the column.
     */
    private int[] lids(int row, int column) {
        double top = elevations.top(row, column);
        double bottom = elevations.bottom(row, column);
        int upper = -1;
        int lower = -1;
        for (int layer = 0; layer < block.layers() && top > bottom; layer++) {
            int cell = block.cell(layer, row, column);
            if (geometry.isPresent(cell) && geometry.bottom(cell) < top && geometry.top(cell) > bottom) {
                upper = upper < 0 ? layer : upper;
                lower = layer;
            }
        }
        return new int[] {upper, lower};
    }
}
