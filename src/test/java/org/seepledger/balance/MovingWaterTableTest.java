package org.seepledger.balance;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.List;
import java.util.Optional;
import org.junit.jupiter.api.Test;
import org.seepledger.aquifer.Aquifer;
import org.seepledger.aquifer.AquiferDraft;
import org.seepledger.aquifer.ArrayValues;
import org.seepledger.aquifer.Axis;
import org.seepledger.aquifer.Grid;
import org.seepledger.aquifer.GriddedValues;
import org.seepledger.aquifer.HeadGradient;
import org.seepledger.aquifer.Source;
import org.seepledger.aquifer.Storage;
import org.seepledger.prism.Prism;
import org.seepledger.prism.Prisms;
import org.seepledger.prism.Shapes;
import org.seepledger.prism.VerticalRange;

/**
 * Rows of cells worked by hand, in which heads pass a layer's top or a prism's lid within a day. A fall of the water table
 * drains specific yield; a fall of head relieves specific storage over the thickness that is saturated at the time.
 */
class MovingWaterTableTest {

    private static final double EXACT = 1e-10;

    private static Aquifer row(
            Grid grid,
            List<double[]> heads,
            boolean waterTable,
            double[] layer,
            double[] coefficients,
            double recharge) {
        return AquiferDraft.on(grid)
                .layers(AquiferDraft.flat(waterTable, layer))
                .flow(new HeadGradient(
                        GriddedValues.constant(coefficients[0]), Optional.empty(), Optional.empty(), false))
                .head(new ArrayValues(grid.columns(), new double[][][] {{heads.get(0)}, {heads.get(1)}}))
                .storage(new Storage(
                        Optional.of(GriddedValues.constant(coefficients[1])),
                        Optional.of(GriddedValues.constant(coefficients[2])),
                        Optional.empty(),
                        List.of()))
                .source(new Source.Areal("recharge", GriddedValues.constant(recharge)))
                .done();
    }

    /** Four cells of 50 by 40, from 5 up to 25: one stays confined, one turns unconfined, one is unconfined, one fills. */
    private static Aquifer turning(boolean waterTable) {
        Grid grid = new Grid(Axis.even(0, 50, 4), Axis.even(0, 40, 1), 0, 1);
        List<double[]> heads = List.of(new double[] {30, 28, 24, 20}, new double[] {27, 22, 21, 26});
        return row(grid, heads, waterTable, new double[] {25, 5}, new double[] {0.5, 0.15, 2e-4}, 0);
    }

    private static BudgetReading between(Aquifer aquifer, double west, double east) {
        return BudgetReading.of(aquifer, Prisms.of("reach", 0, 0, Shapes.box(west, 0, east, 40)));
    }

    @Test
    void aHeadThatFallsThroughTheLayersTopDrainsBelowItAlone() {
        BudgetReading turned = between(turning(true), 50, 100);
        // Above the top 3 of fall at 20 thick; below it from 20 to 17 thick, where 3 drain.
        assertThat(turned.net("water-table storage")).isEqualTo(0.15 * 2000 * 3, within(EXACT));
        assertThat(turned.net("elastic storage"))
                .isEqualTo(2e-4 * 2000 * (20 * 3 + (20 * 20 - 17 * 17) / 2.0), within(EXACT));
        double released = turned.net("water-table storage") + turned.net("elastic storage");
        assertThat(released).isEqualTo(946.2, within(EXACT));
        double allElastic = 2e-4 * 20 * 2000 * 6;
        double allDrained = 0.15 * 2000 * 6;
        assertThat(released).isGreaterThan(10 * allElastic).isLessThan(0.6 * allDrained);
        BudgetReading confined = between(turning(false), 50, 100);
        assertThat(confined.net("elastic storage")).isEqualTo(allElastic, within(EXACT));
        assertThat(confined.entries("elastic storage")).hasSize(1);
    }

    /** One and a half of the cells that fall, beside half of the one that fills. */
    @Test
    void eachCellIsSplitAtTheTopOnItsOwn() {
        BudgetReading falling = between(turning(true), 0, 125);
        assertThat(falling.in("water-table storage")).isEqualTo(0.15 * 2000 * (0 + 3 + 0.5 * 3), within(EXACT));
        // 60; 115.5; from 19 to 16 thick: 52.5, half of it.
        assertThat(falling.in("elastic storage")).isEqualTo(2e-4 * 2000 * (60 + 115.5 + 26.25), within(EXACT));
        assertThat(falling.out("water-table storage") + falling.out("elastic storage"))
                .isZero();
        BudgetReading both = between(turning(true), 100, 175);
        assertThat(both.in("water-table storage")).isEqualTo(0.15 * 2000 * 3, within(EXACT));
        assertThat(both.out("water-table storage")).isEqualTo(0.15 * 2000 * 0.5 * 5, within(EXACT));
        // From 15 to 20 thick: 87.5; then 1 at 20 thick.
        assertThat(both.out("elastic storage")).isEqualTo(2e-4 * 2000 * 0.5 * (87.5 + 20), within(EXACT));
    }

    private static final double LID = 8;

    /** Cells of 10 by 10, from 0 up to 20, without elastic storage. */
    private static List<BudgetReading> aboveAndBelow(Aquifer aquifer, double west, double east) {
        Optional<GriddedValues> lid = Optional.of(GriddedValues.constant(LID));
        Prism plan = Prisms.of("plan", 0, 0, Shapes.box(west, 0, east, 10));
        Prism above = new Prism("above", plan.rings(), new VerticalRange.Elevations(Optional.empty(), lid));
        Prism below = new Prism("below", plan.rings(), new VerticalRange.Elevations(lid, Optional.empty()));
        return BudgetReading.of(aquifer, WellRule.POINT, below, above);
    }

    /**
     * The water table falls from 9 to 7 and from 10.5 to 6 through a lid at 8, and specific yield is 0.2: below the lid 20
     * and 40 are released, above it 20 and 50, which come down through it.
     */
    @Test
    void aWaterTableThatFallsThroughALidReleasesBelowItFromTheLidOnly() {
        Grid grid = new Grid(Axis.even(0, 10, 3), Axis.even(0, 10, 1), 0, 1);
        List<double[]> heads = List.of(new double[] {9, 10.5, 6}, new double[] {7, 6, 5});
        Aquifer aquifer = row(grid, heads, true, new double[] {20, 0}, new double[] {2, 0.2, 0}, 0.03);
        List<BudgetReading> readings = aboveAndBelow(aquifer, 0, 20);
        BudgetReading above = readings.get(1);
        BudgetReading below = readings.get(0);
        assertThat(below.net("water-table storage")).isEqualTo(20 + 40, within(EXACT));
        assertThat(above.net("water-table storage")).isEqualTo(20 + 50, within(EXACT));
        assertThat(below.in("top")).isEqualTo(70, within(EXACT));
        assertThat(above.out("bottom")).isEqualTo(70, within(EXACT));
        // In the end all water is below the lid: K × 1/10 × 6 × 10 = 12 to the east, and recharge at the water table.
        assertThat(below.out("side 2")).isEqualTo(12, within(EXACT));
        assertThat(above.out("side 2")).isZero();
        assertThat(below.net("recharge")).isEqualTo(6, within(EXACT));
        assertThat(above.net("recharge")).isZero();
        assertThat(above.totals().residual()).isEqualTo(0, within(EXACT));
    }

    /**
     * The water table rises from 7 to 10 through a lid at 8, in a cell that balances: 24 K comes in from the west, 11 K from
     * the east and 5 as recharge, 60 is taken up, so that K is 11/7. Four fifths of the lateral flow, 44, lie below the lid,
     * which keep 20 there; 24 rise through it, where 11 and the recharge join them to make up 40.
     */
    @Test
    void aWaterTableThatRisesThroughALidIsFedFromBelowIt() {
        Grid grid = new Grid(Axis.even(0, 10, 3), Axis.even(0, 10, 1), 0, 1);
        List<double[]> heads = List.of(new double[] {9, 7, 9}, new double[] {12, 10, 11});
        Aquifer aquifer = row(grid, heads, true, new double[] {20, 0}, new double[] {11 / 7.0, 0.2, 0}, 0.05);
        List<BudgetReading> readings = aboveAndBelow(aquifer, 10, 20);
        BudgetReading above = readings.get(1);
        BudgetReading below = readings.get(0);
        assertThat(below.in("side 4")).isEqualTo(0.8 * 24 * 11 / 7, within(EXACT));
        assertThat(below.in("side 2")).isEqualTo(0.8 * 11 * 11 / 7, within(EXACT));
        assertThat(above.in("side 4") + above.in("side 2")).isEqualTo(11, within(EXACT));
        assertThat(below.out("water-table storage")).isEqualTo(20, within(EXACT));
        assertThat(above.out("water-table storage")).isEqualTo(40, within(EXACT));
        assertThat(below.out("top")).isEqualTo(24, within(EXACT));
        assertThat(above.in("bottom")).isEqualTo(24, within(EXACT));
        assertThat(below.net("recharge")).isZero();
        assertThat(above.net("recharge")).isEqualTo(5, within(EXACT));
        assertThat(below.totals().residual()).isEqualTo(0, within(EXACT));
        assertThat(above.totals().residual()).isEqualTo(0, within(EXACT));
    }
}
