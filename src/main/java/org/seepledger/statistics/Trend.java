package org.seepledger.statistics;

import java.util.Arrays;
import java.util.Optional;

/**
 * What a short series shows of a trend, as far as its kind allows.
 *
 * <p>Tests and intervals take values as independent of each other. Those that a model computed are not, nor those of which
 * each follows the one before: they get a slope alone.
 *
 * @param kind what the series is
 * @param slope its median slope; without an interval where values are not independent
 * @param test the rank test; empty where values are not independent
 * @param rate the first-order rate; empty where values are not independent or not all positive
 * @param correlation how much values follow each other; empty for fewer than {@link MannKendall#LEAST}
 */
public record Trend(
        Kind kind,
        SenSlope slope,
        Optional<MannKendall> test,
        Optional<FirstOrderRate> rate,
        Optional<SerialCorrelation> correlation) {

    /** What a series is. */
    public enum Kind {
        /** Values that may be taken as independent. */
        INDEPENDENT,
        /** Values of a model. */
        SIMULATED,
        /** Values that follow each other. */
        CORRELATED
    }

    /**
     * {@return what a series shows}
     *
     * @param times at least two strictly increasing times
     * @param values a value at each
     * @param simulated whether a model computed them
     * @param confidence of intervals, between 0 and 1
     * @throws IllegalArgumentException if they are not
     */
    public static Trend of(double[] times, double[] values, boolean simulated, double confidence) {
        SenSlope slope = SenSlope.of(times, values, confidence);
        Optional<SerialCorrelation> correlation = values.length < MannKendall.LEAST
                ? Optional.empty()
                : Optional.of(SerialCorrelation.of(times, values, slope.slope()));
        boolean follows = correlation.filter(SerialCorrelation::isLikely).isPresent();
        if (simulated || follows) {
            return new Trend(
                    simulated ? Kind.SIMULATED : Kind.CORRELATED,
                    new SenSlope(slope.slope(), Optional.empty()),
                    Optional.empty(),
                    Optional.empty(),
                    correlation);
        }
        boolean positive = Arrays.stream(values).allMatch(value -> value > 0);
        return new Trend(
                Kind.INDEPENDENT,
                slope,
                Optional.of(MannKendall.of(values)),
                positive ? Optional.of(FirstOrderRate.of(times, values, confidence)) : Optional.empty(),
                correlation);
    }
}
