package org.seepledger.sample;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.Arrays;
import java.util.List;
import org.junit.jupiter.api.Test;

/** Three blocks in a row, 10, 20 and 10 m long and 4 m wide, worked by hand. */
class FaceThicknessTest {

    private final BlockGrid grid =
            new BlockGrid(new double[] {0, 10, 30, 40}, new double[] {0, 4}, new double[][] {{20, 20, 20}, {0, 0, 0}});
    private final double[] heads = {9, 6, 8};

    /** Conductivities 2 and 5 in series over half-blocks of 5 and 10 m, and 5 and 1 over 10 and 5 m. */
    @Test
    void aWaterTableFlowsAsThickAsItsHigherSide() {
        double[] flows = flows(true);
        assertThat(flows[grid.east(0)]).isCloseTo((9 - 6) / (5 / 2.0 + 10 / 5.0) * 9 * 4, within(1e-12));
        assertThat(flows[grid.east(1)]).isCloseTo((6 - 8) / (10 / 5.0 + 5 / 1.0) * 8 * 4, within(1e-12));
    }

    @Test
    void otherLayersFlowInTheirOwnThickness() {
        double[] flows = flows(false);
        assertThat(flows[grid.east(0)]).isCloseTo((9 - 6) / (5 / 2.0 + 10 / 5.0) * 20 * 4, within(1e-12));
    }

    /** Upward through 4 m of 0.5 m/d, a layer that is not there, and 6 m of 2 m/d: half of each in series. */
    @Test
    void aLayerWithoutThicknessHandsOnWhatFlowsAcrossIt() {
        BlockGrid column =
                new BlockGrid(new double[] {0, 10}, new double[] {0, 7}, new double[][] {{10}, {6}, {6}, {0}});
        FlowProblem problem = new FlowProblem(
                column,
                new double[] {1, 1, 1},
                new double[] {0.5, 0.001, 2},
                closed(column),
                List.of(new Exchange(0, 1e9, 8)),
                new double[] {0, 0, 3});
        FlowEquations equations = new FlowEquations(problem, new double[] {4, 0, 6});
        double[] solved = equations.solve(new double[3]);
        double expected = (solved[2] - solved[0]) / (2 / 0.5 + 3 / 2.0) * 70;
        assertThat(expected).isCloseTo(3, within(1e-8));
        assertThat(equations.faceFlows(solved)[column.top(1)]).isCloseTo(3, within(1e-8));
        assertThat(equations.faceFlows(solved)[column.bottom(1)]).isCloseTo(3, within(1e-8));
    }

    private double[] flows(boolean waterTable) {
        double[] conductivity = {2, 5, 1};
        FlowProblem problem = new FlowProblem(grid, conductivity, conductivity, closed(grid), List.of(), new double[3]);
        boolean[] layers = {waterTable};
        double[] saturated = problem.saturatedThickness(heads, layers);
        return new FlowEquations(problem, FaceThickness.upstream(grid, layers, heads, saturated)).faceFlows(heads);
    }

    private static double[] closed(BlockGrid grid) {
        double[] outer = new double[grid.faces()];
        Arrays.fill(outer, Double.NaN);
        return outer;
    }
}
