package org.seepledger.report;

import java.util.ArrayList;
import java.util.List;
import org.seepledger.ledger.Totals;

/** Whether a budget closes, in words. */
final class ClosureWords {

    /** From this share of throughput on, gross flow that is no net flow is worth a sentence. */
    private static final double THROUGH_FLOW = 0.1;

    private final BudgetCourse budget;
    private final Wording wording;
    private final Totals totals;
    private final double time;

    ClosureWords(BudgetCourse budget, Wording wording) {
        this.budget = budget;
        this.wording = wording;
        this.totals = budget.record().totals();
        this.time = budget.record().period().duration();
    }

    List<String> sentences() {
        List<String> sentences = new ArrayList<>();
        sentences.addAll(inShort());
        if (budget.storageKnown() && totals.throughput() > 0) {
            addThroughFlow(sentences);
        }
        return sentences;
    }

    /** The closure over the record, and that of the worst period where there are several. */
    List<String> inShort() {
        List<String> sentences = new ArrayList<>();
        sentences.add(overTheRecord());
        budget.worstPeriod()
                .map(worst -> "Worst period: " + worst.period().name() + ", "
                        + error(worst.totals().closureError()) + ".")
                .ifPresent(sentences::add);
        return sentences;
    }

    private String overTheRecord() {
        if (!budget.storageKnown()) {
            return "Closure cannot be judged: change in storage is not known. Inflow less outflow, storage included, is "
                    + wording.rate(totals.inflow() - totals.outflow(), time) + ".";
        }
        if (totals.throughput() == 0) {
            return "Nothing flows: there is nothing to close.";
        }
        String throughput = wording.rate(totals.throughput(), time);
        if (budget.closesToRounding()) {
            return "Closes to rounding: " + error(totals.closureError()) + " of a throughput of " + throughput
                    + " is unexplained.";
        }
        return "Closure error " + wording.percent(totals.closureError()) + " of throughput ("
                + wording.percent(totals.netClosureError()) + " of net flow): "
                + wording.rate(totals.residual(), time) + " of " + throughput + " is unexplained.";
    }

    /** A closure error, or that it is no more than rounding. */
    private String error(double percent) {
        double rounding = BudgetCourse.ROUNDING_PERCENT;
        return Math.abs(percent) < rounding ? "less than " + wording.percent(rounding) : wording.percent(percent);
    }

    private void addThroughFlow(List<String> sentences) {
        double through = totals.throughput() - totals.netThroughput();
        if (through >= THROUGH_FLOW * totals.throughput()) {
            sentences.add("Of that throughput, "
                    + wording.percent(100 * through / totals.throughput())
                    + " goes in and out again through the same items, at other places or times; for sides, how much depends"
                    + " on how they are drawn. The closure error set against net flow leaves it out.");
        }
    }
}
