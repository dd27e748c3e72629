package org.seepledger.balance;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.Optional;
import org.junit.jupiter.api.Test;
import org.seepledger.aquifer.Aquifer;
import org.seepledger.aquifer.AquiferDraft;
import org.seepledger.aquifer.Axis;
import org.seepledger.aquifer.FormulaValues;
import org.seepledger.aquifer.GivenFaceFlow;
import org.seepledger.aquifer.Grid;
import org.seepledger.aquifer.GriddedValues;
import org.seepledger.prism.Prism;
import org.seepledger.prism.Prisms;
import org.seepledger.prism.Shapes;

/**
 * Leakage through two clays of 2 m and 6 m between an upper and a lower aquifer whose heads differ: K′/b′ ∬ Δh dA with the
 * harmonic mean K′ = Σb / Σ(b/K) of layers in series (Darcy 1856).
 */
class VerticalLeakageTest {

    private static final double LEAKANCE = 1 / (2 / 0.01 + 6 / 0.004);

    private static double lowerMinusUpper(double x, double y) {
        return 1.5 + 0.01 * x - 0.004 * y;
    }

    private static Aquifer aquifer(int cells) {
        Grid grid = new Grid(Axis.even(0, 160.0 / cells, cells), Axis.even(0, 160.0 / cells, cells), 0, 1);
        GriddedValues up = new FormulaValues(
                grid, 1, (step, layer, x, y) -> layer == 0 ? 0 : LEAKANCE * lowerMinusUpper(x, y) * grid.area(0, 0));
        GriddedValues none = GriddedValues.constant(0);
        return AquiferDraft.on(grid)
                .layers(40, 30, 28, 22, 10)
                .flow(new GivenFaceFlow(
                        none, none, Optional.of(up), Optional.empty(), Optional.empty(), Optional.empty()))
                .done();
    }

    @Test
    void leakageOverWholeCellsIsExact() {
        // The mean of a linear difference over a box is its value in the middle, (60, 100).
        double exact = LEAKANCE * lowerMinusUpper(60, 100) * 80 * 60;
        double[] box = Shapes.box(20, 70, 100, 130);
        BudgetReading clays = BudgetReading.of(aquifer(16), Prisms.of("clays", 1, 2, box));
        assertThat(clays.in("bottom")).isEqualTo(exact, within(1e-12 * exact));
        assertThat(clays.out("top")).isEqualTo(exact, within(1e-12 * exact));
        assertThat(clays.totals().residual()).isEqualTo(0, within(1e-12 * exact));
        BudgetReading upper = BudgetReading.of(aquifer(16), Prisms.of("upper", 0, 0, box));
        assertThat(upper.in("bottom")).isEqualTo(exact, within(1e-12 * exact));
        assertThat(upper.entry("bottom", 0).net()).isEqualTo(upper.totals().residual());
        assertThat(upper.totals().closureError()).isEqualTo(100);
    }

    @Test
    void leakageOverATurnedRectangleConvergesWithTheSquareOfTheCellSize() {
        double exact = LEAKANCE * lowerMinusUpper(73.3, 81.7) * 90 * 50;
        double[] outline = Shapes.turned(Shapes.box(28.3, 56.7, 118.3, 106.7), 30, 73.3, 81.7);
        Prism prism = Prisms.of("turned", 1, 2, outline);
        double[] errors = new double[5];
        for (int level = 0; level < errors.length; level++) {
            errors[level] = BudgetReading.of(aquifer(5 << level), prism).out("top") - exact;
            // The cells' own centres stand for those of their parts inside: at most a cell's difference along the rim.
            assertThat(errors[level]).isEqualTo(0, within(0.02 * exact / (1 << 2 * level)));
        }
        Refinement.order("leakage over a turned rectangle", errors);
    }
}
