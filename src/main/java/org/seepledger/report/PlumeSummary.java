package org.seepledger.report;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import org.seepledger.aquifer.Aquifer;
import org.seepledger.balance.Periods;
import org.seepledger.io.result.MassUnits;
import org.seepledger.ledger.Disclaimer;
import org.seepledger.ledger.Entry;
import org.seepledger.ledger.Period;
import org.seepledger.ledger.PeriodBudget;
import org.seepledger.ledger.SoluteCautions;
import org.seepledger.ledger.Totals;
import org.seepledger.plume.NonDetects;
import org.seepledger.plume.Plume;
import org.seepledger.plume.Stock;
import org.seepledger.unit.Figures;
import org.seepledger.unit.Measure;

/**
 * The summary of a solute balance on the terminal: first the warnings, then for each prism and solute how much there is,
 * what dominates, and how well it closes.
 */
public final class PlumeSummary {

    private static final int TERMS_SHOWN = 6;

    private final Aquifer aquifer;
    private final List<PeriodBudget> water;
    private final List<Period> periods;
    private final MassUnits units;
    private final Period record;
    private final StringBuilder text = new StringBuilder();

    private record Term(String item, double inflow, double outflow) {

        Term plus(Term other) {
            return new Term(item, inflow + other.inflow, outflow + other.outflow);
        }
    }

    /**
     * Prepares a summary.
     *
     * @param aquifer the aquifer
     * @param water the prisms' water budgets over the record
     * @param periods the periods asked for
     * @param units the units to show
     */
    public PlumeSummary(Aquifer aquifer, List<PeriodBudget> water, List<Period> periods, MassUnits units) {
        this.aquifer = aquifer;
        this.water = List.copyOf(water);
        this.periods = List.copyOf(periods);
        this.units = units;
        this.record = new Periods(aquifer.times()).record();
    }

    /**
     * {@return the summary as lines of text}
     *
     * @param plumes by prism and solute, as many solutes for each prism
     * @param warnings what the reader must know
     * @param notes lesser remarks
     */
    public String of(List<Plume> plumes, List<String> warnings, List<String> notes) {
        int solutes = plumes.size() / water.size();
        text.append("Solute budget of \"").append(aquifer.name()).append("\": ");
        text.append(counted(water.size(), "prism")).append(", ").append(counted(solutes, "solute"));
        text.append(", time ").append(Figures.shown(record.from())).append(" to ");
        text.append(Figures.shown(record.to())).append(' ').append(aquifer.timeUnit());
        text.append(". Rates are means over the record.\n");
        writeList("Warnings", warnings);
        for (int i = 0; i < plumes.size(); i++) {
            write(plumes.get(i), water.get(i / solutes));
        }
        writeList("Notes", notes);
        text.append('\n').append(String.join(" ", SoluteCautions.sentences()));
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

    private void write(Plume plume, PeriodBudget waters) {
        text.append('\n')
                .append(plume.prism())
                .append(": ")
                .append(plume.solute().name())
                .append('\n');
        writeMass(plume);
        PeriodBudget budget = plume.ledger().budget(record);
        writeClosure(plume, budget, waters);
        writeTerms(budget);
    }

    private void writeMass(Plume plume) {
        Stock last = plume.whole(aquifer.times().intervals());
        Stock first = plume.whole(0);
        Measure unit = plume.solute().concentration().orElseThrow().unit();
        double factor = MassUnits.concentrationFactor(unit, aquifer.lengthUnit());
        text.append("  Holds ").append(mass(last.total(NonDetects.HALF))).append(" at the end");
        if (plume.solute().sorption().isPresent()) {
            text.append(" (").append(mass(last.dissolved(NonDetects.HALF))).append(" dissolved, ");
            text.append(mass(last.sorbed(NonDetects.HALF))).append(" sorbed)");
        }
        text.append(", ").append(mass(first.total(NonDetects.HALF))).append(" at the begin.\n");
        text.append("  Mean ").append(Figures.shown(last.mean() * factor)).append(", greatest ");
        text.append(Figures.shown(last.maximum() * factor))
                .append(' ')
                .append(unit)
                .append(" at the end.\n");
        if (last.nonDetects() > 0) {
            text.append("  ").append(last.nonDetects()).append(" of ").append(last.nonDetects() + last.detects());
            text.append(" cells are non-detects, on which ").append(Figures.percent(100 * last.undetectedShare()));
            text.append(" of the mass rests: from ")
                    .append(mass(last.total(NonDetects.ZERO)))
                    .append(" to ");
            text.append(mass(last.total(NonDetects.LIMIT))).append(".\n");
        }
        if (last.rockAbove() > 0) {
            text.append("  Above the concentration asked for: ");
            text.append(Figures.shown(last.rockAbove() * units.volumeFactor()))
                    .append(' ')
                    .append(units.volume());
            text.append(" of saturated rock, under ")
                    .append(Figures.shown(last.areaAbove()))
                    .append(' ');
            text.append(units.area()).append(".\n");
        }
    }

    private void writeClosure(Plume plume, PeriodBudget budget, PeriodBudget waters) {
        Totals totals = budget.totals();
        if (Double.isNaN(totals.storageChange())) {
            text.append("  Closure cannot be judged: change in storage of water is not known.\n");
            return;
        }
        text.append("  Closure error ").append(error(totals));
        text.append(" of throughput (water: ").append(error(waters.totals())).append("): ");
        text.append(rate(totals.residual()))
                .append(" of ")
                .append(rate(totals.throughput()))
                .append(' ');
        text.append(units.rate()).append(" is unexplained.\n");
        if (periods.size() > 1) {
            periods.stream()
                    .map(plume.ledger()::budget)
                    .filter(period -> !Double.isNaN(period.totals().closureError()))
                    .max(Comparator.comparingDouble(
                            period -> Math.abs(period.totals().closureError())))
                    .ifPresent(worst -> text.append("  Worst period: ")
                            .append(worst.period().name())
                            .append(", ")
                            .append(error(worst.totals()))
                            .append(".\n"));
        }
    }

    /** A closure error, or that it is no more than rounding. */
    private static String error(Totals totals) {
        double percent = totals.closureError();
        double rounding = PrismResult.ROUNDING_PERCENT;
        return Math.abs(percent) < rounding ? "less than " + Figures.percent(rounding) : Figures.percent(percent);
    }

    private void writeTerms(PeriodBudget budget) {
        Map<String, Term> terms = new LinkedHashMap<>();
        for (Entry entry : budget.entries()) {
            if (entry.account().quantified()) {
                String item = item(entry);
                terms.merge(item, new Term(item, entry.inflow(), entry.outflow()), Term::plus);
            }
        }
        List<Term> sorted = new ArrayList<>(terms.values());
        sorted.sort(Comparator.comparingDouble((Term term) -> -Math.max(term.inflow(), term.outflow())));
        TextTable table = new TextTable().row("", "in", "out", "net");
        sorted.stream().limit(TERMS_SHOWN).forEach(term -> add(table, term.item(), term));
        sorted.stream()
                .skip(TERMS_SHOWN)
                .reduce(Term::plus)
                .ifPresent(rest -> add(table, counted(sorted.size() - TERMS_SHOWN, "smaller term"), rest));
        text.append("  Largest terms in ").append(units.rate()).append(":\n");
        table.appendTo(text, "    ");
    }

    private void add(TextTable table, String item, Term term) {
        table.row(item, rate(term.inflow()), rate(term.outflow()), rate(term.inflow() - term.outflow()));
    }

    private static String item(Entry entry) {
        String item = entry.account().item();
        return switch (entry.account().group()) {
            case LID -> item + " lid";
            case DISPERSION -> "dispersion, " + item;
            case STORAGE -> "storage: " + item;
            default -> item;
        };
    }

    private String rate(double mass) {
        return Figures.shown(mass / record.duration() * units.rateFactor());
    }

    private String mass(double mass) {
        return Figures.shown(mass * units.massFactor()) + " " + units.mass();
    }
}
