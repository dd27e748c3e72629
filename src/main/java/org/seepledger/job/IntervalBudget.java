package org.seepledger.job;

import java.util.List;
import org.seepledger.balance.Whereabouts;
import org.seepledger.ledger.PeriodBudget;
import org.seepledger.prism.Prism;

/**
 * The budget of one prism in one interval, and which geometry it belongs to.
 *
 * @param prism the prism that was asked about, as it was drawn
 * @param area its plan area on the grid, length²
 * @param interval the interval, from 0
 * @param budget the budget
 * @param whereabouts where it does not close in the interval
 * @param notes what was done to the prism, as cutting it at the grid's edge
 */
public record IntervalBudget(
        Prism prism, double area, int interval, PeriodBudget budget, Whereabouts whereabouts, List<String> notes) {

    /** Copies the list. */
    public IntervalBudget {
        notes = List.copyOf(notes);
    }
}
