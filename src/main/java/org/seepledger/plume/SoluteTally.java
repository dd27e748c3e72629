package org.seepledger.plume;

import java.util.List;
import java.util.stream.IntStream;
import org.seepledger.balance.Tally;

/**
 * The running sums of one prism and solute in one interval.
 *
 * @param flows gross rates by account, for each way to count non-detects, mass/time
 * @param alongCells what faces and sources would carry if mass flow were interpolated within cells
 * @param start what is held at the interval's begin: a stock for each layer, and one for all
 * @param end what is held at its end
 * @param doubts what makes numbers doubtful
 */
record SoluteTally(List<Tally> flows, Tally alongCells, List<Stock> start, List<Stock> end, Doubts doubts) {

    static SoluteTally of(SoluteChart chart, int layers) {
        return new SoluteTally(
                IntStream.range(0, NonDetects.values().length)
                        .mapToObj(choice -> new Tally(chart.accounts().size(), 0))
                        .toList(),
                new Tally(chart.accounts().size(), 0),
                stocks(layers),
                stocks(layers),
                new Doubts());
    }

    private static List<Stock> stocks(int layers) {
        return IntStream.rangeClosed(0, layers).mapToObj(layer -> new Stock()).toList();
    }

    void add(SoluteTally other) {
        for (int choice = 0; choice < flows.size(); choice++) {
            flows.get(choice).add(other.flows.get(choice));
        }
        alongCells.add(other.alongCells);
        for (int stock = 0; stock < start.size(); stock++) {
            start.get(stock).add(other.start.get(stock));
            end.get(stock).add(other.end.get(stock));
        }
        doubts.add(other.doubts);
    }
}
