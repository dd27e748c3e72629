package org.seepledger.balance;

import java.util.List;
import org.seepledger.ledger.Ledger;

/**
 * The result of a run.
 *
 * @param ledgers one per prism, in their order
 * @param imbalance what does not balance, cell by cell
 * @param notes what the reader of the result must know
 */
public record Balance(List<Ledger> ledgers, Imbalance imbalance, RunNotes notes) {

    /** Copies the list. */
    public Balance {
        ledgers = List.copyOf(ledgers);
    }
}
