package org.seepledger.statistics;

import java.util.Map;
import java.util.OptionalDouble;
import java.util.TreeMap;
import org.apache.commons.math3.distribution.NormalDistribution;

/**
 * The rank test for a trend (Mann 1945, Econometrica 13, 245–259; Kendall 1975, Rank Correlation Methods, 4th ed.).
 *
 * <p>S is the number of pairs in which the later value is larger less the number in which it is smaller. Its variance
 * without a trend is [n(n−1)(2n+5) − Σ t(t−1)(2t+5)] ÷ 18, the sum over groups of t equal values. The test takes values as
 * independent of each other.
 *
 * @param count the number of values, n
 * @param s the statistic S
 * @param variance its variance if there is no trend
 * @param z S less 1 toward 0, over its standard deviation; 0 where S or the variance is 0
 * @param probability how likely an S as far from 0 or farther is without a trend, both directions taken together: exact up
 *     to {@link #MOST_EXACT} values, by the normal approximation of Z above; empty below {@link #LEAST} values
 */
public record MannKendall(int count, int s, double variance, double z, OptionalDouble probability) {

    /** Fewer values than this can show no trend with any confidence worth the name. */
    public static final int LEAST = 5;

    /** Up to this many values the probability is exact. */
    public static final int MOST_EXACT = 10;

    /**
     * {@return the test of a series}
     *
     * @param values at least two values in the order of time
     * @throws IllegalArgumentException if there are fewer, or one is not a number
     */
    public static MannKendall of(double... values) {
        requireNumbers(values, 2);
        int n = values.length;
        int s = 0;
        for (int later = 1; later < n; later++) {
            for (int earlier = 0; earlier < later; earlier++) {
                s += (int) Math.signum(values[later] - values[earlier]);
            }
        }
        int[] ties = ties(values);
        double spread = n * (n - 1.0) * (2.0 * n + 5);
        for (int equal : ties) {
            spread -= equal * (equal - 1.0) * (2.0 * equal + 5);
        }
        double variance = spread / 18;
        double z = variance == 0 ? 0 : (s - Math.signum(s)) / Math.sqrt(variance);
        return new MannKendall(n, s, variance, z, probability(n, s, z, ties));
    }

    private static OptionalDouble probability(int n, int s, double z, int[] ties) {
        if (n < LEAST) {
            return OptionalDouble.empty();
        }
        double probability = n <= MOST_EXACT
                ? exact(n, s, ties)
                : 2 * new NormalDistribution(0, 1).cumulativeProbability(-Math.abs(z));
        return OptionalDouble.of(Math.min(1, probability));
    }

    /**
     * All orders of the values are equally likely without a trend. The numbers of orders by inversions are the
     * coefficients of [n]! ÷ Π [t]!, where [n]! is the product of 1 + q + … + q^(k−1) for k to n (MacMahon 1916,
     * Combinatory Analysis, vol. 2); S is the number of pairs that are not tied less twice the inversions.
     */
    private static double exact(int n, int s, int[] ties) {
        double[] orders = {1};
        for (int k = 2; k <= n; k++) {
            orders = times(orders, k);
        }
        for (int equal : ties) {
            for (int k = 2; k <= equal; k++) {
                orders = over(orders, k);
            }
        }
        double all = 0;
        double asFar = 0;
        for (int inversions = 0; inversions < orders.length; inversions++) {
            all += orders[inversions];
            asFar += Math.abs(orders.length - 1 - 2 * inversions) >= Math.abs(s) ? orders[inversions] : 0;
        }
        return asFar / all;
    }

    /** A polynomial times 1 + q + … + q^(k−1). */
    private static double[] times(double[] factor, int k) {
        double[] product = new double[factor.length + k - 1];
        for (int i = 0; i < factor.length; i++) {
            for (int j = 0; j < k; j++) {
                product[i + j] += factor[i];
            }
        }
        return product;
    }

    /** A polynomial over 1 + q + … + q^(k−1), which divides it. */
    private static double[] over(double[] product, int k) {
        double[] quotient = new double[product.length - k + 1];
        for (int i = 0; i < quotient.length; i++) {
            quotient[i] = product[i];
            for (int j = 1; j < k && j <= i; j++) {
                quotient[i] -= quotient[i - j];
            }
        }
        return quotient;
    }

    /** How many values there are of each that occurs more than once. */
    private static int[] ties(double[] values) {
        Map<Double, Integer> counts = new TreeMap<>();
        for (double value : values) {
            counts.merge(value + 0.0, 1, Integer::sum);
        }
        return counts.values().stream()
                .mapToInt(Integer::intValue)
                .filter(count -> count > 1)
                .toArray();
    }

    static void requireNumbers(double[] values, int least) {
        if (values.length < least) {
            throw new IllegalArgumentException("at least " + least + " values are needed, not " + values.length);
        }
        for (double value : values) {
            if (!Double.isFinite(value)) {
                throw new IllegalArgumentException("every value must be a number, not " + value);
            }
        }
    }
}
