package org.seepledger.statistics;

/**
 * How much each value of a series follows the one before it (Anderson 1942, Annals of Mathematical Statistics 13, 1–13).
 *
 * @param lagOne the correlation of what is left beside a straight line with itself one step later, from −1 to 1
 * @param limit above this the correlation is hardly chance (one-sided, 5 %)
 */
public record SerialCorrelation(double lagOne, double limit) {

    private static final double ONE_IN_TWENTY = 1.644853626951472;

    /**
     * {@return the correlation of what a slope leaves of a series}
     *
     * @param times at least three strictly increasing times
     * @param values a value at each
     * @param slope the slope that is taken out, per unit of time
     * @throws IllegalArgumentException if they are not
     */
    public static SerialCorrelation of(double[] times, double[] values, double slope) {
        Interval.requireSeries(times, values, 3);
        int n = values.length;
        double[] left = new double[n];
        double mean = 0;
        for (int i = 0; i < n; i++) {
            left[i] = values[i] - slope * (times[i] - times[0]);
            mean += left[i] / n;
        }
        double square = 0;
        double product = 0;
        for (int i = 0; i < n; i++) {
            square += (left[i] - mean) * (left[i] - mean);
            product += i > 0 ? (left[i] - mean) * (left[i - 1] - mean) : 0;
        }
        double lagOne = square == 0 ? 0 : product / square;
        return new SerialCorrelation(lagOne, (ONE_IN_TWENTY * Math.sqrt(n - 2.0) - 1) / (n - 1));
    }

    /**
     * {@return whether values follow each other more than chance has it, so that tests for independent ones are too sure}
     */
    public boolean isLikely() {
        return lagOne > limit;
    }
}
