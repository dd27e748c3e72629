package org.seepledger.sample;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.Arrays;
import java.util.List;
import org.junit.jupiter.api.Test;

/**
 * A strip with recharge w between two heads on a level base: h² = h0² − (h0² − h1²) x / L + w x (L − x) / K
 * (Dupuit 1863; the form is in any handbook of hydrogeology).
 */
class WaterTableFlowTest {

    private static final double LENGTH = 400;
    private static final double WIDTH = 10;
    private static final double CONDUCTIVITY = 6;
    private static final double RECHARGE = 0.002;
    private static final double LEFT = 9;
    private static final double RIGHT = 5;

    @Test
    void headsApproachTheParabolaWithTheSquareOfTheCellSize() {
        double coarse = largestError(40);
        double fine = largestError(80);
        assertThat(fine).isLessThan(5e-4);
        // Second order: halving the cells quarters the error, measured as 3.7.
        assertThat(coarse / fine).isBetween(3.5, 4.5);
    }

    @Test
    void endsDischargeWhatFallsOnTheStrip() {
        FlowSolution solution = solve(80);
        BlockGrid grid = grid(80);
        double west = solution.faceFlows()[grid.west(0)];
        double east = solution.faceFlows()[grid.east(79)];
        assertThat(east - west).isCloseTo(RECHARGE * LENGTH * WIDTH, within(1e-8));
        double gradient = CONDUCTIVITY * (LEFT * LEFT - RIGHT * RIGHT) / (2 * LENGTH);
        double expected = WIDTH * (gradient + RECHARGE * LENGTH / 2);
        assertThat(east).isCloseTo(expected, within(1e-4 * expected));
    }

    @Test
    void confinedLayersStayFull() {
        BlockGrid grid = grid(4);
        FlowProblem problem = problem(grid);
        assertThat(problem.saturatedThickness(new double[] {-1, 3, 12, 20}, new boolean[] {true}))
                .containsExactly(0, 3, 12, 15);
        assertThat(problem.saturatedThickness(new double[] {-1, 3, 12, 20}, new boolean[] {false}))
                .containsExactly(15, 15, 15, 15);
    }

    private static double largestError(int cells) {
        BlockGrid grid = grid(cells);
        double[] heads = solve(cells).heads();
        double largest = 0;
        for (int cell = 0; cell < cells; cell++) {
            double x = grid.centreX(cell);
            double squared = LEFT * LEFT
                    - (LEFT * LEFT - RIGHT * RIGHT) * x / LENGTH
                    + RECHARGE * x * (LENGTH - x) / CONDUCTIVITY;
            largest = Math.max(largest, Math.abs(heads[cell] - Math.sqrt(squared)));
        }
        return largest;
    }

    private static FlowSolution solve(int cells) {
        double[] start = new double[cells];
        Arrays.fill(start, LEFT);
        return WaterTableFlow.solve(problem(grid(cells)), new boolean[] {true}, start);
    }

    private static FlowProblem problem(BlockGrid grid) {
        double[] conductivity = new double[grid.cells()];
        Arrays.fill(conductivity, CONDUCTIVITY);
        double[] outer = new double[grid.faces()];
        Arrays.fill(outer, Double.NaN);
        outer[grid.west(0)] = LEFT;
        outer[grid.east(grid.cells() - 1)] = RIGHT;
        double[] supply = new double[grid.cells()];
        Arrays.setAll(supply, cell -> RECHARGE * grid.area(cell));
        return new FlowProblem(grid, conductivity, conductivity, outer, List.of(), supply);
    }

    private static BlockGrid grid(int cells) {
        double[] edges = new double[cells + 1];
        Arrays.setAll(edges, edge -> edge * LENGTH / cells);
        double[][] surfaces = new double[2][cells];
        Arrays.fill(surfaces[0], 15);
        return new BlockGrid(edges, new double[] {0, WIDTH}, surfaces);
    }
}
