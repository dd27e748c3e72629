package org.seepledger.sample;

import java.math.BigDecimal;
import java.math.MathContext;
import java.math.RoundingMode;

/** Decimal digits that are the same on every machine: rounded from the double's exact value, half to even. */
final class Digits {

    private Digits() {}

    /** {@return a number with so many decimals} */
    static double rounded(double value, int decimals) {
        return decimal(value, decimals).doubleValue();
    }

    /** {@return a number with at most so many decimals, without trailing zeros} */
    static String decimals(double value, int decimals) {
        return plain(decimal(value, decimals));
    }

    /** {@return a number with at most so many significant digits, without trailing zeros} */
    static String significant(double value, int digits) {
        return plain(new BigDecimal(value).round(new MathContext(digits, RoundingMode.HALF_EVEN)));
    }

    private static BigDecimal decimal(double value, int decimals) {
        return new BigDecimal(value).setScale(decimals, RoundingMode.HALF_EVEN);
    }

    private static String plain(BigDecimal number) {
        return number.stripTrailingZeros().toPlainString();
    }
}
