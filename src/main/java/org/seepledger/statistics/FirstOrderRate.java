package org.seepledger.statistics;

import java.util.Optional;
import java.util.OptionalDouble;
import java.util.function.IntToDoubleFunction;
import java.util.stream.IntStream;
import org.apache.commons.math3.distribution.TDistribution;

/**
 * The rate k of value = value₀ exp(−k t), by least squares on logarithms (Newell et al. 2002, EPA/540/S-02/500). Positive
 * where the series falls.
 *
 * @param rate per unit of time
 * @param interval where it lies with the confidence asked for, two-sided, by Student's t with n − 2 degrees of freedom;
 *     empty for two values
 * @param atZero the fitted value at time 0
 */
public record FirstOrderRate(double rate, Optional<Interval> interval, double atZero) {

    /**
     * {@return the rate of a series}
     *
     * @param times at least two strictly increasing times
     * @param values a positive value at each
     * @param confidence between 0 and 1
     * @throws IllegalArgumentException if they are not
     */
    public static FirstOrderRate of(double[] times, double[] values, double confidence) {
        Interval.requireSeries(times, values, 2);
        int n = values.length;
        double[] logs = new double[n];
        for (int i = 0; i < n; i++) {
            if (!(values[i] > 0)) {
                throw new IllegalArgumentException("a first-order rate needs positive values, not " + values[i]);
            }
            logs[i] = Math.log(values[i]);
        }
        double meanTime = mean(times);
        double meanLog = mean(logs);
        double square = sum(n, i -> (times[i] - meanTime) * (times[i] - meanTime));
        double slope = sum(n, i -> (times[i] - meanTime) * (logs[i] - meanLog)) / square;
        double atZero = Math.exp(meanLog - slope * meanTime);
        if (n == 2) {
            return new FirstOrderRate(-slope, Optional.empty(), atZero);
        }
        double scatter = sum(n, i -> Math.pow(logs[i] - meanLog - slope * (times[i] - meanTime), 2)) / (n - 2);
        double t = new TDistribution(n - 2).inverseCumulativeProbability(0.5 + 0.5 * confidence);
        double half = t * Math.sqrt(scatter / square);
        return new FirstOrderRate(-slope, Optional.of(new Interval(-slope - half, -slope + half)), atZero);
    }

    private static double mean(double[] values) {
        return sum(values.length, i -> values[i]) / values.length;
    }

    private static double sum(int count, IntToDoubleFunction term) {
        return IntStream.range(0, count).mapToDouble(term).sum();
    }

    /**
     * {@return the time in which half is left, ln 2 ÷ rate; empty where the series does not fall}
     */
    public OptionalDouble halfLife() {
        return rate > 0 ? OptionalDouble.of(Math.log(2) / rate) : OptionalDouble.empty();
    }

    /**
     * {@return where the half-life lies: from the rate's upper end to its lower end, without bound where that is not
     * positive; empty where the rate has no interval or its upper end shows no fall}
     */
    public Optional<Interval> halfLifeInterval() {
        return interval.filter(ends -> ends.high() > 0)
                .map(ends -> new Interval(
                        Math.log(2) / ends.high(),
                        ends.low() > 0 ? Math.log(2) / ends.low() : Double.POSITIVE_INFINITY));
    }
}
