package org.seepledger.intake;

import java.math.BigDecimal;
import java.math.MathContext;
import java.util.ArrayList;
import java.util.List;

/** Numbers that a person types in a row. */
final class Numbers {

    private static final MathContext DIGITS = new MathContext(13);

    private Numbers() {}

    /** {@return the numbers in a text, apart by blanks, commas or semicolons; none if something else stands among them} */
    static List<Double> of(String text) {
        List<Double> numbers = new ArrayList<>();
        try {
            for (String word : text.strip().split("[\\s,;]+")) {
                double number = Double.parseDouble(word);
                if (!Double.isFinite(number)) {
                    return List.of();
                }
                numbers.add(number);
            }
        } catch (NumberFormatException e) {
            return List.of();
        }
        return numbers;
    }

    /** {@return a number without the noise that sums and differences leave in its last digits} */
    static double clean(double value) {
        return new BigDecimal(value).round(DIGITS).doubleValue();
    }

    /** {@return a number as JSON has it: whole ones without a decimal point} */
    static Number json(double value) {
        return value == Math.rint(value) && Math.abs(value) < 1e15 ? (Number) (long) value : (Number) value;
    }
}
