package org.seepledger.balance;

import java.util.function.Consumer;
import org.seepledger.aquifer.Block;
import org.seepledger.aquifer.FaceFlows;
import org.seepledger.prism.Coverage;

/**
 * A face between two cells of a layer, where a prism's lids may make a step.
 *
 * @param layer the layer
 * @param row the row of the cell that the flow is counted from
 * @param column its column
 * @param nextRow the row of the cell that it is counted to
 * @param nextColumn its column
 * @param flow what flows from the one to the other through the part of the face inside, length³/time
 */
record Riser(int layer, int row, int column, int nextRow, int nextColumn, double flow) {

    /** Finds the faces of a cell to the west and north that lie inside, at least in part. */
    static void around(FaceFlows flows, Coverage coverage, int layer, int row, int column, Consumer<Riser> found) {
        Block block = flows.block();
        double toWest = coverage.westFace(row, column);
        if (toWest != 0 && column > 0) {
            double flow = toWest * flows.x()[block.xFace(layer, row, column)];
            found.accept(new Riser(layer, row, column - 1, row, column, flow));
        }
        double toNorth = coverage.northFace(row, column);
        if (toNorth != 0 && row > 0) {
            double flow = toNorth * flows.y()[block.yFace(layer, row, column)];
            found.accept(new Riser(layer, row, column, row - 1, column, flow));
        }
    }

    /** The cell that the flow comes from. */
    int upstream(Block block) {
        return flow >= 0 ? block.cell(layer, row, column) : block.cell(layer, nextRow, nextColumn);
    }

    /** What leaves through the top's step. */
    double throughTop(Slab slab) {
        return flow == 0 ? 0 : flow * (Math.max(high(slab), nextLow(slab)) - Math.max(nextHigh(slab), low(slab)));
    }

    /** What leaves through the bottom's step. */
    double throughBottom(Slab slab) {
        return flow == 0 ? 0 : flow * (Math.min(nextLow(slab), high(slab)) - Math.min(low(slab), nextHigh(slab)));
    }

    /** What flows from one slab in the first cell to another in the second. */
    double between(Slab from, Slab to) {
        return flow == 0
                ? 0
                : flow * Math.max(0, Math.min(high(from), nextHigh(to)) - Math.max(low(from), nextLow(to)));
    }

    private double low(Slab slab) {
        return slab.low(layer, row, column);
    }

    private double high(Slab slab) {
        return slab.high(layer, row, column);
    }

    private double nextLow(Slab slab) {
        return slab.low(layer, nextRow, nextColumn);
    }

    private double nextHigh(Slab slab) {
        return slab.high(layer, nextRow, nextColumn);
    }
}
