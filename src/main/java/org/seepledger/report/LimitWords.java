package org.seepledger.report;

import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.OptionalDouble;
import java.util.stream.Collectors;
import org.seepledger.ledger.Group;
import org.seepledger.ledger.Totals;
import org.seepledger.unit.Figures;

/** What a budget cannot carry, in words: terms that drown in the residual or in their own uncertainty, and what closure does not show. */
final class LimitWords {

    private final PrismResult result;
    private final StatedOrigins origins;
    private final Wording wording;
    private final List<Term> terms;
    private final Totals totals;
    private final double time;

    LimitWords(PrismResult result, StatedOrigins origins, Wording wording) {
        this.result = result;
        this.origins = origins;
        this.wording = wording;
        this.terms = result.budget().terms();
        this.totals = result.record().totals();
        this.time = result.record().period().duration();
    }

    List<String> sentences() {
        List<String> sentences = new ArrayList<>();
        addNotGiven(sentences);
        if (totals.throughput() == 0) {
            return sentences;
        }
        addBelowResidual(sentences);
        addBelowUncertainty(sentences);
        addCombined(sentences);
        addByDifference(sentences);
        if (result.storageKnown()) {
            sentences.add(
                    result.budget().closesToRounding()
                            ? "That it closes to rounding proves the arithmetic and that flow, sources and storage belong"
                                    + " together; it does not prove that any of them is right."
                            : "A small closure error would not prove that the terms are right, nor does a large one tell"
                                    + " which of them is wrong.");
        }
        return sentences;
    }

    private void addNotGiven(List<String> sentences) {
        List<String> names = terms.stream()
                .filter(term -> !term.quantified() && (result.storageKnown() || term.group() != Group.STORAGE))
                .map(Term::name)
                .toList();
        if (!names.isEmpty()) {
            sentences.add("No flow can be given for " + Wording.listed(names) + "; totals count it as 0.");
        }
    }

    private void addBelowResidual(List<String> sentences) {
        double residual = Math.abs(totals.residual());
        if (!result.storageKnown() || result.budget().closesToRounding()) {
            return;
        }
        List<String> names = Term.bySize(terms).stream()
                .filter(term -> term.gross() > 0 && term.gross() < residual)
                .map(this::withGross)
                .toList();
        if (!names.isEmpty()) {
            sentences.add("Smaller than what is unexplained (" + wording.rate(residual, time)
                    + "), so that the budget neither supports nor contradicts them: " + Wording.listed(names) + ".");
        }
    }

    private String withGross(Term term) {
        return term.name() + " (" + wording.rate(term.gross(), time) + ")";
    }

    private void addBelowUncertainty(List<String> sentences) {
        List<String> names = Term.bySize(terms).stream()
                .filter(term -> flows(term) && Math.abs(term.net()) < deviation(term))
                .map(term -> term.name() + " (net " + wording.rate(term.net(), time) + ", standard deviation "
                        + wording.rate(deviation(term), time) + ")")
                .toList();
        if (!names.isEmpty()) {
            sentences.add("Net flow smaller than one stated standard deviation of the gross flow, so that not even its"
                    + " direction is certain: " + Wording.listed(names) + ".");
        }
    }

    /** One stated standard deviation, of the larger of inflow and outflow; NaN where none is stated in percent. */
    private double deviation(Term term) {
        OptionalDouble percent = origins.percent(term);
        return percent.isPresent() ? percent.getAsDouble() / 100 * term.gross() : Double.NaN;
    }

    private void addCombined(List<String> sentences) {
        List<Term> flowing = terms.stream().filter(this::flows).toList();
        List<Term> stating =
                flowing.stream().filter(term -> !Double.isNaN(deviation(term))).toList();
        List<String> silent = flowing.stream()
                .filter(term -> !stating.contains(term))
                .map(Term::name)
                .toList();
        if (stating.isEmpty()) {
            sentences.add("No uncertainty is stated in percent for any of its terms, so that none can be weighed.");
            return;
        }
        double combined = combined(stating);
        sentences.add(
                "Stated uncertainties, all faces taken as one term and all storage as one, then added as squares as if"
                        + " they were independent, come to "
                        + wording.rate(combined, time) + ", " + wording.percent(100 * combined / totals.throughput())
                        + " of throughput; a difference smaller than that tells nothing." + against(combined)
                        + (silent.isEmpty()
                                ? ""
                                : " It leaves out what states none in percent: " + Wording.listed(silent) + "."));
    }

    /** Terms that rest on the same statement err together: how many sides are drawn must not matter. */
    private double combined(List<Term> stating) {
        Map<String, List<Term>> together = stating.stream()
                .collect(Collectors.groupingBy(term -> switch (term.group()) {
                    case SIDE, LID -> "faces";
                    case STORAGE -> "storage";
                    default -> "source " + term.item();
                }));
        return Math.sqrt(together.values().stream()
                .mapToDouble(terms -> Math.pow(deviation(terms), 2))
                .sum());
    }

    private double deviation(List<Term> together) {
        double inflow = together.stream().mapToDouble(Term::inflow).sum();
        double outflow = together.stream().mapToDouble(Term::outflow).sum();
        return origins.percent(together.get(0)).orElseThrow() / 100 * Math.max(inflow, outflow);
    }

    /** Whether more than rounding goes through a term. */
    private boolean flows(Term term) {
        return Figures.withoutRounding(term.gross(), totals.throughput()) > 0;
    }

    private String against(double combined) {
        if (!result.storageKnown() || result.budget().closesToRounding()) {
            return "";
        }
        return Math.abs(totals.residual()) > combined
                ? " What is unexplained is more than that: errors are larger than stated, or something is missing."
                : " What is unexplained is less than that.";
    }

    private void addByDifference(List<String> sentences) {
        List<String> names =
                terms.stream().filter(origins::byDifference).map(Term::name).toList();
        if (!names.isEmpty()) {
            sentences.add(
                    "Computed by difference, so that closure is no evidence for it: " + Wording.listed(names) + ".");
        }
    }
}
