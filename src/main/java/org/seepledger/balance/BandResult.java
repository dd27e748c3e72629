package org.seepledger.balance;

import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.stream.IntStream;
import org.seepledger.aquifer.CellTerm;
import org.seepledger.aquifer.FaceMismatch;
import org.seepledger.aquifer.IntervalState;

/** What one band, or all bands together, came to. */
final class BandResult {

    private final List<List<Tally>> tallies = new ArrayList<>();
    private final boolean[] flowing;
    private final List<List<Tally>> exchanged = new ArrayList<>();
    private final List<Map<String, Uncounted>> uncounted = new ArrayList<>();
    private Optional<FaceMismatch> mismatch = Optional.empty();

    BandResult(List<PrismAccounts> prisms, List<Contact> contacts, int intervals) {
        flowing = new boolean[intervals];
        for (int interval = 0; interval < intervals; interval++) {
            tallies.add(prisms.stream().map(PrismAccounts::emptyTally).toList());
            exchanged.add(contacts.stream().map(contact -> Contact.emptyTally()).toList());
            uncounted.add(new LinkedHashMap<>());
        }
    }

    Tally tally(int interval, int prism) {
        return tallies.get(interval).get(prism);
    }

    Tally exchanged(int interval, int contact) {
        return exchanged.get(interval).get(contact);
    }

    void note(int interval, IntervalState state) {
        for (CellTerm term : state.terms()) {
            uncounted.get(interval).merge(term.item(), new Uncounted(term.missing(), term.lost()), Uncounted::plus);
        }
        state.flows().mismatch().ifPresent(this::note);
        for (boolean active : state.flows().active()) {
            flowing[interval] |= active;
        }
    }

    private void note(FaceMismatch found) {
        if (mismatch.isEmpty() || found.difference() > mismatch.get().difference()) {
            mismatch = Optional.of(found);
        }
    }

    void add(BandResult other) {
        for (int interval = 0; interval < tallies.size(); interval++) {
            for (int prism = 0; prism < tallies.get(interval).size(); prism++) {
                tally(interval, prism).add(other.tally(interval, prism));
            }
            for (int contact = 0; contact < exchanged.get(interval).size(); contact++) {
                exchanged(interval, contact).add(other.exchanged(interval, contact));
            }
            flowing[interval] |= other.flowing[interval];
            Map<String, Uncounted> own = uncounted.get(interval);
            other.uncounted.get(interval).forEach((item, more) -> own.merge(item, more, Uncounted::plus));
        }
        other.mismatch.ifPresent(this::note);
    }

    /** The intervals, from 0, in which no cell is active. */
    List<Integer> still() {
        return IntStream.range(0, flowing.length)
                .filter(interval -> !flowing[interval])
                .boxed()
                .toList();
    }

    /** The greatest difference between two given values of one face, if any differ. */
    Optional<FaceMismatch> mismatch() {
        return mismatch;
    }

    /** What was not counted of each source, in the interval where it was most. */
    Map<String, Uncounted> uncounted() {
        Map<String, Uncounted> worst = new LinkedHashMap<>();
        uncounted.forEach(ofInterval -> ofInterval.forEach((item, it) -> worst.merge(item, it, Uncounted::larger)));
        return worst;
    }
}
