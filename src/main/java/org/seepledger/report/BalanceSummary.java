package org.seepledger.report;

import java.util.List;
import org.seepledger.aquifer.Aquifer;
import org.seepledger.balance.Balance;
import org.seepledger.balance.Whereabouts;
import org.seepledger.io.result.PrismBudget;
import org.seepledger.io.result.ResultUnits;
import org.seepledger.ledger.Disclaimer;
import org.seepledger.ledger.PeriodBudget;
import org.seepledger.unit.Figures;

/** The summary of a balance on the terminal: first the warnings, then for each prism
 * whether it closes, what dominates, and where it does not. */
public final class BalanceSummary {

    private static final int TERMS_SHOWN = 6;

    private final Aquifer aquifer;
    private final Balance balance;
    private final List<PrismBudget> budgets;
    private final ResultUnits units;
    private final StringBuilder text = new StringBuilder();

    private BalanceSummary(Aquifer aquifer, Balance balance, List<PrismBudget> budgets, ResultUnits units) {
        this.aquifer = aquifer;
        this.balance = balance;
        this.budgets = budgets;
        this.units = units;
    }

    /**
     * {@return the summary as lines of text}
     *
     * @param aquifer the aquifer
     * @param balance the balance
     * @param budgets the budgets by period, for the worst of them
     * @param units the units to show
     * @param warnings what the reader must know
     * @param notes lesser remarks
     */
    public static String of(
            Aquifer aquifer,
            Balance balance,
            List<PrismBudget> budgets,
            ResultUnits units,
            List<String> warnings,
            List<String> notes) {
        return new BalanceSummary(aquifer, balance, budgets, units).write(warnings, notes);
    }

    private String write(List<String> warnings, List<String> notes) {
        int intervals = aquifer.times().intervals();
        int prisms = balance.ledgers().size();
        text.append("Water budget of \"").append(aquifer.name()).append("\": ");
        text.append(Wording.counted(prisms, "prism"))
                .append(", ")
                .append(Wording.counted(intervals, "interval"))
                .append(", time ");
        text.append(Figures.shown(aquifer.times().instant(0))).append(" to ");
        text.append(Figures.shown(aquifer.times().instant(intervals))).append(' ');
        text.append(aquifer.timeUnit()).append(". Rates are means over the record.\n");
        writeList("Warnings", warnings);
        for (int prism = 0; prism < prisms; prism++) {
            writePrism(prism);
        }
        writeList("Notes", notes);
        text.append('\n').append(Disclaimer.text()).append('\n');
        return text.toString();
    }

    private void writeList(String title, List<String> lines) {
        if (!lines.isEmpty()) {
            text.append('\n').append(title).append('\n');
            lines.forEach(line -> text.append("  - ").append(line).append('\n'));
        }
    }

    private void writePrism(int prism) {
        PrismResult result = PrismResult.of(aquifer, balance, budgets, prism);
        text.append('\n').append(result.prism()).append('\n');
        new ClosureWords(result, Wording.plain(units))
                .inShort()
                .forEach(sentence -> text.append("  ").append(sentence).append('\n'));
        writeTerms(result);
        if (result.isWorthLocating()) {
            writeWhereabouts(result.whereabouts(), result.record());
        }
    }

    private void writeTerms(PrismResult result) {
        List<Term> sorted = Term.bySize(result.terms());
        double throughput = result.record().totals().throughput();
        TextTable table = new TextTable().row("", "in", "out", "net", "of throughput");
        for (Term term : sorted.subList(0, Math.min(TERMS_SHOWN, sorted.size()))) {
            String share = Figures.percent(throughput == 0 ? Double.NaN : 100 * Math.abs(term.net()) / throughput);
            addRow(table, term.name(), term.inflow(), term.outflow(), result.record(), share);
        }
        if (sorted.size() > TERMS_SHOWN) {
            List<Term> rest = sorted.subList(TERMS_SHOWN, sorted.size());
            double inflow = rest.stream().mapToDouble(Term::inflow).sum();
            double outflow = rest.stream().mapToDouble(Term::outflow).sum();
            addRow(table, Wording.counted(rest.size(), "smaller term"), inflow, outflow, result.record(), "");
        }
        text.append("  Largest terms in ").append(units.rate()).append(":\n");
        table.appendTo(text, "    ");
    }

    private void addRow(
            TextTable table, String name, double inflow, double outflow, PeriodBudget record, String share) {
        table.row(name, rate(inflow, record), rate(outflow, record), rate(inflow - outflow, record), share);
    }

    private void writeWhereabouts(Whereabouts where, PeriodBudget record) {
        text.append("  Where it does not close (cells add up to ");
        text.append(Figures.shown(where.magnitude() * units.rateFactor()))
                .append(' ')
                .append(units.rate());
        text.append(" regardless of sign), the largest cells:\n");
        double throughput = record.totals().throughput() / record.period().duration();
        String unit = units.rate().toString();
        HotSpots.append(text, aquifer.grid(), where.largest(), unit, units.rateFactor(), throughput);
    }

    /** A rate over the record; rounding of the terms that make the throughput counts as 0. */
    private String rate(double volume, PeriodBudget record) {
        double factor = units.rateFactor() / record.period().duration();
        return Figures.shown(volume * factor, record.totals().throughput() * factor);
    }
}
