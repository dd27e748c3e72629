package org.seepledger.report.page;

import java.util.List;
import java.util.Set;
import java.util.stream.Stream;
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

    /** The chosen budgets of a prism: the record first, then periods in their order. */
    List<PeriodBudget> of(PrismResult result) {
        return Stream.concat(
                        record ? Stream.of(result.record()) : Stream.empty(),
                        result.periods().stream().filter(budget -> isChosen(budget, result)))
                .toList();
    }

    private boolean isChosen(PeriodBudget budget, PrismResult result) {
        boolean isRecord = budget.period().equals(result.record().period());
        boolean isWorst = worst && result.worstPeriod().filter(budget::equals).isPresent();
        return !(isRecord && record)
                && (all || isWorst || names.contains(budget.period().name()));
    }
}
