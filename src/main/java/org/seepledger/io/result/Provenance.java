package org.seepledger.io.result;

/**
 * Where a term comes from, as the set says.
 *
 * @param term what it is about, as {@code flow} or a source's category
 * @param origin measured, estimated, simulated or by difference; empty if not said
 * @param reference where it is documented; empty if not said
 * @param uncertainty one standard deviation as {@code 20 %} or an absolute value; empty if not said
 */
public record Provenance(String term, String origin, String reference, String uncertainty) {

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
