package org.seepledger.balance;

import java.util.List;
import org.seepledger.ledger.ExchangeFlow;
import org.seepledger.ledger.Ledger;
import org.seepledger.prism.PrismCut;

/**
 * The result of a run.
 *
 * @param ledgers one per prism, in their order
 * @param cuts how each prism cuts the grid, in the same order
 * @param exchange what prisms give to each other and to the outside
 * @param imbalance what does not balance, cell by cell
 * @param whereabouts where each prism does not close, in the same order
 * @param notes what the reader of the result must know
 */
public record Balance(
        List<Ledger> ledgers,
        List<PrismCut> cuts,
        List<ExchangeFlow> exchange,
        Imbalance imbalance,
        List<Whereabouts> whereabouts,
        RunNotes notes) {

    /** Copies the lists. */
    public Balance {
        ledgers = List.copyOf(ledgers);
        cuts = List.copyOf(cuts);
        exchange = List.copyOf(exchange);
        whereabouts = List.copyOf(whereabouts);
    }
}
