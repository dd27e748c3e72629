package org.seepledger.balance;

import org.seepledger.aquifer.Block;
import org.seepledger.aquifer.CellTerm;
import org.seepledger.aquifer.FaceFlows;
import org.seepledger.aquifer.IntervalState;

/** A range of whole layers: its lids are interfaces. */
record LayerSlab(Chart chart, IntervalState state) implements Slab {

    @Override
    public double part(int layer, int row, int column) {
        return 1;
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
    public void bookLids(int row, int column, double share, Bookings bookings) {
        if (isOpen(row, column)) {
            FaceFlows flows = state.flows();
            Block block = flows.block();
            double up = flows.z()[block.zFace(chart.first(), row, column)];
            double upFromBelow = flows.z()[block.zFace(chart.last() + 1, row, column)];
            bookings.throughFace(chart.top(chart.first()), share * up);
            bookings.throughFace(chart.bottom(chart.last()), -share * upFromBelow);
        }
    }

    /** Whether any layer of the range has thickness here. */
    private boolean isOpen(int row, int column) {
        for (int layer = chart.first(); layer <= chart.last(); layer++) {
            if (!state.geometry().isPinchedOut(state.flows().block().cell(layer, row, column))) {
                return true;
            }
        }
        return false;
    }

    @Override
    public void bookRisers(int row, int column, Bookings bookings) {
        // Whole layers have no steps: what flows from cell to cell stays inside.
    }
}
