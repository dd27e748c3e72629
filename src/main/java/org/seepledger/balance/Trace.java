package org.seepledger.balance;

import java.util.List;
import java.util.Optional;
import org.seepledger.aquifer.Aquifer;
import org.seepledger.aquifer.CellGeometry;
import org.seepledger.aquifer.PlacedWell;
import org.seepledger.aquifer.Response;
import org.seepledger.aquifer.Window;
import org.seepledger.ledger.Account;
import org.seepledger.ledger.Period;
import org.seepledger.prism.Prism;
import org.seepledger.prism.PrismCut;
import org.seepledger.progress.Progress;

/**
 * Where a row of a budget comes from: the stored numbers that it rests on, each with its weight.
 *
 * <p>A row is linear in what was given. Its weights are found by booking ones in place of the given values, with the
 * same code that books the budget, so that there is but one account of how a number comes about. Values far enough
 * apart not to act on the same column of cells are booked at once ({@link OnesApart}).
 */
public final class Trace {

    /** Takes the lines of a trace. Lines of the same place add. */
    public interface Lines {

        /**
         * Takes one line.
         *
         * @param file the file as the set names it
         * @param place where in it
         * @param value the number that stands there
         * @param weight what it adds to the row for each unit of it
         */
        void line(String file, String place, double value, double weight);
    }

    /**
     * What all lines came to.
     *
     * @param value the sum of value × weight
     * @param magnitude the sum of their magnitudes, against which rounding is measured
     * @param lines how many lines there are
     */
    public record Sum(double value, double magnitude, long lines) {}

    private final Aquifer aquifer;
    private final PrismAccounts accounts;
    private final List<PlacedWell> wells;
    private final TracedRow row;
    private final PartWeights weights;

    private Trace(Aquifer aquifer, Prism prism, WellRule rule, TracedRow row, Lines lines) {
        this.aquifer = aquifer;
        PrismCut cut = PrismCut.of(prism, aquifer.grid());
        Window window = cut.coverage().window();
        this.wells = aquifer.placedWells().stream()
                .filter(well -> window.contains(well.row(), well.column()))
                .toList();
        this.accounts = new PrismAccounts(aquifer, cut, wells, rule);
        this.row = row;
        this.weights = new PartWeights(lines);
    }

    /**
     * Traces a row.
     *
     * @param aquifer the aquifer
     * @param prism the prism whose row it is
     * @param rule how wells in cut cells count
     * @param row the row
     * @param period its period
     * @param rateFactor how many of the unit of rates one length³/time of the set is
     * @param lines takes the lines, band by band from the north and interval by interval, what belongs to no cell last
     * @param progress told of each band and interval
     * @return what they came to
     * @throws org.seepledger.fault.DataFault if the data are wrong
     * @throws org.seepledger.progress.Cancelled if the work was stopped
     */
    public static Sum of(
            Aquifer aquifer,
            Prism prism,
            WellRule rule,
            TracedRow row,
            Period period,
            double rateFactor,
            Lines lines,
            Progress progress) {
        Trace trace = new Trace(aquifer, prism, rule, row, lines);
        Window window = trace.accounts.cut().coverage().window();
        List<Window> bands = Bands.of(window, aquifer.layers().size());
        progress.begin("tracing", (long) bands.size() * period.parts().size());
        for (Window band : bands) {
            trace.trace(band, period, rateFactor, progress);
        }
        trace.weights.giveOutNumbers();
        return trace.weights.sum();
    }

    /**
     * {@return the accounts that a prism's budget has, in the order of rows}
     *
     * @param aquifer the aquifer
     * @param prism the prism
     * @throws org.seepledger.fault.DataFault if the prism lies in no layer
     */
    public static List<Account> accounts(Aquifer aquifer, Prism prism) {
        return new Chart(aquifer, PrismCut.of(prism, aquifer.grid())).accounts();
    }

    private void trace(Window band, Period period, double rateFactor, Progress progress) {
        CellGeometry geometry = aquifer.geometry(band);
        Window block = geometry.block().window();
        Optional<Elevations> elevations = accounts.elevations(block);
        List<PlacedWell> inBand = wells.stream()
                .filter(well -> band.contains(well.row(), well.column()))
                .toList();
        for (Period.Part part : period.parts()) {
            Response response = aquifer.response(part.interval(), geometry, inBand);
            Slopes slopes = new Slopes(row);
            accounts.book(response.state(), accounts.slab(response.state(), elevations), slopes);
            if (!slopes.areZero()) {
                double share = part.duration() / period.duration() * rateFactor;
                UnitBookings units = new UnitBookings(accounts, elevations, response, slopes);
                units.addQuantities(row.restsOnFlow(accounts.chart().accounts()), share, weights);
                units.addWells(aquifer, part.interval(), share, weights);
            }
            weights.giveOutPast(block);
            progress.step();
        }
        weights.giveOutPlanes(block);
    }
}
