package org.seepledger.ledger;

import java.util.List;

/**
 * A stretch of time that a budget is given for, as far as the record covers it.
 *
 * @param name its name, as {@code 2021-10}
 * @param from when the covered time begins, in time units
 * @param to when it ends
 * @param parts the intervals that it takes part of, in order
 */
public record Period(String name, double from, double to, List<Part> parts) {

    /** Copies the list. */
    public Period {
        parts = List.copyOf(parts);
    }

    /**
     * How long a period shares an interval.
     *
     * @param interval the interval, from 0
     * @param duration in time units
     */
    public record Part(int interval, double duration) {}

    /**
     * {@return the covered time, in time units}
     */
    public double duration() {
        return to - from;
    }
}
