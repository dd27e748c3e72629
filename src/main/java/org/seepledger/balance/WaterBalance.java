package org.seepledger.balance;

import java.util.ArrayList;
import java.util.List;
import java.util.concurrent.Callable;
import org.seepledger.aquifer.Aquifer;
import org.seepledger.aquifer.PlacedWell;
import org.seepledger.aquifer.StorageKnowledge;
import org.seepledger.aquifer.Window;
import org.seepledger.ledger.Ledger;
import org.seepledger.prism.Overlap;
import org.seepledger.prism.Overlaps;
import org.seepledger.prism.Prism;
import org.seepledger.prism.PrismCut;
import org.seepledger.progress.Progress;

/** Balances prisms in an aquifer: the work of one run. */
public final class WaterBalance {

    /** How far the two routes to a prism's outflow may differ, as a share of the gross flow through the cells touched. */
    public static final double ROUTES_AGREE = 1e-12;

    private final Aquifer aquifer;
    private final List<PlacedWell> wells;
    private final List<PrismAccounts> prisms;
    private final List<Contact> contacts;
    private final List<Overlap> overlaps;
    private final Window window;

    private WaterBalance(Aquifer aquifer, List<Prism> prisms, WellRule rule) {
        this.aquifer = aquifer;
        List<PrismCut> cuts =
                prisms.stream().map(prism -> PrismCut.of(prism, aquifer.grid())).toList();
        this.window = Bands.joint(cuts);
        this.wells = aquifer.placedWells().stream()
                .filter(well -> window.contains(well.row(), well.column()))
                .toList();
        this.prisms = cuts.stream()
                .map(cut -> new PrismAccounts(aquifer, cut, wells, rule))
                .toList();
        this.contacts = contacts();
        this.overlaps = new Overlaps(aquifer.grid(), aquifer.layers().size(), aquifer::surface).of(prisms);
    }

    private List<Contact> contacts() {
        List<Contact> found = new ArrayList<>();
        for (int one = 0; one < prisms.size(); one++) {
            for (int other = one + 1; other < prisms.size(); other++) {
                Contact.between(prisms, one, other, aquifer.grid()).ifPresent(found::add);
            }
        }
        return found;
    }

    /**
     * Balances prisms over the whole record.
     *
     * @param aquifer the aquifer
     * @param prisms at least one valid prism within the grid
     * @param rule how wells in cut cells count
     * @param threads how many threads may work; the result does not depend on it
     * @param progress told of each band and interval
     * @return the result
     * @throws org.seepledger.fault.DataFault if the data are wrong
     * @throws org.seepledger.fault.ProgramFault if an identity that must hold does not
     * @throws org.seepledger.progress.Cancelled if the work was stopped
     */
    public static Balance of(Aquifer aquifer, List<Prism> prisms, WellRule rule, int threads, Progress progress) {
        return new WaterBalance(aquifer, prisms, rule).work(threads, progress);
    }

    private Balance work(int threads, Progress progress) {
        Imbalance imbalance = new Imbalance(window, aquifer.layers().size());
        List<Callable<BandResult>> bands = new ArrayList<>();
        for (Window rows : Bands.of(window, aquifer.layers().size())) {
            Band band = new Band(aquifer, rows, prisms, contacts, wells, imbalance);
            bands.add(() -> band.work(progress));
        }
        progress.begin("balancing", (long) bands.size() * aquifer.times().intervals());
        BandResult total = new BandResult(prisms, contacts, aquifer.times().intervals());
        Bands.work(bands, threads, total::add);
        return new Balance(
                ledgers(total),
                prisms.stream().map(PrismAccounts::cut).toList(),
                new ExchangeSheet(aquifer, prisms, contacts, overlaps, total).flows(),
                imbalance,
                prisms.stream().map(prism -> Whereabouts.of(prism, imbalance)).toList(),
                RunNotes.of(aquifer, prisms, overlaps, total));
    }

    private List<Ledger> ledgers(BandResult total) {
        int intervals = aquifer.times().intervals();
        boolean known = aquifer.storageKnowledge() != StorageKnowledge.UNKNOWN;
        List<Ledger> ledgers = new ArrayList<>();
        for (int prism = 0; prism < prisms.size(); prism++) {
            String name = prisms.get(prism).cut().prism().name();
            double[][] inflow = new double[intervals][];
            double[][] outflow = new double[intervals][];
            for (int interval = 0; interval < intervals; interval++) {
                Tally tally = total.tally(interval, prism);
                tally.check(name, interval, ROUTES_AGREE);
                inflow[interval] = tally.inflow();
                outflow[interval] = tally.outflow();
            }
            ledgers.add(new Ledger(name, prisms.get(prism).chart().accounts(), known, inflow, outflow));
        }
        return ledgers;
    }
}
