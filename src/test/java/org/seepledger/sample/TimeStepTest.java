package org.seepledger.sample;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.Arrays;
import java.util.List;
import org.apache.commons.math3.special.Erf;
import org.junit.jupiter.api.Test;

class TimeStepTest {

    private static final double TRANSMISSIVITY = 50;
    private static final double STORATIVITY = 0.001;
    private static final double THICKNESS = 10;
    private static final double END = 1;

    /**
     * After a sudden rise by 1 at the end of a long strip the head at distance x has risen by erfc(x / √(4 T t / S)) (Carslaw
     * and Jaeger 1959). The implicit step is of first order: with half the step half the error.
     */
    @Test
    void aSuddenStageChangeSpreadsAsTheErrorFunctionSays() {
        double coarse = largestError(40);
        double fine = largestError(80);
        assertThat(fine).isLessThan(5e-3);
        assertThat(coarse / fine).isBetween(1.8, 2.2);
    }

    private static double largestError(int steps) {
        BlockGrid grid = strip(300, 10, THICKNESS);
        double[] outer = closed(grid);
        outer[grid.west(0)] = 1;
        FlowProblem problem = problem(grid, TRANSMISSIVITY / THICKNESS, outer, new double[grid.cells()]);
        StoredWater stored =
                new StoredWater(grid, new boolean[] {false}, perCell(grid, 0), new double[] {STORATIVITY / THICKNESS});
        double[] heads = new double[grid.cells()];
        for (int step = 0; step < steps; step++) {
            heads = new TimeStep(problem, stored, END / steps).from(heads).heads();
        }
        double largest = 0;
        for (int cell = 0; cell < heads.length; cell++) {
            double risen = Erf.erfc(grid.centreX(cell) / Math.sqrt(4 * TRANSMISSIVITY * END / STORATIVITY));
            largest = Math.max(largest, Math.abs(heads[cell] - risen));
        }
        return largest;
    }

    /** A closed cell gets 30 m³ in 5 d, of which 20 m³ and some fill it to the top; the rest raises the head far above. */
    @Test
    void aCellFillsThroughItsTop() {
        BlockGrid grid = strip(1, 10, 4);
        StoredWater stored = new StoredWater(grid, new boolean[] {true}, new double[] {0.2}, new double[] {0.001});
        FlowSolution solution =
                new TimeStep(problem(grid, 1, closed(grid), new double[] {6}), stored, 5).from(new double[] {3});
        double toTop = 100 * (0.2 * 1 + 0.001 * (4 * 4 - 3 * 3) / 2);
        assertThat(solution.heads()[0]).isCloseTo(4 + (30 - toTop) / (100 * 0.001 * 4), within(1e-8));
        FlowSolution back =
                new TimeStep(problem(grid, 1, closed(grid), new double[] {-6}), stored, 5).from(solution.heads());
        assertThat(back.heads()[0]).isCloseTo(3, within(1e-8));
    }

    /** What a strip whose water table falls to a ditch gives is what leaves it. */
    @Test
    void releaseIsWhatLeaves() {
        BlockGrid grid = strip(20, 10, 8);
        double[] outer = closed(grid);
        outer[grid.west(0)] = 2;
        double[] before = new double[grid.cells()];
        Arrays.fill(before, 9);
        StoredWater stored = new StoredWater(grid, new boolean[] {true}, perCell(grid, 0.2), new double[] {0.0001});
        FlowSolution solution = new TimeStep(problem(grid, 5, outer, new double[grid.cells()]), stored, 3).from(before);
        double released = 0;
        for (int cell = 0; cell < grid.cells(); cell++) {
            released += stored.volume(cell, 9) - stored.volume(cell, solution.heads()[cell]);
        }
        assertThat(released).isGreaterThan(10);
        assertThat(-3 * solution.faceFlows()[grid.west(0)]).isCloseTo(released, within(1e-8 * released));
    }

    private static BlockGrid strip(int cells, double width, double thickness) {
        double[] edges = new double[cells + 1];
        Arrays.setAll(edges, edge -> edge * width);
        double[][] surfaces = new double[2][cells];
        Arrays.fill(surfaces[0], thickness);
        return new BlockGrid(edges, new double[] {0, 10}, surfaces);
    }

    private static FlowProblem problem(BlockGrid grid, double conductivity, double[] outer, double[] supply) {
        double[] everywhere = perCell(grid, conductivity);
        return new FlowProblem(grid, everywhere, everywhere, outer, List.of(), supply);
    }

    private static double[] perCell(BlockGrid grid, double value) {
        double[] values = new double[grid.cells()];
        Arrays.fill(values, value);
        return values;
    }

    private static double[] closed(BlockGrid grid) {
        double[] outer = new double[grid.faces()];
        Arrays.fill(outer, Double.NaN);
        return outer;
    }
}
