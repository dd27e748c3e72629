package org.seepledger.unit;

import java.math.BigDecimal;
import java.math.MathContext;
import java.util.Locale;
import java.util.regex.Matcher;
import java.util.regex.Pattern;
import java.util.stream.Collectors;

/** Numbers as people read them. */
public final class Figures {

    private static final double SMALL = 1e-4;
    private static final double LARGE = 1e12;

    /** Sums of some thousand terms in double precision are as exact as this. */
    private static final double ROUNDING = 1e-12;

    private static final int DIGITS = 4;
    private static final Pattern POWER_OF_TEN = Pattern.compile("e([+-]\\d+)");
    private static final String RAISED = "⁰¹²³⁴⁵⁶⁷⁸⁹";

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
        BigDecimal rounded = new BigDecimal(value).round(new MathContext(DIGITS));
        int decimals = Math.max(0, rounded.scale());
        return String.format(Locale.ROOT, "%,." + decimals + "f", rounded).replace(',', ' ');
    }

    /**
     * {@return a number as {@link #shown(double)}, but 0 where it is nothing but rounding}
     *
     * @param value the number
     * @param scale the magnitude of the numbers that it was reckoned from
     */
    public static String shown(double value, double scale) {
        return shown(withoutRounding(value, scale));
    }

    /**
     * {@return a number, but 0 where it is nothing but rounding}
     *
     * @param value the number
     * @param scale the magnitude of the numbers that it was reckoned from
     */
    public static double withoutRounding(double value, double scale) {
        return Math.abs(value) < ROUNDING * scale ? 0 : value;
    }

    /**
     * {@return a percentage to two decimals, or in powers of ten where that would be 0.00}
     *
     * @param value in percent
     */
    public static String percent(double value) {
        if (Double.isNaN(value)) {
            return "-";
        }
        boolean small = value != 0 && Math.abs(value) < 0.005;
        return String.format(Locale.ROOT, small ? "%.0e %%" : "%.2f %%", value);
    }

    /**
     * {@return a number for page and window: four significant digits, a true minus, thousands kept apart by a narrow space
     * that no line breaks at, powers of ten raised, and a dash where there is none}
     *
     * @param value the number
     */
    public static String typeset(double value) {
        return typeset(shown(value));
    }

    /**
     * {@return a number for a column of numbers in page and window: as {@link #typeset(double)}, but with four significant
     * digits even where the last are zeros, so that figures that change do not jump}
     *
     * @param value the number
     */
    public static String tabular(double value) {
        String shown = shown(value);
        int digits = (int) shown.chars().filter(Character::isDigit).count() - leadingZeros(shown);
        boolean plain = value != 0 && !Double.isNaN(value) && shown.indexOf('e') < 0;
        if (plain && digits < DIGITS) {
            shown += (shown.indexOf('.') < 0 ? "." : "") + "0".repeat(DIGITS - digits);
        }
        return typeset(shown);
    }

    private static int leadingZeros(String shown) {
        return (int) shown.chars()
                .filter(sign -> sign != '-' && sign != '.')
                .takeWhile(sign -> sign == '0')
                .count();
    }

    /**
     * {@return a percentage for page and window, in the same way}
     *
     * @param value in percent
     */
    public static String typesetPercent(double value) {
        return typeset(percent(value));
    }

    private static String typeset(String shown) {
        if (shown.equals("-")) {
            return "–";
        }
        Matcher power = POWER_OF_TEN.matcher(shown);
        String raised = power.replaceAll(found -> "·10" + raised(Integer.parseInt(found.group(1))));
        return raised.replace('-', '−').replace(' ', '\u202f');
    }

    private static String raised(int exponent) {
        return String.valueOf(exponent)
                .chars()
                .mapToObj(sign -> sign == '-' ? "⁻" : RAISED.substring(sign - '0', sign - '0' + 1))
                .collect(Collectors.joining());
    }
}
