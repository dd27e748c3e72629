package org.seepledger.report.page;

import java.util.ArrayList;
import java.util.List;
import java.util.Set;
import org.seepledger.ledger.PeriodBudget;
import org.seepledger.report.PrismResult;

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
    List<PeriodBudget> of(PrismResult result) {
        List<PeriodBudget> chosen = new ArrayList<>(result.periods());
        chosen.removeIf(budget -> !isChosen(budget, result));
        if (record || chosen.isEmpty()) {
            chosen.add(0, result.record());
        }
        return chosen;
    }

    private boolean isChosen(PeriodBudget budget, PrismResult result) {
        boolean isRecord = budget.period().equals(result.record().period());
        boolean isWorst = worst && result.worstPeriod().filter(budget::equals).isPresent();
        return !(isRecord && record)
                && (all || isWorst || names.contains(budget.period().name()));
    }
}
