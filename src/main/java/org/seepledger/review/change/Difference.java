package org.seepledger.review.change;

import java.util.Optional;

/**
 * How a number of two runs differs.
 *
 * @param first the first run's row; empty where it has none
 * @param second the second run's row; empty where it has none
 * @param rate the parts of the difference of rates; empty where they cannot be told
 * @param volume the parts of the difference of volumes; empty where they cannot be told
 */
public record Difference(
        Optional<RecordedRow> first, Optional<RecordedRow> second, Optional<Split> rate, Optional<Split> volume) {

    /** {@return a row that there is} */
    public RecordedRow any() {
        return first.or(() -> second).orElseThrow();
    }

    /**
     * {@return second − first, of numbers as they were written; NaN where one is missing}
     *
     * @param volumes whether of volumes, rather than rates
     */
    public double off(boolean volumes) {
        return value(second, volumes) - value(first, volumes);
    }

    /**
     * {@return the difference in percent of the first; NaN where there is none, or units differ}
     *
     * @param volumes whether of volumes, rather than rates
     */
    public double percent(boolean volumes) {
        double percent = 100 * off(volumes) / Math.abs(value(first, volumes));
        return Double.isFinite(percent) && unit(first, volumes).equals(unit(second, volumes)) ? percent : Double.NaN;
    }

    /**
     * {@return a number as it was written; NaN where there is none}
     *
     * @param row the row
     * @param volumes whether its volume, rather than its rate
     */
    public static double value(Optional<RecordedRow> row, boolean volumes) {
        return row.map(one -> volumes ? one.volume() : one.rate()).orElse(Double.NaN);
    }

    /**
     * {@return the unit of a number; empty where there is none}
     *
     * @param row the row
     * @param volumes whether of its volume, rather than its rate
     */
    public static String unit(Optional<RecordedRow> row, boolean volumes) {
        return row.map(one -> volumes ? one.volumeUnit() : one.rateUnit()).orElse("");
    }
}
