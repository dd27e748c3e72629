package org.seepledger.report;

import java.math.BigDecimal;
import java.math.MathContext;
import java.util.Locale;

/** Numbers as people read them. */
public final class Figures {

    private static final double SMALL = 1e-4;
    private static final double LARGE = 1e12;

    /** Sums of some thousand terms in double precision are as exact as this. */
    private static final double ROUNDING = 1e-12;

    private Figures() {}

    /**
     * {@return a number to four significant digits, thousands kept apart; a dash where there is none}
     *
     * @param value the number
     */
    public static String shown(double value) {
        if (Double.isNaN(value)) {
            return "-";
        }
        if (value == 0) {
            return "0";
        }
        double magnitude = Math.abs(value);
        if (magnitude < SMALL || magnitude >= LARGE) {
            return String.format(Locale.ROOT, "%.3e", value);
        }
        BigDecimal rounded = new BigDecimal(value).round(new MathContext(4));
        int decimals = Math.max(0, rounded.scale());
        return String.format(Locale.ROOT, "%,." + decimals + "f", rounded).replace(',', ' ');
    }

    /**
     * {@return a number as {@link #shown}, but 0 where it is nothing but rounding}
     *
     * @param value the number
     * @param scale the magnitude of the numbers that it was reckoned from
     */
    public static String shown(double value, double scale) {
        return shown(Math.abs(value) < ROUNDING * scale ? 0 : value);
    }

    /**
     * {@return a percentage to two decimals, or in powers of ten where that would be 0.00 though it is more than rounding}
     *
     * @param value in percent
     */
    public static String percent(double value) {
        if (Double.isNaN(value)) {
            return "-";
        }
        boolean small = Math.abs(value) < 0.005 && Math.abs(value) >= 100 * ROUNDING;
        double shown = Math.abs(value) < 100 * ROUNDING ? 0 : value;
        return String.format(Locale.ROOT, small ? "%.0e %%" : "%.2f %%", shown);
    }
}
