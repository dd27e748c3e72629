package org.seepledger.statistics;

import java.util.Arrays;
import java.util.Optional;
import org.apache.commons.math3.distribution.NormalDistribution;

/**
 * The median of the slopes between all pairs of values (Sen 1968, Journal of the American Statistical Association 63,
 * 1379–1389), with the interval that follows from the variance of S in {@link MannKendall}.
 *
 * @param slope the median slope, per unit of time
 * @param interval where it lies with the confidence asked for; empty below {@link MannKendall#LEAST} values
 */
public record SenSlope(double slope, Optional<Interval> interval) {

    /**
     * {@return the slope of a series}
     *
     * <p>The interval's ends are the slopes of rank (N − C)/2 and (N + C)/2 + 1 of N, rounded, with C = z √Var(S).
     *
     * @param times at least two strictly increasing times
     * @param values a value at each
     * @param confidence between 0 and 1
     * @throws IllegalArgumentException if they are not
     */
    public static SenSlope of(double[] times, double[] values, double confidence) {
        Interval.requireSeries(times, values, 2);
        int n = values.length;
        double[] slopes = new double[n * (n - 1) / 2];
        int next = 0;
        for (int later = 1; later < n; later++) {
            for (int earlier = 0; earlier < later; earlier++) {
                slopes[next++] = (values[later] - values[earlier]) / (times[later] - times[earlier]);
            }
        }
        Arrays.sort(slopes);
        double median = 0.5 * (slopes[(next - 1) / 2] + slopes[next / 2]);
        return new SenSlope(
                median, n < MannKendall.LEAST ? Optional.empty() : Optional.of(interval(slopes, values, confidence)));
    }

    private static Interval interval(double[] slopes, double[] values, double confidence) {
        double z = new NormalDistribution(0, 1).inverseCumulativeProbability(0.5 + 0.5 * confidence);
        double width = z * Math.sqrt(MannKendall.of(values).variance());
        int low = (int) Math.rint(0.5 * (slopes.length - width)) - 1;
        int high = (int) Math.rint(0.5 * (slopes.length + width));
        return new Interval(slopes[Math.max(low, 0)], slopes[Math.min(high, slopes.length - 1)]);
    }
}
