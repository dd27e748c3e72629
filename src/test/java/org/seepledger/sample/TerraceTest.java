package org.seepledger.sample;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.Arrays;
import java.util.stream.DoubleStream;
import java.util.stream.IntStream;
import org.junit.jupiter.api.Test;

class TerraceTest {

    private static final Terrace TERRACE = Terrace.solved();

    private final FlowProblem problem = TERRACE.problem();
    private final FlowSolution solution = TERRACE.solution();
    private final BlockGrid grid = problem.grid();

    @Test
    void everyCellCloses() {
        double throughput = outerFlows().map(Math::abs).sum() / 2;
        assertThat(throughput).isGreaterThan(1000);
        assertThat(DoubleStream.of(solution.imbalance()).map(Math::abs).max().orElseThrow())
                .isLessThan(1e-8 * throughput);
    }

    /** What enters at the sides, from the river and from above leaves again: nothing is stored. */
    @Test
    void theWholeCloses() {
        double river = TERRACE.river().stream().mapToDouble(TERRACE::exchange).sum();
        double given = Arrays.stream(problem.supply()).sum();
        double sides = outerFlows().sum();
        assertThat(Math.abs(river + given + sides)).isLessThan(1e-8 * Math.abs(given));
    }

    @Test
    void theWaterTableLiesInTheGravel() {
        IntStream.range(0, grid.cellsInLayer()).filter(problem::isActive).forEach(cell -> {
            assertThat(solution.heads()[cell]).isLessThan(grid.topElevation(cell));
            assertThat(solution.saturated()[cell]).isGreaterThan(3);
        });
    }

    @Test
    void theRiverBothGainsAndLoses() {
        double gained = TERRACE.river().stream()
                .mapToDouble(TERRACE::exchange)
                .filter(flow -> flow > 0)
                .sum();
        double lost = TERRACE.river().stream()
                .mapToDouble(TERRACE::exchange)
                .filter(flow -> flow < 0)
                .sum();
        assertThat(gained).isGreaterThan(100);
        assertThat(lost).isLessThan(-100);
    }

    @Test
    void wellsAreScreenedInActiveCellsBelowTheWater() {
        assertThat(Terrace.WELLS).allSatisfy(well -> {
            int cell = well.cell(grid);
            assertThat(problem.isActive(cell)).isTrue();
            assertThat(grid.layer(cell)).isEqualTo(well.layer());
            assertThat(well.screenTop(grid)).isLessThan(Math.min(solution.heads()[cell], grid.topElevation(cell)));
            assertThat(well.screenBottom(grid)).isGreaterThan(grid.bottomElevation(cell));
        });
    }

    @Test
    void theKnollReachesThroughAllLayersAndWidensDownward() {
        int[] inactive = new int[grid.layers()];
        IntStream.range(0, grid.cells())
                .filter(cell -> !problem.isActive(cell))
                .forEach(cell -> inactive[grid.layer(cell)]++);
        assertThat(inactive[0]).isPositive();
        assertThat(inactive).isSorted().doesNotHaveDuplicates();
    }

    /**
     * A well cannot be told from the mean of two faces: by the faces that linear interpolation gives back from the
     * centres, its cell takes in about a third of what it pumps.
     */
    @Test
    void theFieldAtTheCentresDoesNotBalanceAroundWells() {
        CentreDischarge discharge = CentreDischarge.of(grid, solution);
        int well = Terrace.WELLS.get(1).cell(grid);
        assertThat(lateralInflow(well, discharge)).isBetween(0.2 * 640, 0.5 * 640);
    }

    /** From the mean of the two neighbours' centres, which is linear interpolation where cells are even. */
    private double lateralInflow(int cell, CentreDischarge discharge) {
        double[] b = solution.saturated();
        int north = cell - grid.columns();
        int south = cell + grid.columns();
        double west = (discharge.x()[cell - 1] + discharge.x()[cell]) * (b[cell - 1] + b[cell]) / 4;
        double east = (discharge.x()[cell + 1] + discharge.x()[cell]) * (b[cell + 1] + b[cell]) / 4;
        double fromSouth = (discharge.y()[south] + discharge.y()[cell]) * (b[south] + b[cell]) / 4;
        double toNorth = (discharge.y()[north] + discharge.y()[cell]) * (b[north] + b[cell]) / 4;
        return (west - east) * grid.height(cell) + (fromSouth - toNorth) * grid.width(cell);
    }

    /** What the aquifer gains through the grid's outer faces. */
    private DoubleStream outerFlows() {
        double[] flows = solution.faceFlows();
        DoubleStream in = IntStream.range(0, grid.faces())
                .filter(face -> grid.behind(face) == BlockGrid.OUTSIDE)
                .mapToDouble(face -> flows[face]);
        DoubleStream out = IntStream.range(0, grid.faces())
                .filter(face -> grid.ahead(face) == BlockGrid.OUTSIDE)
                .mapToDouble(face -> -flows[face]);
        return DoubleStream.concat(in, out);
    }
}
