package org.seepledger.statistics;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.assertj.core.api.Assertions.within;

import org.junit.jupiter.api.Test;

/** Sen's slope, first-order rate and serial correlation. */
class TrendTest {

    private static final double[] TIMES = {0, 1, 2, 3.5, 4, 5, 6, 7.25, 8, 9, 10, 11};
    private static final double[] VALUES = {12.1, 11.4, 11.9, 9.8, 10.2, 8.8, 8.8, 7.1, 7.9, 6.4, 6.6, 5.2};

    /** SciPy 1.17.1, {@code stats.theilslopes(VALUES, TIMES, confidence)}. */
    @Test
    void sensSlopeAgreesWithAnIndependentLibrary() {
        SenSlope slope = SenSlope.of(TIMES, VALUES, 0.95);
        assertThat(slope.slope()).isCloseTo(-0.6261363636363636, within(1e-14));
        assertThat(slope.interval().orElseThrow().low()).isCloseTo(-0.7142857142857142, within(1e-14));
        assertThat(slope.interval().orElseThrow().high()).isCloseTo(-0.5199999999999999, within(1e-14));
        Interval narrower = SenSlope.of(TIMES, VALUES, 0.9).interval().orElseThrow();
        assertThat(narrower.low()).isCloseTo(-0.6999999999999993, within(1e-14));
        assertThat(narrower.high()).isCloseTo(-0.5333333333333334, within(1e-14));
    }

    @Test
    void sensSlopeOfALineIsTheLines() {
        SenSlope slope = SenSlope.of(new double[] {1, 2, 5}, new double[] {3, 5, 11}, 0.95);
        assertThat(slope.slope()).isEqualTo(2);
        assertThat(slope.interval()).isEmpty();
    }

    /** SciPy 1.17.1, {@code stats.linregress(TIMES, log(VALUES))} and {@code stats.t.ppf(0.975, 10)}. */
    @Test
    void firstOrderRateAgreesWithAnIndependentLibrary() {
        FirstOrderRate fit = FirstOrderRate.of(TIMES, VALUES, 0.95);
        assertThat(fit.rate()).isCloseTo(0.07304746491945928, within(1e-14));
        assertThat(fit.atZero()).isCloseTo(12.863292820712797, within(1e-12));
        Interval interval = fit.interval().orElseThrow();
        assertThat(interval.high() - fit.rate()).isCloseTo(0.012959092785796912, within(1e-11));
        assertThat(fit.rate() - interval.low()).isCloseTo(0.012959092785796912, within(1e-11));
        assertThat(fit.halfLife().orElseThrow()).isCloseTo(Math.log(2) / 0.07304746491945928, within(1e-11));
        assertThat(fit.halfLifeInterval().orElseThrow().low()).isCloseTo(Math.log(2) / interval.high(), within(1e-12));
    }

    /** C = C₀ exp(−kt) gives k back, with no doubt left. */
    @Test
    void firstOrderRateOfADecayIsTheDecays() {
        double[] times = {0, 2, 3, 7, 11};
        double[] values = new double[5];
        for (int i = 0; i < 5; i++) {
            values[i] = 40 * Math.exp(-0.125 * times[i]);
        }
        FirstOrderRate fit = FirstOrderRate.of(times, values, 0.95);
        assertThat(fit.rate()).isCloseTo(0.125, within(1e-14));
        assertThat(fit.halfLife().orElseThrow()).isCloseTo(Math.log(2) / 0.125, within(1e-12));
    }

    @Test
    void aRateThatMayBeNoneHasAHalfLifeWithoutBound() {
        FirstOrderRate fit = FirstOrderRate.of(new double[] {0, 1, 2, 3}, new double[] {1, 2, 0.8, 1.1}, 0.95);
        assertThat(fit.interval().orElseThrow().low()).isNegative();
        assertThat(fit.halfLifeInterval().orElseThrow().high()).isInfinite();
        FirstOrderRate growing = FirstOrderRate.of(new double[] {0, 1, 2}, new double[] {1, 2, 4}, 0.95);
        assertThat(growing.halfLife()).isEmpty();
        assertThat(growing.halfLifeInterval()).isEmpty();
        assertThat(FirstOrderRate.of(new double[] {0, 1}, new double[] {2, 1}, 0.95)
                        .interval())
                .isEmpty();
    }

    @Test
    void refusesWhatHasNoLogarithm() {
        assertThatThrownBy(() -> FirstOrderRate.of(new double[] {0, 1, 2}, new double[] {1, 0, 1}, 0.95))
                .hasMessageContaining("positive");
        assertThatThrownBy(() -> SenSlope.of(new double[] {0, 0}, new double[] {1, 2}, 0.95))
                .hasMessageContaining("increase");
        assertThatThrownBy(() -> SenSlope.of(new double[] {0, 1}, new double[] {1, 2, 3}, 0.95))
                .hasMessageContaining("2 times for 3 values");
    }

    /** r₁ = Σ d(i) d(i−1) ÷ Σ d(i)², by hand: waves follow themselves, a seesaw does not. */
    @Test
    void seesValuesThatFollowEachOther() {
        double[] times = {0, 1, 2, 3, 4, 5, 6, 7};
        SerialCorrelation waves = SerialCorrelation.of(times, new double[] {1, 1, 1, 1, -1, -1, -1, -1}, 0);
        assertThat(waves.lagOne()).isCloseTo(5.0 / 8, within(1e-15));
        assertThat(waves.isLikely()).isTrue();
        SerialCorrelation seesaw = SerialCorrelation.of(times, new double[] {1, -1, 1, -1, 1, -1, 1, -1}, 0);
        assertThat(seesaw.lagOne()).isCloseTo(-7.0 / 8, within(1e-15));
        assertThat(seesaw.isLikely()).isFalse();
        assertThat(SerialCorrelation.of(times, times, 1).lagOne()).isZero();
    }
}
