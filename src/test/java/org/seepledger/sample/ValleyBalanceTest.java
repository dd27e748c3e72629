package org.seepledger.sample;

import static org.assertj.core.api.Assertions.assertThat;

import java.io.IOException;
import java.nio.file.Path;
import java.time.LocalDate;
import java.util.List;
import java.util.Optional;
import java.util.stream.IntStream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.seepledger.aquifer.Aquifer;
import org.seepledger.aquifer.Block;
import org.seepledger.aquifer.CellGeometry;
import org.seepledger.aquifer.CellTerm;
import org.seepledger.aquifer.FaceFlows;
import org.seepledger.aquifer.IntervalState;
import org.seepledger.aquifer.PlacedWell;
import org.seepledger.aquifer.WellRate;
import org.seepledger.balance.Periods;
import org.seepledger.balance.WellRule;
import org.seepledger.io.aquifer.AquiferFolder;
import org.seepledger.io.aquifer.AquiferReader;
import org.seepledger.job.BalanceJob;
import org.seepledger.job.BalanceOutcome;
import org.seepledger.job.BalanceRequest;
import org.seepledger.job.ReportRequest;
import org.seepledger.progress.Progress;

/** An independent solution, given as heads and conductivity: the program finds its face flows again, and it closes. */
class ValleyBalanceTest {

    private static final Path SAMPLE = Path.of("sample-aquifers", "valley");

    /** What the last bit of a head of 100 m is worth, 1.4e-14 m, through the best conducting faces, 2500 m²/d, m³/d. */
    private static final double ROUNDING = 4e-11;

    private final Valley valley = Valley.solved();
    private final BlockGrid grid = valley.grid();

    @Test
    void faceFlowsAreTheSolutionsOwn() {
        forEachInterval((interval, state) -> {
            FaceFlows flows = state.flows();
            double[] own = valley.solution(interval).faceFlows();
            for (int cell = 0; cell < grid.cells(); cell++) {
                assertThat(flows.active()[cell]).isEqualTo(valley.isActive(cell));
                int layer = grid.layer(cell);
                int row = grid.row(cell);
                int column = grid.column(cell);
                Block block = flows.block();
                check(flows.x()[block.xFace(layer, row, column)], own[grid.west(cell)]);
                check(flows.x()[block.xFace(layer, row, column + 1)], own[grid.east(cell)]);
                check(flows.y()[block.yFace(layer, row, column)], own[grid.north(cell)]);
                check(flows.y()[block.yFace(layer, row + 1, column)], own[grid.south(cell)]);
                check(flows.z()[block.zFace(layer, row, column)], own[grid.top(cell)]);
                check(flows.z()[block.zFace(layer + 1, row, column)], own[grid.bottom(cell)]);
            }
        });
    }

    private static void check(double flow, double own) {
        // There are a million of them: a matcher each would take longer than all else.
        if (!(Math.abs(flow - own) <= 1e-9 * Math.abs(own) + ROUNDING)) {
            assertThat(flow).isEqualTo(own);
        }
    }

    @Test
    void everyCellBalancesInEveryInterval() {
        forEachInterval((interval, state) -> {
            double[] gain = new double[grid.cells()];
            double[] gross = new double[grid.cells()];
            for (int cell = 0; cell < gain.length; cell++) {
                gain[cell] = state.flows().gain(grid.layer(cell), grid.row(cell), grid.column(cell));
                gross[cell] = state.flows().gross(grid.layer(cell), grid.row(cell), grid.column(cell));
                for (CellTerm term : state.terms()) {
                    gain[cell] += term.rates()[cell];
                    gross[cell] += Math.abs(term.rates()[cell]);
                }
            }
            for (WellRate rate : state.wells()) {
                int cell =
                        grid.cell(rate.layer(), rate.well().row(), rate.well().column());
                gain[cell] += rate.rate();
                gross[cell] += Math.abs(rate.rate());
            }
            IntStream.range(0, gain.length)
                    .filter(valley::isActive)
                    .forEach(cell -> assertThat(Math.abs(gain[cell])).isLessThan(1e-8 * gross[cell] / 2));
        });
    }

    @Test
    void everyPrismClosesInEveryInterval(@TempDir Path folder) throws IOException {
        BalanceRequest request = new BalanceRequest(
                SAMPLE,
                SAMPLE.resolve("prisms.geojson"),
                folder.resolve("budget"),
                Periods.Every.INTERVAL,
                Optional.empty(),
                10,
                Optional.empty(),
                Optional.empty(),
                WellRule.POINT,
                false,
                1,
                false,
                ReportRequest.dated(LocalDate.of(2024, 5, 31)));
        BalanceOutcome outcome = BalanceJob.run(request, Progress.NONE);
        // In percent: a hundred times stricter than 1e-8 of throughput.
        assertThat(outcome.worstClosureError()).isLessThan(1e-8);
        assertThat(outcome.summary()).contains("well field", "north fields", "river meadow", "south terrace");
        assertThat(outcome.summary()).doesNotContain("overlap");
    }

    private interface Check {
        void check(int interval, IntervalState state);
    }

    private static void forEachInterval(Check check) {
        try (AquiferFolder folder = AquiferReader.open(SAMPLE)) {
            Aquifer aquifer = folder.aquifer();
            assertThat(folder.warnings()).isEmpty();
            CellGeometry geometry = aquifer.geometry(aquifer.grid().window());
            List<PlacedWell> wells = aquifer.placedWells();
            assertThat(aquifer.times().intervals()).isEqualTo(ValleySeasons.MONTHS);
            for (int interval = 0; interval < ValleySeasons.MONTHS; interval++) {
                check.check(interval, aquifer.state(interval, geometry, wells));
            }
        }
    }
}
