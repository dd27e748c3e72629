package org.seepledger.aquifer;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;

import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

/** Edges at 0, 1, 3 and 7 from an origin of 100, counted by hand. */
class AxisTest {

    private static final Axis AXIS = Axis.of(100, 101, 103, 107);

    @Test
    void keepsEdgesAsDistancesFromTheFirst() {
        assertThat(AXIS.origin()).isEqualTo(100);
        assertThat(AXIS.count()).isEqualTo(3);
        assertThat(AXIS.edge(0)).isZero();
        assertThat(AXIS.edge(2)).isEqualTo(3);
        assertThat(AXIS.size(0)).isEqualTo(1);
        assertThat(AXIS.size(2)).isEqualTo(4);
    }

    @Test
    void evenStepsAreMultiplesNotSums() {
        Axis axis = Axis.even(5, 0.1, 10);
        assertThat(axis.count()).isEqualTo(10);
        assertThat(axis.edge(3)).isEqualTo(3 * 0.1);
        assertThat(axis.edge(10)).isEqualTo(1.0);
        assertThat(axis.isEven()).isTrue();
    }

    @Test
    void isEvenWhenStepsDifferByNoMoreThanABillionth() {
        assertThat(Axis.of(0, 1, 2 + 0.9e-9, 3).isEven()).isTrue();
        assertThat(Axis.of(0, 1, 2 + 2e-9).isEven()).isFalse();
        assertThat(Axis.of(0, 1, 2 - 2e-9).isEven()).isFalse();
        assertThat(Axis.of(0, 1, 3, 4).isEven()).isFalse();
        assertThat(AXIS.isEven()).isFalse();
    }

    @ParameterizedTest
    @CsvSource({"-0.5, -1", "0, 0", "0.5, 0", "1, 1", "2.9, 1", "3, 2", "6.9, 2", "7, 2", "7.1, 3"})
    void aPlaceOnAnEdgeIsInTheCellBeyondItButTheLastIsInTheLastCell(double distance, int cell) {
        assertThat(AXIS.cellAt(distance)).isEqualTo(cell);
    }

    @ParameterizedTest
    @CsvSource({
        "2.9999999985, 3", // 1.5e-9 of 2: within a billionth of its cell
        "2.999999997, 2.999999997",
        "3.0000000035, 3", // 3.5e-9 of 4
        "3.000000005, 3.000000005",
        "0.0000000005, 0",
        "0.000000002, 0.000000002",
        "-0.5, 0",
        "8, 7",
        "6.9999999961, 7",
        "2, 2",
    })
    void aPlaceAsGoodAsOnAnEdgeIsPutOnIt(double distance, double snapped) {
        assertThat(AXIS.snapped(distance, Axis.SNAP)).isEqualTo(snapped);
    }

    @Test
    void holdsItsEndsAndWhatRoundingPutsBeyondThem() {
        assertThat(AXIS.holds(0, 0)).isTrue();
        assertThat(AXIS.holds(7, 0)).isTrue();
        assertThat(AXIS.holds(-0.9e-9, 1e-9)).isTrue();
        assertThat(AXIS.holds(-1.1e-9, 1e-9)).isFalse();
        assertThat(AXIS.holds(-1.1e-9, 1e-8)).isTrue();
        assertThat(AXIS.holds(7 + 3.9e-9, 1e-9)).isTrue();
        assertThat(AXIS.holds(7 + 4.1e-9, 1e-9)).isFalse();
        assertThat(AXIS.holds(7 + 3.9e-8, 1e-8)).isTrue();
        assertThat(AXIS.holds(7 + 4.1e-8, 1e-8)).isFalse();
    }

    @Test
    void refusesStepsThatMakeNoCells() {
        assertRefused(0, 0, 3);
        assertRefused(0, -1, 3);
        assertRefused(0, Double.NaN, 3);
        assertRefused(0, Double.POSITIVE_INFINITY, 3);
        assertRefused(Double.NaN, 1, 3);
        assertRefused(0, 1, 0);
        assertThat(Axis.even(0, 1, 1).count()).isEqualTo(1);
    }

    private static void assertRefused(double from, double step, int count) {
        assertThatThrownBy(() -> Axis.even(from, step, count)).hasMessageContaining("positive");
    }

    @Test
    void refusesEdgesThatDoNotIncreaseAndSaysWhich() {
        assertThatThrownBy(() -> Axis.of(1)).hasMessageContaining("at least two");
        assertThatThrownBy(() -> Axis.of(0, 1, 1)).hasMessageContaining("edge 3 is 1.0 after 1.0");
        assertThatThrownBy(() -> Axis.of(0, Double.NaN)).hasMessageContaining("edge 2");
        assertThatThrownBy(() -> Axis.of(0, Double.POSITIVE_INFINITY)).hasMessageContaining("edge 2");
        assertThatThrownBy(() -> Axis.of(Double.NEGATIVE_INFINITY, 0)).hasMessageContaining("edge 2");
        assertThat(Axis.of(0, 1).count()).isEqualTo(1);
    }
}
