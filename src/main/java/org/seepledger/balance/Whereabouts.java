package org.seepledger.balance;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import java.util.PriorityQueue;
import org.seepledger.prism.Coverage;

/**
 * Where a prism does not close, mean over the record.
 *
 * @param prism the prism
 * @param magnitude the sum of the magnitudes of its cells' imbalances, length³/time
 * @param largest the cells that are furthest from balance, the furthest first
 */
public record Whereabouts(String prism, double magnitude, List<HotSpot> largest) {

    private static final int SHOWN = 5;

    /** Copies the list. */
    public Whereabouts {
        largest = List.copyOf(largest);
    }

    static Whereabouts of(PrismAccounts accounts, Imbalance imbalance) {
        Comparator<HotSpot> bySize = Comparator.comparingDouble(spot -> Math.abs(spot.imbalance()));
        PriorityQueue<HotSpot> largest = new PriorityQueue<>(bySize);
        Coverage coverage = accounts.cut().coverage();
        double magnitude = 0;
        for (int layer = accounts.chart().first(); layer <= accounts.chart().last(); layer++) {
            for (int row = coverage.window().row(); row < coverage.window().rowEnd(); row++) {
                for (int column = coverage.firstColumn(row); column < coverage.columnEnd(row); column++) {
                    double part = coverage.share(row, column) * imbalance.at(layer, row, column);
                    if (part != 0 && !Double.isNaN(part)) {
                        magnitude += Math.abs(part);
                        boolean full = largest.size() == SHOWN;
                        if (full && Math.abs(part) < Math.abs(largest.peek().imbalance())) {
                            continue;
                        }
                        largest.add(new HotSpot(layer, row, column, part));
                        if (full) {
                            largest.remove();
                        }
                    }
                }
            }
        }
        List<HotSpot> sorted = new ArrayList<>(largest);
        sorted.sort(bySize.reversed());
        return new Whereabouts(accounts.cut().prism().name(), magnitude, sorted);
    }
}
