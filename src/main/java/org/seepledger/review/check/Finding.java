package org.seepledger.review.check;

import java.util.Comparator;

/**
 * Something that a review found.
 *
 * @param severity how much it weighs
 * @param code what it is about
 * @param prism the area; {@code *} for all
 * @param period the period; {@code *} for several
 * @param item the term; {@code *} for several
 * @param submitted what was submitted; NaN where there is no such number
 * @param recomputed what it should be; NaN where there is no such number
 * @param unit the unit of both; empty where none is known
 * @param message what it may mean, as a sentence
 */
public record Finding(
        Severity severity,
        Code code,
        String prism,
        String period,
        String item,
        double submitted,
        double recomputed,
        String unit,
        String message) {

    /** In place of a name: several. */
    public static final String SEVERAL = "*";

    /** By weight, then by how much they explain. */
    static final Comparator<Finding> BY_WEIGHT =
            Comparator.comparing(Finding::severity).thenComparing(Finding::code);

    /**
     * {@return a finding without numbers}
     *
     * @param severity how much it weighs
     * @param code what it is about
     * @param prism the area
     * @param period the period
     * @param item the term
     * @param message what it may mean
     */
    static Finding of(Severity severity, Code code, String prism, String period, String item, String message) {
        return new Finding(severity, code, prism, period, item, Double.NaN, Double.NaN, "", message);
    }

    /** The same of another term. */
    Finding about(String other) {
        return new Finding(severity, code, prism, period, other, submitted, recomputed, unit, message);
    }

    /** {@return submitted ÷ recomputed; NaN where there is none} */
    public double ratio() {
        double ratio = submitted / recomputed;
        return Double.isFinite(ratio) ? ratio : Double.NaN;
    }
}
