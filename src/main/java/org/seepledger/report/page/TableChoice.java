package org.seepledger.report.page;

import java.util.ArrayList;
import java.util.List;
import java.util.Set;
import org.seepledger.ledger.PeriodBudget;
import org.seepledger.report.BudgetCourse;

/**
 * Which budgets of a prism get a table of all their rows.
 *
 * @param record whether the whole record does
 * @param worst whether the period with the largest closure error does
 * @param all whether every period does
 * @param names the names of further periods
 */
public record TableChoice(boolean record, boolean worst, boolean all, Set<String> names) {

    /** Copies the set. */
    public TableChoice {
        names = Set.copyOf(names);
    }

    /**
     * The chosen budgets of a prism: the record first, then periods in their order; the record where the choice comes to
     * nothing, as the worst period does where there is but one.
     */
    List<PeriodBudget> of(BudgetCourse course) {
        List<PeriodBudget> chosen = new ArrayList<>(course.periods());
        chosen.removeIf(budget -> !isChosen(budget, course));
        if (record || chosen.isEmpty()) {
            chosen.add(0, course.record());
        }
        return chosen;
    }

    private boolean isChosen(PeriodBudget budget, BudgetCourse course) {
        boolean isRecord = budget.period().equals(course.record().period());
        boolean isWorst = worst && course.worstPeriod().filter(budget::equals).isPresent();
        return !(isRecord && record)
                && (all || isWorst || names.contains(budget.period().name()));
    }
}
