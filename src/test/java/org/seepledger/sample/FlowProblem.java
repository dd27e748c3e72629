package org.seepledger.sample;

import java.util.List;

/**
 * What determines the flow: the ground, and where water comes and goes.
 *
 * @param grid the grid
 * @param horizontal hydraulic conductivity of each cell along the layers, m/d; NaN where nothing flows
 * @param vertical hydraulic conductivity of each cell across them, m/d
 * @param outerHead the head at each outer face, m; NaN where it is closed; inner faces have NaN
 * @param exchanges flows that depend on the head
 * @param supply what each cell is given, m³/d
 */
record FlowProblem(
        BlockGrid grid,
        double[] horizontal,
        double[] vertical,
        double[] outerHead,
        List<Exchange> exchanges,
        double[] supply) {

    boolean isActive(int cell) {
        return !Double.isNaN(horizontal[cell]);
    }

    FlowProblem with(List<Exchange> others) {
        return new FlowProblem(grid, horizontal, vertical, outerHead, others, supply);
    }

    /** The water-filled thickness of each cell at some heads; layers without a water table are full. */
    double[] saturatedThickness(double[] heads, boolean[] waterTable) {
        double[] thickness = new double[grid.cells()];
        for (int cell = 0; cell < thickness.length; cell++) {
            double bottom = grid.bottomElevation(cell);
            double top = grid.topElevation(cell);
            double surface = waterTable[grid.layer(cell)] ? Math.max(bottom, Math.min(top, heads[cell])) : top;
            thickness[cell] = surface - bottom;
        }
        return thickness;
    }
}
