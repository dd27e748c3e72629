package org.seepledger.io.result;

import java.io.IOException;
import java.nio.file.Path;
import java.util.List;
import org.seepledger.aquifer.Times;
import org.seepledger.io.table.CsvText;
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
    private static final String NONE = "";

    private final Times times;
    private final ResultUnits units;
    private final ResultTable rows;

    private BudgetCsv(Times times, ResultUnits units, ResultTable rows) {
        this.times = times;
        this.units = units;
        this.rows = rows;
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
            String layer = String.valueOf(entry.account().layer() + 1);
            begin(prism, period, entry.account().group(), entry.account().item(), layer);
            for (double volume : new double[] {entry.inflow(), entry.outflow(), entry.net()}) {
                rows.cell(rate(volume, period));
            }
            for (double volume : new double[] {entry.inflow(), entry.outflow(), entry.net()}) {
                rows.cell(volume(volume));
            }
            end(units.rate().toString(), units.volume().toString());
        }
        Totals totals = budget.totals();
        for (Total total : Total.rows(!Double.isNaN(totals.storageChange()))) {
            write(prism, period, total, totals.get(total));
        }
    }

    private void write(String prism, Period period, Total total, double value) throws IOException {
        begin(prism, period, Group.TOTAL, total.toString(), ALL_LAYERS);
        if (total.isPercentage()) {
            nets(CsvText.number(value), NONE);
            end("%", NONE);
        } else {
            nets(rate(value, period), volume(value));
            end(units.rate().toString(), units.volume().toString());
        }
    }

    private void nets(String rate, String volume) throws IOException {
        for (String cell : new String[] {NONE, NONE, rate, NONE, NONE, volume}) {
            rows.cell(cell);
        }
    }

    private void begin(String prism, Period period, Group group, String item, String layer) throws IOException {
        rows.cell(CsvText.text(prism));
        rows.cell(CsvText.text(period.name()));
        rows.span(period, times);
        rows.cell(group.toString());
        rows.cell(CsvText.text(item));
        rows.cell(layer);
    }

    private void end(String rateUnit, String volumeUnit) throws IOException {
        rows.cell(rateUnit);
        rows.cell(volumeUnit);
        rows.endRow();
    }

    private String rate(double volume, Period period) {
        return CsvText.number(volume / period.duration() * units.rateFactor());
    }

    private String volume(double volume) {
        return CsvText.number(volume * units.volumeFactor());
    }
}
