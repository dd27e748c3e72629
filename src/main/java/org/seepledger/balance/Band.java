package org.seepledger.balance;

import java.util.List;
import java.util.Optional;
import java.util.stream.IntStream;
import org.seepledger.aquifer.Aquifer;
import org.seepledger.aquifer.Block;
import org.seepledger.aquifer.CellGeometry;
import org.seepledger.aquifer.CellTerm;
import org.seepledger.aquifer.IntervalState;
import org.seepledger.aquifer.PlacedWell;
import org.seepledger.aquifer.WellRate;
import org.seepledger.aquifer.Window;
import org.seepledger.progress.Progress;

/** One band of rows, worked through all intervals. */
final class Band {

    private final Aquifer aquifer;
    private final Window window;
    private final List<PrismAccounts> prisms;
    private final List<Contact> contacts;
    private final List<PlacedWell> wells;
    private final Imbalance imbalance;

    Band(
            Aquifer aquifer,
            Window window,
            List<PrismAccounts> prisms,
            List<Contact> contacts,
            List<PlacedWell> wells,
            Imbalance imbalance) {
        this.contacts = contacts;
        this.aquifer = aquifer;
        this.window = window;
        this.prisms = prisms;
        this.wells = wells.stream()
                .filter(well -> window.contains(well.row(), well.column()))
                .toList();
        this.imbalance = imbalance;
    }

    BandResult work(Progress progress) {
        CellGeometry geometry = aquifer.geometry(window);
        int intervals = aquifer.times().intervals();
        BandResult result = new BandResult(prisms, contacts, intervals);
        Window block = geometry.block().window();
        List<Optional<Elevations>> elevations =
                prisms.stream().map(prism -> prism.elevations(block)).toList();
        double record = aquifer.times().instant(intervals) - aquifer.times().instant(0);
        for (int interval = 0; interval < intervals; interval++) {
            IntervalState state = aquifer.state(interval, geometry, wells);
            book(interval, state, elevations, result);
            addImbalance(state, aquifer.times().length(interval) / record);
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

    private void addImbalance(IntervalState state, double weight) {
        Block block = state.flows().block();
        double[] perCell = new double[block.size()];
        for (CellTerm term : state.terms()) {
            IntStream.range(0, perCell.length).forEach(cell -> perCell[cell] += term.rates()[cell]);
        }
        for (WellRate rate : state.wells()) {
            perCell[block.cell(rate.layer(), rate.well().row(), rate.well().column())] += rate.rate();
        }
        for (int layer = 0; layer < block.layers(); layer++) {
            for (int row = window.row(); row < window.rowEnd(); row++) {
                for (int column = window.column(); column < window.columnEnd(); column++) {
                    int cell = block.cell(layer, row, column);
                    if (state.flows().active()[cell]) {
                        double gain = state.flows().gain(layer, row, column) + perCell[cell];
                        imbalance.add(layer, row, column, gain * weight);
                    }
                }
            }
        }
    }
}
