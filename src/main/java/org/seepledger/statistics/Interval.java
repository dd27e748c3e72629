package org.seepledger.statistics;

/**
 * Where a number lies with a stated confidence.
 *
 * @param low its lower end; may be infinite
 * @param high its upper end; may be infinite
 */
public record Interval(double low, double high) {

    static void requireSeries(double[] times, double[] values, int least) {
        MannKendall.requireNumbers(values, least);
        MannKendall.requireNumbers(times, least);
        if (times.length != values.length) {
            throw new IllegalArgumentException(times.length + " times for " + values.length + " values");
        }
        for (int i = 1; i < times.length; i++) {
            if (!(times[i] > times[i - 1])) {
                throw new IllegalArgumentException("times must increase");
            }
        }
    }
}
