package org.seepledger.io.result;

import java.io.IOException;
import java.nio.file.Path;
import java.util.List;
import org.seepledger.aquifer.Times;
import org.seepledger.io.table.CsvText;
import org.seepledger.ledger.Account;
import org.seepledger.ledger.Entry;
import org.seepledger.ledger.Group;
import org.seepledger.ledger.Period;
import org.seepledger.ledger.PeriodBudget;
import org.seepledger.ledger.Total;
import org.seepledger.ledger.Totals;

/** Writes {@code budget.csv}: notes, a header, tidy rows by prism, period and account, then the totals. */
public final class BudgetCsv {

    private static final String[] HEADER = {
        "prism",
        "period",
        "from",
        "to",
        "from_date",
        "to_date",
        "group",
        "item",
        "layer",
        "inflow_rate",
        "outflow_rate",
        "net_rate",
        "inflow_volume",
        "outflow_volume",
        "net_volume",
        "rate_unit",
        "volume_unit"
    };
    private static final String ALL_LAYERS = "*";

    private final Times times;
    private final ResultTable rows;
    private final AmountCells amounts;

    private BudgetCsv(Times times, ResultUnits units, ResultTable rows) {
        this.times = times;
        this.rows = rows;
        this.amounts = new AmountCells(rows, units);
    }

    /**
     * Writes the table.
     *
     * @param file the file, which must not exist
     * @param statement what stands before the rows
     * @param budgets the budgets of each prism
     * @param times the record's instants, for dates
     * @param units the units to give
     * @throws IOException if it cannot be written
     */
    public static void write(Path file, Statement statement, List<PrismBudget> budgets, Times times, ResultUnits units)
            throws IOException {
        try (ResultTable rows = ResultTable.open(file, statement.lines(), HEADER)) {
            BudgetCsv table = new BudgetCsv(times, units, rows);
            for (PrismBudget prism : budgets) {
                for (PeriodBudget budget : prism.periods()) {
                    table.write(prism.prism(), budget);
                }
            }
        }
    }

    private void write(String prism, PeriodBudget budget) throws IOException {
        Period period = budget.period();
        for (Entry entry : budget.entries()) {
            Account account = entry.account();
            begin(prism, period, account.group(), account.item(), String.valueOf(account.layer() + 1));
            amounts.write(entry, period);
            rows.endRow();
        }
        Totals totals = budget.totals();
        for (Total total : Total.rows(!Double.isNaN(totals.storageChange()))) {
            begin(prism, period, Group.TOTAL, total.toString(), ALL_LAYERS);
            amounts.write(total, totals.get(total), period);
            rows.endRow();
        }
    }

    private void begin(String prism, Period period, Group group, String item, String layer) throws IOException {
        rows.cells(CsvText.text(prism), CsvText.text(period.name()));
        rows.span(period, times);
        rows.cells(group.toString(), CsvText.text(item), layer);
    }
}
