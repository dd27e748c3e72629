package org.seepledger.review.change;

/**
 * The parts of a difference. They add to it.
 *
 * @param area due to the area
 * @param period due to the period
 * @param inputs due to inputs and options
 * @param unit due to the unit
 */
public record Split(double area, double period, double inputs, double unit) {

    /** Place of the first run's inputs, area and period among eight budgets. */
    public static final int NONE_CHANGED = 0;

    /** Added to a place where the area is the second run's. */
    public static final int AREA = 1;

    /** Added to a place where the period is the second run's. */
    public static final int PERIOD = 2;

    /** Added to a place where inputs and options are the second run's. */
    public static final int INPUTS = 4;

    private static final int ALL = AREA + PERIOD + INPUTS;

    /**
     * {@return the parts of a difference}
     *
     * @param values the eight numbers in the first run's unit, each at the sum of what is the second run's in it
     * @param second the last of them in the second run's unit
     * @throws IllegalArgumentException if they are not eight
     */
    public static Split of(double[] values, double second) {
        if (values.length != ALL + 1) {
            throw new IllegalArgumentException("a split needs 8 numbers, not " + values.length);
        }
        return new Split(
                part(values, AREA, PERIOD, INPUTS),
                part(values, PERIOD, AREA, INPUTS),
                part(values, INPUTS, AREA, PERIOD),
                second - values[ALL]);
    }

    /** What one change does, with none, either or both of the others made before: weights 1/3, 1/6, 1/6, 1/3. */
    private static double part(double[] values, int change, int one, int other) {
        double first = values[change] - values[NONE_CHANGED];
        double afterOne = values[one + change] - values[one];
        double afterOther = values[other + change] - values[other];
        double last = values[ALL] - values[one + other];
        return first / 3 + afterOne / 6 + afterOther / 6 + last / 3;
    }

    /** {@return the whole difference} */
    public double sum() {
        return area + period + inputs + unit;
    }
}
