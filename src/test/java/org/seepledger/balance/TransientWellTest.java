package org.seepledger.balance;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.List;
import java.util.Optional;
import java.util.function.DoubleUnaryOperator;
import org.apache.commons.math3.analysis.integration.IterativeLegendreGaussIntegrator;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.seepledger.aquifer.Aquifer;
import org.seepledger.aquifer.AquiferDraft;
import org.seepledger.aquifer.Axis;
import org.seepledger.aquifer.FormulaValues;
import org.seepledger.aquifer.Grid;
import org.seepledger.aquifer.GriddedValues;
import org.seepledger.aquifer.HeadGradient;
import org.seepledger.aquifer.PointRate;
import org.seepledger.aquifer.Screen;
import org.seepledger.aquifer.Source;
import org.seepledger.aquifer.Storage;
import org.seepledger.aquifer.Well;
import org.seepledger.prism.Prisms;
import org.seepledger.prism.Shapes;

/**
 * Heads about a well in a confined aquifer, after Theis (1935, Trans. AGU 16, 519–524): s = (Q / 4πT) W(u), u = r²S / 4Tt.
 * Through a circle of radius r flows Q exp(−u), and storage within it releases the rest.
 */
class TransientWellTest {

    private static final double RATE = 800;
    private static final double TRANSMISSIVITY = 120;
    private static final double STORATIVITY = 0.002;
    private static final double THICKNESS = 12;
    private static final double CENTRE = 240;
    /** Half the side of a square about the well, which cuts cells at a third or two on each of the grids. */
    private static final double HALF = 340 / 3.0;

    private static final double NOW = 0.1;
    private static final double STOPPED = 0.06;

    /** Drawdown at each of the instants. */
    private interface Drawdown {
        double at(double distance, int instant);
    }

    private static Aquifer aquifer(int cells, double pumpedUntil, Drawdown drawdown, double... instants) {
        Grid grid = new Grid(Axis.even(0, 2 * CENTRE / cells, cells), Axis.even(0, 2 * CENTRE / cells, cells), 0, 1);
        PointRate pump = new PointRate(
                "P", "pumping", CENTRE, CENTRE, new Screen.InLayer(0), 0, pumpedUntil, -RATE, "wells.csv, line 2");
        return AquiferDraft.on(grid)
                .layers(THICKNESS, 0)
                .times(instants)
                .flow(new HeadGradient(
                        GriddedValues.constant(TRANSMISSIVITY / THICKNESS), Optional.empty(), Optional.empty(), false))
                .head(new FormulaValues(
                        grid,
                        instants.length,
                        (instant, layer, x, y) -> 40 - drawdown.at(Math.hypot(x - CENTRE, y - CENTRE), instant)))
                .storage(new Storage(
                        Optional.empty(),
                        Optional.empty(),
                        Optional.of(GriddedValues.constant(STORATIVITY)),
                        List.of()))
                .source(new Source.Points("pumping", Well.of(List.of(pump))))
                .done();
    }

    /** r²S / 4T, which over the time gives u. */
    private static double delay(double distance) {
        return distance * distance * STORATIVITY / (4 * TRANSMISSIVITY);
    }

    private static double theis(double distance, double time) {
        return RATE / (4 * Math.PI * TRANSMISSIVITY) * WellFunction.of(delay(distance) / time);
    }

    /** Integral over the square's outline of Q / 2πr across it, times a factor that depends on r²S / 4T. */
    private static double throughSquare(DoubleUnaryOperator factor) {
        return 8
                * new IterativeLegendreGaussIntegrator(12, 1e-12, 1e-14)
                        .integrate(
                                100_000,
                                along -> RATE
                                        / (2 * Math.PI)
                                        * HALF
                                        / (HALF * HALF + along * along)
                                        * factor.applyAsDouble(delay(Math.hypot(HALF, along))),
                                0,
                                HALF);
    }

    private static double[] square() {
        return Shapes.box(CENTRE - HALF, CENTRE - HALF, CENTRE + HALF, CENTRE + HALF);
    }

    /** Values by Wenzel (1942, USGS Water-Supply Paper 887), table of W(u), from memory; each by quadrature too. */
    @ParameterizedTest
    @CsvSource({"1e-4, 8.6332", "0.01, 4.0379", "0.1, 1.8229", "1, 0.2194"})
    void theWellFunctionAgreesWithTheTable(double u, double tabulated) {
        assertThat(WellFunction.of(u)).isEqualTo(tabulated, within(5.1e-5));
        double integral = new IterativeLegendreGaussIntegrator(16, 1e-12, 1e-14)
                .integrate(100_000, logarithm -> Math.exp(-Math.exp(logarithm)), Math.log(u), Math.log(750));
        assertThat(WellFunction.of(u)).isEqualTo(integral, within(1e-11));
        assertThat(WellFunction.of(1 + 1e-12)).isEqualTo(WellFunction.of(1), within(1e-12));
    }

    @Test
    void aSquareTakesInLessThanTheWellPumpsAndReleasesTheRest() {
        double inflow = throughSquare(delay -> Math.exp(-delay / NOW));
        double released = RATE * NOW - throughSquare(delay -> WellFunction.pulse(delay, NOW));
        assertThat(inflow).isBetween(0.2 * RATE, 0.8 * RATE);
        double[][] errors = new double[2][3];
        for (int level = 0; level < 3; level++) {
            Aquifer aquifer = aquifer(24 << level, NOW, (r, instant) -> instant == 0 ? 0 : theis(r, NOW), 0, NOW);
            BudgetReading budget = BudgetReading.of(aquifer, Prisms.of("square", 0, 0, square()));
            assertThat(budget.net("pumping")).isEqualTo(-RATE * NOW, within(1e-12 * RATE));
            assertThat(budget.out("elastic storage")).isZero();
            assertThat(budget.net("side 1")).isEqualTo(budget.net("side 3"), within(1e-9 * RATE));
            errors[0][level] = sides(budget) / NOW - inflow;
            errors[1][level] = budget.in("elastic storage") - released;
        }
        assertThat(errors[0][2]).isEqualTo(0, within(2e-3 * inflow));
        assertThat(errors[1][2]).isEqualTo(0, within(2e-3 * released));
        assertThat(Refinement.order("transient well, inflow", errors[0])).isBetween(1.7, 2.4);
        assertThat(Refinement.order("transient well, release", errors[1])).isBetween(1.7, 2.4);
    }

    private static double sides(BudgetReading budget) {
        return budget.net("side 1") + budget.net("side 2") + budget.net("side 3") + budget.net("side 4");
    }

    /** A short interval, so that the release over it is as good as the rate at its end. */
    @ParameterizedTest
    @CsvSource({"60", "110", "170"})
    void throughACircleFlowsTheShareThatTheisGives(double radius) {
        double shortly = 1e-4 * NOW;
        Aquifer aquifer =
                aquifer(96, NOW, (r, instant) -> theis(r, instant == 0 ? NOW - shortly : NOW), NOW - shortly, NOW);
        BudgetReading budget =
                BudgetReading.of(aquifer, Prisms.of("circle", 0, 0, Shapes.round(CENTRE, CENTRE, radius, 720)));
        double share = Math.exp(-delay(radius) / NOW);
        double inflow = budget.totals().inflow() - budget.totals().outflow() - budget.net("pumping");
        assertThat(inflow / shortly).isEqualTo(RATE * share, within(2e-3 * RATE));
        assertThat(budget.net("elastic storage") / shortly).isEqualTo(RATE * (1 - share), within(2e-3 * RATE));
        assertThat(budget.totals().closureError()).isEqualTo(0, within(0.3));
    }

    /** Recovery by superposition, as Theis puts it: a well that goes on pumping, and one that puts the same in since. */
    @Test
    void afterTheWellStopsTheSquareGoesOnTakingIn() {
        double since = NOW - STOPPED;
        double flowed = STOPPED * throughSquare(delay -> Math.exp(-delay / STOPPED))
                + since * throughSquare(delay -> Math.exp(-delay / NOW) - Math.exp(-delay / since));
        double released = RATE * STOPPED
                - throughSquare(delay -> WellFunction.pulse(delay, NOW) - WellFunction.pulse(delay, since));
        double[][] errors = new double[2][3];
        for (int level = 0; level < 3; level++) {
            Aquifer aquifer = aquifer(
                    24 << level,
                    STOPPED,
                    (r, instant) ->
                            instant == 0 ? 0 : instant == 1 ? theis(r, STOPPED) : theis(r, NOW) - theis(r, since),
                    0,
                    STOPPED,
                    NOW);
            BudgetReading budget = BudgetReading.of(aquifer, Prisms.of("square", 0, 0, square()));
            assertThat(budget.net("pumping")).isEqualTo(-RATE * STOPPED, within(1e-12 * RATE));
            // Heads near the well rise again, which takes up part of what flows in.
            assertThat(budget.out("elastic storage")).isGreaterThan(0.1 * released);
            errors[0][level] = sides(budget) - flowed;
            errors[1][level] = budget.net("elastic storage") - released;
        }
        assertThat(errors[0][2]).isEqualTo(0, within(2e-3 * flowed));
        assertThat(errors[1][2]).isEqualTo(0, within(2e-3 * released));
        assertThat(Refinement.order("well on and off, inflow", errors[0])).isBetween(1.7, 2.4);
        assertThat(Refinement.order("well on and off, release", errors[1])).isBetween(1.7, 2.4);
    }
}
