package org.seepledger.sample;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.Arrays;
import java.util.List;
import java.util.stream.DoubleStream;
import java.util.stream.IntStream;
import org.junit.jupiter.api.Test;

class ValleyTest {

    private final Valley valley = Valley.solved();
    private final BlockGrid grid = valley.grid();

    @Test
    void everyCellClosesInEveryMonth() {
        for (int interval = 0; interval < ValleySeasons.MONTHS; interval++) {
            FlowSolution solution = valley.solution(interval);
            assertThat(DoubleStream.of(solution.imbalance())
                            .map(Math::abs)
                            .max()
                            .orElseThrow())
                    .isLessThan(1e-10);
        }
    }

    /** Over the two years: recharge, wells and river make up for the change of what is stored. */
    @Test
    void theWholeCloses() {
        double gained = 0;
        double thrown = 0;
        for (int interval = 0; interval < ValleySeasons.MONTHS; interval++) {
            for (double flow : sources(interval)) {
                gained += flow * ValleySeasons.days(interval);
                thrown += Math.abs(flow) * ValleySeasons.days(interval);
            }
        }
        double stored = stored(ValleySeasons.MONTHS) - stored(0);
        assertThat(Math.abs(stored)).isGreaterThan(0.01 * thrown);
        assertThat(Math.abs(gained - stored)).isLessThan(1e-9 * thrown);
    }

    private double[] sources(int interval) {
        DoubleStream recharge = IntStream.range(0, grid.cellsInLayer())
                .filter(valley::isActive)
                .mapToDouble(cell -> ValleySeasons.recharge(interval, grid.centreX(cell), grid.centreY(cell))
                        / 365_250.0
                        * grid.area(cell));
        DoubleStream wells = Valley.WELLS.stream().mapToDouble(well -> well.rate(interval));
        return DoubleStream.concat(DoubleStream.concat(recharge, wells), river(interval))
                .toArray();
    }

    private DoubleStream river(int interval) {
        return valley.river().stream().mapToDouble(piece -> valley.exchange(piece, interval));
    }

    private double stored(int instant) {
        return IntStream.range(0, grid.cells())
                .filter(valley::isActive)
                .mapToDouble(cell -> valley.stored().volume(cell, valley.heads(instant)[cell]))
                .sum();
    }

    @Test
    void theRiverGivesAndTakesInEveryMonth() {
        for (int interval = 0; interval < ValleySeasons.MONTHS; interval++) {
            assertThat(river(interval).filter(flow -> flow > 0).sum()).isPositive();
            assertThat(river(interval).filter(flow -> flow < 0).sum()).isLessThan(-1000);
        }
        assertThat(IntStream.range(0, ValleySeasons.MONTHS)
                        .mapToDouble(interval ->
                                river(interval).filter(flow -> flow > 0).sum())
                        .max()
                        .orElseThrow())
                .isGreaterThan(300);
    }

    /** Under the meadows the gravel fills to the loam each winter and drains each summer. */
    @Test
    void gravelTurnsConfinedInWinter() {
        long march = full(5);
        long nextOctober = full(12);
        assertThat(march).isGreaterThan(400);
        assertThat(nextOctober).isLessThan(march / 4);
    }

    private long full(int instant) {
        return gravel().filter(cell -> valley.heads(instant)[cell] > grid.topElevation(cell))
                .count();
    }

    @Test
    void noGravelRunsDryAndHeadsMoveWithTheSeasons() {
        List<double[]> heads = IntStream.rangeClosed(0, ValleySeasons.MONTHS)
                .mapToObj(valley::heads)
                .toList();
        double[] ranges = gravel().mapToDouble(cell -> {
                    double least =
                            heads.stream().mapToDouble(at -> at[cell]).min().orElseThrow();
                    double greatest =
                            heads.stream().mapToDouble(at -> at[cell]).max().orElseThrow();
                    assertThat(least).isGreaterThan(grid.bottomElevation(cell) + 3);
                    return greatest - least;
                })
                .toArray();
        assertThat(Arrays.stream(ranges).average().orElseThrow()).isBetween(0.5, 2.0);
    }

    @Test
    void theClayIsMissingUnderPartOfTheValley() {
        long missing = gravel().filter(cell -> grid.thickness(cell + ValleyGround.CLAY * grid.cellsInLayer()) == 0)
                .count();
        assertThat(missing).isBetween(100L, 400L);
    }

    @Test
    void deeperLayersAreNarrower() {
        long[] active = new long[grid.layers()];
        IntStream.range(0, grid.cells()).filter(valley::isActive).forEach(cell -> active[grid.layer(cell)]++);
        assertThat(active[ValleyGround.GRAVEL]).isLessThan(grid.cellsInLayer());
        assertThat(active[ValleyGround.OLD_GRAVEL]).isLessThan(active[ValleyGround.GRAVEL]);
    }

    @Test
    void oneWellDrawsFromAllLayersAndTheOthersFromOne() {
        assertThat(reached(Valley.WELLS.get(0))).isEqualTo(3);
        assertThat(Valley.WELLS.subList(1, Valley.WELLS.size()))
                .allSatisfy(well -> assertThat(reached(well)).isEqualTo(1));
    }

    private long reached(PumpedWell well) {
        return DoubleStream.of(well.shares(grid, valley.horizontal()))
                .filter(share -> share > 0)
                .count();
    }

    private IntStream gravel() {
        return IntStream.range(0, grid.cellsInLayer()).filter(valley::isActive);
    }
}
