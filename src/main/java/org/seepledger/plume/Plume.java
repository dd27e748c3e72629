package org.seepledger.plume;

import java.util.List;
import java.util.Map;
import java.util.Set;
import java.util.function.ToDoubleFunction;
import java.util.stream.IntStream;
import org.seepledger.aquifer.Solute;
import org.seepledger.aquifer.Times;
import org.seepledger.ledger.Account;
import org.seepledger.ledger.Entry;
import org.seepledger.ledger.Group;
import org.seepledger.ledger.Ledger;
import org.seepledger.ledger.Period;

/**
 * What one prism holds of one solute, and its budget.
 *
 * @param prism the prism's name
 * @param solute the solute
 * @param firstLayer the first layer of the prism's range, from 0
 * @param ledgers the budget in kilograms for each way to count non-detects; {@link NonDetects#HALF} is the one to show
 * @param alongCells what faces and sources would carry if mass flow were interpolated within cells as the water's is,
 *     non-detects counted half their limit; other accounts are empty
 * @param stocks what is held: by instant and layer of the range, the last for all layers together
 * @param doubts what makes numbers doubtful
 */
public record Plume(
        String prism,
        Solute solute,
        int firstLayer,
        Map<NonDetects, Ledger> ledgers,
        Ledger alongCells,
        List<List<Stock>> stocks,
        Doubts doubts) {

    private static final Set<Group> CARRIED = Set.of(Group.SIDE, Group.LID, Group.SOURCE);

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
     * {@return what sides, lids and sources that cut cells add to a period's residual, by account, kg: a cell's own
     * concentration counts all through it there, while its balance is kept on its faces}
     *
     * @param period the period
     */
    public double[] cutting(Period period) {
        List<Entry> booked = ledger().budget(period).entries();
        List<Entry> along = alongCells.budget(period).entries();
        return IntStream.range(0, booked.size())
                .mapToDouble(i -> {
                    Account account = booked.get(i).account();
                    return account.quantified() && CARRIED.contains(account.group())
                            ? booked.get(i).net() - along.get(i).net()
                            : 0;
                })
                .toArray();
    }

    /**
     * {@return something of what is held at a time, between instants in proportion}
     *
     * @param times the record's instants
     * @param time in time units, within the record
     * @param layer a layer counted from the range's first; the number of its layers for all together
     * @param what what of it
     */
    public double held(Times times, double time, int layer, ToDoubleFunction<Stock> what) {
        int interval = times.intervalAt(time);
        double after = (time - times.instant(interval)) / times.length(interval);
        double start = what.applyAsDouble(stocks.get(interval).get(layer));
        double end = what.applyAsDouble(stocks.get(interval + 1).get(layer));
        return after >= 1 ? end : after <= 0 ? start : start + after * (end - start);
    }

    /** {@return the number of layers in the prism's range} */
    public int layers() {
        return stocks.get(0).size() - 1;
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

    /** {@return how many times the least limit of a non-detect the greatest is, over all instants; 1 where there are none} */
    public double limitsRatio() {
        double least = Double.POSITIVE_INFINITY;
        double greatest = 0;
        for (int instant = 0; instant < stocks.size(); instant++) {
            least = Math.min(least, whole(instant).leastLimit());
            greatest = Math.max(greatest, whole(instant).greatestLimit());
        }
        return greatest > least ? greatest / least : 1;
    }
}
