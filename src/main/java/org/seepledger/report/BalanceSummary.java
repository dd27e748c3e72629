package org.seepledger.report;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import org.seepledger.aquifer.Aquifer;
import org.seepledger.balance.Balance;
import org.seepledger.balance.Periods;
import org.seepledger.balance.Whereabouts;
import org.seepledger.io.result.PrismBudget;
import org.seepledger.io.result.ResultUnits;
import org.seepledger.ledger.Disclaimer;
import org.seepledger.ledger.Entry;
import org.seepledger.ledger.Group;
import org.seepledger.ledger.Ledger;
import org.seepledger.ledger.PeriodBudget;
import org.seepledger.ledger.Totals;
import org.seepledger.unit.Figures;

/** The summary of a balance on the terminal: first the warnings, then for each prism
 * whether it closes, what dominates, and where it does not. */
public final class BalanceSummary {

    private static final int TERMS_SHOWN = 6;

    /** Below this a closure error is rounding and nothing else. */
    private static final double ROUNDING_PERCENT = 1e-9;

    private final Aquifer aquifer;
    private final Balance balance;
    private final List<PrismBudget> budgets;
    private final ResultUnits units;
    private final StringBuilder text = new StringBuilder();

    /** What one item came to over all layers. */
    private record Term(String item, double inflow, double outflow) {

        double net() {
            return inflow - outflow;
        }

        Term plus(Term other) {
            return new Term(item, inflow + other.inflow, outflow + other.outflow);
        }
    }

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
        text.append(counted(prisms, "prism"))
                .append(", ")
                .append(counted(intervals, "interval"))
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

    private static String counted(int count, String what) {
        return count + " " + what + (count == 1 ? "" : "s");
    }

    private void writePrism(int prism) {
        Ledger ledger = balance.ledgers().get(prism);
        PeriodBudget record = ledger.budget(new Periods(aquifer.times()).record());
        text.append('\n').append(ledger.prism()).append('\n');
        writeClosure(record, budgets.get(prism));
        writeTerms(record);
        Whereabouts where = balance.whereabouts().get(prism);
        if (ledger.storageKnown() && isWorthLocating(where, record)) {
            writeWhereabouts(where, record);
        }
    }

    private void writeClosure(PeriodBudget record, PrismBudget periods) {
        Totals totals = record.totals();
        double time = record.period().duration();
        if (Double.isNaN(totals.storageChange())) {
            double unexplained = totals.inflow() - totals.outflow();
            text.append(
                            "  Closure cannot be judged: change in storage is not known. Inflow less outflow, storage included,"
                                    + " is ")
                    .append(rate(unexplained, time, true))
                    .append(".\n");
            return;
        }
        boolean closes = Math.abs(totals.closureError()) < ROUNDING_PERCENT;
        text.append(closes ? "  Closes to rounding: closure error " : "  Closure error ");
        text.append(Figures.percent(totals.closureError()));
        text.append(" of throughput (")
                .append(Figures.percent(totals.netClosureError()))
                .append(" of net flow): ");
        text.append(rate(totals.residual(), time, true)).append(" of ");
        text.append(rate(totals.throughput(), time, true)).append(" is unexplained.\n");
        if (periods.periods().size() > 1) {
            periods.periods().stream()
                    .max(Comparator.comparingDouble(
                            budget -> size(budget.totals().closureError())))
                    .ifPresent(worst -> text.append("  Worst period: ")
                            .append(worst.period().name())
                            .append(", ")
                            .append(Figures.percent(worst.totals().closureError()))
                            .append(".\n"));
        }
    }

    private static double size(double value) {
        return Double.isNaN(value) ? 0 : Math.abs(value);
    }

    private void writeTerms(PeriodBudget record) {
        Map<String, Term> terms = new LinkedHashMap<>();
        for (Entry entry : record.entries()) {
            if (entry.account().quantified()) {
                Group group = entry.account().group();
                String item = group == Group.LID
                        ? entry.account().item() + " lid"
                        : entry.account().item();
                terms.merge(group + item, new Term(item, entry.inflow(), entry.outflow()), Term::plus);
            }
        }
        List<Term> sorted = new ArrayList<>(terms.values());
        sorted.sort(Comparator.comparingDouble((Term term) -> -Math.max(term.inflow(), term.outflow())));
        double time = record.period().duration();
        double throughput = record.totals().throughput();
        TextTable table = new TextTable().row("", "in", "out", "net", "of throughput");
        for (Term term : sorted.subList(0, Math.min(TERMS_SHOWN, sorted.size()))) {
            table.row(
                    term.item(),
                    rate(term.inflow(), time, false),
                    rate(term.outflow(), time, false),
                    rate(term.net(), time, false),
                    Figures.percent(throughput == 0 ? Double.NaN : 100 * Math.abs(term.net()) / throughput));
        }
        if (sorted.size() > TERMS_SHOWN) {
            Term rest = sorted.subList(TERMS_SHOWN, sorted.size()).stream().reduce(new Term("", 0, 0), Term::plus);
            table.row(
                    counted(sorted.size() - TERMS_SHOWN, "smaller term"),
                    rate(rest.inflow(), time, false),
                    rate(rest.outflow(), time, false),
                    rate(rest.net(), time, false),
                    "");
        }
        text.append("  Largest terms in ").append(units.rate()).append(":\n");
        table.appendTo(text, "    ");
    }

    private boolean isWorthLocating(Whereabouts where, PeriodBudget record) {
        double throughput = record.totals().throughput() / record.period().duration();
        return !where.largest().isEmpty() && where.magnitude() > 1e-9 * throughput;
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

    private String rate(double volume, double time, boolean withUnit) {
        String shown = Figures.shown(volume / time * units.rateFactor());
        return withUnit ? shown + " " + units.rate() : shown;
    }
}
