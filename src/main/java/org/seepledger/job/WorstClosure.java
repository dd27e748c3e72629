package org.seepledger.job;

import java.util.stream.Stream;
import org.seepledger.ledger.PeriodBudget;

/** The largest closure error of a run. */
final class WorstClosure {

    private WorstClosure() {}

    /** In percent, without sign; NaN where none can be given. */
    static double of(Stream<PeriodBudget> budgets) {
        return budgets.mapToDouble(budget -> Math.abs(budget.totals().closureError()))
                .filter(error -> !Double.isNaN(error))
                .max()
                .orElse(Double.NaN);
    }
}
