package org.seepledger.aquifer;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.List;
import java.util.Optional;
import org.junit.jupiter.api.Test;

/** When change in storage can be given, when it is none, and when it stays empty. */
class StorageKnowledgeTest {

    private static final Grid GRID = new Grid(Axis.even(0, 1, 1), Axis.even(0, 1, 1), 0, 1);
    private static final Optional<GriddedValues> GIVEN = Optional.of(GriddedValues.constant(0.1));
    private static final Optional<GriddedValues> LEFT_OUT = Optional.empty();
    private static final GriddedValues MOVING = new ArrayValues(1, new double[][][] {{{5}}, {{6}}, {{7}}});

    private static Aquifer aquifer(
            List<Layer> layers,
            GriddedValues head,
            Optional<GriddedValues> specificYield,
            Optional<GriddedValues> specificStorage,
            Optional<GriddedValues> storativity) {
        return AquiferDraft.on(GRID)
                .times(0, 1, 2)
                .layers(layers)
                .head(head)
                .storage(new Storage(specificYield, specificStorage, storativity, List.of()))
                .done();
    }

    private static StorageKnowledge knowledge(
            List<Layer> layers,
            Optional<GriddedValues> specificYield,
            Optional<GriddedValues> specificStorage,
            Optional<GriddedValues> storativity) {
        return aquifer(layers, MOVING, specificYield, specificStorage, storativity)
                .storageKnowledge();
    }

    private static List<Layer> both() {
        Layer upper = AquiferDraft.flat(true, 10, 5).get(0);
        Layer lower = new Layer("lower", Optional.empty(), GriddedValues.constant(0), false);
        return List.of(upper, lower);
    }

    @Test
    void oneIntervalWithoutHeadsIsSteadySeveralAreUnknown() {
        AquiferDraft draft = AquiferDraft.on(GRID);
        assertThat(draft.done().storageKnowledge()).isEqualTo(StorageKnowledge.STEADY);
        assertThat(draft.times(0, 1, 2).done().storageKnowledge()).isEqualTo(StorageKnowledge.UNKNOWN);
    }

    @Test
    void oneHeadForAllInstantsIsSteady() {
        Aquifer aquifer = aquifer(both(), GriddedValues.constant(7), GIVEN, GIVEN, LEFT_OUT);
        assertThat(aquifer.storageKnowledge()).isEqualTo(StorageKnowledge.STEADY);
        assertThat(AquiferDraft.state(aquifer, 0).terms()).isEmpty();
    }

    @Test
    void headsThatMoveNeedTheCoefficientsOfTheLayersThatThereAre() {
        List<Layer> waterTable = AquiferDraft.flat(true, 10, 0);
        List<Layer> confined = AquiferDraft.flat(false, 10, 0);
        assertThat(knowledge(waterTable, GIVEN, LEFT_OUT, LEFT_OUT)).isEqualTo(StorageKnowledge.KNOWN);
        assertThat(knowledge(waterTable, LEFT_OUT, GIVEN, LEFT_OUT)).isEqualTo(StorageKnowledge.UNKNOWN);
        assertThat(knowledge(confined, LEFT_OUT, GIVEN, LEFT_OUT)).isEqualTo(StorageKnowledge.KNOWN);
        assertThat(knowledge(confined, LEFT_OUT, LEFT_OUT, GIVEN)).isEqualTo(StorageKnowledge.KNOWN);
        assertThat(knowledge(confined, GIVEN, LEFT_OUT, LEFT_OUT)).isEqualTo(StorageKnowledge.UNKNOWN);
        assertThat(knowledge(both(), GIVEN, LEFT_OUT, LEFT_OUT)).isEqualTo(StorageKnowledge.UNKNOWN);
        assertThat(knowledge(both(), LEFT_OUT, GIVEN, LEFT_OUT)).isEqualTo(StorageKnowledge.UNKNOWN);
        assertThat(knowledge(both(), GIVEN, GIVEN, LEFT_OUT)).isEqualTo(StorageKnowledge.KNOWN);
    }

    @Test
    void computedItemsStandBesideSuppliedOnes() {
        Storage.Supplied supplied = new Storage.Supplied("compaction", GriddedValues.constant(1));
        Storage both = new Storage(GIVEN, GIVEN, LEFT_OUT, List.of(supplied));
        AquiferDraft draft = AquiferDraft.on(GRID).times(0, 1, 2).storage(both);
        assertThat(draft.done().storageItems()).containsExactly("compaction");
        assertThat(draft.head(MOVING).done().storageItems())
                .containsExactly(Aquifer.WATER_TABLE_STORAGE, Aquifer.ELASTIC_STORAGE, "compaction");
        assertThat(AquiferDraft.on(GRID).done().storageItems())
                .containsExactly(Aquifer.WATER_TABLE_STORAGE, Aquifer.ELASTIC_STORAGE);
    }

    @Test
    void surfacesAreCountedFromTheTop() {
        Aquifer aquifer = AquiferDraft.on(GRID).layers(both()).done();
        double[] target = new double[3];
        for (int i = 0; i < 3; i++) {
            aquifer.surface(i).read(0, 0, GRID.window(), target, i);
        }
        assertThat(target).containsExactly(10, 5, 0);
    }
}
