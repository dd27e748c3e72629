package org.seepledger.balance;

import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import org.seepledger.aquifer.CellTerm;
import org.seepledger.aquifer.FaceMismatch;
import org.seepledger.aquifer.IntervalState;

/** What one band, or all bands together, came to. */
final class BandResult {

    private final Span span;
    private final List<List<Tally>> tallies = new ArrayList<>();
    private final boolean[] flowing;
    private final List<List<Tally>> exchanged = new ArrayList<>();
    private final List<Map<String, Uncounted>> uncounted = new ArrayList<>();
    private Optional<FaceMismatch> mismatch = Optional.empty();

    BandResult(List<PrismAccounts> prisms, List<Contact> contacts, Span span) {
        this.span = span;
        flowing = new boolean[span.count()];
        for (int place = 0; place < span.count(); place++) {
            tallies.add(prisms.stream().map(PrismAccounts::emptyTally).toList());
            exchanged.add(contacts.stream().map(contact -> Contact.emptyTally()).toList());
            uncounted.add(new LinkedHashMap<>());
        }
    }

    Tally tally(int interval, int prism) {
        return tallies.get(interval - span.from()).get(prism);
    }

    Tally exchanged(int interval, int contact) {
        return exchanged.get(interval - span.from()).get(contact);
    }

    void note(int interval, IntervalState state) {
        int place = interval - span.from();
        for (CellTerm term : state.terms()) {
            uncounted.get(place).merge(term.item(), new Uncounted(term.missing(), term.lost()), Uncounted::plus);
        }
        state.flows().mismatch().ifPresent(this::note);
        for (boolean active : state.flows().active()) {
            flowing[place] |= active;
        }
    }

    private void note(FaceMismatch found) {
        if (mismatch.isEmpty() || found.difference() > mismatch.get().difference()) {
            mismatch = Optional.of(found);
        }
    }

    void add(BandResult other) {
        for (int place = 0; place < tallies.size(); place++) {
            for (int prism = 0; prism < tallies.get(place).size(); prism++) {
                tallies.get(place).get(prism).add(other.tallies.get(place).get(prism));
            }
            for (int contact = 0; contact < exchanged.get(place).size(); contact++) {
                exchanged.get(place).get(contact).add(other.exchanged.get(place).get(contact));
            }
            flowing[place] |= other.flowing[place];
            Map<String, Uncounted> own = uncounted.get(place);
            other.uncounted.get(place).forEach((item, more) -> own.merge(item, more, Uncounted::plus));
        }
        other.mismatch.ifPresent(this::note);
    }

    /** The intervals, from 0, in which no cell is active. */
    List<Integer> still() {
        return span.intervals()
                .filter(interval -> !flowing[interval - span.from()])
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
