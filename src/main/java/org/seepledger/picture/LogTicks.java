package org.seepledger.picture;

import java.math.BigDecimal;
import java.util.ArrayList;
import java.util.List;

/**
 * Round values along a logarithmic scale: powers of ten, or every second or third of them; with 2 and 5 between them where there
 * is room.
 *
 * @param values in increasing order
 */
public record LogTicks(List<Double> values) implements RoundValues {

    private static final int PLAIN = 5;
    private static final int[][] DIGITS = {{1, 2, 5}, {1, 3}, {1}};

    /** Copies the list. */
    public LogTicks {
        values = List.copyOf(values);
    }

    /**
     * {@return the values within a range}
     *
     * @param from where the range begins, above 0
     * @param to where it ends, beyond {@code from}
     * @param most how many there may be, at least 2
     */
    public static LogTicks within(double from, double to, int most) {
        if (!(from > 0 && to > from) || most < 2) {
            throw new IllegalArgumentException("no ticks from " + from + " to " + to);
        }
        for (int[] digits : DIGITS) {
            List<Double> values = between(from, to, digits, 1);
            if (values.size() <= most) {
                return new LogTicks(values);
            }
        }
        int apart = 2;
        while (between(from, to, new int[] {1}, apart).size() > most) {
            apart++;
        }
        return new LogTicks(between(from, to, new int[] {1}, apart));
    }

    private static List<Double> between(double from, double to, int[] digits, int apart) {
        List<Double> values = new ArrayList<>();
        int first = (int) Math.floor(Math.log10(from));
        for (int power = Math.floorDiv(first, apart) * apart; power <= Math.log10(to); power += apart) {
            for (int digit : digits) {
                double value =
                        BigDecimal.valueOf(digit).scaleByPowerOfTen(power).doubleValue();
                if (value >= from && value <= to) {
                    values.add(value);
                }
            }
        }
        return values;
    }

    @Override
    public int count() {
        return values.size();
    }

    @Override
    public String label(int index) {
        BigDecimal value = BigDecimal.valueOf(values.get(index)).stripTrailingZeros();
        int power = value.precision() - value.scale() - 1;
        return Math.abs(power) <= PLAIN
                ? value.toPlainString()
                : value.unscaledValue() + "e" + String.valueOf(power).replace('-', '−');
    }
}
