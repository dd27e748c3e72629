package org.seepledger.plume;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.List;
import org.apache.commons.math3.special.Erf;
import org.junit.jupiter.api.Test;
import org.seepledger.aquifer.Aquifer;
import org.seepledger.aquifer.Axis;
import org.seepledger.aquifer.FormulaValues;
import org.seepledger.aquifer.Grid;
import org.seepledger.balance.Refinement;
import org.seepledger.prism.Prism;

/**
 * An instantaneous point source in uniform flow (Baetslé 1969, Migration of radionuclides in porous media, Progress in
 * Nuclear Energy XII, 707–730): a Gaussian in three directions that moves with v ÷ R, spreads with D ÷ R and decays. Moments as in
 * Freyberg 1986, Water Resources Research 22, 2031–2046.
 */
class GaussianPlumeTest {

    private static final double SPILLED = 12;
    private static final double POROSITY = 0.25;
    private static final double RETARDATION = 1.6;
    private static final double DECAY = 0.01;
    private static final double TIME = 50;
    private static final double[] CENTRE = {26, 11, 5};
    private static final double[] SIGMA = {4, 2, 0.8};
    private static final double LEFT = SPILLED * Math.exp(-DECAY * TIME);

    private static double density(double place, int axis) {
        double d = (place - CENTRE[axis]) / SIGMA[axis];
        return Math.exp(-0.5 * d * d) / (SIGMA[axis] * Math.sqrt(2 * Math.PI));
    }

    private static double share(int axis, double from, double to) {
        double wide = SIGMA[axis] * Math.sqrt(2);
        return 0.5 * (Erf.erf((to - CENTRE[axis]) / wide) - Erf.erf((from - CENTRE[axis]) / wide));
    }

    private static double concentration(double x, double y, double z) {
        return LEFT / (POROSITY * RETARDATION) * density(x, 0) * density(y, 1) * density(z, 2);
    }

    private static Plume plume(int refined, Prism prism) {
        Grid grid =
                new Grid(Axis.even(0, 2.0 / refined, 28 * refined), Axis.even(0, 1.0 / refined, 22 * refined), 0, 1);
        int layers = 20 * refined;
        Aquifer aquifer = SmallPlumes.uniform(grid, layers, new double[] {0.1, 0, 0}, TIME, TIME + 1);
        FormulaValues values = new FormulaValues(
                grid, 1, (step, layer, x, y) -> concentration(x, y, 10 - 10 * (layer + 0.5) / layers));
        return SoluteDraft.balance(
                        aquifer,
                        false,
                        List.of(prism),
                        SoluteDraft.of("tracer", values)
                                .retardation(RETARDATION)
                                .done())
                .get(0);
    }

    @Test
    void massCentreAndVariancesAreTheClosedForms() {
        Stock held = plume(1, SmallPlumes.box("all", 0, 19, 0, 0, 56, 22)).whole(0);
        assertThat(held.dissolved(NonDetects.HALF)).isCloseTo(LEFT / RETARDATION, within(1e-6));
        assertThat(held.sorbed(NonDetects.HALF)).isCloseTo(LEFT * (1 - 1 / RETARDATION), within(1e-6));
        double[] spread = held.spread();
        int[] own = {0, 3, 5};
        for (int axis = 0; axis < 3; axis++) {
            assertThat(held.centre()[axis]).isCloseTo(CENTRE[axis], within(1e-5));
            assertThat(spread[own[axis]]).isCloseTo(SIGMA[axis] * SIGMA[axis], within(1e-3));
        }
        for (int mixed : new int[] {1, 2, 4}) {
            assertThat(spread[mixed]).isCloseTo(0, within(1e-5));
        }
    }

    /** Mass in a box is the product of three differences of error functions. */
    @Test
    void massInABoxApproachesTheClosedForm() {
        double exact = LEFT * share(0, 20, 30) * share(1, 9, 14) * share(2, 2, 6);
        double[] errors = new double[3];
        for (int i = 0; i < 3; i++) {
            int refined = 1 << i;
            Prism box = SmallPlumes.box("box", 8 * refined, 16 * refined - 1, 20, 9, 30, 14);
            errors[i] = plume(refined, box).whole(0).total(NonDetects.HALF) / exact - 1;
        }
        assertThat(Refinement.order("Baetsle, mass in a box", errors)).isCloseTo(2, within(0.1));
        assertThat(Math.abs(errors[2])).isLessThan(1e-3);
    }
}
