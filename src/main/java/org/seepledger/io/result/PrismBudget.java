package org.seepledger.io.result;

import java.util.List;
import org.seepledger.ledger.PeriodBudget;

/**
 * The budgets of one prism.
 *
 * @param prism its name
 * @param periods one budget per period
 */
public record PrismBudget(String prism, List<PeriodBudget> periods) {

    /** Copies the list. */
    public PrismBudget {
        periods = List.copyOf(periods);
    }
}
