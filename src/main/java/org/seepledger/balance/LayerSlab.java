package org.seepledger.balance;

import org.seepledger.aquifer.Block;
import org.seepledger.aquifer.CellGeometry;
import org.seepledger.aquifer.CellTerm;
import org.seepledger.aquifer.IntervalState;

/** A range of whole layers: its lids are interfaces. */
record LayerSlab(Chart chart, IntervalState state) implements Slab {

    @Override
    public double low(int layer, int row, int column) {
        return 0;
    }

    @Override
    public double high(int layer, int row, int column) {
        return chart.holds(layer) ? 1 : 0;
    }

    @Override
    public double counted(CellTerm.Entry entry, int layer, int row, int column) {
        return 1;
    }

    @Override
    public double outflow(int layer, int row, int column) {
        return -state.flows().gain(layer, row, column);
    }

    @Override
    public double gross(int layer, int row, int column) {
        return state.flows().gross(layer, row, column);
    }

    @Override
    public double top(int row, int column) {
        CellGeometry geometry = state.geometry();
        for (int layer = chart.first(); layer <= chart.last(); layer++) {
            int cell = geometry.block().cell(layer, row, column);
            if (!geometry.isPinchedOut(cell)) {
                return geometry.top(cell);
            }
        }
        return Double.NaN;
    }

    @Override
    public double bottom(int row, int column) {
        CellGeometry geometry = state.geometry();
        for (int layer = chart.last(); layer >= chart.first(); layer--) {
            int cell = geometry.block().cell(layer, row, column);
            if (!geometry.isPinchedOut(cell)) {
                return geometry.bottom(cell);
            }
        }
        return Double.NaN;
    }

    @Override
    public int topLayer(int row, int column) {
        return chart.first();
    }

    @Override
    public int bottomLayer(int row, int column) {
        return chart.last();
    }

    @Override
    public double upwardAtTop(int row, int column) {
        Block block = state.flows().block();
        return state.flows().z()[block.zFace(chart.first(), row, column)];
    }

    @Override
    public double upwardAtBottom(int row, int column) {
        Block block = state.flows().block();
        return state.flows().z()[block.zFace(chart.last() + 1, row, column)];
    }

    @Override
    public int cellBelowTop(int row, int column) {
        return state.geometry().next(chart.first() - 1, 1, row, column);
    }

    @Override
    public int cellAboveTop(int row, int column) {
        return state.geometry().next(chart.first(), -1, row, column);
    }

    @Override
    public int cellAboveBottom(int row, int column) {
        return state.geometry().next(chart.last() + 1, -1, row, column);
    }

    @Override
    public int cellBelowBottom(int row, int column) {
        return state.geometry().next(chart.last(), 1, row, column);
    }

    @Override
    public double floor(int row, int column) {
        return Double.NEGATIVE_INFINITY;
    }

    @Override
    public double ceiling(int row, int column) {
        return Double.POSITIVE_INFINITY;
    }

    @Override
    public boolean hasRisers() {
        return false;
    }
}
