package org.seepledger.intake;

import java.util.List;

/**
 * The instants of a set.
 *
 * @param instants the instants in the time unit, at least two; counted from 0 where nothing tells more
 * @param start the date of the first, ISO 8601; empty if nothing tells it
 * @param skipFirst whether the first interval that files give is left out
 * @param reason what tells them, as a sentence
 */
public record FoundTimes(List<Double> instants, String start, boolean skipFirst, String reason) {

    /** Copies the list. */
    public FoundTimes {
        instants = List.copyOf(instants);
    }

    /** {@return the number of intervals} */
    public int intervals() {
        return instants.size() - 1;
    }
}
