package org.seepledger.report;

import java.util.Comparator;
import java.util.List;
import java.util.Optional;
import org.seepledger.ledger.PeriodBudget;

/**
 * A budget over the whole record and by period, of water or of a solute.
 *
 * @param record the budget over the whole record
 * @param periods the budgets by period
 */
public record BudgetCourse(PeriodBudget record, List<PeriodBudget> periods) {

    /** Below this, in percent, a closure error is rounding and nothing else. */
    static final double ROUNDING_PERCENT = 1e-9;

    /** Copies the list. */
    public BudgetCourse {
        periods = List.copyOf(periods);
    }

    /** {@return whether change in storage can be given, and with it a residual} */
    public boolean storageKnown() {
        return !Double.isNaN(record.totals().storageChange());
    }

    /** {@return whether the residual over the record is rounding and nothing else; false where there is none} */
    public boolean closesToRounding() {
        return closesToRounding(record);
    }

    /** {@return whether the residual of a budget is rounding and nothing else; false where there is none} */
    static boolean closesToRounding(PeriodBudget budget) {
        return !Double.isNaN(budget.totals().storageChange())
                && (budget.totals().throughput() == 0
                        || Math.abs(budget.totals().closureError()) < ROUNDING_PERCENT);
    }

    /** {@return the period with the largest closure error, where there is more than one period} */
    public Optional<PeriodBudget> worstPeriod() {
        return periods.size() < 2
                ? Optional.empty()
                : periods.stream()
                        .filter(budget -> !Double.isNaN(budget.totals().closureError()))
                        .max(Comparator.comparingDouble(
                                budget -> Math.abs(budget.totals().closureError())));
    }

    /** {@return the terms over the record, in the order of rows} */
    public List<Term> terms() {
        return Term.of(record);
    }
}
