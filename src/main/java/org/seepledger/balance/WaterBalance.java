package org.seepledger.balance;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import java.util.concurrent.Callable;
import java.util.function.Function;
import org.seepledger.aquifer.Aquifer;
import org.seepledger.aquifer.KnownCells;
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
    private final KnownCells known;
    private final Span span;
    private final List<PlacedWell> wells;
    private final List<PrismAccounts> prisms;
    private final List<Contact> contacts;
    private final List<Overlap> overlaps;
    private final Window window;

    private WaterBalance(
            Aquifer aquifer, Function<Window, KnownCells> known, Span span, List<Prism> prisms, WellRule rule) {
        this.aquifer = aquifer;
        this.span = span;
        List<PrismCut> cuts =
                prisms.stream().map(prism -> PrismCut.of(prism, aquifer.grid())).toList();
        this.window = Bands.joint(cuts);
        this.known = known.apply(window);
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
        return of(aquifer, window -> aquifer, Span.all(aquifer.times()), prisms, rule, threads, progress);
    }

    /**
     * Balances prisms over some intervals. Ledgers and exchange have no numbers for the others; imbalance and whereabouts
     * are means over those asked for.
     *
     * @param aquifer the aquifer
     * @param known what is known of its cells, by the prisms' joint window; where that is about more cells than are asked
     *     for, so are the notes
     * @param span the intervals
     * @param prisms at least one valid prism within the grid
     * @param rule how wells in cut cells count
     * @param threads how many threads may work; the result does not depend on it
     * @param progress told of each band and interval
     * @return the result
     * @throws org.seepledger.fault.DataFault if the data are wrong
     * @throws org.seepledger.fault.ProgramFault if an identity that must hold does not
     * @throws org.seepledger.progress.Cancelled if the work was stopped
     */
    public static Balance of(
            Aquifer aquifer,
            Function<Window, KnownCells> known,
            Span span,
            List<Prism> prisms,
            WellRule rule,
            int threads,
            Progress progress) {
        return new WaterBalance(aquifer, known, span, prisms, rule).work(threads, progress);
    }

    private Balance work(int threads, Progress progress) {
        Imbalance imbalance = new Imbalance(window, aquifer.layers().size());
        List<Callable<BandResult>> bands = new ArrayList<>();
        for (Window rows : Bands.of(window, aquifer.layers().size())) {
            Band band = new Band(aquifer.times(), known, span, rows, prisms, contacts, wells, imbalance);
            bands.add(() -> band.work(progress));
        }
        progress.begin("balancing", (long) bands.size() * span.count());
        BandResult total = new BandResult(prisms, contacts, span);
        Bands.work(bands, threads, total::add);
        return new Balance(
                ledgers(total),
                prisms.stream().map(PrismAccounts::cut).toList(),
                new ExchangeSheet(aquifer.times().intervals(), span, prisms, contacts, overlaps, total).flows(),
                imbalance,
                prisms.stream().map(prism -> Whereabouts.of(prism, imbalance)).toList(),
                RunNotes.of(aquifer, span, prisms, overlaps, total));
    }

    private List<Ledger> ledgers(BandResult total) {
        int intervals = aquifer.times().intervals();
        boolean known = aquifer.storageKnowledge() != StorageKnowledge.UNKNOWN;
        List<Ledger> ledgers = new ArrayList<>();
        for (int prism = 0; prism < prisms.size(); prism++) {
            String name = prisms.get(prism).cut().prism().name();
            double[][] inflow = new double[intervals][];
            double[][] outflow = new double[intervals][];
            double[] none = notGiven(prisms.get(prism).chart().accounts().size());
            Arrays.fill(inflow, none);
            Arrays.fill(outflow, none);
            for (int interval = span.from(); interval < span.to(); interval++) {
                Tally tally = total.tally(interval, prism);
                tally.check(name, interval, ROUTES_AGREE);
                inflow[interval] = tally.inflow();
                outflow[interval] = tally.outflow();
            }
            ledgers.add(new Ledger(name, prisms.get(prism).chart().accounts(), known, inflow, outflow));
        }
        return ledgers;
    }

    private static double[] notGiven(int count) {
        double[] values = new double[count];
        Arrays.fill(values, Double.NaN);
        return values;
    }
}
