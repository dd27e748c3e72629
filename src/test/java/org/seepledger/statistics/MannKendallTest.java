package org.seepledger.statistics;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.assertj.core.api.Assertions.within;

import java.util.Arrays;
import net.jqwik.api.ForAll;
import net.jqwik.api.Property;
import net.jqwik.api.constraints.IntRange;
import net.jqwik.api.constraints.Size;
import org.apache.commons.math3.distribution.NormalDistribution;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

class MannKendallTest {

    /** SciPy 1.17.1, {@code stats.kendalltau(range(n), values, method="exact")}. */
    @ParameterizedTest
    @CsvSource({
        "1 2 3 4 5, 10, 0.016666666666666666",
        "1 2 4 3 5 6 8 7, 24, 0.001736111111111111",
        "2 1 4 3 6 5 10 7 8 9, 33, 0.002212852733686067"
    })
    void agreesWithAnIndependentLibrary(String series, int s, double probability) {
        MannKendall test = MannKendall.of(values(series));
        assertThat(test.s()).isEqualTo(s);
        assertThat(test.probability().orElseThrow()).isCloseTo(probability, within(1e-14));
    }

    /** Kendall 1975, table of the probabilities of S, one-sided to three digits (from memory). */
    @ParameterizedTest
    @CsvSource({"1 2 3 5 4, 0.042", "2 1 3 5 4, 0.117", "1 2 3 4 6 5, 0.0083", "1 2 3 4 5 6 7, 0.0002"})
    void agreesWithTheTable(String series, double oneSided) {
        assertThat(MannKendall.of(values(series)).probability().orElseThrow() / 2)
                .isCloseTo(oneSided, within(5e-4));
    }

    /** All 1,260 different orders of 3 1 1 2 5 5 4 counted one by one in Python: 0.22857142857142856. */
    @ParameterizedTest
    @CsvSource({"3 1 1 2 5 5 4, 9, 0.22857142857142856", "7 7 7 7 7, 0, 1"})
    void countsTiesExactly(String series, int s, double probability) {
        MannKendall test = MannKendall.of(values(series));
        assertThat(test.s()).isEqualTo(s);
        assertThat(test.probability().orElseThrow()).isCloseTo(probability, within(1e-14));
    }

    /** Variance by Kendall's formula, worked by hand: [12·11·29 − 2·1·9] ÷ 18; S by counting; Z takes 1 off. */
    @ParameterizedTest
    @CsvSource({"12.1 11.4 11.9 9.8 10.2 8.8 8.8 7.1 7.9 6.4 6.6 5.2"})
    void usesTheNormalApproximationForLongSeries(String series) {
        MannKendall test = MannKendall.of(values(series));
        assertThat(test.s()).isEqualTo(-57);
        assertThat(test.variance()).isCloseTo(3810.0 / 18, within(1e-12));
        double z = -56 / Math.sqrt(3810.0 / 18);
        assertThat(test.z()).isCloseTo(z, within(1e-14));
        assertThat(test.probability().orElseThrow())
                .isCloseTo(2 * new NormalDistribution().cumulativeProbability(z), within(1e-16));
    }

    @ParameterizedTest
    @CsvSource({"1 2", "1 2 3 4"})
    void givesNoProbabilityBelowFive(String series) {
        assertThat(MannKendall.of(values(series)).probability()).isEmpty();
    }

    @Property(tries = 200)
    void turnsWithTheSeries(@ForAll @Size(min = 5, max = 14) int[] given) {
        double[] values = new double[given.length];
        double[] back = new double[given.length];
        for (int i = 0; i < given.length; i++) {
            values[i] = given[i] % 7;
            back[given.length - 1 - i] = values[i];
        }
        MannKendall onward = MannKendall.of(values);
        MannKendall backward = MannKendall.of(back);
        assertThat(backward.s()).isEqualTo(-onward.s());
        assertThat(backward.probability()).isEqualTo(onward.probability());
        assertThat(onward.probability().orElseThrow()).isBetween(0.0, 1.0);
    }

    /** Where exact and approximate meet they are close, so that ten years and eleven are judged alike. */
    @Property(tries = 50)
    void approximatesWhatItCounts(@ForAll @IntRange(min = 0, max = 45) int swaps) {
        double[] values = {1, 2, 3, 4, 5, 6, 7, 8, 9, 10};
        for (int i = 0; i < swaps; i++) {
            int at = (i * 7) % 9;
            double kept = values[at];
            values[at] = values[at + 1];
            values[at + 1] = kept;
        }
        MannKendall test = MannKendall.of(values);
        double approximate = 2 * new NormalDistribution().cumulativeProbability(-Math.abs(test.z()));
        assertThat(test.probability().orElseThrow()).isCloseTo(Math.min(1, approximate), within(0.015));
    }

    @ParameterizedTest
    @CsvSource({"1", "1 NaN 2"})
    void refusesWhatIsNoSeries(String series) {
        assertThatThrownBy(() -> MannKendall.of(values(series))).isInstanceOf(IllegalArgumentException.class);
    }

    static double[] values(String series) {
        return Arrays.stream(series.split(" ")).mapToDouble(Double::parseDouble).toArray();
    }
}
