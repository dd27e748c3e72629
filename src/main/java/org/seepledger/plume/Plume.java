package org.seepledger.plume;

import java.util.List;
import java.util.Map;
import org.seepledger.aquifer.Solute;
import org.seepledger.ledger.Ledger;

/**
 * What one prism holds of one solute, and its budget.
 *
 * @param prism the prism's name
 * @param solute the solute
 * @param firstLayer the first layer of the prism's range, from 0
 * @param ledgers the budget in kilograms for each way to count non-detects; {@link NonDetects#HALF} is the one to show
 * @param stocks what is held: by instant and layer of the range, the last for all layers together
 * @param doubts what makes numbers doubtful
 */
public record Plume(
        String prism,
        Solute solute,
        int firstLayer,
        Map<NonDetects, Ledger> ledgers,
        List<List<Stock>> stocks,
        Doubts doubts) {

    /** Copies the collections. */
    public Plume {
        ledgers = Map.copyOf(ledgers);
        stocks = List.copyOf(stocks);
    }

    /** {@return the budget to show} */
    public Ledger ledger() {
        return ledgers.get(NonDetects.HALF);
    }

    /**
     * {@return what is held at an instant in all layers}
     *
     * @param instant from 0
     */
    public Stock whole(int instant) {
        List<Stock> layers = stocks.get(instant);
        return layers.get(layers.size() - 1);
    }
}
