package org.seepledger.balance;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.tuple;
import static org.assertj.core.api.Assertions.within;

import java.util.Arrays;
import java.util.List;
import java.util.Optional;
import org.junit.jupiter.api.Test;
import org.seepledger.aquifer.Aquifer;
import org.seepledger.aquifer.AquiferDraft;
import org.seepledger.aquifer.ArrayValues;
import org.seepledger.aquifer.Axis;
import org.seepledger.aquifer.DarcyFlux;
import org.seepledger.aquifer.Flow;
import org.seepledger.aquifer.GivenFaceFlow;
import org.seepledger.aquifer.Grid;
import org.seepledger.aquifer.GriddedValues;
import org.seepledger.aquifer.Layer;
import org.seepledger.aquifer.OuterFaces;
import org.seepledger.aquifer.Source;
import org.seepledger.aquifer.Storage;
import org.seepledger.ledger.Entry;
import org.seepledger.ledger.Group;
import org.seepledger.prism.Prism;
import org.seepledger.prism.Prisms;
import org.seepledger.prism.Ring;
import org.seepledger.prism.Shapes;
import org.seepledger.prism.Side;
import org.seepledger.prism.VerticalRange;
import org.seepledger.progress.Progress;

/** Which rows a budget has, what stands in them, and what the reader is told beside. */
class AccountsTest {

    private static final Grid GRID = new Grid(Axis.even(0, 10, 4), Axis.even(0, 10, 3), 0, 1);
    private static final double NONE = Double.NaN;

    private static Flow uniform(double east, OuterFaces outer) {
        return new DarcyFlux(GriddedValues.constant(east), GriddedValues.constant(0), Optional.empty(), false, outer);
    }

    private static Balance balance(Aquifer aquifer, Prism... prisms) {
        return WaterBalance.of(aquifer, List.of(prisms), WellRule.POINT, 1, Progress.NONE);
    }

    @Test
    void everySideAndLayerHasARowInTheOrderOfTheTable() {
        Aquifer aquifer = AquiferDraft.on(GRID)
                .layers(30, 20, 10, 0)
                .source(new Source.Areal("recharge", GriddedValues.constant(1)))
                .done();
        BudgetReading budget = BudgetReading.of(aquifer, Prisms.of("a", 1, 2, 5, 5, 25, 5, 15, 25));
        assertThat(budget.budget().entries())
                .extracting(entry -> entry.account().group() + " "
                        + entry.account().item() + " " + entry.account().layer())
                .containsExactly(
                        "side side 1 1",
                        "side side 1 2",
                        "side side 2 1",
                        "side side 2 2",
                        "side side 3 1",
                        "side side 3 2",
                        "lid top 1",
                        "lid bottom 2",
                        "source recharge 1",
                        "source recharge 2",
                        "storage water-table storage 1",
                        "storage water-table storage 2",
                        "storage elastic storage 1",
                        "storage elastic storage 2");
    }

    @Test
    void aBoundaryOfSeveralSidesIsOneItemWhoseGrossIsKeptPerPiece() {
        List<Side> sides = List.of(
                new Side("side 1", "bank", 10, 5),
                new Side("side 2", "bank", 30, 15),
                new Side("side 3", "rest", 10, 25));
        Prism prism = new Prism("a", List.of(new Ring(1, 0, sides)), new VerticalRange.Layers(0, 0));
        BudgetReading budget = BudgetReading.of(
                AquiferDraft.on(GRID)
                        .flow(uniform(2, new OuterFaces(true, false, false)))
                        .done(),
                prism);
        // Both sides of the bank face east, over 20 in y and 10 thick.
        assertThat(budget.out("bank")).isEqualTo(400, within(1e-11));
        assertThat(budget.in("bank")).isZero();
        assertThat(budget.in("rest")).isEqualTo(400, within(1e-11));
    }

    @Test
    void gridEdgeSidesComeLast() {
        List<Side> sides = List.of(
                new Side(Prism.GRID_EDGE, Prism.GRID_EDGE, 0, 0),
                new Side("side 4", "side 4", 20, 0),
                new Side("side 2", "side 2", 20, 20),
                new Side(Prism.GRID_EDGE, Prism.GRID_EDGE, 0, 20));
        Prism prism = new Prism("a", List.of(new Ring(1, 0, sides)), new VerticalRange.Layers(0, 0));
        Balance balance = balance(AquiferDraft.on(GRID).done(), prism);
        assertThat(balance.cuts().get(0).items()).containsExactly("side 4", "side 2", Prism.GRID_EDGE);
        assertThat(balance.cuts().get(0).item(0)).isEqualTo(2);
        assertThat(balance.cuts().get(0).sides()).isEqualTo(sides);
    }

    @Test
    void aSideOnAClosedOuterFaceIsEmptyNotZeroAndIsNoted() {
        Prism corner = Prisms.of("corner", 0, 0, Shapes.box(0, 0, 25, 20));
        OuterFaces closed = new OuterFaces(false, false, false);
        Aquifer aquifer = AquiferDraft.on(GRID).flow(uniform(2, closed)).done();
        Balance balance = balance(aquifer, corner);
        assertThat(balance.notes().closedSides())
                .extracting(RunNotes.ClosedSide::prism, RunNotes.ClosedSide::item)
                .containsExactly(tuple("corner", "side 1"), tuple("corner", "side 4"));
        BudgetReading budget = BudgetReading.of(aquifer, balance).get(0);
        assertThat(budget.in("side 4")).isNaN();
        assertThat(budget.out("side 2")).isEqualTo(400, within(1e-11));
        assertThat(budget.totals().inflow()).isZero();
        OuterFaces open = new OuterFaces(true, false, false);
        Balance flowing = balance(AquiferDraft.on(GRID).flow(uniform(2, open)).done(), corner);
        assertThat(flowing.notes().closedSides()).isEmpty();
        assertThat(BudgetReading.of(aquifer, flowing).get(0).in("side 4")).isEqualTo(400, within(1e-11));
    }

    @Test
    void eachOuterSideIsKnownAsOne() {
        Prism all = Prisms.of("all", 0, 0, Shapes.box(0, 0, 40, 30));
        Balance balance = balance(
                AquiferDraft.on(GRID)
                        .flow(uniform(2, new OuterFaces(false, false, false)))
                        .done(),
                all);
        assertThat(balance.notes().closedSides()).hasSize(4);
        Prism inner = Prisms.of("inner", 0, 0, Shapes.box(10, 10, 30, 20));
        assertThat(balance(
                                AquiferDraft.on(GRID)
                                        .flow(uniform(2, new OuterFaces(false, false, false)))
                                        .done(),
                                inner)
                        .notes()
                        .closedSides())
                .isEmpty();
    }

    @Test
    void inactiveAreaIsReportedWhereItIsMost() {
        double[][][] heads = {
            {{5, 5, 5, 5, 5, 5, 5, 5, 5, 5, 5, 5}},
            {{5, 5, 5, 5, 5, NONE, 5, 5, 5, 5, 5, 5}},
            {{5, 5, 5, 5, 5, 5, NONE, 5, 5, 5, 5, 5}}
        };
        Aquifer aquifer = AquiferDraft.on(GRID)
                .times(0, 1, 2)
                .head(new ArrayValues(4, heads))
                .done();
        // Cell 6 (row 2, column 2) is inactive in both intervals, cell 7 in the second alone; both are half covered.
        Balance balance = balance(aquifer, Prisms.of("a", 0, 0, Shapes.box(0, 10, 40, 15)));
        assertThat(balance.notes().inactive()).containsExactly(new RunNotes.InactiveArea("a", 0, 100));
        assertThat(balance(aquifer, Prisms.of("a", 0, 0, Shapes.box(0, 0, 40, 10)))
                        .notes()
                        .inactive())
                .isEmpty();
    }

    @Test
    void sourcesCountByAreaInTheirCellAndSign() {
        double[] rates = {0, 0, 0, 0, 8, -4, 0, 0, 0, 0, 0, 0};
        Aquifer aquifer = AquiferDraft.on(GRID)
                .source(new Source.Cells("exchange", ArrayValues.steady(4, rates)))
                .source(new Source.Areal("exchange", GriddedValues.constant(0.5)))
                .done();
        BudgetReading budget = BudgetReading.of(aquifer, Prisms.of("a", 0, 0, Shapes.box(5, 10, 15, 20)));
        // Half of each of two cells; two sources of one category add, in and out apart.
        assertThat(budget.in("exchange")).isEqualTo(4 + 50, within(1e-12));
        assertThat(budget.out("exchange")).isEqualTo(2, within(1e-12));
        assertThat(budget.totals().closureError()).isEqualTo(100 * 52 / 54.0, within(1e-11));
    }

    @Test
    void whatIsMissingOrLostOfASourceIsCountedInItsWorstInterval() {
        double[] first = new double[12];
        double[] second = {NONE, NONE, 1, 1, 1, 1, 1, 1, 1, 1, 1, 1};
        double[] surface = {0, 0, NONE, 0, 0, 0, 0, 0, 0, 0, 0, 0};
        Aquifer aquifer = AquiferDraft.on(GRID)
                .times(0, 1, 2)
                .layers(List.of(new Layer(
                        "one", Optional.of(GriddedValues.constant(9)), ArrayValues.steady(4, surface), false)))
                .source(new Source.Cells("exchange", new ArrayValues(4, new double[][][] {{first}, {second}})))
                .done();
        Balance balance = balance(aquifer, Prisms.of("a", 0, 0, Shapes.box(0, 0, 40, 30)));
        assertThat(balance.notes().uncounted()).containsEntry("exchange", new Uncounted(2, 1));
    }

    @Test
    void disagreementOfGivenFacesIsHandedOn() {
        double[] east = {1, 1, 1, 1, 1, 1, 1, 1, 1, 1, 1, 1};
        double[] west = {1, 1, 1, 1, 1, 1, 1.5, 1, 1, 1, 1, 1};
        Flow flow = new GivenFaceFlow(
                ArrayValues.steady(4, east),
                GriddedValues.constant(0),
                Optional.empty(),
                Optional.of(ArrayValues.steady(4, west)),
                Optional.empty(),
                Optional.empty());
        Balance balance =
                balance(AquiferDraft.on(GRID).flow(flow).done(), Prisms.of("a", 0, 0, Shapes.box(0, 0, 40, 30)));
        assertThat(balance.notes().mismatch()).hasValueSatisfying(found -> {
            assertThat(found.difference()).isEqualTo(0.5);
            assertThat(found.row()).isEqualTo(1);
            assertThat(found.column()).isEqualTo(1);
        });
        assertThat(balance(AquiferDraft.on(GRID).done(), Prisms.of("a", 0, 0, Shapes.box(0, 0, 40, 30)))
                        .notes()
                        .mismatch())
                .isEmpty();
    }

    @Test
    void storageIsCountedByShareAndEmptyWhereUnknown() {
        double[][][] falling = {{fill(8)}, {fill(6)}};
        Storage storage =
                new Storage(Optional.of(GriddedValues.constant(0.2)), Optional.empty(), Optional.empty(), List.of());
        AquiferDraft draft = AquiferDraft.on(GRID).waterTableLayers(10, 0).head(new ArrayValues(4, falling));
        Prism prism = Prisms.of("a", 0, 0, Shapes.box(5, 5, 25, 15));
        BudgetReading known = BudgetReading.of(draft.storage(storage).done(), prism);
        assertThat(known.in(Aquifer.WATER_TABLE_STORAGE)).isEqualTo(0.2 * 2 * 200, within(1e-11));
        assertThat(known.totals().storageChange()).isEqualTo(-80, within(1e-11));
        assertThat(known.totals().residual()).isEqualTo(80, within(1e-11));
        BudgetReading unknown = BudgetReading.of(draft.storage(Storage.NONE).done(), prism);
        assertThat(unknown.in(Aquifer.WATER_TABLE_STORAGE)).isNaN();
        assertThat(unknown.totals().residual()).isNaN();
    }

    private static double[] fill(double value) {
        double[] values = new double[12];
        Arrays.fill(values, value);
        return values;
    }

    @Test
    void aPeriodAddsTheGrossOfIntervalsWhoseFlowTurns() {
        double[] one = fill(3);
        double[] other = fill(-1);
        Flow flow = new DarcyFlux(
                new ArrayValues(4, new double[][][] {{one}, {other}}),
                GriddedValues.constant(0),
                Optional.empty(),
                false,
                new OuterFaces(true, false, false));
        Aquifer aquifer = AquiferDraft.on(GRID).times(0, 2, 7).flow(flow).done();
        BudgetReading budget = BudgetReading.of(aquifer, Prisms.of("a", 0, 0, Shapes.box(5, 5, 25, 15)));
        Entry west = budget.entry("side 4", 0);
        assertThat(west.inflow()).isEqualTo(3 * 100 * 2, within(1e-10));
        assertThat(west.outflow()).isEqualTo(1 * 100 * 5, within(1e-10));
        assertThat(west.account().group()).isEqualTo(Group.SIDE);
    }
}
