package org.seepledger.review.sheet;

/**
 * A number as it was printed.
 *
 * @param value the number; NaN where a dash or a word says that it was not given
 * @param half half of its last printed digit: as far as it may be from what was rounded
 * @param unit the unit printed beside it in its cell; empty for none
 */
public record Numeral(double value, double half, String unit) {

    /** {@return whether a number was given} */
    public boolean given() {
        return !Double.isNaN(value);
    }
}
