package org.seepledger.io.result;

import java.util.OptionalDouble;

/**
 * Where a term comes from, as the set says.
 *
 * @param term what it is about, as {@code flow} or a source's category
 * @param origin measured, estimated, simulated or by difference; empty if not said
 * @param reference where it is documented; empty if not said
 * @param uncertainty one standard deviation as {@code 20 %} or an absolute value; empty if not said
 */
public record Provenance(String term, String origin, String reference, String uncertainty) {

    private static final String PERCENT = " %";

    /** {@return the stated standard deviation in percent; empty if none or an absolute one is stated} */
    public OptionalDouble percent() {
        return uncertainty.endsWith(PERCENT)
                ? OptionalDouble.of(
                        Double.parseDouble(uncertainty.substring(0, uncertainty.length() - PERCENT.length())))
                : OptionalDouble.empty();
    }

    /** {@return whether it was computed so that the budget closes} */
    public boolean byDifference() {
        return origin.equals("by difference");
    }

    /** {@return the sentence that stands in exports} */
    @Override
    public String toString() {
        StringBuilder text = new StringBuilder(term).append(": ");
        text.append(origin.isEmpty() ? "origin not stated" : origin);
        text.append(reference.isEmpty() ? "" : ", " + reference);
        text.append(uncertainty.isEmpty() ? ", uncertainty not stated" : ", standard deviation " + uncertainty);
        return text.toString();
    }
}
