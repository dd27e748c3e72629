package org.seepledger.job;

import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.function.UnaryOperator;
import org.seepledger.aquifer.Aquifer;
import org.seepledger.prism.Prism;
import org.seepledger.progress.Progress;
import org.seepledger.report.ReviewText;
import org.seepledger.review.check.Reference;
import org.seepledger.review.check.Review;
import org.seepledger.review.mapping.Catalogue;
import org.seepledger.review.mapping.Figure;
import org.seepledger.review.mapping.Mapping;
import org.seepledger.review.mapping.Submission;

/**
 * The part of a {@link Workbench} that reviews submitted budgets without writing. Findings are those of {@link ReviewJob}
 * with the same prisms, digit for digit.
 *
 * <p>What was recomputed is kept for the next review of the same prisms: a mapping that is corrected costs no new balance.
 */
public final class ReviewDesk {

    private final Aquifer aquifer;
    private final Gate gate;
    private final UnaryOperator<Prism> admitting;
    private final int threads;
    private Optional<Kept> kept = Optional.empty();

    /** A recomputation, what it is of, and who hears how far it is. */
    private record Kept(List<Prism> prisms, boolean wholeCells, Relay relay, Recomputation recomputation) {}

    /**
     * Makes the desk.
     *
     * @param aquifer the aquifer
     * @param gate lets questions in
     * @param admitting cuts a prism at the grid's edge, or refuses it
     * @param threads how many threads may work
     */
    ReviewDesk(Aquifer aquifer, Gate gate, UnaryOperator<Prism> admitting, int threads) {
        this.aquifer = aquifer;
        this.gate = gate;
        this.admitting = admitting;
        this.threads = threads;
    }

    /**
     * Reviews a table by itself.
     *
     * @param asked what is to be reviewed
     * @return what was found
     * @throws org.seepledger.fault.DataFault if the submission cannot be read
     */
    public static ReviewAnswer alone(ReviewAsked asked) {
        return answer(asked, Optional.empty());
    }

    /**
     * Reviews a table against the budgets of prisms.
     *
     * @param asked what is to be reviewed
     * @param prisms at least one prism; what lies beyond the grid is cut off
     * @param progress told how far the work is
     * @return what was found
     * @throws org.seepledger.fault.DataFault if the submission cannot be read, or a prism is no polygon or lies off the grid
     * @throws org.seepledger.progress.Cancelled if the work was stopped
     */
    public ReviewAnswer against(ReviewAsked asked, List<Prism> prisms, Progress progress) {
        return gate.ask(progress, until -> review(asked, prisms, until));
    }

    /** One at a time: what is kept is not made for many hands. */
    private synchronized ReviewAnswer review(ReviewAsked asked, List<Prism> prisms, Progress progress) {
        Kept used = kept.filter(one -> one.prisms().equals(prisms) && one.wholeCells() == asked.wholeCells())
                .orElseGet(() -> recomputed(prisms, asked.wholeCells(), progress));
        kept = Optional.of(used);
        used.relay().to = progress;
        ReviewAnswer answer = answer(asked, Optional.of(used.recomputation()));
        Map<String, Integer> intervals = new HashMap<>();
        for (Submission table : answer.tables()) {
            for (Figure figure : table.figures()) {
                used.recomputation()
                        .period(figure.when())
                        .ifPresent(period -> intervals.putIfAbsent(
                                figure.when().label(), period.parts().get(0).interval()));
            }
        }
        return new ReviewAnswer(
                answer.tables(),
                answer.result(),
                answer.verdict(),
                true,
                answer.catalogue(),
                answer.areas(),
                intervals);
    }

    private Kept recomputed(List<Prism> prisms, boolean wholeCells, Progress progress) {
        Relay relay = new Relay();
        relay.to = progress;
        List<Prism> admitted = prisms.stream().map(admitting).toList();
        return new Kept(prisms, wholeCells, relay, new Recomputation(aquifer, admitted, wholeCells, threads, relay));
    }

    private static ReviewAnswer answer(ReviewAsked asked, Optional<Reference> reference) {
        Optional<Mapping> corrections =
                Optional.of(asked.corrections()).filter(mapping -> !mapping.equals(Mapping.NONE));
        List<Submission> tables = Reading.of(asked.submitted(), corrections, reference, asked.waterYearStart());
        Review.Result result = Review.of(tables, reference, asked.tolerance());
        Catalogue catalogue = reference.map(Reference::catalogue).orElse(Catalogue.EMPTY);
        String verdict = ReviewText.verdict(result, reference.isPresent());
        Map<String, String> areas = Review.areas(tables, catalogue);
        return new ReviewAnswer(tables, result, verdict, reference.isPresent(), catalogue, areas, Map.of());
    }

    /** Passes on to whoever asks now. */
    private static final class Relay implements Progress {

        private volatile Progress to = Progress.NONE;

        @Override
        public void begin(String what, long steps) {
            to.begin(what, steps);
        }

        @Override
        public void step() {
            to.step();
        }
    }
}
