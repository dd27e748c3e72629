package org.seepledger.report;

import java.util.List;
import org.seepledger.review.check.Finding;
import org.seepledger.review.check.Review;
import org.seepledger.review.check.Severity;

/** What a review came to, as lines for a terminal and as sentences for a page. */
public final class ReviewText {

    private static final int TOLD = 12;

    private ReviewText() {}

    /**
     * {@return the verdict, a sentence or two}
     *
     * @param result what the review came to
     * @param recomputed whether it was held against a recomputed budget
     */
    public static String verdict(Review.Result result, boolean recomputed) {
        long faults = count(result, Severity.FAULT);
        long doubts = count(result, Severity.DOUBT);
        String against = recomputed
                ? result.beside().size() + " figures were held against recomputed ones, and "
                        + result.beside().stream().filter(one -> one.agrees()).count() + " of them agree."
                : "The table was looked at by itself; nothing was recomputed.";
        if (faults > 0) {
            return "The budget cannot stand as it is: " + Wording.counted((int) faults, "fault") + " and "
                    + Wording.counted((int) doubts, "doubt") + ". " + against;
        }
        return doubts > 0
                ? "No fault was found, but " + Wording.counted((int) doubts, "doubt") + " for the author to answer. "
                        + against
                : "No fault and no doubt was found. " + against;
    }

    private static long count(Review.Result result, Severity severity) {
        return result.findings().stream()
                .filter(finding -> finding.severity() == severity)
                .count();
    }

    /**
     * {@return the summary, lines of text}
     *
     * @param result what the review came to
     * @param recomputed whether it was held against a recomputed budget
     */
    public static String summary(Review.Result result, boolean recomputed) {
        StringBuilder text = new StringBuilder(verdict(result, recomputed)).append('\n');
        List<Finding> findings = result.findings();
        for (Finding finding : findings.subList(0, Math.min(TOLD, findings.size()))) {
            text.append("  ").append(finding.severity()).append(' ').append(finding.code());
            text.append(place(finding)).append(": ").append(finding.message()).append('\n');
        }
        if (findings.size() > TOLD) {
            text.append("  And ").append(findings.size() - TOLD).append(" more in findings.csv.\n");
        }
        return text.toString();
    }

    private static String place(Finding finding) {
        String place = finding.prism().equals(Finding.SEVERAL) ? "" : finding.prism();
        String period = finding.period().equals(Finding.SEVERAL) ? "" : finding.period();
        String both = place.isEmpty() || period.isEmpty() ? place + period : place + ", " + period;
        return both.isEmpty() ? "" : " (" + both + ")";
    }
}
