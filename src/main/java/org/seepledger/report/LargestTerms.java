package org.seepledger.report;

import java.util.List;
import org.seepledger.io.result.ResultUnits;
import org.seepledger.unit.Figures;

/** The largest terms of a budget over the record as a table of plain letters, the smaller ones in one row. */
final class LargestTerms {

    private static final int SHOWN = 6;

    private final BudgetCourse budget;
    private final ResultUnits units;
    private final double throughput;
    private final TextTable table = new TextTable().row("", "in", "out", "net", "of throughput");

    private LargestTerms(BudgetCourse budget, ResultUnits units) {
        this.budget = budget;
        this.units = units;
        this.throughput = budget.record().totals().throughput();
    }

    static void append(StringBuilder text, BudgetCourse budget, ResultUnits units) {
        text.append("  Largest terms in ").append(units.rate()).append(":\n");
        new LargestTerms(budget, units).fill().appendTo(text, "    ");
    }

    private TextTable fill() {
        List<Term> sorted = Term.bySize(budget.terms());
        for (Term term : sorted.subList(0, Math.min(SHOWN, sorted.size()))) {
            String share = Figures.percent(throughput == 0 ? Double.NaN : 100 * Math.abs(term.net()) / throughput);
            row(term.name(), term.inflow(), term.outflow(), share);
        }
        if (sorted.size() > SHOWN) {
            List<Term> rest = sorted.subList(SHOWN, sorted.size());
            double inflow = rest.stream().mapToDouble(Term::inflow).sum();
            double outflow = rest.stream().mapToDouble(Term::outflow).sum();
            row(Wording.counted(rest.size(), "smaller term"), inflow, outflow, "");
        }
        return table;
    }

    private void row(String name, double inflow, double outflow, String share) {
        table.row(name, rate(inflow), rate(outflow), rate(inflow - outflow), share);
    }

    /** A rate over the record; rounding of the terms that make the throughput counts as 0. */
    private String rate(double volume) {
        double factor = units.rateFactor() / budget.record().period().duration();
        return Figures.shown(volume * factor, throughput * factor);
    }
}
