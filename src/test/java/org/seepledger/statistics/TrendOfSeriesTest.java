package org.seepledger.statistics;

import static org.assertj.core.api.Assertions.assertThat;

import org.junit.jupiter.api.Test;

/** What a series is told depends on what it is. */
class TrendOfSeriesTest {

    private static final double[] TIMES = {0, 1, 2, 3, 4, 5, 6, 7};

    @Test
    void independentValuesAreTested() {
        Trend trend = Trend.of(TIMES, new double[] {9, 8, 8.5, 7, 7.4, 6, 6.3, 5}, false, 0.95);
        assertThat(trend.kind()).isEqualTo(Trend.Kind.INDEPENDENT);
        assertThat(trend.test()).isPresent();
        assertThat(trend.rate()).isPresent();
        assertThat(trend.slope().interval()).isPresent();
    }

    @Test
    void simulatedAndCorrelatedValuesGetASlopeAlone() {
        double[] later = new double[12];
        double[] wave = new double[12];
        for (int i = 0; i < wave.length; i++) {
            later[i] = i;
            wave[i] = 9 + Math.sin(2 * Math.PI * i / 12);
        }
        for (Trend trend : new Trend[] {
            Trend.of(TIMES, new double[] {9, 8, 8.5, 7, 7.4, 6, 6.3, 5}, true, 0.95), Trend.of(later, wave, false, 0.95)
        }) {
            assertThat(trend.slope().slope()).isNegative();
            assertThat(trend.slope().interval()).isEmpty();
            assertThat(trend.test()).isEmpty();
            assertThat(trend.rate()).isEmpty();
        }
        assertThat(Trend.of(later, wave, false, 0.95).kind()).isEqualTo(Trend.Kind.CORRELATED);
    }

    @Test
    void aSeriesWithZerosHasNoFirstOrderRate() {
        Trend trend = Trend.of(new double[] {0, 1, 2}, new double[] {2, 0, 1}, false, 0.95);
        assertThat(trend.rate()).isEmpty();
        assertThat(trend.correlation()).isEmpty();
        assertThat(trend.test().orElseThrow().probability()).isEmpty();
    }
}
