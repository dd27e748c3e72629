package org.seepledger.plume;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.EnumMap;
import java.util.List;
import java.util.Map;
import java.util.OptionalDouble;
import java.util.concurrent.Callable;
import java.util.function.Function;
import java.util.stream.IntStream;
import org.seepledger.aquifer.Aquifer;
import org.seepledger.aquifer.KnownCells;
import org.seepledger.aquifer.PlacedWell;
import org.seepledger.aquifer.Solute;
import org.seepledger.aquifer.StorageKnowledge;
import org.seepledger.aquifer.Window;
import org.seepledger.balance.Bands;
import org.seepledger.balance.PrismWalk;
import org.seepledger.balance.Span;
import org.seepledger.balance.Tally;
import org.seepledger.balance.WellRule;
import org.seepledger.fault.DataFault;
import org.seepledger.ledger.Ledger;
import org.seepledger.prism.Prism;
import org.seepledger.prism.PrismCut;
import org.seepledger.progress.Progress;

/** Balances solutes in prisms: the work of one run. */
public final class SoluteBalance {

    private final Scope scope;
    private final List<Solute> solutes;
    private final List<PlacedWell> wells;
    private final List<PrismWalk> walks;
    private final Window window;

    /**
     * How to balance.
     *
     * @param wells how wells in cut cells count
     * @param dispersion whether dispersion is booked where it is known
     * @param above the concentration above which volume and area are counted, mass/length³; empty for none
     * @param threads how many threads may work; the result does not depend on it
     */
    public record Options(WellRule wells, boolean dispersion, OptionalDouble above, int threads) {}

    /** What of the aquifer is balanced, and how. */
    record Scope(Aquifer aquifer, KnownCells known, Span span, Options options) {}

    private SoluteBalance(
            Aquifer aquifer,
            Function<Window, KnownCells> known,
            Span span,
            List<Solute> solutes,
            List<PrismCut> cuts,
            Options options) {
        this.solutes = solutes;
        this.window = Bands.joint(cuts);
        this.scope = new Scope(aquifer, known.apply(window), span, options);
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
        return of(aquifer, window -> aquifer, Span.all(aquifer.times()), solutes, prisms, options, progress);
    }

    /**
     * Balances solutes over some intervals. Ledgers and stocks have no numbers for other intervals and instants.
     *
     * @param aquifer the aquifer
     * @param known what is known of its cells, by the prisms' joint window
     * @param span the intervals
     * @param solutes at least one solute, each with concentration and porosity, and with its parent among them
     * @param prisms at least one valid prism within the grid
     * @param options how to balance
     * @param progress told of each band and interval
     * @return by prism, and for each by solute
     * @throws DataFault if the data are wrong or something is missing
     * @throws org.seepledger.progress.Cancelled if the work was stopped
     */
    public static List<Plume> of(
            Aquifer aquifer,
            Function<Window, KnownCells> known,
            Span span,
            List<Solute> solutes,
            List<Prism> prisms,
            Options options,
            Progress progress) {
        solutes.forEach(solute -> requireKnown(solute, solutes));
        List<PrismCut> cuts =
                prisms.stream().map(prism -> PrismCut.of(prism, aquifer.grid())).toList();
        return new SoluteBalance(aquifer, known, span, solutes, cuts, options).work(progress);
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
        for (Window rows : Bands.of(window, scope.aquifer().layers().size())) {
            PlumeBand band = new PlumeBand(scope, rows, solutes, walks, charts, wells);
            bands.add(() -> band.work(progress));
        }
        progress.begin("balancing solutes", (long) bands.size() * scope.span().count());
        PlumeSums total = new PlumeSums(walks, charts, scope.span());
        Bands.work(bands, scope.options().threads(), total::add);
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
                scope.options().dispersion() && solute.dispersion().isPresent(),
                solute.ancestry().isPresent(),
                isStorageKnown());
    }

    private boolean isStorageKnown() {
        return scope.aquifer().storageKnowledge() != StorageKnowledge.UNKNOWN;
    }

    private Plume plume(PlumeSums total, int prism, int solute, SoluteChart chart) {
        Map<NonDetects, Ledger> ledgers = new EnumMap<>(NonDetects.class);
        for (NonDetects choice : NonDetects.values()) {
            ledgers.put(
                    choice,
                    ledger(total, prism, solute, chart, tally -> tally.flows().get(choice.ordinal())));
        }
        Ledger alongCells = ledger(total, prism, solute, chart, SoluteTally::alongCells);
        PrismWalk walk = walks.get(prism);
        int from = scope.span().from();
        List<List<Stock>> stocks = IntStream.rangeClosed(
                        0, scope.aquifer().times().intervals())
                .mapToObj(instant -> notGiven(walk.layers()))
                .collect(ArrayList::new, ArrayList::add, ArrayList::addAll);
        stocks.set(from, total.tally(from, prism, solute).start());
        Doubts doubts = new Doubts();
        for (int interval = from; interval < scope.span().to(); interval++) {
            stocks.set(interval + 1, total.tally(interval, prism, solute).end());
            doubts.add(total.tally(interval, prism, solute).doubts());
        }
        return new Plume(name(prism), solutes.get(solute), walk.firstLayer(), ledgers, alongCells, stocks, doubts);
    }

    private String name(int prism) {
        return walks.get(prism).cut().prism().name();
    }

    private static List<Stock> notGiven(int layers) {
        return IntStream.rangeClosed(0, layers)
                .mapToObj(layer -> Stock.notGiven())
                .toList();
    }

    private Ledger ledger(
            PlumeSums total, int prism, int solute, SoluteChart chart, Function<SoluteTally, Tally> which) {
        int intervals = scope.aquifer().times().intervals();
        double[][] inflow = new double[intervals][];
        double[][] outflow = new double[intervals][];
        double[] none = new double[chart.accounts().size()];
        Arrays.fill(none, Double.NaN);
        Arrays.fill(inflow, none);
        Arrays.fill(outflow, none);
        for (int interval = scope.span().from(); interval < scope.span().to(); interval++) {
            Tally tally = which.apply(total.tally(interval, prism, solute));
            inflow[interval] = tally.inflow();
            outflow[interval] = tally.outflow();
        }
        return new Ledger(name(prism), chart.accounts(), isStorageKnown(), inflow, outflow);
    }
}
