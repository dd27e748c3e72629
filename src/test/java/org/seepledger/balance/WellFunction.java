package org.seepledger.balance;

import org.apache.commons.math3.util.ContinuedFraction;

/** The exponential integral E₁, in the trade the well function W, for tests. */
final class WellFunction {

    private static final double EULER = 0.57721_56649_01532_86;

    private static final ContinuedFraction TAIL = new ContinuedFraction() {
        @Override
        protected double getA(int n, double u) {
            return u + 2 * n + 1;
        }

        @Override
        protected double getB(int n, double u) {
            return -(double) n * n;
        }
    };

    private WellFunction() {}

    /** By the power series up to 1 and the continued fraction above: Abramowitz and Stegun (1964), 5.1.11 and 5.1.22. */
    static double of(double u) {
        if (u > 700) {
            return 0;
        }
        if (u > 1) {
            return Math.exp(-u) / TAIL.evaluate(u, 1e-14);
        }
        double sum = -EULER - Math.log(u);
        double power = 1;
        for (int n = 1; n <= 20; n++) {
            power *= -u / n;
            sum -= power / n;
        }
        return sum;
    }

    /** The integral over time of exp(−c/t), from 0 to a time; by parts. */
    static double pulse(double c, double time) {
        return time * Math.exp(-c / time) - c * of(c / time);
    }
}
