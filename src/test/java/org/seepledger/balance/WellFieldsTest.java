package org.seepledger.balance;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.List;
import java.util.Optional;
import org.apache.commons.math3.analysis.integration.IterativeLegendreGaussIntegrator;
import org.junit.jupiter.api.Test;
import org.seepledger.aquifer.Aquifer;
import org.seepledger.aquifer.AquiferDraft;
import org.seepledger.aquifer.Axis;
import org.seepledger.aquifer.DarcyFlux;
import org.seepledger.aquifer.FormulaValues;
import org.seepledger.aquifer.Grid;
import org.seepledger.aquifer.OuterFaces;
import org.seepledger.aquifer.PointRate;
import org.seepledger.aquifer.Screen;
import org.seepledger.aquifer.Source;
import org.seepledger.aquifer.Well;
import org.seepledger.prism.Prism;
import org.seepledger.prism.Prisms;
import org.seepledger.prism.Shapes;

/** Steady flow to a well that pumps 500 m³/d out of a layer 8 m thick, at the corner of four cells. */
class WellFieldsTest {

    private static final double RATE = 500;
    private static final double THICKNESS = 8;
    private static final double CENTRE = 240;

    private static Aquifer aquifer(int cells, boolean leaky, double leakage) {
        Grid grid = new Grid(Axis.even(0, 2 * CENTRE / cells, cells), Axis.even(0, 2 * CENTRE / cells, cells), 0, 1);
        FormulaValues x =
                FormulaValues.steady(grid, (east, north) -> component(east - CENTRE, north - CENTRE, leaky, leakage));
        FormulaValues y =
                FormulaValues.steady(grid, (east, north) -> component(north - CENTRE, east - CENTRE, leaky, leakage));
        FormulaValues z = FormulaValues.steady(
                grid,
                (east, north) -> leaky
                        ? -RATE
                                / (2 * Math.PI * leakage * leakage)
                                * bessel(0, Math.hypot(east - CENTRE, north - CENTRE) / leakage)
                        : 0);
        PointRate pump =
                new PointRate("P", "pumping", CENTRE, CENTRE, new Screen.InLayer(0), 0, 1, -RATE, "wells.csv, line 2");
        return AquiferDraft.on(grid)
                .layers(THICKNESS, 0)
                .flow(new DarcyFlux(x, y, Optional.of(z), false, new OuterFaces(true, true, false)))
                .source(new Source.Points("pumping", Well.of(List.of(pump))))
                .done();
    }

    /** Specific discharge toward the well along one axis. */
    private static double component(double along, double across, boolean leaky, double leakage) {
        double distance = Math.hypot(along, across);
        double share = leaky ? distance / leakage * bessel(1, distance / leakage) : 1;
        return -RATE * share / (2 * Math.PI * distance * THICKNESS) * along / distance;
    }

    /** Any polygon round the well takes in what it pumps, any other nothing: Thiem (1906), Hydrologische Methoden. */
    @Test
    void aPolygonRoundTheWellTakesInItsRateAndNoOtherDoes() {
        double[][] errors = new double[2][3];
        double[] round = {150, 190, 260, 130, 330, 240, 270, 340, 140, 300};
        double[] beside = {300, 290, 420, 280, 400, 400, 330, 390};
        for (int level = 0; level < 3; level++) {
            Aquifer aquifer = aquifer(48 << level, false, 0);
            BudgetReading inside = BudgetReading.of(aquifer, Prisms.of("round", 0, 0, round));
            BudgetReading outside = BudgetReading.of(aquifer, Prisms.of("beside", 0, 0, beside));
            assertThat(inside.net("pumping")).isEqualTo(-RATE);
            assertThat(outside.net("pumping")).isZero();
            errors[0][level] = inside.totals().inflow() - inside.totals().outflow();
            errors[1][level] = outside.totals().inflow() - outside.totals().outflow();
            assertThat(errors[0][level]).isEqualTo(0, within(0.01 * RATE));
            assertThat(errors[1][level]).isEqualTo(0, within(0.001 * RATE));
        }
        assertThat(Refinement.order("well inside a polygon", errors[0])).isBetween(1.7, 2.4);
        assertThat(Refinement.order("well beside a polygon", errors[1])).isBetween(1.7, 2.4);
    }

    @Test
    void theNearSideOfASquareTakesMoreThanTheFarOne() {
        BudgetReading far =
                BudgetReading.of(aquifer(96, false, 0), Prisms.of("far", 0, 0, Shapes.box(300, 200, 380, 280)));
        // Seen from the well the near side spans 2 atan(40/60), the far one 2 atan(40/140) of the whole way round.
        double near = RATE * 2 * Math.atan2(40, 60) / (2 * Math.PI);
        double away = RATE * 2 * Math.atan2(40, 140) / (2 * Math.PI);
        assertThat(far.out("side 4")).isEqualTo(near, within(0.002 * RATE));
        assertThat(far.in("side 2")).isEqualTo(away, within(0.002 * RATE));
        assertThat(far.out("side 4")).isGreaterThan(far.in("side 2"));
        assertThat(far.in("side 4")).isZero();
    }

    /**
     * Steady flow to a well in a leaky aquifer: Hantush and Jacob (1955, Trans. AGU 36, 95–100): s = (Q / 2πT) K₀(r/B), so
     * that Q (r/B) K₁(r/B) comes in through a circle of radius r, and the rest leaks in through the lid within it.
     */
    @Test
    void aLeakyAquiferTakesInPartThroughTheSidesAndTheRestThroughTheLid() {
        double leakage = 150;
        double radius = 120;
        double exact = RATE * radius / leakage * bessel(1, radius / leakage);
        double[][] errors = new double[2][3];
        for (int level = 0; level < 3; level++) {
            Aquifer aquifer = aquifer(24 << level, true, leakage);
            Prism circle = Prisms.of("circle", 0, 0, Shapes.round(CENTRE, CENTRE, radius, 720));
            BudgetReading budget = BudgetReading.of(aquifer, circle);
            double sides =
                    budget.totals().inflow() - budget.totals().outflow() - budget.net("top") - budget.net("pumping");
            errors[0][level] = sides - exact;
            errors[1][level] = budget.in("top") - (RATE - exact);
            assertThat(sides).isEqualTo(exact, within(0.01 * RATE));
            assertThat(budget.in("top")).isEqualTo(RATE - exact, within(0.01 * RATE));
            assertThat(budget.net("bottom")).isZero();
        }
        assertThat(Math.abs(errors[0][2])).isLessThan(1e-3 * RATE);
        assertThat(Refinement.order("leaky aquifer, lid", errors[1])).isBetween(1.7, 2.4);
    }

    /** K₀ and K₁ by their integral representation, Abramowitz and Stegun (1964) 9.6.24: ∫ exp(−x cosh t) cosh(νt) dt. */
    private static double bessel(int order, double x) {
        // Beyond this the integrand is below 1e-17 of its largest.
        double end = Math.log(2 * (40 + 5 * order) / x + 2);
        return new IterativeLegendreGaussIntegrator(16, 1e-12, 1e-14)
                .integrate(100_000, t -> Math.exp(-x * Math.cosh(t)) * Math.cosh(order * t), 0, Math.max(1, end));
    }

    @Test
    void theBesselFunctionsAgreeWithTheHandbook() {
        // Abramowitz and Stegun (1964), table 9.8; from memory.
        assertThat(bessel(0, 1)).isEqualTo(0.42102_44382, within(1e-10));
        assertThat(bessel(1, 1)).isEqualTo(0.60190_72302, within(1e-10));
        assertThat(bessel(0, 0.1)).isEqualTo(2.42706_90247, within(1e-9));
        assertThat(bessel(1, 0.1)).isEqualTo(9.85384_47809, within(1e-9));
    }
}
