package org.seepledger.io.result;

import java.io.IOException;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.EnumMap;
import java.util.List;
import java.util.Map;
import java.util.function.ToDoubleFunction;
import org.seepledger.aquifer.Times;
import org.seepledger.io.table.CsvText;
import org.seepledger.ledger.Entry;
import org.seepledger.ledger.Period;
import org.seepledger.ledger.PeriodBudget;
import org.seepledger.ledger.SoluteCautions;
import org.seepledger.ledger.Total;
import org.seepledger.plume.NonDetects;
import org.seepledger.plume.Plume;

/** Writes {@code plume.csv}: notes, a header, tidy rows by prism, solute, period and account, then the totals. */
public final class PlumeCsv {

    private static final String[] HEADER = {
        "prism",
        "solute",
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
        "inflow_mass",
        "outflow_mass",
        "net_mass",
        "rate_unit",
        "mass_unit",
        "net_mass_nd_zero",
        "net_mass_nd_half",
        "net_mass_nd_limit"
    };
    /** How masses and flows of a solute are worked out, in a few sentences. */
    public static final String METHOD =
            "Solutes: mass in place is total porosity x concentration, and dry bulk density x"
                    + " what the isotherm gives, over saturated rock; flow is the water's times the concentration of the cell that"
                    + " the water leaves, mean of an interval's two ends. Non-detects count half their limit; nd_zero and nd_limit"
                    + " say what 0 and the limit would give: a bracket, not an estimate.";

    private static final String NONE = "";

    private final Times times;
    private final ResultTable rows;
    private final AmountCells amounts;

    private PlumeCsv(Times times, MassUnits units, ResultTable rows) {
        this.times = times;
        this.rows = rows;
        this.amounts = new AmountCells(rows, units.ofBudget());
    }

    /**
     * Writes the table.
     *
     * @param file the file, which must not exist
     * @param statement what stands before the rows
     * @param plumes by prism and solute
     * @param periods the periods to give
     * @param times the record's instants
     * @param units the units to give
     * @throws IOException if it cannot be written
     */
    public static void write(
            Path file, Statement statement, List<Plume> plumes, List<Period> periods, Times times, MassUnits units)
            throws IOException {
        try (ResultTable rows = ResultTable.open(file, notes(statement), HEADER)) {
            PlumeCsv table = new PlumeCsv(times, units, rows);
            for (Plume plume : plumes) {
                for (Period period : periods) {
                    table.write(plume, period);
                }
            }
        }
    }

    /** What every table about solutes says before its rows. */
    static List<String> notes(Statement statement) {
        List<String> notes = new ArrayList<>(statement.lines());
        notes.add(METHOD);
        SoluteCautions.sentences().forEach(sentence -> notes.add("Caution: " + sentence));
        return notes;
    }

    private void write(Plume plume, Period period) throws IOException {
        for (int layer = 0; layer < plume.layers(); layer++) {
            writeStock(plume, period, layer, "dissolved");
        }
        for (int layer = 0; layer < plume.layers(); layer++) {
            writeStock(plume, period, layer, "sorbed");
        }
        Map<NonDetects, PeriodBudget> budgets = new EnumMap<>(NonDetects.class);
        plume.ledgers().forEach((choice, ledger) -> budgets.put(choice, ledger.budget(period)));
        PeriodBudget shown = budgets.get(NonDetects.HALF);
        for (int i = 0; i < shown.entries().size(); i++) {
            write(plume, period, budgets, i);
        }
        for (Total total : Total.rows(!Double.isNaN(shown.totals().storageChange()))) {
            write(plume, period, total, budgets);
        }
    }

    private void writeStock(Plume plume, Period period, int layer, String phase) throws IOException {
        begin(plume, period, "mass", phase, String.valueOf(plume.firstLayer() + layer + 1));
        ToDoubleFunction<NonDetects> held = choice -> plume.held(
                times,
                period.to(),
                layer,
                stock -> phase.equals("sorbed") ? stock.sorbed(choice) : stock.dissolved(choice));
        rows.cells(NONE, NONE, NONE, NONE, NONE, amounts.amount(held.applyAsDouble(NonDetects.HALF)));
        rows.cells(NONE, amounts.units().volume().toString());
        end(held);
    }

    private void write(Plume plume, Period period, Map<NonDetects, PeriodBudget> budgets, int index)
            throws IOException {
        Entry entry = budgets.get(NonDetects.HALF).entries().get(index);
        begin(
                plume,
                period,
                entry.account().group().toString(),
                entry.account().item(),
                String.valueOf(entry.account().layer() + 1));
        amounts.write(entry, period);
        end(choice -> budgets.get(choice).entries().get(index).net());
    }

    private void write(Plume plume, Period period, Total total, Map<NonDetects, PeriodBudget> budgets)
            throws IOException {
        begin(plume, period, "total", total.toString(), "*");
        amounts.write(total, budgets.get(NonDetects.HALF).totals().get(total), period);
        end(choice ->
                total.isPercentage() ? Double.NaN : budgets.get(choice).totals().get(total));
    }

    private void begin(Plume plume, Period period, String group, String item, String layer) throws IOException {
        rows.cells(CsvText.text(plume.prism()), CsvText.text(plume.solute().name()), CsvText.text(period.name()));
        rows.span(period, times);
        rows.cells(group, CsvText.text(item), layer);
    }

    private void end(ToDoubleFunction<NonDetects> net) throws IOException {
        for (NonDetects choice : NonDetects.values()) {
            rows.cell(amounts.amount(net.applyAsDouble(choice)));
        }
        rows.endRow();
    }
}
