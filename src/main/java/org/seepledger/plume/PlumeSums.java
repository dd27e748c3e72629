package org.seepledger.plume;

import java.util.ArrayList;
import java.util.List;
import org.seepledger.balance.PrismWalk;

/** What one band, or all bands together, came to: a tally for each interval, prism and solute. */
final class PlumeSums {

    private final List<List<List<SoluteTally>>> tallies = new ArrayList<>();

    PlumeSums(List<PrismWalk> walks, List<List<SoluteChart>> charts, int intervals) {
        for (int interval = 0; interval < intervals; interval++) {
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
        return tallies.get(interval).get(prism).get(solute);
    }

    void add(PlumeSums other) {
        for (int interval = 0; interval < tallies.size(); interval++) {
            for (int prism = 0; prism < tallies.get(interval).size(); prism++) {
                for (int solute = 0; solute < tallies.get(interval).get(prism).size(); solute++) {
                    tally(interval, prism, solute).add(other.tally(interval, prism, solute));
                }
            }
        }
    }
}
