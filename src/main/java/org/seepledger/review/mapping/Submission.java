package org.seepledger.review.mapping;

import java.util.List;

/**
 * A submitted budget, read.
 *
 * @param figures its figures, in the order in which they stand
 * @param mapping how it was read
 * @param unread what stands where a figure should, and is none; and rows that nothing is known of
 */
public record Submission(List<Figure> figures, Mapping mapping, List<String> unread) {

    /** Copies the lists. */
    public Submission {
        figures = List.copyOf(figures);
        unread = List.copyOf(unread);
    }
}
