package org.seepledger.aquifer;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.assertj.core.api.Assertions.within;

import java.util.List;
import java.util.Optional;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.seepledger.fault.DataFault;

/**
 * One cell of 3 by 4 from 2 up to 12, in which a head falls within 5 days. Expected values follow from the definitions of
 * specific yield (drained volume per area and fall of the water table) and specific storage (released volume per volume
 * and fall of head), integrated by hand.
 */
class StorageReleaseTest {

    private static final Grid GRID = new Grid(Axis.even(0, 3, 1), Axis.even(0, 4, 1), 0, 1);
    private static final double AREA_PER_DAY = 12 / 5.0;
    private static final double YIELD = 0.2;
    private static final double SPECIFIC = 0.001;

    private static Aquifer aquifer(boolean waterTable, Storage storage, double start, double end) {
        return AquiferDraft.on(GRID)
                .layers(AquiferDraft.flat(waterTable, 12, 2))
                .times(0, 5)
                .head(new ArrayValues(1, new double[][][] {{{start}}, {{end}}}))
                .storage(storage)
                .done();
    }

    private static Storage coefficients(double specificYield, double specificStorage) {
        return new Storage(
                Optional.of(GriddedValues.constant(specificYield)),
                Optional.of(GriddedValues.constant(specificStorage)),
                Optional.empty(),
                List.of());
    }

    private static double released(Aquifer aquifer, String item) {
        return AquiferDraft.state(aquifer, 0).terms().stream()
                .filter(term -> term.item().equals(item) && term.storage())
                .mapToDouble(term -> term.rates()[0])
                .sum();
    }

    /** The drained height, and the integral of saturated thickness over the fall of head. */
    @ParameterizedTest
    @CsvSource({
        "8, 6, 2, 10", // from 6 to 4 thick: (36 - 16) / 2
        "6, 8, -2, -10",
        "15, 10, 2, 48", // confined for 3 at 10 thick: 30; then from 10 to 8: 18
        "10, 15, -2, -48",
        "15, 13, 0, 20",
        "12, 2, 10, 50",
        "5, 1, 3, 4.5", // dry from 2 on
        "1, 5, -3, -4.5",
        "20, -Infinity, 10, 130", // 80 confined, then 50
        "-Infinity, 4, -2, -2",
        "-Infinity, -Infinity, 0, 0",
        "7, 7, 0, 0",
    })
    void aWaterTableLayerIsSplitAtItsTopAndBottom(double start, double end, double drained, double integral) {
        Aquifer aquifer = aquifer(true, coefficients(YIELD, SPECIFIC), start, end);
        assertThat(released(aquifer, Aquifer.WATER_TABLE_STORAGE))
                .isEqualTo(YIELD * drained * AREA_PER_DAY, within(1e-12));
        assertThat(released(aquifer, Aquifer.ELASTIC_STORAGE))
                .isEqualTo(SPECIFIC * integral * AREA_PER_DAY, within(1e-12));
    }

    @ParameterizedTest
    @CsvSource({"20, 15, 50", "15, 20, -50", "8, 6, 20", "5, -Infinity, 30"})
    void aConfinedLayerReleasesOverItsWholeThickness(double start, double end, double integral) {
        Aquifer aquifer = aquifer(false, coefficients(YIELD, SPECIFIC), start, end);
        assertThat(released(aquifer, Aquifer.WATER_TABLE_STORAGE)).isZero();
        assertThat(released(aquifer, Aquifer.ELASTIC_STORAGE))
                .isEqualTo(SPECIFIC * integral * AREA_PER_DAY, within(1e-12));
    }

    @Test
    void storativityIsSpecificStorageTimesThickness() {
        Storage storage =
                new Storage(Optional.empty(), Optional.empty(), Optional.of(GriddedValues.constant(0.01)), List.of());
        // 0.01 × a fall of 5, as 0.001 × 10 × 5 above.
        assertThat(released(aquifer(false, storage, 20, 15), Aquifer.ELASTIC_STORAGE))
                .isEqualTo(0.05 * AREA_PER_DAY, within(1e-13));
    }

    @Test
    void specificYieldAloneServesAWaterTableLayer() {
        Storage storage =
                new Storage(Optional.of(GriddedValues.constant(YIELD)), Optional.empty(), Optional.empty(), List.of());
        Aquifer aquifer = aquifer(true, storage, 8, 6);
        assertThat(aquifer.storageKnowledge()).isEqualTo(StorageKnowledge.KNOWN);
        assertThat(released(aquifer, Aquifer.WATER_TABLE_STORAGE)).isEqualTo(0.4 * AREA_PER_DAY, within(1e-13));
        assertThat(released(aquifer, Aquifer.ELASTIC_STORAGE)).isZero();
    }

    @Test
    void aCoefficientMissingInAnActiveCellIsAFault() {
        assertThatThrownBy(() -> AquiferDraft.state(aquifer(true, coefficients(Double.NaN, SPECIFIC), 8, 6), 0))
                .isInstanceOf(DataFault.class)
                .hasMessageContaining("specific yield")
                .hasMessageContaining("layer 1, row 1, column 1");
        assertThatThrownBy(() -> AquiferDraft.state(aquifer(false, coefficients(YIELD, Double.NaN), 8, 6), 0))
                .isInstanceOf(DataFault.class)
                .hasMessageContaining("specific storage");
        Storage storativity = new Storage(
                Optional.empty(), Optional.empty(), Optional.of(GriddedValues.constant(Double.NaN)), List.of());
        assertThatThrownBy(() -> AquiferDraft.state(aquifer(false, storativity, 8, 6), 0))
                .hasMessageContaining("storativity");
    }

    @Test
    void missingYieldWhereThereIsNoWaterTableAndMissingHeadsAreNoFault() {
        assertThat(released(aquifer(false, coefficients(Double.NaN, SPECIFIC), 8, 6), Aquifer.WATER_TABLE_STORAGE))
                .isZero();
        assertThat(released(
                        aquifer(true, coefficients(Double.NaN, Double.NaN), Double.NaN, 6),
                        Aquifer.WATER_TABLE_STORAGE))
                .isZero();
    }

    @Test
    void aFaultSaysWhereAsUsersCount() {
        Grid grid = new Grid(Axis.even(0, 1, 3), Axis.even(0, 1, 4), 0, 1);
        double[] yields = new double[12];
        yields[2 * 3 + 1] = Double.NaN;
        GriddedValues fine = ArrayValues.steady(3, new double[12]);
        GriddedValues holed = ArrayValues.steady(3, new double[12], yields);
        double[][] head = {new double[12], new double[12]};
        Aquifer aquifer = AquiferDraft.on(grid)
                .waterTableLayers(10, 5, 0)
                .head(new ArrayValues(3, new double[][][] {head, head}))
                .storage(new Storage(Optional.of(holed), Optional.of(fine), Optional.empty(), List.of()))
                .done();
        assertThatThrownBy(() -> AquiferDraft.state(aquifer, 0)).hasMessageContaining("layer 2, row 3, column 2");
    }
}
