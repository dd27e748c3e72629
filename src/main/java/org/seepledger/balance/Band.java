package org.seepledger.balance;

import java.util.List;
import java.util.Optional;
import java.util.stream.IntStream;
import org.seepledger.aquifer.CellGeometry;
import org.seepledger.aquifer.IntervalState;
import org.seepledger.aquifer.KnownCells;
import org.seepledger.aquifer.PlacedWell;
import org.seepledger.aquifer.Times;
import org.seepledger.aquifer.Window;
import org.seepledger.progress.Progress;

/** One band of rows, worked through all intervals. */
final class Band {

    private final Times times;
    private final KnownCells known;
    private final Span span;
    private final Window window;
    private final List<PrismAccounts> prisms;
    private final List<Contact> contacts;
    private final List<PlacedWell> wells;
    private final Imbalance imbalance;

    Band(
            Times times,
            KnownCells known,
            Span span,
            Window window,
            List<PrismAccounts> prisms,
            List<Contact> contacts,
            List<PlacedWell> wells,
            Imbalance imbalance) {
        this.contacts = contacts;
        this.times = times;
        this.known = known;
        this.span = span;
        this.window = window;
        this.prisms = prisms;
        this.wells = wells.stream()
                .filter(well -> window.contains(well.row(), well.column()))
                .toList();
        this.imbalance = imbalance;
    }

    BandResult work(Progress progress) {
        CellGeometry geometry = known.geometry(window);
        BandResult result = new BandResult(prisms, contacts, span);
        Window block = geometry.block().window();
        List<Optional<Elevations>> elevations =
                prisms.stream().map(prism -> prism.elevations(block)).toList();
        double duration = span.duration(times);
        for (int interval = span.from(); interval < span.to(); interval++) {
            IntervalState state = known.state(interval, geometry, wells);
            book(interval, state, elevations, result);
            imbalance.add(state, window, times.length(interval) / duration);
            result.note(interval, state);
            progress.step();
        }
        return result;
    }

    private void book(int interval, IntervalState state, List<Optional<Elevations>> elevations, BandResult result) {
        List<Slab> slabs = IntStream.range(0, prisms.size())
                .mapToObj(prism -> prisms.get(prism).slab(state, elevations.get(prism)))
                .toList();
        for (int prism = 0; prism < prisms.size(); prism++) {
            prisms.get(prism).book(state, slabs.get(prism), result.tally(interval, prism));
        }
        for (int i = 0; i < contacts.size(); i++) {
            Contact contact = contacts.get(i);
            contact.book(state, slabs.get(contact.one()), slabs.get(contact.other()), result.exchanged(interval, i));
        }
    }
}
