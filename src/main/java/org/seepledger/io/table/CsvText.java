package org.seepledger.io.table;

import java.math.BigDecimal;
import java.math.MathContext;

/** What stands in the cells of the tables that the program writes. */
public final class CsvText {

    /** Decimal digits that any double keeps, and that tell any two apart (IEEE 754-2019, 5.12.2). */
    private static final int DIGITS_KEPT = 15;

    private static final int DIGITS_ENOUGH = 17;

    private static final String STARTS_A_FORMULA = "=+-@\t\r";

    private CsvText() {}

    /**
     * {@return a text as it is written in a cell, before quoting: with an apostrophe before it where a spreadsheet
     * would take it for a formula}
     *
     * @param text the text; null is written as an empty cell
     */
    public static String text(String text) {
        if (text == null || text.isEmpty()) {
            return "";
        }
        return STARTS_A_FORMULA.indexOf(text.charAt(0)) < 0 ? text : "'" + text;
    }

    /**
     * {@return the shortest decimal number that reads back to the same double, empty for NaN; negative zero is written
     * as zero}
     *
     * @param value the number
     * @throws IllegalArgumentException if it is infinite
     */
    public static String number(double value) {
        if (Double.isNaN(value)) {
            return "";
        }
        if (Double.isInfinite(value)) {
            throw new IllegalArgumentException("an infinite number cannot be written in a table");
        }
        return value == 0 ? "0.0" : plain(shortest(value));
    }

    /** Found here, since the language's own text is the shortest only from Java 19 on (JDK-4511638). */
    private static BigDecimal shortest(double value) {
        BigDecimal exact = new BigDecimal(value);
        int digits = Math.abs(value) < Double.MIN_NORMAL ? 1 : DIGITS_KEPT;
        BigDecimal rounded = exact.round(new MathContext(digits));
        while (rounded.doubleValue() != value && digits < DIGITS_ENOUGH) {
            digits++;
            rounded = exact.round(new MathContext(digits));
        }
        return rounded.stripTrailingZeros();
    }

    private static String plain(BigDecimal number) {
        boolean shortInteger = number.scale() <= 0 && number.precision() - number.scale() <= DIGITS_ENOUGH;
        return (shortInteger ? number.setScale(1) : number).toString();
    }
}
