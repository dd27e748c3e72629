package org.seepledger.sample;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.Arrays;
import java.util.List;
import org.junit.jupiter.api.Test;

class CentreDischargeTest {

    /** Uniform flow in a homogeneous box is K times the fall of head over the distance, everywhere (Darcy 1856). */
    @Test
    void uniformFlowIsTheSameAtEveryCentre() {
        double[] edges = {0, 10, 25, 45, 60};
        double[][] surfaces = new double[3][16];
        Arrays.fill(surfaces[0], 6);
        Arrays.fill(surfaces[1], 2);
        BlockGrid grid = new BlockGrid(edges, edges, surfaces);
        double[] conductivity = new double[grid.cells()];
        Arrays.fill(conductivity, 3);
        double[] outer = new double[grid.faces()];
        Arrays.fill(outer, Double.NaN);
        for (int cell = 0; cell < grid.cells(); cell++) {
            setOuter(grid, outer, grid.west(cell), grid.centreX(cell) - grid.width(cell) / 2, grid.centreY(cell));
            setOuter(grid, outer, grid.east(cell), grid.centreX(cell) + grid.width(cell) / 2, grid.centreY(cell));
            setOuter(grid, outer, grid.south(cell), grid.centreX(cell), grid.centreY(cell) - grid.height(cell) / 2);
            setOuter(grid, outer, grid.north(cell), grid.centreX(cell), grid.centreY(cell) + grid.height(cell) / 2);
        }
        FlowProblem problem =
                new FlowProblem(grid, conductivity, conductivity, outer, List.of(), new double[grid.cells()]);
        FlowSolution solution = WaterTableFlow.solve(problem, new boolean[2], new double[grid.cells()]);
        CentreDischarge discharge = CentreDischarge.of(grid, solution);
        assertThat(discharge.x()).usingComparatorWithPrecision(1e-9).containsOnly(3 * 0.02);
        assertThat(discharge.y()).usingComparatorWithPrecision(1e-9).containsOnly(3 * -0.01);
        assertThat(discharge.z()).usingComparatorWithPrecision(1e-9).containsOnly(0);
    }

    private static void setOuter(BlockGrid grid, double[] heads, int face, double x, double y) {
        if (grid.behind(face) == BlockGrid.OUTSIDE || grid.ahead(face) == BlockGrid.OUTSIDE) {
            heads[face] = 50 - 0.02 * x + 0.01 * y;
        }
    }
}
