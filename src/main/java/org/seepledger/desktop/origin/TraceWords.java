package org.seepledger.desktop.origin;

import java.util.List;
import org.seepledger.desktop.budget.PeriodWords;
import org.seepledger.desktop.words.NumberForm;
import org.seepledger.desktop.words.Words;
import org.seepledger.job.TracedNumber;
import org.seepledger.job.TracedNumber.Line;
import org.seepledger.report.Wording;
import org.seepledger.unit.Figures;

/**
 * A traced number in words.
 *
 * @param numbers how numbers read
 * @param volumes whether the ledger shows volumes or masses rather than rates
 */
record TraceWords(NumberForm numbers, boolean volumes) {

    /** A difference that shows in the digits that a person reads. */
    private static final double SEEN = 1e-5;

    /** Whose number it is, and of when. */
    String belongs(Question asked) {
        return Words.of(
                "origin.belongs",
                asked.prism().name(),
                asked.solute()
                        .map(read -> Words.of("ledger.of.solute", read.name(), asked.itemWords()))
                        .orElse(asked.itemWords()),
                PeriodWords.of(asked.period(), asked.set().aquifer().times(), numbers));
    }

    /** The number, and what its values add up to. */
    String sum(TracedNumber number) {
        String unit = Wording.raised(number.units().rate());
        return Words.of("origin.sum", shown(number.net()), unit, number.count(), exact(number.sum()))
                + rounding(number)
                + amount(number);
    }

    /** How many values are shown, and what they come to. */
    String shown(TracedNumber number, List<Line> lines) {
        double part = lines.stream().mapToDouble(Line::contribution).sum();
        String unit = Wording.raised(number.units().rate());
        String text = Words.of("origin.shown", lines.size(), shown(part), unit);
        long others = number.count() - number.largest().size();
        return others > 0 ? text + " " + Words.of("origin.rest", others, shown(number.rest()), unit) : text;
    }

    private String shown(double value) {
        return numbers.of(Figures.typeset(value));
    }

    /** Where much cancels, a sum in another order ends in other digits; that it is no more than that has been checked. */
    private static String rounding(TracedNumber number) {
        boolean differs = Math.abs(number.sum() - number.net()) > SEEN * Math.abs(number.net());
        return differs ? " " + Words.of("origin.rounding") : "";
    }

    /** All digits, with a true minus. */
    private static String exact(double number) {
        return String.valueOf(number).replace('-', '\u2212');
    }

    /** What the ledger shows where it shows volumes or masses. */
    private String amount(TracedNumber number) {
        return volumes
                ? " "
                        + Words.of(
                                "origin.amount",
                                shown(number.amount()),
                                Wording.raised(number.units().amount()))
                : "";
    }
}
