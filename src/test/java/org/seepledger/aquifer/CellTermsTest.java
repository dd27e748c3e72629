package org.seepledger.aquifer;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.List;
import java.util.Optional;
import org.junit.jupiter.api.Test;

/** Sources on a grid of two cells of 3 by 4 in each of two layers. */
class CellTermsTest {

    private static final Grid GRID = new Grid(Axis.even(0, 3, 2), Axis.even(0, 4, 1), 0, 1);
    private static final double NONE = Double.NaN;

    private static AquiferDraft draft(double[] upper, double[] lower) {
        Flow flow = new DarcyFlux(
                ArrayValues.steady(2, upper, lower),
                GriddedValues.constant(0),
                Optional.empty(),
                false,
                new OuterFaces(true, false, false));
        return AquiferDraft.on(GRID).layers(10, 5, 0).flow(flow);
    }

    private static AquiferDraft allActive() {
        return draft(new double[2], new double[2]);
    }

    private static ArrayValues plan(double... values) {
        return ArrayValues.steady(2, values);
    }

    private static CellTerm only(AquiferDraft draft) {
        List<CellTerm> terms = AquiferDraft.state(draft.done(), 0).terms();
        assertThat(terms).hasSize(1);
        return terms.get(0);
    }

    @Test
    void arealRatesAreTimesTheCellsArea() {
        CellTerm term = only(allActive().source(new Source.Areal("recharge", plan(0.5, 2))));
        assertThat(term.item()).isEqualTo("recharge");
        assertThat(term.storage()).isFalse();
        assertThat(term.rates()).containsExactly(6, 24, 0, 0);
        assertThat(term.missing()).isZero();
        assertThat(term.lost()).isZero();
    }

    @Test
    void withoutALayerTheyEnterTheUppermostActiveCell() {
        AquiferDraft draft = draft(new double[] {NONE, 0}, new double[2]);
        assertThat(only(draft.source(new Source.Cells("drain", plan(-1, -2)))).rates())
                .containsExactly(0, -2, -1, 0);
    }

    @Test
    void ratesOfALayerEnterThatLayer() {
        GriddedValues layered = ArrayValues.steady(2, new double[] {1, 2}, new double[] {3, 4});
        assertThat(only(allActive().source(new Source.Cells("exchange", layered)))
                        .rates())
                .containsExactly(1, 2, 3, 4);
        assertThat(only(allActive().source(new Source.Areal("leakage", layered)))
                        .rates())
                .containsExactly(12, 24, 36, 48);
    }

    @Test
    void whatHasNoValueIsMissingAndWhatFindsNoActiveCellIsLost() {
        AquiferDraft draft = draft(new double[] {NONE, 0}, new double[] {NONE, 0});
        CellTerm term = only(draft.source(new Source.Areal("recharge", plan(-0.5, NONE))));
        assertThat(term.rates()).containsOnly(0);
        assertThat(term.missing()).isEqualTo(1);
        assertThat(term.lost()).isEqualTo(6);
    }

    @Test
    void aLayersRateIsLostInItsOwnInactiveCell() {
        AquiferDraft draft = draft(new double[] {NONE, 0}, new double[2]);
        GriddedValues layered = ArrayValues.steady(2, new double[] {-7, NONE}, new double[] {NONE, 4});
        CellTerm term = only(draft.source(new Source.Cells("exchange", layered)));
        assertThat(term.rates()).containsExactly(0, 0, 0, 4);
        assertThat(term.missing()).isEqualTo(2);
        assertThat(term.lost()).isEqualTo(7);
    }

    @Test
    void onlyTheWindowThatWasAskedForIsCounted() {
        Aquifer aquifer =
                allActive().source(new Source.Areal("recharge", plan(1, NONE))).done();
        IntervalState state = aquifer.state(0, aquifer.geometry(new Window(0, 0, 1, 1)), List.of());
        assertThat(state.terms().get(0).missing()).isZero();
        assertThat(state.terms().get(0).rates()).hasSize(4).startsWith(12);
    }

    @Test
    void ratesChangeFromIntervalToInterval() {
        Aquifer aquifer = allActive()
                .times(0, 1, 2)
                .source(new Source.Cells("drain", new ArrayValues(2, new double[][][] {{{1, 2}}, {{3, 4}}})))
                .done();
        assertThat(AquiferDraft.state(aquifer, 1).terms().get(0).rates()).startsWith(3, 4);
    }

    @Test
    void suppliedStorageIsATermOfItsOwn() {
        GriddedValues rate = ArrayValues.steady(2, new double[] {1, 2}, new double[] {3, -4});
        Storage storage = new Storage(
                Optional.empty(),
                Optional.empty(),
                Optional.empty(),
                List.of(new Storage.Supplied("compaction", rate)));
        Aquifer aquifer = allActive().storage(storage).done();
        CellTerm term = AquiferDraft.state(aquifer, 0).terms().get(0);
        assertThat(term.storage()).isTrue();
        assertThat(term.item()).isEqualTo("compaction");
        assertThat(term.rates()).containsExactly(1, 2, 3, -4);
        assertThat(aquifer.storageItems()).containsExactly("compaction");
        assertThat(aquifer.storageKnowledge()).isEqualTo(StorageKnowledge.KNOWN);
    }

    @Test
    void categoriesAreTheUsersOwnWordsInOrderOfFirstMention() {
        PointRate barrier = new PointRate("B", "barrier", 1, 1, new Screen.InLayer(0), 0, 1, 1, "wells.csv");
        PointRate pump = new PointRate("P", "pumping", 1, 1, new Screen.InLayer(0), 0, 1, 1, "wells.csv");
        GriddedValues zero = GriddedValues.constant(0);
        Aquifer aquifer = allActive()
                .source(new Source.Areal("recharge", zero))
                .source(new Source.Points("unused", Well.of(List.of(barrier, pump))))
                .source(new Source.Cells("recharge", zero))
                .source(new Source.Cells("drain", zero))
                .done();
        assertThat(aquifer.categories()).containsExactly("recharge", "barrier", "pumping", "drain");
        assertThat(aquifer.placedWells()).hasSize(2);
    }
}
