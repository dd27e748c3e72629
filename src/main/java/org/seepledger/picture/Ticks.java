package org.seepledger.picture;

import java.math.BigDecimal;
import java.math.RoundingMode;
import java.util.ArrayList;
import java.util.List;
import java.util.Locale;

/**
 * Round values along an axis: 1, 2 or 5 times a power of ten apart, all with the same decimals.
 *
 * @param first the first
 * @param step how far they are apart
 * @param count how many there are
 */
public record Ticks(BigDecimal first, BigDecimal step, int count) implements RoundValues {

    private static final int LARGEST_PLAIN = 7;
    private static final int SMALLEST_PLAIN = 5;

    /**
     * {@return the ticks within a range}
     *
     * @param from where the range begins
     * @param to where it ends, beyond {@code from}
     * @param most how many there may be, at least 2
     */
    public static Ticks within(double from, double to, int most) {
        if (!(to > from) || most < 2 || Double.isInfinite(to - from)) {
            throw new IllegalArgumentException("no ticks from " + from + " to " + to);
        }
        BigDecimal step = step((to - from) / most);
        while (true) {
            BigDecimal first = BigDecimal.valueOf(from).divide(step, 0, RoundingMode.CEILING);
            BigDecimal last = BigDecimal.valueOf(to).divide(step, 0, RoundingMode.FLOOR);
            int count = last.subtract(first).intValue() + 1;
            if (count <= most) {
                return new Ticks(first.multiply(step), step, Math.max(0, count));
            }
            step = step(1.5 * step.doubleValue());
        }
    }

    /** The smallest round step that is not below a number. */
    private static BigDecimal step(double least) {
        int power = (int) Math.floor(Math.log10(least));
        for (int shift = power - 1; ; shift++) {
            for (int digit : new int[] {1, 2, 5}) {
                BigDecimal step = BigDecimal.valueOf(digit).scaleByPowerOfTen(shift);
                if (step.doubleValue() >= least * (1 - 1e-12)) {
                    return step;
                }
            }
        }
    }

    @Override
    public List<Double> values() {
        List<Double> values = new ArrayList<>();
        for (int i = 0; i < count; i++) {
            values.add(value(i).doubleValue());
        }
        return values;
    }

    /**
     * {@return how one is written: thousands kept apart, with a true minus}
     *
     * @param index which, from 0
     */
    @Override
    public String label(int index) {
        BigDecimal value = value(index);
        int power = step.precision() - step.scale() - 1;
        if (power > LARGEST_PLAIN || power < -SMALLEST_PLAIN) {
            return value.signum() == 0
                    ? "0"
                    : String.format(
                                    Locale.ROOT,
                                    "%." + Math.max(1, value.precision() - value.scale() - 1 - power) + "e",
                                    value)
                            .replace('-', '−');
        }
        int decimals = Math.max(0, -power);
        return String.format(Locale.ROOT, "%,." + decimals + "f", value)
                .replace(',', '\u202f')
                .replace('-', '−');
    }

    private BigDecimal value(int index) {
        return first.add(step.multiply(BigDecimal.valueOf(index)));
    }
}
