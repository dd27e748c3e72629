package org.seepledger.report;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import java.util.function.ToDoubleFunction;
import org.seepledger.ledger.Group;

/** What a budget's gains and losses are made of, in words. */
final class DominanceWords {

    private static final int NAMED = 3;

    private final BudgetCourse budget;
    private final Wording wording;

    DominanceWords(BudgetCourse budget, Wording wording) {
        this.budget = budget;
        this.wording = wording;
    }

    List<String> sentences() {
        List<String> sentences = new ArrayList<>();
        add(sentences, "gains", "release from", Term::inflow);
        add(sentences, "losses", "uptake into", Term::outflow);
        return sentences;
    }

    private void add(List<String> sentences, String what, String storage, ToDoubleFunction<Term> volume) {
        List<Term> terms = budget.terms().stream()
                .filter(term -> term.quantified() && volume.applyAsDouble(term) > 0)
                .sorted(Comparator.comparingDouble(term -> -volume.applyAsDouble(term)))
                .toList();
        double all = terms.stream().mapToDouble(volume).sum();
        double time = budget.record().period().duration();
        if (terms.isEmpty()) {
            sentences.add("There are no " + what + ".");
            return;
        }
        List<String> largest = terms.stream()
                .limit(NAMED)
                .map(term -> term.name() + " (" + wording.rate(volume.applyAsDouble(term), time) + ", "
                        + wording.percent(100 * volume.applyAsDouble(term) / all) + ")")
                .toList();
        boolean stored = terms.stream().anyMatch(term -> term.group() == Group.STORAGE);
        sentences.add("Of all " + what + (stored ? ", " + storage + " storage among them, " : ", ")
                + wording.rate(all, time) + " gross, the largest " + (largest.size() == 1 ? "is " : "are ")
                + Wording.listed(largest) + "." + throughFaces(terms, volume, all));
    }

    /** All faces together, where there are more of them than are named: alone each may be small. */
    private String throughFaces(List<Term> terms, ToDoubleFunction<Term> volume, double all) {
        List<Term> faces = terms.stream()
                .filter(term -> term.group() == Group.SIDE || term.group() == Group.LID)
                .toList();
        double sum = faces.stream().mapToDouble(volume).sum();
        return faces.size() <= NAMED
                ? ""
                : " All " + faces.size() + " faces together have "
                        + wording.rate(sum, budget.record().period().duration()) + " ("
                        + wording.percent(100 * sum / all) + ").";
    }
}
