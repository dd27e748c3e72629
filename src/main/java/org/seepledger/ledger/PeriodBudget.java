package org.seepledger.ledger;

import java.util.List;

/**
 * The budget of a prism in a period.
 *
 * @param period the period
 * @param entries one per account, in the ledger's order
 * @param totals their totals
 */
public record PeriodBudget(Period period, List<Entry> entries, Totals totals) {

    /** Copies the list. */
    public PeriodBudget {
        entries = List.copyOf(entries);
    }
}
