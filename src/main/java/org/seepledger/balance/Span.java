package org.seepledger.balance;

import java.util.stream.IntStream;
import org.seepledger.aquifer.Times;

/**
 * Intervals of a record that follow one another.
 *
 * @param from the first, from 0
 * @param to the one after the last
 */
public record Span(int from, int to) {

    public Span {
        if (from < 0 || to <= from) {
            throw new IllegalArgumentException("no intervals: from " + from + " to " + to);
        }
    }

    /**
     * {@return all intervals of a record}
     *
     * @param times the record's instants
     */
    public static Span all(Times times) {
        return new Span(0, times.intervals());
    }

    /**
     * {@return one interval alone}
     *
     * @param interval the interval, from 0
     */
    public static Span only(int interval) {
        return new Span(interval, interval + 1);
    }

    /**
     * {@return how many there are}
     */
    public int count() {
        return to - from;
    }

    boolean holds(int interval) {
        return interval >= from && interval < to;
    }

    IntStream intervals() {
        return IntStream.range(from, to);
    }

    double duration(Times times) {
        return times.instant(to) - times.instant(from);
    }
}
