package org.seepledger.balance;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.List;
import java.util.Optional;
import org.junit.jupiter.api.Test;
import org.seepledger.aquifer.Aquifer;
import org.seepledger.aquifer.AquiferDraft;
import org.seepledger.aquifer.Axis;
import org.seepledger.aquifer.DarcyFlux;
import org.seepledger.aquifer.FormulaValues;
import org.seepledger.aquifer.GivenFaceFlow;
import org.seepledger.aquifer.Grid;
import org.seepledger.aquifer.GriddedValues;
import org.seepledger.aquifer.OuterFaces;
import org.seepledger.ledger.ExchangeFlow;
import org.seepledger.prism.Prism;
import org.seepledger.prism.Prisms;
import org.seepledger.prism.Shapes;
import org.seepledger.prism.VerticalRange;
import org.seepledger.progress.Progress;

/**
 * What prisms give to each other, worked by hand: discharge × area of what they share. Two layers, from 10 to 5 to 0, in
 * cells of 10 by 10, with a discharge of 0.2 to the east, 0.1 to the north and 0.03 upward everywhere.
 */
class ExchangeByHandTest {

    private static final double EXACT = 1e-12;
    private static final Grid GRID = new Grid(Axis.even(0, 10, 4), Axis.even(0, 10, 3), 0, 1);

    private static Aquifer uniform() {
        return AquiferDraft.on(GRID)
                .layers(10, 5, 0)
                .flow(new DarcyFlux(
                        GriddedValues.constant(0.2),
                        GriddedValues.constant(0.1),
                        Optional.of(GriddedValues.constant(0.03)),
                        false,
                        new OuterFaces(true, true, true)))
                .done();
    }

    private static Prism between(String name, GriddedValues bottom, GriddedValues top, double... outline) {
        VerticalRange range = new VerticalRange.Elevations(Optional.of(top), Optional.of(bottom));
        return new Prism(name, List.of(Prisms.ring(1, 0, outline)), range);
    }

    private static GriddedValues level(double elevation) {
        return GriddedValues.constant(elevation);
    }

    private static Balance balance(Aquifer aquifer, Prism... prisms) {
        return WaterBalance.of(aquifer, List.of(prisms), WellRule.POINT, 1, Progress.NONE);
    }

    private static double flow(Balance balance, String giver, String receiver) {
        List<ExchangeFlow> found = balance.exchange().stream()
                .filter(flow -> flow.giver().equals(giver) && flow.receiver().equals(receiver))
                .toList();
        assertThat(found).as("%s to %s", giver, receiver).hasSize(1);
        return found.get(0).rates()[0];
    }

    private static void assertFlow(Balance balance, String giver, String receiver, double expected) {
        assertThat(flow(balance, giver, receiver))
                .as("%s to %s", giver, receiver)
                .isCloseTo(expected, within(EXACT * Math.max(1, expected)));
    }

    /** The eastern one begins further north and ends further south: they share 16 of 22. */
    @Test
    void acrossAPartOfASide() {
        Balance balance = balance(
                uniform(),
                Prisms.of("west", 0, 1, Shapes.box(2, 3, 17, 25)),
                Prisms.of("east", 0, 1, Shapes.box(17, 5, 33, 21)));
        assertFlow(balance, "west", "east", 0.2 * 16 * 10);
        assertFlow(balance, "east", "west", 0);
        assertFlow(balance, "west", "outside", 0.2 * (22 - 16) * 10 + 0.1 * 15 * 10 + 0.03 * 15 * 22);
        assertFlow(balance, "outside", "west", 0.2 * 22 * 10 + 0.1 * 15 * 10 + 0.03 * 15 * 22);
        assertFlow(balance, "east", "outside", 0.2 * 16 * 10 + 0.1 * 16 * 10 + 0.03 * 16 * 16);
        assertFlow(balance, "outside", "east", 0.1 * 16 * 10 + 0.03 * 16 * 16);
    }

    /** A shared side on a grid line, as which the two prisms see cells on either side of it. */
    @Test
    void acrossASideOnAGridLine() {
        Balance balance = balance(
                uniform(),
                Prisms.of("west", 0, 1, Shapes.box(2, 3, 20, 25)),
                Prisms.of("east", 1, 1, Shapes.box(20, 10, 33, 28)));
        assertFlow(balance, "west", "east", 0.2 * 15 * 5);
        assertFlow(balance, "east", "west", 0);
    }

    /** The normal of the shared side is (10, -10): what flows through it does not depend on its vertices. */
    @Test
    void acrossASlantedSideWithAVertexMoreOnOneHand() {
        Balance balance = balance(
                uniform(),
                Prisms.of("lower", 0, 0, 4, 4, 24, 4, 24, 14, 14, 14),
                Prisms.of("upper", 0, 0, 4, 4, 9, 9, 14, 14, 4, 14));
        assertFlow(balance, "upper", "lower", (0.2 - 0.1) * 10 * 5);
        assertFlow(balance, "lower", "upper", 0);
    }

    /** Northward flow of 3, -2, 0 and 5 in the columns, of which a shared side along x covers 7, 10, 10 and 4. */
    @Test
    void thereAndBackThroughOneSideAreKeptApart() {
        double[] north = {3, -2, 0, 5};
        GriddedValues flow = new FormulaValues(GRID, 1, (step, layer, x, y) -> north[(int) (x / 10)]);
        GriddedValues none = GriddedValues.constant(0);
        Aquifer aquifer = AquiferDraft.on(GRID)
                .layers(10, 0)
                .flow(new GivenFaceFlow(
                        none, flow, Optional.empty(), Optional.empty(), Optional.of(flow), Optional.empty()))
                .done();
        Balance balance = balance(
                aquifer,
                Prisms.of("south", 0, 0, Shapes.box(3, 2, 34, 14)),
                Prisms.of("north", 0, 0, Shapes.box(3, 14, 34, 27)));
        assertFlow(balance, "south", "north", 3 * 0.7 + 5 * 0.4);
        assertFlow(balance, "north", "south", 2);
        assertFlow(balance, "outside", "south", 3 * 0.7 + 5 * 0.4);
        assertFlow(balance, "south", "outside", 2);
        assertFlow(balance, "north", "outside", 3 * 0.7 + 5 * 0.4);
    }

    /** From 2 to 7 and from 4 to 9 both reach from 4 to 7. */
    @Test
    void onlyAtHeightsThatBothReach() {
        Balance balance = balance(
                uniform(),
                between("west", level(2), level(7), Shapes.box(2, 3, 17, 25)),
                between("east", level(4), level(9), Shapes.box(17, 5, 33, 21)));
        assertFlow(balance, "west", "east", 0.2 * 16 * 3);
        assertFlow(balance, "east", "west", 0);
        Balance apart = balance(
                uniform(),
                between("west", level(1), level(4), Shapes.box(2, 3, 17, 25)),
                between("east", level(6), level(9), Shapes.box(17, 5, 33, 21)));
        assertFlow(apart, "west", "east", 0);
        assertFlow(apart, "east", "west", 0);
    }

    /** Overlap in plan of 7 by 17. */
    @Test
    void throughALidThatTheyShareInPart() {
        Prism lower = Prisms.of("lower", 1, 1, Shapes.box(2, 3, 17, 25));
        Prism upper = Prisms.of("upper", 0, 0, Shapes.box(10, 8, 30, 28));
        Balance balance = balance(uniform(), lower, upper);
        assertFlow(balance, "lower", "upper", 0.03 * 7 * 17);
        assertFlow(balance, "upper", "lower", 0);
        Balance other = balance(uniform(), upper, lower);
        assertFlow(other, "lower", "upper", 0.03 * 7 * 17);
        assertFlow(other, "outside", "upper", 0.2 * 20 * 5 + 0.1 * 20 * 5 + 0.03 * (20 * 20 - 7 * 17));
    }

    @Test
    void notThroughLidsAtOtherElevations() {
        Balance balance = balance(
                uniform(),
                between("lower", level(1), level(4), Shapes.box(2, 3, 17, 25)),
                between("upper", level(4.001), level(9), Shapes.box(2, 3, 17, 25)));
        assertFlow(balance, "lower", "upper", 0);
        assertFlow(balance, "upper", "lower", 0);
    }

    /** A lid that steps from 3 up to 6 at x = 20: from above 3 in the west water flows into what is below 6 in the east. */
    @Test
    void throughTheRiserOfAStepAlongX() {
        GriddedValues lid = FormulaValues.steady(GRID, (x, y) -> x < 20 ? 3 : 6);
        double[] box = Shapes.box(5, 4, 35, 24);
        Balance balance =
                balance(uniform(), between("lower", level(1), lid, box), between("upper", lid, level(9), box));
        assertFlow(balance, "lower", "upper", 0.03 * 30 * 20);
        assertFlow(balance, "upper", "lower", 0.2 * 20 * 3);
        assertFlow(balance, "outside", "lower", 0.2 * 20 * 2 + 0.1 * (15 * 2 + 15 * 5) + 0.03 * 600);
        assertFlow(balance, "lower", "outside", 0.2 * 20 * 5 + 0.1 * (15 * 2 + 15 * 5));
    }

    /** A lid that steps from 6 down to 3 at y = 10: from below 6 in the south water flows into what is above 3 in the north. */
    @Test
    void throughTheRiserOfAStepAlongY() {
        GriddedValues lid = FormulaValues.steady(GRID, (x, y) -> y < 10 ? 6 : 3);
        double[] box = Shapes.box(5, 4, 35, 24);
        Balance balance =
                balance(uniform(), between("lower", level(1), lid, box), between("upper", lid, level(9), box));
        assertFlow(balance, "lower", "upper", 0.03 * 30 * 20 + 0.1 * 30 * 3);
        assertFlow(balance, "upper", "lower", 0);
    }

    /** Where a step is higher than the prism is thick, what leaves one part of it does not enter the other. */
    @Test
    void aStepHigherThanThePrismLeadsOutOfIt() {
        GriddedValues bottom = FormulaValues.steady(GRID, (x, y) -> x < 20 ? 1 : 7);
        GriddedValues top = FormulaValues.steady(GRID, (x, y) -> x < 20 ? 3 : 9);
        BudgetReading alone = BudgetReading.of(uniform(), between("p", bottom, top, Shapes.box(5, 4, 35, 24)));
        // What leaves the west at heights from 1 to 3 passes under the east's bottom; what enters that from 7 to 9
        // passes over.
        assertThat(alone.out("top")).isCloseTo(0.03 * 600, within(EXACT));
        assertThat(alone.in("top")).isCloseTo(0.2 * 20 * 2, within(EXACT));
        assertThat(alone.in("bottom")).isCloseTo(0.03 * 600, within(EXACT * 20));
        assertThat(alone.out("bottom")).isCloseTo(0.2 * 20 * 2, within(EXACT));
        assertThat(alone.totals().residual()).isCloseTo(0, within(1e-10));
    }

    @Test
    void threeInARowAndTheOutside() {
        Balance balance = balance(
                uniform(),
                Prisms.of("a", 0, 1, Shapes.box(0, 0, 10, 10)),
                Prisms.of("b", 0, 1, Shapes.box(10, 0, 22, 10)),
                Prisms.of("c", 0, 1, Shapes.box(22, 0, 40, 10)));
        assertFlow(balance, "a", "b", 0.2 * 100);
        assertFlow(balance, "b", "c", 0.2 * 100);
        assertThat(balance.exchange())
                .noneMatch(flow -> flow.giver().equals("a") && flow.receiver().equals("c"));
        assertFlow(balance, "b", "outside", (0.1 * 10 + 0.03 * 10) * 12);
        assertFlow(balance, "outside", "b", (0.1 * 10 + 0.03 * 10) * 12);
        assertFlow(balance, "c", "outside", 0.2 * 100 + (0.1 * 10 + 0.03 * 10) * 18);
    }

    /** What fills an island gets from all around it. */
    @Test
    void anIslandAndWhatFillsIt() {
        double[] hole = Shapes.box(12, 8, 27, 19);
        Prism around = Prisms.of(
                "around",
                0,
                1,
                List.of(Prisms.ring(1, 0, Shapes.box(3, 2, 36, 28)), Prisms.ring(1, 1, Shapes.reversed(hole))));
        Balance balance = balance(uniform(), around, Prisms.of("inside", 0, 1, hole));
        assertFlow(balance, "around", "inside", 0.2 * 11 * 10 + 0.1 * 15 * 10);
        assertFlow(balance, "inside", "around", 0.2 * 11 * 10 + 0.1 * 15 * 10);
        assertFlow(balance, "inside", "outside", 0.03 * 15 * 11);
    }

    @Test
    void prismsThatOverlapLeaveTheirExchangeEmpty() {
        Balance balance = balance(
                uniform(),
                Prisms.of("a", 0, 1, Shapes.box(2, 2, 18, 18)),
                Prisms.of("b", 0, 1, Shapes.box(12, 12, 28, 28)),
                Prisms.of("c", 0, 1, Shapes.box(28, 12, 38, 28)));
        assertThat(flow(balance, "a", "b")).isNaN();
        assertThat(flow(balance, "b", "a")).isNaN();
        assertThat(flow(balance, "a", "outside")).isNaN();
        assertFlow(balance, "b", "c", 0.2 * 16 * 10);
    }
}
