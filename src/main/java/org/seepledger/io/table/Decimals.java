package org.seepledger.io.table;

/** Reads the numbers of one table, which have one decimal sign throughout. */
final class Decimals {

    private static final char NONE_YET = 0;

    private final boolean commaAllowed;
    private char sign = NONE_YET;

    Decimals(Dialect dialect) {
        this.commaAllowed = dialect.allowsDecimalComma();
    }

    /**
     * {@return the number that a cell holds; NaN for an empty cell or {@code NaN}}
     *
     * @param text the cell
     * @param expected what the cell should hold, for the message
     * @throws NumberFormatException if it is not a finite number; the message says what was expected
     */
    double number(String text, String expected) {
        if (text.isEmpty() || text.equalsIgnoreCase("nan")) {
            return Double.NaN;
        }
        char found = decimalSign(text, expected);
        double value = parsed(found == ',' ? text.replace(',', '.') : text, expected);
        if (found != NONE_YET && sign != NONE_YET && found != sign) {
            throw new NumberFormatException("\"" + sign + "\" as the decimal sign, as before it in the file");
        }
        if (found != NONE_YET) {
            sign = found;
        }
        return value;
    }

    /** Lets only decimal digits, signs and exponents through: the parser of the language knows more. */
    private char decimalSign(String text, String expected) {
        char found = NONE_YET;
        for (int i = 0; i < text.length(); i++) {
            char c = text.charAt(i);
            if (c == '.' || c == ',' && commaAllowed) {
                found = c;
            } else if ((c < '0' || c > '9') && c != '-' && c != '+' && c != 'e' && c != 'E') {
                throw new NumberFormatException(expected);
            }
        }
        return found;
    }

    private static double parsed(String text, String expected) {
        double value;
        try {
            value = Double.parseDouble(text);
        } catch (NumberFormatException e) {
            throw (NumberFormatException) new NumberFormatException(expected).initCause(e);
        }
        if (Double.isInfinite(value)) {
            throw new NumberFormatException("a number within the range of double precision");
        }
        return value;
    }
}
