package org.seepledger.io.result;

import java.io.IOException;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.EnumMap;
import java.util.List;
import java.util.Map;
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
    private final MassUnits units;
    private final ResultTable rows;

    private PlumeCsv(Times times, MassUnits units, ResultTable rows) {
        this.times = times;
        this.units = units;
        this.rows = rows;
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
        double[] held = new double[NonDetects.values().length];
        for (NonDetects choice : NonDetects.values()) {
            held[choice.ordinal()] = plume.held(
                    times,
                    period.to(),
                    layer,
                    stock -> phase.equals("sorbed") ? stock.sorbed(choice) : stock.dissolved(choice));
        }
        cells(
                NONE,
                NONE,
                NONE,
                NONE,
                NONE,
                mass(held[NonDetects.HALF.ordinal()]),
                NONE,
                units.mass().toString());
        end(mass(held[0]), mass(held[1]), mass(held[2]));
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
        cells(rate(entry.inflow(), period), rate(entry.outflow(), period), rate(entry.net(), period));
        cells(mass(entry.inflow()), mass(entry.outflow()), mass(entry.net()));
        cells(units.rate().toString(), units.mass().toString());
        end(
                mass(budgets.get(NonDetects.ZERO).entries().get(index).net()),
                mass(entry.net()),
                mass(budgets.get(NonDetects.LIMIT).entries().get(index).net()));
    }

    private void write(Plume plume, Period period, Total total, Map<NonDetects, PeriodBudget> budgets)
            throws IOException {
        double value = budgets.get(NonDetects.HALF).totals().get(total);
        begin(plume, period, "total", total.toString(), "*");
        if (total.isPercentage()) {
            cells(NONE, NONE, CsvText.number(value), NONE, NONE, NONE, "%", NONE);
            end(NONE, NONE, NONE);
            return;
        }
        cells(NONE, NONE, rate(value, period), NONE, NONE, mass(value));
        cells(units.rate().toString(), units.mass().toString());
        end(
                mass(budgets.get(NonDetects.ZERO).totals().get(total)),
                mass(value),
                mass(budgets.get(NonDetects.LIMIT).totals().get(total)));
    }

    private void begin(Plume plume, Period period, String group, String item, String layer) throws IOException {
        cells(CsvText.text(plume.prism()), CsvText.text(plume.solute().name()), CsvText.text(period.name()));
        rows.span(period, times);
        cells(group, CsvText.text(item), layer);
    }

    private void end(String zero, String half, String limit) throws IOException {
        cells(zero, half, limit);
        rows.endRow();
    }

    private void cells(String... cells) throws IOException {
        for (String cell : cells) {
            rows.cell(cell);
        }
    }

    private String rate(double mass, Period period) {
        return CsvText.number(mass / period.duration() * units.rateFactor());
    }

    private String mass(double mass) {
        return CsvText.number(mass * units.massFactor());
    }
}
