package org.seepledger.sample;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.Arrays;
import java.util.List;
import java.util.Random;
import org.junit.jupiter.api.Test;

class FlowEquationsTest {

    /** Darcy (1856): flow through beds in series is the fall of head over the sum of their resistances. */
    @Test
    void twoZonesInSeriesActAsTheirHarmonicMean() {
        BlockGrid grid = box(new double[] {0, 3, 10, 12, 40, 55, 100}, new double[] {0, 8}, 5, 1);
        double[] conductivity = {2, 2, 2, 30, 30, 30};
        double[] outer = closed(grid);
        outer[grid.west(0)] = 50;
        outer[grid.east(5)] = 46;
        double[] flows = flows(new FlowProblem(grid, conductivity, conductivity, outer, List.of(), new double[6]));
        double expected = 8 * 5 * (50.0 - 46.0) / (12 / 2.0 + 88 / 30.0);
        for (int cell = 0; cell < 6; cell++) {
            assertThat(flows[grid.west(cell)]).isCloseTo(expected, within(1e-9 * expected));
        }
        assertThat(flows[grid.east(5)]).isCloseTo(expected, within(1e-9 * expected));
    }

    /** The same upward through three layers. */
    @Test
    void layersInSeriesActAsTheirHarmonicMean() {
        BlockGrid grid =
                new BlockGrid(new double[] {0, 20}, new double[] {0, 30}, new double[][] {{25}, {21}, {20.5}, {12}});
        double[] vertical = {5, 0.001, 2};
        double[] outer = closed(grid);
        outer[grid.top(0)] = 24;
        outer[grid.bottom(2)] = 24.7;
        double[] flows =
                flows(new FlowProblem(grid, new double[] {1, 1, 1}, vertical, outer, List.of(), new double[3]));
        double expected = 20 * 30 * 0.7 / (4 / 5.0 + 0.5 / 0.001 + 8.5 / 2);
        for (int cell = 0; cell < 3; cell++) {
            assertThat(flows[grid.top(cell)]).isCloseTo(expected, within(1e-9 * expected));
        }
    }

    /** A closed cell gives its supply to the river: the head stands above the stage by supply over conductance. */
    @Test
    void exchangeTakesWhatIsSupplied() {
        BlockGrid grid = box(new double[] {0, 10}, new double[] {0, 10}, 2, 1);
        FlowProblem problem = new FlowProblem(
                grid, new double[] {1}, new double[] {1}, closed(grid), List.of(new Exchange(0, 4, 7)), new double[] {6
                });
        assertThat(new FlowEquations(problem, new double[] {2}).solve(new double[1])[0])
                .isCloseTo(8.5, within(1e-12));
    }

    @Test
    void everyCellOfAHeterogeneousBoxCloses() {
        BlockGrid grid = box(evenly(13, 7.0), evenly(11, 9.0), 3, 4);
        FlowProblem problem = heterogeneous(grid, new Random(20));
        double[] saturated = problem.saturatedThickness(new double[grid.cells()], new boolean[4]);
        FlowEquations equations = new FlowEquations(problem, saturated);
        double[] heads = equations.solve(new double[grid.cells()]);
        double throughput = Arrays.stream(problem.supply()).map(Math::abs).sum();
        double largest =
                Arrays.stream(equations.imbalance(heads)).map(Math::abs).max().orElseThrow();
        assertThat(largest).isLessThan(1e-8 * throughput);
    }

    @Test
    void nothingFlowsThroughAnInactiveCell() {
        BlockGrid grid = box(evenly(5, 10), evenly(5, 10), 3, 3);
        FlowProblem problem = heterogeneous(grid, new Random(3));
        int cell = grid.cell(1, 2, 2);
        assertThat(problem.isActive(cell)).isFalse();
        double[] flows = flows(problem);
        assertThat(List.of(
                        grid.west(cell),
                        grid.east(cell),
                        grid.south(cell),
                        grid.north(cell),
                        grid.bottom(cell),
                        grid.top(cell)))
                .allSatisfy(face -> assertThat(flows[face]).isZero());
        assertThat(flows[grid.west(cell) - 1]).isNotZero();
    }

    private static double[] flows(FlowProblem problem) {
        BlockGrid grid = problem.grid();
        double[] start = new double[grid.cells()];
        FlowEquations equations =
                new FlowEquations(problem, problem.saturatedThickness(start, new boolean[grid.layers()]));
        return equations.faceFlows(equations.solve(start));
    }

    /** Conductivities over four orders of magnitude, an inactive core, a river and a head at one side. */
    private static FlowProblem heterogeneous(BlockGrid grid, Random random) {
        double[] horizontal = new double[grid.cells()];
        double[] supply = new double[grid.cells()];
        Arrays.setAll(horizontal, cell -> StrictMath.exp(9 * random.nextDouble() - 5));
        Arrays.setAll(supply, cell -> random.nextDouble() - 0.4);
        int core = grid.cell(1, grid.rows() / 2, grid.columns() / 2);
        horizontal[core] = Double.NaN;
        double[] outer = closed(grid);
        for (int row = 0; row < grid.rows(); row++) {
            outer[grid.west(grid.cell(0, row, 0))] = 100 + row;
        }
        double[] vertical = Arrays.stream(horizontal).map(value -> value / 10).toArray();
        return new FlowProblem(grid, horizontal, vertical, outer, List.of(new Exchange(7, 20, 99)), supply);
    }

    private static double[] closed(BlockGrid grid) {
        double[] heads = new double[grid.faces()];
        Arrays.fill(heads, Double.NaN);
        return heads;
    }

    private static BlockGrid box(double[] columnEdges, double[] rowEdges, double thickness, int layers) {
        double[][] surfaces = new double[layers + 1][(columnEdges.length - 1) * (rowEdges.length - 1)];
        for (int surface = 0; surface <= layers; surface++) {
            Arrays.fill(surfaces[surface], -thickness * surface);
        }
        return new BlockGrid(columnEdges, rowEdges, surfaces);
    }

    private static double[] evenly(int cells, double size) {
        double[] edges = new double[cells + 1];
        Arrays.setAll(edges, edge -> edge * size);
        return edges;
    }
}
