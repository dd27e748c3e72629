package org.seepledger.plume;

import java.util.ArrayList;
import java.util.EnumMap;
import java.util.List;
import java.util.Map;
import java.util.OptionalDouble;
import java.util.concurrent.Callable;
import org.seepledger.aquifer.Aquifer;
import org.seepledger.aquifer.PlacedWell;
import org.seepledger.aquifer.Solute;
import org.seepledger.aquifer.StorageKnowledge;
import org.seepledger.aquifer.Window;
import org.seepledger.balance.Bands;
import org.seepledger.balance.PrismWalk;
import org.seepledger.balance.WellRule;
import org.seepledger.fault.DataFault;
import org.seepledger.ledger.Ledger;
import org.seepledger.prism.Prism;
import org.seepledger.prism.PrismCut;
import org.seepledger.progress.Progress;

/** Balances solutes in prisms: the work of one run. */
public final class SoluteBalance {

    private final Aquifer aquifer;
    private final List<Solute> solutes;
    private final List<PlacedWell> wells;
    private final List<PrismWalk> walks;
    private final Window window;
    private final Options options;

    /**
     * How to balance.
     *
     * @param wells how wells in cut cells count
     * @param dispersion whether dispersion is booked where it is known
     * @param above the concentration above which volume and area are counted, mass/length³; empty for none
     * @param threads how many threads may work; the result does not depend on it
     */
    public record Options(WellRule wells, boolean dispersion, OptionalDouble above, int threads) {}

    private SoluteBalance(Aquifer aquifer, List<Solute> solutes, List<PrismCut> cuts, Options options) {
        this.aquifer = aquifer;
        this.solutes = solutes;
        this.options = options;
        this.window = Bands.joint(cuts);
        this.wells = aquifer.placedWells().stream()
                .filter(well -> window.contains(well.row(), well.column()))
                .toList();
        this.walks = cuts.stream()
                .map(cut -> new PrismWalk(aquifer, cut, wells, options.wells()))
                .toList();
    }

    /**
     * Balances solutes over the whole record.
     *
     * @param aquifer the aquifer
     * @param solutes at least one solute, each with concentration and porosity, and with its parent among them
     * @param prisms at least one valid prism within the grid
     * @param options how to balance
     * @param progress told of each band and interval
     * @return by prism, and for each by solute
     * @throws DataFault if the data are wrong or something is missing
     * @throws org.seepledger.progress.Cancelled if the work was stopped
     */
    public static List<Plume> of(
            Aquifer aquifer, List<Solute> solutes, List<Prism> prisms, Options options, Progress progress) {
        solutes.forEach(solute -> requireKnown(solute, solutes));
        List<PrismCut> cuts =
                prisms.stream().map(prism -> PrismCut.of(prism, aquifer.grid())).toList();
        return new SoluteBalance(aquifer, solutes, cuts, options).work(progress);
    }

    private static void requireKnown(Solute solute, List<Solute> all) {
        String lacking = solute.concentration().isEmpty()
                ? "concentration"
                : solute.porosity().isEmpty() ? "porosity" : "";
        if (!lacking.isEmpty()) {
            throw new DataFault(
                    "solute \"" + solute.name() + "\"",
                    "",
                    "no " + lacking,
                    "concentration and porosity",
                    "Add it to aquifer.json, or leave the solute out.");
        }
        solute.ancestry().ifPresent(ancestry -> {
            if (all.stream().noneMatch(other -> other.name().equals(ancestry.parent()))) {
                throw new DataFault(
                        "solute \"" + solute.name() + "\"",
                        "parent",
                        "\"" + ancestry.parent() + "\", which is not balanced with it",
                        "both together",
                        "Balance the parent too, since what decays of it is needed.");
            }
        });
    }

    private List<Plume> work(Progress progress) {
        List<List<SoluteChart>> charts = walks.stream()
                .map(walk -> solutes.stream().map(solute -> chart(walk, solute)).toList())
                .toList();
        List<Callable<PlumeSums>> bands = new ArrayList<>();
        for (Window rows : Bands.of(window, aquifer.layers().size())) {
            PlumeBand band = new PlumeBand(aquifer, rows, solutes, walks, charts, wells, options);
            bands.add(() -> band.work(progress));
        }
        progress.begin(
                "balancing solutes", (long) bands.size() * aquifer.times().intervals());
        PlumeSums total = new PlumeSums(walks, charts, aquifer.times().intervals());
        Bands.work(bands, options.threads(), total::add);
        List<Plume> plumes = new ArrayList<>();
        for (int prism = 0; prism < walks.size(); prism++) {
            for (int solute = 0; solute < solutes.size(); solute++) {
                plumes.add(plume(total, prism, solute, charts.get(prism).get(solute)));
            }
        }
        return plumes;
    }

    private SoluteChart chart(PrismWalk walk, Solute solute) {
        return new SoluteChart(
                walk,
                options.dispersion() && solute.dispersion().isPresent(),
                solute.ancestry().isPresent(),
                aquifer.storageKnowledge() != StorageKnowledge.UNKNOWN);
    }

    private Plume plume(PlumeSums total, int prism, int solute, SoluteChart chart) {
        int intervals = aquifer.times().intervals();
        Map<NonDetects, Ledger> ledgers = new EnumMap<>(NonDetects.class);
        String name = walks.get(prism).cut().prism().name();
        boolean known = aquifer.storageKnowledge() != StorageKnowledge.UNKNOWN;
        for (NonDetects choice : NonDetects.values()) {
            double[][] inflow = new double[intervals][];
            double[][] outflow = new double[intervals][];
            for (int interval = 0; interval < intervals; interval++) {
                SoluteTally tally = total.tally(interval, prism, solute);
                inflow[interval] = tally.flows().get(choice.ordinal()).inflow();
                outflow[interval] = tally.flows().get(choice.ordinal()).outflow();
            }
            ledgers.put(choice, new Ledger(name, chart.accounts(), known, inflow, outflow));
        }
        List<List<Stock>> stocks = new ArrayList<>();
        Doubts doubts = new Doubts();
        stocks.add(total.tally(0, prism, solute).start());
        for (int interval = 0; interval < intervals; interval++) {
            stocks.add(total.tally(interval, prism, solute).end());
            doubts.add(total.tally(interval, prism, solute).doubts());
        }
        return new Plume(name, solutes.get(solute), walks.get(prism).firstLayer(), ledgers, stocks, doubts);
    }
}
