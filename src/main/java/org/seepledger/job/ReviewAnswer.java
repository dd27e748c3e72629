package org.seepledger.job;

import java.util.List;
import java.util.Map;
import org.seepledger.review.check.Review;
import org.seepledger.review.mapping.Catalogue;
import org.seepledger.review.mapping.Submission;

/**
 * What a review came to that is not written.
 *
 * @param tables the submission as it was read
 * @param result what was found
 * @param verdict the verdict, a sentence or two
 * @param recomputed whether it was held against a recomputed budget
 * @param catalogue what there is to tie to
 * @param areas which prisms its areas are, by label
 * @param intervals the interval that each of its periods begins in, from 0, by label; of those that the record covers
 */
public record ReviewAnswer(
        List<Submission> tables,
        Review.Result result,
        String verdict,
        boolean recomputed,
        Catalogue catalogue,
        Map<String, String> areas,
        Map<String, Integer> intervals) {

    /** Copies the collections. */
    public ReviewAnswer {
        tables = List.copyOf(tables);
        areas = Map.copyOf(areas);
        intervals = Map.copyOf(intervals);
    }
}
