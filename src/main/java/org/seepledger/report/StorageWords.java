package org.seepledger.report;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import org.seepledger.aquifer.StorageKnowledge;
import org.seepledger.ledger.PeriodBudget;

/** What a prism's storage gave and took, in words. */
final class StorageWords {

    private static final int STRETCHES_LISTED = 6;

    private final PrismResult result;
    private final Wording wording;

    /** Consecutive periods in which storage changes in one direction. */
    private record Stretch(String first, String last, double uptake) {

        Stretch plus(PeriodBudget budget) {
            return new Stretch(
                    first, budget.period().name(), uptake + budget.totals().storageChange());
        }

        String name() {
            return first.equals(last) ? first : first + " to " + last;
        }
    }

    StorageWords(PrismResult result, Wording wording) {
        this.result = result;
        this.wording = wording;
    }

    List<String> sentences() {
        List<String> sentences = new ArrayList<>();
        if (!result.storageKnown()) {
            sentences.add("It is not known: heads or storage coefficients are missing.");
        } else if (result.storage() == StorageKnowledge.STEADY) {
            sentences.add("Nothing, because the set is steady: it has one interval, or one head for all instants.");
        } else {
            sentences.add(overTheRecord());
            addByPeriod(sentences);
        }
        return sentences;
    }

    private String overTheRecord() {
        double uptake = result.record().totals().storageChange();
        double time = result.record().period().duration();
        if (uptake == 0) {
            return "Over the record nothing changed.";
        }
        return "Over the record storage " + changed(uptake) + ", which is " + wording.rate(Math.abs(uptake), time)
                + " on average.";
    }

    private String changed(double uptake) {
        return (uptake > 0 ? "took up " : "released ") + wording.volume(Math.abs(uptake));
    }

    private void addByPeriod(List<String> sentences) {
        List<Stretch> stretches = stretches();
        if (result.periods().size() < 2 || stretches.isEmpty()) {
            return;
        }
        if (stretches.size() <= STRETCHES_LISTED) {
            sentences.add("By period: "
                    + Wording.listed(stretches.stream()
                            .map(stretch -> changed(stretch.uptake()) + " (" + stretch.name() + ")")
                            .toList())
                    + ".");
            return;
        }
        addExtreme(sentences, "The largest rise, ", Comparator.comparingDouble(Stretch::uptake), 1);
        addExtreme(sentences, "The largest fall, ", Comparator.comparingDouble(stretch -> -stretch.uptake()), -1);
    }

    private void addExtreme(List<String> sentences, String begin, Comparator<Stretch> order, int sign) {
        stretches().stream()
                .filter(stretch -> stretch.uptake() * sign > 0)
                .max(order)
                .ifPresent(stretch -> sentences.add(begin + stretch.name() + ", " + changed(stretch.uptake()) + "."));
    }

    private List<Stretch> stretches() {
        List<Stretch> stretches = new ArrayList<>();
        for (PeriodBudget budget : result.periods()) {
            double uptake = budget.totals().storageChange();
            String name = budget.period().name();
            int last = stretches.size() - 1;
            if (uptake == 0 || Double.isNaN(uptake)) {
                continue;
            }
            if (last >= 0 && stretches.get(last).uptake() * uptake > 0) {
                stretches.set(last, stretches.get(last).plus(budget));
            } else {
                stretches.add(new Stretch(name, name, uptake));
            }
        }
        return stretches;
    }
}
