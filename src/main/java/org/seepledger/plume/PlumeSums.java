package org.seepledger.plume;

import java.util.ArrayList;
import java.util.List;
import org.seepledger.balance.PrismWalk;
import org.seepledger.balance.Span;

/** What one band, or all bands together, came to: a tally for each interval, prism and solute. */
final class PlumeSums {

    private final int first;
    private final List<List<List<SoluteTally>>> tallies = new ArrayList<>();

    PlumeSums(List<PrismWalk> walks, List<List<SoluteChart>> charts, Span span) {
        first = span.from();
        for (int interval = span.from(); interval < span.to(); interval++) {
            List<List<SoluteTally>> byPrism = new ArrayList<>();
            for (int prism = 0; prism < walks.size(); prism++) {
                int layers = walks.get(prism).layers();
                byPrism.add(charts.get(prism).stream()
                        .map(chart -> SoluteTally.of(chart, layers))
                        .toList());
            }
            tallies.add(byPrism);
        }
    }

    SoluteTally tally(int interval, int prism, int solute) {
        return tallies.get(interval - first).get(prism).get(solute);
    }

    void add(PlumeSums other) {
        for (int interval = 0; interval < tallies.size(); interval++) {
            for (int prism = 0; prism < tallies.get(interval).size(); prism++) {
                for (int solute = 0; solute < tallies.get(interval).get(prism).size(); solute++) {
                    tally(first + interval, prism, solute).add(other.tally(first + interval, prism, solute));
                }
            }
        }
    }
}
