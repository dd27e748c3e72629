package org.seepledger.desktop.budget;

import java.util.List;
import java.util.Optional;
import org.seepledger.balance.Periods;
import org.seepledger.desktop.session.OpenSet;
import org.seepledger.desktop.words.NumberForm;
import org.seepledger.desktop.words.Words;
import org.seepledger.job.IntervalBudget;
import org.seepledger.job.RecordBudget;
import org.seepledger.ledger.Period;
import org.seepledger.ledger.PeriodBudget;
import org.seepledger.prism.Prism;
import org.seepledger.prism.VerticalRange;
import org.seepledger.report.Wording;
import org.seepledger.unit.Figures;
import org.seepledger.unit.Measure;

/**
 * A budget with the geometry that it belongs to.
 *
 * @param prism the prism as it was drawn then
 * @param area its plan area on the grid, length²
 * @param budget its budget in a period
 * @param notes what was done to the prism
 */
public record BudgetShown(Prism prism, double area, PeriodBudget budget, List<String> notes) {

    /** Copies the list. */
    public BudgetShown {
        notes = List.copyOf(notes);
    }

    /**
     * {@return whose budget it is, and of when, in a line}
     *
     * @param set the set
     * @param form how numbers are written
     */
    public String whose(OpenSet set, NumberForm form) {
        Period period = budget.period();
        String unit = Wording.raised(Measure.power(set.aquifer().lengthUnit(), 2));
        return Words.of(
                "budget.belongs",
                prism.name(),
                reach(set),
                form.of(Figures.tabular(area)),
                unit,
                PeriodWords.of(period, set.aquifer().times(), form));
    }

    private String reach(OpenSet set) {
        if (prism.range() instanceof VerticalRange.Layers layers) {
            return layers.first() == layers.last()
                    ? set.aquifer().layers().get(layers.first()).name()
                    : Words.of("budget.layers", layers.first() + 1, layers.last() + 1);
        }
        return Words.of("budget.elevations");
    }

    /**
     * {@return the budget of a prism over the whole record, if the record holds it}
     *
     * @param set the set
     * @param known what is known of the record
     * @param prism the prism's name
     */
    public static Optional<BudgetShown> whole(OpenSet set, RecordBudget known, String prism) {
        return of(known, prism, set.workbench().periods(Periods.Every.RECORD, 1).get(0));
    }

    private static BudgetShown of(RecordBudget known, int prism, Period period) {
        return new BudgetShown(
                known.prisms().get(prism),
                known.balance().cuts().get(prism).area(),
                known.balance().ledgers().get(prism).budget(period),
                ownNotes(known, known.prisms().get(prism).name()));
    }

    /** Notes on one prism begin with its name. */
    private static List<String> ownNotes(RecordBudget known, String prism) {
        return known.notes().stream()
                .filter(note -> note.startsWith("\"" + prism + "\""))
                .toList();
    }

    static BudgetShown of(IntervalBudget known) {
        return new BudgetShown(known.prism(), known.area(), known.budget(), known.notes());
    }

    static Optional<BudgetShown> of(RecordBudget known, String prism, Period period) {
        for (int i = 0; i < known.prisms().size(); i++) {
            if (known.prisms().get(i).name().equals(prism)) {
                return Optional.of(of(known, i, period));
            }
        }
        return Optional.empty();
    }
}
