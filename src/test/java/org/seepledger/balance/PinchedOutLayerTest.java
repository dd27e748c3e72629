package org.seepledger.balance;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.List;
import java.util.Optional;
import net.jqwik.api.ForAll;
import net.jqwik.api.Property;
import net.jqwik.api.constraints.IntRange;
import org.junit.jupiter.api.Test;
import org.seepledger.aquifer.Aquifer;
import org.seepledger.aquifer.AquiferDraft;
import org.seepledger.aquifer.Axis;
import org.seepledger.aquifer.DarcyFlux;
import org.seepledger.aquifer.Flow;
import org.seepledger.aquifer.FormulaValues;
import org.seepledger.aquifer.GivenFaceFlow;
import org.seepledger.aquifer.Grid;
import org.seepledger.aquifer.GriddedValues;
import org.seepledger.aquifer.Layer;
import org.seepledger.aquifer.OuterFaces;
import org.seepledger.aquifer.Source;
import org.seepledger.ledger.Entry;
import org.seepledger.ledger.Group;
import org.seepledger.prism.Prism;
import org.seepledger.prism.Prisms;
import org.seepledger.prism.Shapes;
import org.seepledger.progress.Progress;

/** A layer without thickness is as good as none. */
class PinchedOutLayerTest {

    private static final Grid GRID = new Grid(Axis.even(0, 3, 6), Axis.even(0, 2, 5), 0, 1);
    private static final double[] OUTLINE = Shapes.turned(Shapes.box(5, 2.5, 13, 7), 20, 9, 5);

    /** Values of three layers without the pinched one: each layer is asked for its number in the full set. */
    private static GriddedValues values(int seed, int pinched, int layers) {
        return new FormulaValues(GRID, 1, (step, layer, x, y) -> {
            int number = layers == 2 && layer >= pinched ? layer + 1 : layer;
            return Math.sin(seed + 3 * number + 0.7 * x) + Math.cos(number - seed + 0.4 * y);
        });
    }

    private static Flow flux(int pinched, int layers) {
        return new DarcyFlux(
                values(1, pinched, layers),
                values(2, pinched, layers),
                Optional.of(values(3, pinched, layers)),
                false,
                new OuterFaces(true, true, true));
    }

    private static Flow faces(int pinched, int layers) {
        return new GivenFaceFlow(
                values(1, pinched, layers),
                values(2, pinched, layers),
                Optional.of(values(3, pinched, layers)),
                Optional.of(values(4, pinched, layers)),
                Optional.of(values(5, pinched, layers)),
                Optional.of(values(6, pinched, layers)));
    }

    private static BudgetReading reading(Flow flow, Prism prism, double... elevations) {
        Aquifer aquifer = AquiferDraft.on(GRID)
                .layers(elevations)
                .flow(flow)
                .source(new Source.Areal("recharge", GriddedValues.constant(0.3)))
                .done();
        return BudgetReading.of(aquifer, prism);
    }

    @Property(tries = 6)
    void theBudgetIsThatOfTheSetWithoutIt(@ForAll @IntRange(max = 2) int pinched, @ForAll boolean darcy) {
        double[] full = {9, 9 - (pinched == 0 ? 0 : 4), pinched == 2 ? 2 : 5, 2};
        Flow three = darcy ? flux(pinched, 3) : faces(pinched, 3);
        Flow two = darcy ? flux(pinched, 2) : faces(pinched, 2);
        double middle = pinched == 2 ? full[1] : full[2];
        BudgetReading withIt = reading(three, Prisms.of("a", 0, 2, OUTLINE), full);
        BudgetReading without = reading(two, Prisms.of("a", 0, 1, OUTLINE), 9, middle, 2);
        for (Entry entry : without.budget().entries()) {
            int layer = entry.account().layer();
            boolean lid = entry.account().group() == Group.LID;
            int number = lid ? (layer == 0 ? 0 : 2) : layer >= pinched ? layer + 1 : layer;
            Entry same = withIt.entry(entry.account().item(), number);
            assertThat(same.inflow()).isEqualTo(entry.inflow());
            assertThat(same.outflow()).isEqualTo(entry.outflow());
        }
        assertThat(withIt.totals().residual()).isEqualTo(without.totals().residual());
    }

    @Test
    void aPrismOfThePinchedOutLayerAloneIsEmpty() {
        BudgetReading budget = reading(flux(1, 3), Prisms.of("a", 1, 1, OUTLINE), 9, 5, 5, 2);
        for (Entry entry : budget.budget().entries()) {
            assertThat(entry.inflow()).isZero();
            assertThat(entry.outflow()).isZero();
        }
        assertThat(budget.totals().closureError()).isNaN();
    }

    @Test
    void whereTheOutermostLayerOfARangePinchesOutItsLidIsTheNextActiveCells() {
        BudgetReading two = reading(flux(1, 3), Prisms.of("a", 1, 2, OUTLINE), 9, 5, 5, 2);
        BudgetReading one = reading(flux(1, 3), Prisms.of("a", 2, 2, OUTLINE), 9, 5, 5, 2);
        assertThat(two.entry("top", 1).net()).isEqualTo(one.entry("top", 2).net());
        assertThat(two.entry("top", 1).net()).isNotZero();
        assertThat(two.totals().residual()).isEqualTo(one.totals().residual());
    }

    /** A cell whose top is not known is inactive; the lid below the next cell carries its flow all the same. */
    @Test
    void anUnknownSurfaceTakesNoLidFromTheOtherEndOfTheRange() {
        GriddedValues holed = new FormulaValues(GRID, 1, (step, layer, x, y) -> x < 3 && y < 2 ? Double.NaN : 9);
        List<Layer> layers = List.of(
                new Layer("upper", Optional.of(holed), GriddedValues.constant(5), false),
                new Layer("lower", Optional.empty(), GriddedValues.constant(2), false));
        GriddedValues still = GriddedValues.constant(0);
        Flow rising = new DarcyFlux(
                still, still, Optional.of(GriddedValues.constant(0.1)), false, new OuterFaces(true, true, true));
        BudgetReading budget = BudgetReading.of(
                AquiferDraft.on(GRID).layers(layers).flow(rising).done(), Prisms.of("a", 0, 1, Shapes.box(0, 0, 6, 4)));
        assertThat(budget.in("bottom")).isCloseTo(0.1 * 6 * 4, within(1e-12));
        assertThat(budget.out("top")).isCloseTo(0.1 * (6 * 4 - 3 * 2), within(1e-12));
    }

    @Test
    void itsAreaIsReported() {
        Aquifer aquifer = AquiferDraft.on(GRID).layers(9, 5, 5, 2).done();
        Balance balance = WaterBalance.of(
                aquifer, List.of(Prisms.of("a", 0, 2, Shapes.box(3, 2, 7.5, 6))), WellRule.POINT, 1, Progress.NONE);
        assertThat(balance.notes().inactive()).containsExactly(new RunNotes.InactiveArea("a", 1, 18));
    }
}
