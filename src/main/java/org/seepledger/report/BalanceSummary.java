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
        new ClosureWords(result.budget(), Wording.plain(units))
                .inShort()
                .forEach(sentence -> text.append("  ").append(sentence).append('\n'));
        LargestTerms.append(text, result.budget(), units);
        if (result.isWorthLocating()) {
            writeWhereabouts(result.whereabouts(), result.record());
        }
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
}
