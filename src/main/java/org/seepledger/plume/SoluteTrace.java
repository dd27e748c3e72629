package org.seepledger.plume;

import java.util.List;
import java.util.Optional;
import org.seepledger.aquifer.Aquifer;
import org.seepledger.aquifer.CellGeometry;
import org.seepledger.aquifer.IntervalState;
import org.seepledger.aquifer.PlacedWell;
import org.seepledger.aquifer.Solute;
import org.seepledger.aquifer.StorageKnowledge;
import org.seepledger.aquifer.Window;
import org.seepledger.balance.Bands;
import org.seepledger.balance.PartWeights;
import org.seepledger.balance.PrismWalk;
import org.seepledger.balance.Trace;
import org.seepledger.ledger.Account;
import org.seepledger.ledger.Period;
import org.seepledger.prism.Prism;
import org.seepledger.prism.PrismCut;
import org.seepledger.progress.Progress;

/**
 * Where a row of a solute's budget comes from: the stored concentrations that it rests on, each with its weight, while the
 * water's flows, porosities, sorption and decay stand as they are.
 *
 * <p>A row's net is linear in the concentrations of the solute at both ends of each interval, of its parent where it is a
 * product, and in what sources and the grid's outer faces carry. Its weights are found by booking ones in place of them,
 * with the code that books the budget. A value that counts as a non-detect has half the weight, on its limit.
 */
public final class SoluteTrace {

    private final Aquifer aquifer;
    private final Request request;
    private final PrismWalk walk;
    private final SoluteChart chart;
    private final List<PlacedWell> wells;
    private final PartWeights weights;

    /**
     * What is traced.
     *
     * @param solute the solute
     * @param parent what it is a product of, if of anything
     * @param prism the prism
     * @param options how the budget was struck
     * @param row how often the net of each account counts, in the order of {@link #accounts}
     * @param period the period
     * @param rateFactor how many of the unit of rates one kilogram over the set's time unit is
     */
    public record Request(
            Solute solute,
            Optional<Solute> parent,
            Prism prism,
            SoluteBalance.Options options,
            double[] row,
            Period period,
            double rateFactor) {}

    private SoluteTrace(Aquifer aquifer, Request request, Trace.Lines lines) {
        this.aquifer = aquifer;
        this.request = request;
        PrismCut cut = PrismCut.of(request.prism(), aquifer.grid());
        Window window = cut.coverage().window();
        this.wells = aquifer.placedWells().stream()
                .filter(well -> window.contains(well.row(), well.column()))
                .toList();
        this.walk = new PrismWalk(aquifer, cut, wells, request.options().wells());
        this.chart = chart(aquifer, walk, request.solute(), request.options());
        this.weights = new PartWeights(lines);
    }

    /**
     * Traces a row.
     *
     * @param aquifer the aquifer
     * @param request what is traced
     * @param lines takes the lines, band by band from the north and interval by interval, what belongs to no cell last
     * @param progress told of each band and interval
     * @return what they came to
     * @throws org.seepledger.fault.DataFault if the data are wrong
     * @throws org.seepledger.progress.Cancelled if the work was stopped
     */
    public static Trace.Sum of(Aquifer aquifer, Request request, Trace.Lines lines, Progress progress) {
        SoluteTrace trace = new SoluteTrace(aquifer, request, lines);
        List<Window> bands =
                Bands.of(trace.walk.cut().coverage().window(), aquifer.layers().size());
        progress.begin("tracing", (long) bands.size() * request.period().parts().size());
        bands.forEach(band -> trace.trace(band, progress));
        trace.weights.giveOutNumbers();
        return trace.weights.sum();
    }

    /**
     * {@return the accounts that a prism's budget of a solute has, in the order of rows}
     *
     * @param aquifer the aquifer
     * @param solute the solute
     * @param prism the prism
     * @param options how the budget is struck
     * @throws org.seepledger.fault.DataFault if the prism lies in no layer
     */
    public static List<Account> accounts(Aquifer aquifer, Solute solute, Prism prism, SoluteBalance.Options options) {
        PrismCut cut = PrismCut.of(prism, aquifer.grid());
        PrismWalk walk = new PrismWalk(aquifer, cut, List.of(), options.wells());
        return chart(aquifer, walk, solute, options).accounts();
    }

    private static SoluteChart chart(Aquifer aquifer, PrismWalk walk, Solute solute, SoluteBalance.Options options) {
        return new SoluteChart(
                walk,
                options.dispersion() && solute.dispersion().isPresent(),
                solute.ancestry().isPresent(),
                aquifer.storageKnowledge() != StorageKnowledge.UNKNOWN);
    }

    private void trace(Window band, Progress progress) {
        CellGeometry geometry = aquifer.geometry(band);
        Window block = geometry.block().window();
        List<PlacedWell> inBand = wells.stream()
                .filter(well -> band.contains(well.row(), well.column()))
                .toList();
        UnitConcentrations.Band known = new UnitConcentrations.Band(
                walk,
                walk.over(geometry),
                chart,
                Matrix.of(request.solute(), geometry),
                request.parent().map(parent -> Matrix.of(parent, geometry)));
        Givers givers = new Givers(aquifer);
        for (Period.Part part : request.period().parts()) {
            IntervalState state = aquifer.state(part.interval(), geometry, inBand);
            double share = part.duration() / request.period().duration() * request.rateFactor();
            double length = aquifer.times().length(part.interval());
            new UnitConcentrations(request, known, state, part.interval(), length, givers.of(state))
                    .addTo(weights, share);
            weights.giveOutPast(block);
            progress.step();
        }
        weights.giveOutPlanes(block);
    }
}
