package org.seepledger.balance;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.Optional;
import org.junit.jupiter.api.Test;
import org.seepledger.aquifer.Aquifer;
import org.seepledger.aquifer.AquiferDraft;
import org.seepledger.aquifer.Axis;
import org.seepledger.aquifer.FormulaValues;
import org.seepledger.aquifer.FormulaValues.PlanFormula;
import org.seepledger.aquifer.Grid;
import org.seepledger.aquifer.GriddedValues;
import org.seepledger.aquifer.HeadGradient;
import org.seepledger.aquifer.Source;
import org.seepledger.prism.Prisms;
import org.seepledger.prism.Shapes;

/**
 * Steady unconfined flow under recharge, after Dupuit (1863, Études théoriques et pratiques sur le mouvement des eaux):
 * where flow is nearly level, K h dh/dx carries it, and h² obeys a linear equation. The thickness is that of the upstream
 * cell, so that errors fall with the cell size itself.
 */
class UnconfinedFlowTest {

    private static final double BOTTOM = 100;
    private static final double TOP = 130;
    private static final double CONDUCTIVITY = 5;
    private static final double RECHARGE = 0.002;

    private static final double LENGTH = 540;
    private static final double WIDTH = 30;
    private static final double WEST_HEIGHT = 11;
    private static final double EAST_HEIGHT = 8;

    private static Aquifer aquifer(Grid grid, boolean waterTable, PlanFormula squaredHeight) {
        return AquiferDraft.on(grid)
                .layers(AquiferDraft.flat(waterTable, TOP, BOTTOM))
                .flow(new HeadGradient(GriddedValues.constant(CONDUCTIVITY), Optional.empty(), Optional.empty(), false))
                .head(FormulaValues.steady(grid, (x, y) -> BOTTOM + Math.sqrt(squaredHeight.at(x, y))))
                .source(new Source.Areal("recharge", GriddedValues.constant(RECHARGE)))
                .done();
    }

    /** A strip between two ditches at 0 and at its length; the grid goes on beyond, since its outer faces are closed. */
    private static Aquifer strip(int cells, boolean waterTable) {
        double step = LENGTH / cells;
        Grid grid = new Grid(Axis.even(-2 * step, step, cells + 4), Axis.even(0, WIDTH, 1), 0, 1);
        double fall = (WEST_HEIGHT * WEST_HEIGHT - EAST_HEIGHT * EAST_HEIGHT) / LENGTH;
        return aquifer(
                grid,
                waterTable,
                (x, y) -> WEST_HEIGHT * WEST_HEIGHT - fall * x + RECHARGE / CONDUCTIVITY * (LENGTH - x) * x);
    }

    /** Discharge to the east at a place in the strip, from the parabola: −K/2 d(h²)/dx. */
    private static double discharge(double x) {
        double fall = (WEST_HEIGHT * WEST_HEIGHT - EAST_HEIGHT * EAST_HEIGHT) / LENGTH;
        return WIDTH * (0.5 * CONDUCTIVITY * fall - RECHARGE * (0.5 * LENGTH - x));
    }

    private static BudgetReading reading(Aquifer aquifer, double west, double east) {
        return BudgetReading.of(aquifer, Prisms.of("reach", 0, 0, Shapes.box(west, 0, east, WIDTH)));
    }

    @Test
    void aStripUnderRechargeDrainsToBothDitches() {
        double west = -discharge(0);
        double east = discharge(LENGTH);
        assertThat(west).isPositive();
        assertThat(west + east).isEqualTo(RECHARGE * LENGTH * WIDTH, within(1e-12));
        double[][] errors = new double[2][3];
        for (int level = 0; level < 3; level++) {
            BudgetReading budget = reading(strip(30 << level, true), 0, LENGTH);
            assertThat(budget.net("recharge")).isEqualTo(west + east, within(1e-12));
            assertThat(budget.totals().storageChange()).isZero();
            errors[0][level] = budget.out("side 4") - west;
            errors[1][level] = budget.out("side 2") - east;
            // The thickness is that of the upstream cell, so both are too large before the cells are small.
            assertThat(Math.min(errors[0][level], errors[1][level])).isPositive();
        }
        assertThat(errors[0][2]).isEqualTo(0, within(0.01 * west));
        assertThat(errors[1][2]).isEqualTo(0, within(0.01 * east));
        assertThat(Refinement.order("strip, west ditch", errors[0])).isBetween(0.9, 1.1);
        assertThat(Refinement.order("strip, east ditch", errors[1])).isBetween(0.9, 1.1);
    }

    @Test
    void noWaterCrossesTheDivideAndOnEitherSideItFlowsAway() {
        double divide = 0.5 * LENGTH
                - CONDUCTIVITY * (WEST_HEIGHT * WEST_HEIGHT - EAST_HEIGHT * EAST_HEIGHT) / (2 * RECHARGE * LENGTH);
        assertThat(divide).isBetween(0.1 * LENGTH, 0.4 * LENGTH);
        double[] errors = new double[3];
        for (int level = 0; level < 3; level++) {
            Aquifer aquifer = strip(30 << level, true);
            BudgetReading westOfIt = reading(aquifer, 0, divide);
            BudgetReading acrossIt = reading(aquifer, divide - 40, divide + 70);
            errors[level] = westOfIt.out("side 4") - RECHARGE * divide * WIDTH;
            assertThat(westOfIt.net("side 2")).isEqualTo(0, within(0.002 * RECHARGE * LENGTH * WIDTH));
            assertThat(acrossIt.out("side 4")).isEqualTo(RECHARGE * 40 * WIDTH, within(0.03 * RECHARGE * 40 * WIDTH));
            assertThat(acrossIt.out("side 2")).isEqualTo(RECHARGE * 70 * WIDTH, within(0.03 * RECHARGE * 70 * WIDTH));
            assertThat(acrossIt.in("side 4") + acrossIt.in("side 2")).isZero();
        }
        assertThat(Refinement.order("strip, west of the divide", errors)).isBetween(0.9, 1.1);
    }

    /** The same heads with the layer's whole thickness, 30 over some 8 to 11 of water, would give far too much. */
    @Test
    void theWholeThicknessWouldCarryTooMuch() {
        BudgetReading saturated = reading(strip(120, true), 0, LENGTH);
        BudgetReading whole = reading(strip(120, false), 0, LENGTH);
        double westRatio = (TOP - BOTTOM) / WEST_HEIGHT;
        double eastRatio = (TOP - BOTTOM) / EAST_HEIGHT;
        assertThat(saturated.out("side 4")).isEqualTo(-discharge(0), within(-0.01 * discharge(0)));
        assertThat(saturated.totals().closureError()).isEqualTo(0, within(0.5));
        assertThat(whole.out("side 4")).isEqualTo(-discharge(0) * westRatio, within(-0.01 * discharge(0) * westRatio));
        assertThat(whole.out("side 2"))
                .isEqualTo(discharge(LENGTH) * eastRatio, within(0.01 * discharge(LENGTH) * eastRatio));
        assertThat(whole.totals().closureError()).isLessThan(-60);
    }

    /**
     * A round island in the sea, its fresh water resting on a level base: h² = h₀² + w (R² − r²) / 2K, by Dupuit's reasoning
     * about an axis. The discharge (wx/2, wy/2) has the divergence w, so that out of any outline on the island flows w
     * times its area, and through a side w/2 times its length times its distance from the centre.
     */
    @Test
    void aRoundIslandShedsTheRechargeOfTheAreaWithinACircle() {
        double shore = 400;
        double radius = 310;
        double[][] errors = new double[3][3];
        for (int level = 0; level < 3; level++) {
            int cells = 42 << level;
            double step = 840.0 / cells;
            Grid grid = new Grid(Axis.even(-420, step, cells), Axis.even(-420, step, cells), 0, 1);
            Aquifer island = aquifer(
                    grid, true, (x, y) -> 225 + RECHARGE * (shore * shore - x * x - y * y) / (2 * CONDUCTIVITY));
            BudgetReading circle =
                    BudgetReading.of(island, Prisms.of("circle", 0, 0, Shapes.round(0, 0, radius, 1440)));
            // 240 by 160; its south side is 30, its east side 250 from the centre, which lies without.
            BudgetReading beside = BudgetReading.of(island, Prisms.of("beside", 0, 0, Shapes.box(10, 30, 250, 190)));
            double net = circle.totals().inflow() - circle.totals().outflow();
            assertThat(net).isEqualTo(0, within(0.02 * RECHARGE * Math.PI * radius * radius));
            errors[0][level] = circle.net("recharge") - net - RECHARGE * Math.PI * radius * radius;
            errors[1][level] = beside.out("side 2") - 0.5 * RECHARGE * 160 * 250;
            errors[2][level] = beside.in("side 1") - 0.5 * RECHARGE * 240 * 30;
        }
        assertThat(errors[0][2]).isEqualTo(0, within(0.003 * RECHARGE * Math.PI * radius * radius));
        assertThat(errors[1][2]).isEqualTo(0, within(0.003 * RECHARGE * 0.5 * 160 * 250));
        assertThat(Refinement.order("round island, circle", errors[0])).isBetween(0.9, 1.1);
        assertThat(Refinement.order("round island, far side", errors[1])).isBetween(0.8, 1.2);
        assertThat(Refinement.order("round island, near side", errors[2])).isBetween(0.8, 1.2);
    }
}
