package org.seepledger.review.check;

import org.seepledger.review.mapping.Sense;

/**
 * What was submitted of a term beside what was recomputed.
 *
 * @param prism the prism
 * @param period the period, as the table names it
 * @param term the term, as the table names it
 * @param sense which way it counts
 * @param submitted what was submitted
 * @param recomputed what was recomputed
 * @param unit the unit of both; empty where the table states none
 * @param share the difference in percent of throughput
 * @param agrees whether the two agree
 * @param place where it stands
 */
public record Beside(
        String prism,
        String period,
        String term,
        Sense sense,
        double submitted,
        double recomputed,
        String unit,
        double share,
        boolean agrees,
        String place) {

    static Beside of(Series series, Point point, double tolerance) {
        return new Beside(
                series.prism(),
                point.when().label(),
                series.term(),
                series.sense(),
                point.submitted() / point.unit(),
                point.recomputed() / point.unit(),
                point.figures().get(0).unit(),
                point.throughput() == 0 ? Double.NaN : 100 * point.off() / point.throughput(),
                point.agrees(tolerance),
                point.figures().get(0).place());
    }
}
