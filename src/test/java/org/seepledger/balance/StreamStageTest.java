package org.seepledger.balance;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.List;
import java.util.Optional;
import org.apache.commons.math3.special.Erf;
import org.junit.jupiter.api.Test;
import org.seepledger.aquifer.Aquifer;
import org.seepledger.aquifer.AquiferDraft;
import org.seepledger.aquifer.Axis;
import org.seepledger.aquifer.FormulaValues;
import org.seepledger.aquifer.Grid;
import org.seepledger.aquifer.GriddedValues;
import org.seepledger.aquifer.HeadGradient;
import org.seepledger.aquifer.Storage;
import org.seepledger.prism.Prisms;
import org.seepledger.prism.Shapes;

/**
 * A stream that rises all at once beside an aquifer at rest: s = s₀ erfc(x / √(4Tt/S)), as heat enters a half space whose
 * surface is warmed (Carslaw and Jaeger 1959, Conduction of Heat in Solids, section 2.5).
 */
class StreamStageTest {

    private static final double RISE = 1.7;
    private static final double TRANSMISSIVITY = 90;
    private static final double STORATIVITY = 0.05;
    private static final double WIDTH = 20;
    private static final double AWAY = 70;

    /** How far the rise has spread after a time: √(4Tt/S). */
    private static double spread(double time) {
        return Math.sqrt(4 * TRANSMISSIVITY * time / STORATIVITY);
    }

    /** Heads go on beyond the bank by the same formula, so that the bank lies within the grid, whose outer faces are closed. */
    private static Aquifer aquifer(int cells, boolean meanHeads, double... instants) {
        double step = 3 * AWAY / cells;
        Grid grid = new Grid(Axis.even(-2 * step, step, cells + 2), Axis.even(0, WIDTH, 1), 0, 1);
        return AquiferDraft.on(grid)
                .layers(15, 0)
                .times(instants)
                .flow(new HeadGradient(
                        GriddedValues.constant(TRANSMISSIVITY / 15), Optional.empty(), Optional.empty(), meanHeads))
                .head(new FormulaValues(
                        grid,
                        instants.length,
                        (instant, layer, x, y) ->
                                20 + (instants[instant] == 0 ? 0 : RISE * Erf.erfc(x / spread(instants[instant])))))
                .storage(new Storage(
                        Optional.empty(),
                        Optional.empty(),
                        Optional.of(GriddedValues.constant(STORATIVITY)),
                        List.of()))
                .done();
    }

    private static BudgetReading bank(Aquifer aquifer) {
        return BudgetReading.of(aquifer, Prisms.of("bank", 0, 0, Shapes.box(0, 0, AWAY, WIDTH)));
    }

    /** Discharge away from the stream, −T ds/dx. */
    private static double discharge(double x, double time) {
        double scaled = x / spread(time);
        return WIDTH * TRANSMISSIVITY * RISE * 2 / Math.sqrt(Math.PI) / spread(time) * Math.exp(-scaled * scaled);
    }

    /** Volume in storage between the bank and a place, from ∫ erfc = x erfc x − exp(−x²)/√π (A. and S. 1964, 7.2.1, 7.2.5). */
    private static double stored(double x, double time) {
        double scaled = x / spread(time);
        double integral = scaled * Erf.erfc(scaled) + (1 - Math.exp(-scaled * scaled)) / Math.sqrt(Math.PI);
        return WIDTH * STORATIVITY * RISE * spread(time) * integral;
    }

    @Test
    void dischargeFallsOffAwayFromTheBankAndStorageTakesTheRest() {
        double now = 1.5;
        double[][] errors = new double[3][3];
        for (int level = 0; level < 3; level++) {
            BudgetReading budget = bank(aquifer(20 << level, false, 0, now));
            assertThat(budget.out("side 4") + budget.in("side 2")).isZero();
            assertThat(budget.in("elastic storage")).isZero();
            errors[0][level] = budget.in("side 4") / now - discharge(0, now);
            errors[1][level] = budget.out("side 2") / now - discharge(AWAY, now);
            errors[2][level] = budget.out("elastic storage") - stored(AWAY, now);
        }
        assertThat(errors[0][2]).isEqualTo(0, within(1e-3 * discharge(0, now)));
        assertThat(errors[1][2]).isEqualTo(0, within(1e-3 * discharge(AWAY, now)));
        assertThat(errors[2][2]).isEqualTo(0, within(1e-3 * stored(AWAY, now)));
        assertThat(discharge(AWAY, now)).isBetween(0.3 * discharge(0, now), 0.9 * discharge(0, now));
        assertThat(Refinement.order("stream stage, discharge at the bank", errors[0]))
                .isBetween(1.8, 2.2);
        assertThat(Refinement.order("stream stage, discharge beyond", errors[1]))
                .isBetween(1.6, 2.4);
        assertThat(Refinement.order("stream stage, uptake", errors[2])).isBetween(1.6, 2.4);
    }

    /** Heads at the ends of intervals err with their length, mean heads with its square; here cells are far finer. */
    @Test
    void theBudgetClosesAsIntervalsAreHalved() {
        double[][] residuals = new double[2][3];
        for (int level = 0; level < 3; level++) {
            double[] instants = new double[(6 << level) + 1];
            for (int i = 0; i < instants.length; i++) {
                instants[i] = 0.5 + 1.5 * i / (instants.length - 1);
            }
            for (int mean = 0; mean < 2; mean++) {
                BudgetReading budget = bank(aquifer(1920, mean == 1, instants));
                double uptake = stored(AWAY, 2) - stored(AWAY, 0.5);
                assertThat(budget.net("elastic storage")).isEqualTo(-uptake, within(1e-5 * uptake));
                residuals[mean][level] = budget.totals().residual();
            }
        }
        assertThat(Refinement.order("stream stage, residual with heads at the end", residuals[0]))
                .isBetween(0.8, 1.2);
        assertThat(Refinement.order("stream stage, residual with mean heads", residuals[1]))
                .isBetween(1.7, 2.3);
    }
}
