package org.seepledger.plume;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.List;
import org.junit.jupiter.api.Test;
import org.seepledger.aquifer.Aquifer;
import org.seepledger.aquifer.Axis;
import org.seepledger.aquifer.FormulaValues;
import org.seepledger.aquifer.Grid;
import org.seepledger.balance.Refinement;
import org.seepledger.ledger.Group;

/**
 * A steady column with decay of a parent and its daughter, plug flow: C₁ = C₀ exp(−k₁τ), C₂ = y k₁ C₀ ÷ (k₂ − k₁) ×
 * [exp(−k₁τ) − exp(−k₂τ)], τ = x ÷ v (Bateman 1910, Proceedings of the Cambridge Philosophical Society 15, 423–427); a phase
 * that sorbs and decays there too has R k in place of k.
 */
class DecayColumnTest {

    private static final double INLET = 0.08;
    private static final double Q = 0.1;
    private static final double RETARDATION = 1.5;
    private static final double K1 = 0.03;
    private static final double K2 = 0.008;
    private static final double YIELD = 0.7;
    private static final double LENGTH = 16;
    private static final double SECTION = 10;

    private static double parent(double x) {
        return INLET * Math.exp(-K1 * RETARDATION * x * 0.25 / Q);
    }

    private static double daughter(double x) {
        double first = K1 * RETARDATION;
        double tau = x * 0.25 / Q;
        return YIELD * first * INLET / (K2 - first) * (Math.exp(-first * tau) - Math.exp(-K2 * tau));
    }

    private static double[] errors(double size) {
        Grid grid = new Grid(Axis.even(0, size, (int) (LENGTH / size)), Axis.even(0, 1, 1), 0, 1);
        Aquifer aquifer = SmallPlumes.uniform(grid, 1, new double[] {Q, 0, 0}, 0, 4);
        List<Plume> plumes = SoluteDraft.balance(
                aquifer,
                false,
                List.of(SmallPlumes.box("column", 0, 0, 0, 0, LENGTH, 1)),
                SoluteDraft.of("parent", FormulaValues.steady(grid, (x, y) -> parent(x)))
                        .retardation(RETARDATION)
                        .decay(K1)
                        .boundary(INLET)
                        .done(),
                SoluteDraft.of("daughter", FormulaValues.steady(grid, (x, y) -> daughter(x)))
                        .decay(K2)
                        .parent("parent", YIELD)
                        .boundary(0)
                        .done());
        MassReading first = MassReading.of(plumes.get(0), aquifer.times());
        MassReading second = MassReading.of(plumes.get(1), aquifer.times());
        double flow = Q * SECTION * 4;
        double decayed = flow * (INLET - parent(LENGTH));
        assertThat(second.in(Group.PRODUCTION, "production"))
                .isCloseTo(YIELD * first.out(Group.DECAY, "decay"), within(1e-14));
        assertThat(first.in(Group.SIDE, "side 4")).isCloseTo(flow * INLET, within(1e-14));
        return new double[] {
            first.out(Group.DECAY, "decay") / decayed - 1,
            first.out(Group.SIDE, "side 2") / (flow * parent(LENGTH)) - 1,
            second.out(Group.DECAY, "decay") / (YIELD * decayed - flow * daughter(LENGTH)) - 1,
            second.budget().totals().residual() / (YIELD * decayed),
        };
    }

    @Test
    void whatComesInGoesOutOrDecays() {
        double[][] errors = {errors(1), errors(0.5), errors(0.25)};
        String[] what = {"decay", "outflow", "decay of the daughter", "residual of the daughter"};
        int[] orders = {2, 1, 2, 1};
        for (int i = 0; i < what.length; i++) {
            double order = Refinement.order("Bateman, " + what[i], errors[0][i], errors[1][i], errors[2][i]);
            assertThat(order).as(what[i]).isCloseTo(orders[i], within(0.2));
        }
        assertThat(Math.abs(errors[2][0])).isLessThan(1e-3);
    }
}
