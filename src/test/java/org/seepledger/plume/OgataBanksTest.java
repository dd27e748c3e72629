package org.seepledger.plume;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.List;
import org.apache.commons.math3.analysis.integration.RombergIntegrator;
import org.apache.commons.math3.special.Erf;
import org.junit.jupiter.api.Test;
import org.seepledger.aquifer.Aquifer;
import org.seepledger.aquifer.Axis;
import org.seepledger.aquifer.FormulaValues;
import org.seepledger.aquifer.Grid;
import org.seepledger.balance.Refinement;
import org.seepledger.ledger.Group;

/**
 * A column with a constant inlet (Ogata and Banks 1961, USGS Professional Paper 411-A):
 * C = ½ C₀ [erfc((x − vt) ÷ 2√(Dt)) + exp(vx ÷ D) erfc((x + vt) ÷ 2√(Dt))], with v and D over R = 1 + ρb Kd ÷ θ where it sorbs.
 */
class OgataBanksTest {

    private static final double INLET = 0.04;
    private static final double Q = 0.05;
    private static final double POROSITY = 0.25;
    private static final double DISPERSIVITY = 5;
    private static final double RETARDATION = 2;
    private static final double[] TIMES = {240, 250};
    private static final double LENGTH = 40;
    private static final double SECTION = 3 * 10;

    private static double at(double x, double time) {
        double v = Q / POROSITY / RETARDATION;
        double d = v * DISPERSIVITY;
        double wide = 2 * Math.sqrt(d * time);
        return 0.5 * INLET * (Erf.erfc((x - v * time) / wide) + Math.exp(v * x / d) * Erf.erfc((x + v * time) / wide));
    }

    private static double meanAt(double x) {
        return 0.5 * (at(x, TIMES[0]) + at(x, TIMES[1]));
    }

    private static double[] errors(double size) {
        Grid grid = new Grid(Axis.even(0, size, (int) (64 / size)), Axis.even(0, 3, 1), 0, 1);
        Aquifer aquifer = SmallPlumes.uniform(grid, 1, new double[] {Q, 0, 0}, TIMES);
        Plume plume = SoluteDraft.balance(
                        aquifer,
                        true,
                        List.of(SmallPlumes.box("column", 0, 0, 0, 0, LENGTH, 3)),
                        SoluteDraft.of("salt", new FormulaValues(grid, 2, (step, layer, x, y) -> at(x, TIMES[step])))
                                .retardation(RETARDATION)
                                .dispersion(DISPERSIVITY, 0.5, 0.05, 0)
                                .boundary(INLET)
                                .done())
                .get(0);
        double inColumn =
                new RombergIntegrator(1e-12, 1e-12, 5, 30).integrate(1 << 24, x -> at(x, TIMES[1]), 0, LENGTH);
        MassReading mass = MassReading.of(plume, aquifer.times());
        double time = TIMES[1] - TIMES[0];
        double slope = (meanAt(LENGTH + 1e-3) - meanAt(LENGTH - 1e-3)) / 2e-3;
        Stock held = plume.whole(1);
        assertThat(held.sorbed(NonDetects.HALF))
                .isCloseTo((RETARDATION - 1) * held.dissolved(NonDetects.HALF), within(1e-12));
        assertThat(mass.in(Group.SIDE, "side 4")).isCloseTo(Q * SECTION * INLET * time, within(1e-13));
        return new double[] {
            held.total(NonDetects.HALF) / (SECTION * POROSITY * RETARDATION * inColumn) - 1,
            mass.out(Group.SIDE, "side 2") / (Q * SECTION * meanAt(LENGTH) * time) - 1,
            mass.net(Group.DISPERSION, "side 2") / (Q * DISPERSIVITY * SECTION * slope * time) - 1,
        };
    }

    @Test
    void massAndFlowAtAPlaneApproachTheClosedForm() {
        double[][] errors = {errors(4), errors(2), errors(1), errors(0.5)};
        double[] orders = new double[3];
        String[] what = {"mass in the column", "advective flow at a plane", "dispersive flow at a plane"};
        for (int i = 0; i < 3; i++) {
            orders[i] = Refinement.order("Ogata and Banks, " + what[i], errors[1][i], errors[2][i], errors[3][i]);
            assertThat(Math.abs(errors[3][i])).as(what[i]).isLessThan(i == 1 ? 0.03 : 2e-3);
        }
        assertThat(orders[0]).isCloseTo(2, within(0.15));
        assertThat(orders[1])
                .as("the cell upstream gives its own concentration")
                .isCloseTo(1, within(0.1));
        assertThat(orders[2]).isCloseTo(2, within(0.15));
    }
}
