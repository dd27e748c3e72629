package org.seepledger.job;

import java.nio.file.Path;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.OptionalInt;
import java.util.function.Function;
import org.seepledger.aquifer.Aquifer;
import org.seepledger.aquifer.CellGeometry;
import org.seepledger.aquifer.Concentration;
import org.seepledger.aquifer.Grid;
import org.seepledger.aquifer.KnownCells;
import org.seepledger.aquifer.Saturation;
import org.seepledger.aquifer.Solute;
import org.seepledger.aquifer.Window;
import org.seepledger.balance.Span;
import org.seepledger.balance.Trace;
import org.seepledger.balance.WellRule;
import org.seepledger.io.aquifer.AquiferFolder;
import org.seepledger.io.prisms.PrismsReader;
import org.seepledger.io.result.MassUnits;
import org.seepledger.io.table.MeasuredPanels;
import org.seepledger.ledger.Period;
import org.seepledger.picture.Drape;
import org.seepledger.picture.ThresholdOutline;
import org.seepledger.plume.Crossing;
import org.seepledger.plume.NonDetects;
import org.seepledger.plume.Plume;
import org.seepledger.plume.SoluteBalance;
import org.seepledger.plume.TransectFlows;
import org.seepledger.prism.Prism;
import org.seepledger.prism.PrismCut;
import org.seepledger.prism.Ring;
import org.seepledger.prism.Side;
import org.seepledger.prism.Transect;
import org.seepledger.prism.VerticalRange;
import org.seepledger.progress.Progress;
import org.seepledger.unit.Measure;

/**
 * The part of a {@link Workbench} that answers questions about solutes. Budgets and crossings are those that {@link
 * PlumeJob} makes of the same prisms and transects, digit for digit.
 */
public final class SoluteBench {

    private final AquiferFolder folder;
    private final List<Solute> solutes;
    private final Function<Window, KnownCells> kept;
    private final Gate gate;
    private final Function<List<String>, PrismsReader> readers;

    /**
     * How solutes are balanced.
     *
     * @param dispersion whether dispersion is booked where it is known
     * @param above the concentration above which volume and area are counted, kg/length³; empty for none
     */
    public record Choice(boolean dispersion, OptionalDouble above) {}

    SoluteBench(
            AquiferFolder folder,
            Function<Window, KnownCells> kept,
            Gate gate,
            Function<List<String>, PrismsReader> readers) {
        this.folder = folder;
        this.solutes = known(folder.solutes());
        this.kept = kept;
        this.gate = gate;
        this.readers = readers;
    }

    /** Those solutes that can be balanced. */
    static List<Solute> known(List<Solute> all) {
        return all.stream().filter(solute -> solute.concentration().isPresent()).toList();
    }

    private Aquifer aquifer() {
        return folder.aquifer();
    }

    /** {@return the solutes that a concentration is given for} */
    public List<Solute> solutes() {
        return solutes;
    }

    /**
     * {@return the units of results}
     *
     * @param rate the unit of mass rates; empty for the mass's over the set's time unit
     * @param mass the unit of masses; empty for kilograms
     */
    public MassUnits units(Optional<Measure> rate, Optional<Measure> mass) {
        return MassUnits.of(aquifer().lengthUnit(), aquifer().timeUnit(), rate.orElse(null), mass.orElse(null), null);
    }

    /**
     * Balances all solutes in one prism and one interval. Quick for a prism that was asked about before and has moved a
     * little.
     *
     * @param prism the prism; what lies beyond the grid is cut off
     * @param interval the interval, from 0
     * @param choice how
     * @param progress told how far the work is
     * @return the budgets
     * @throws org.seepledger.fault.DataFault if the prism is no polygon or lies off the grid, or the data are wrong
     * @throws org.seepledger.progress.Cancelled if the work was stopped
     */
    public IntervalPlume interval(Prism prism, int interval, Choice choice, Progress progress) {
        return gate.ask(progress, until -> {
            List<String> notes = new ArrayList<>();
            Prism admitted = readers.apply(notes).admitted(prism);
            List<Plume> plumes = SoluteBalance.of(
                    aquifer(), kept, Span.only(interval), solutes, List.of(admitted), options(choice, 1), until);
            return new IntervalPlume(prism, area(admitted), interval, plumes, notes);
        });
    }

    private static SoluteBalance.Options options(Choice choice, int threads) {
        return new SoluteBalance.Options(WellRule.POINT, choice.dispersion(), choice.above(), threads);
    }

    private double area(Prism prism) {
        return PrismCut.of(prism, aquifer().grid()).area();
    }

    /**
     * Traces a row of a solute's budget of a prism to the stored concentrations that it rests on.
     *
     * @param prism the prism; what lies beyond the grid is cut off
     * @param solute the solute's name
     * @param row the row, as {@code PRISM/PERIOD/GROUP/ITEM/LAYER}
     * @param periods the periods that one of is named
     * @param choice how solutes are balanced
     * @param units the units of results
     * @param most how many values are kept, those that contribute the most
     * @param progress told how far the work is
     * @return the number and its values
     * @throws org.seepledger.fault.UsageFault if there is no such row, or it has no weights
     * @throws org.seepledger.fault.DataFault if the data are wrong
     * @throws org.seepledger.progress.Cancelled if the work was stopped
     */
    public TracedNumber trace(
            Prism prism,
            String solute,
            String row,
            List<Period> periods,
            Choice choice,
            MassUnits units,
            int most,
            Progress progress) {
        return gate.ask(progress, until -> {
            Prism admitted = readers.apply(new ArrayList<>()).admitted(prism);
            SoluteRow named = SoluteRow.of(
                    new SoluteRow.Budget(aquifer(), solutes, solute, options(choice, Workbench.threads()), units),
                    row,
                    List.of(admitted),
                    periods,
                    until);
            LargestLines lines = new LargestLines(most);
            Trace.Sum sum = named.trace(lines, until);
            return new TracedNumber(
                    row,
                    named.period(),
                    named.net(),
                    TracedNumber.Units.of(units),
                    sum.value(),
                    sum.lines(),
                    lines.lines());
        });
    }

    /**
     * Balances all solutes in prisms over the whole record.
     *
     * @param prisms at least one prism; what lies beyond the grid is cut off
     * @param choice how
     * @param progress told how far the work is
     * @return the budgets
     * @throws org.seepledger.fault.DataFault if a prism is no polygon or lies off the grid, or the data are wrong
     * @throws org.seepledger.progress.Cancelled if the work was stopped
     */
    public RecordPlume record(List<Prism> prisms, Choice choice, Progress progress) {
        return gate.ask(progress, until -> {
            List<String> notes = new ArrayList<>();
            PrismsReader reader = readers.apply(notes);
            List<Prism> admitted = prisms.stream().map(reader::admitted).toList();
            List<Plume> plumes =
                    SoluteBalance.of(aquifer(), solutes, admitted, options(choice, Workbench.threads()), until);
            PlumeWarnings words = new PlumeWarnings(aquifer(), choice.dispersion());
            notes.addAll(words.remarks(solutes, plumes));
            return new RecordPlume(
                    prisms, admitted.stream().map(this::area).toList(), plumes, words.warnings(plumes), notes);
        });
    }

    /**
     * Works out what crosses transects.
     *
     * @param transects at least one line within the grid
     * @param interval the only interval asked for, from 0; empty for all
     * @param progress told how far the work is
     * @return by transect, and for each by solute
     * @throws org.seepledger.fault.DataFault if the data are wrong
     * @throws org.seepledger.progress.Cancelled if the work was stopped
     */
    public List<Crossing> crossings(List<Transect> transects, OptionalInt interval, Progress progress) {
        Span span = interval.isPresent()
                ? Span.only(interval.getAsInt())
                : Span.all(aquifer().times());
        Function<Window, KnownCells> known = interval.isPresent() ? kept : window -> aquifer();
        return gate.ask(progress, until -> TransectFlows.of(aquifer(), known, span, solutes, transects, until));
    }

    /**
     * {@return the outline of the cells of a layer with more than a concentration at an interval's end, non-detects counted as
     * half their limit: the cells that a budget counts in}
     *
     * @param solute the solute
     * @param layer the layer, from 0
     * @param interval the interval, from 0
     * @param above the concentration, kg/length³
     * @param progress told how far the work is
     * @throws org.seepledger.fault.DataFault if the data are wrong
     * @throws org.seepledger.progress.Cancelled if the work was stopped
     */
    public ThresholdOutline outline(Solute solute, int layer, int interval, double above, Progress progress) {
        return gate.ask(progress, until -> {
            until.begin("outlining a plume", 1);
            Grid grid = aquifer().grid();
            double[] values = wetConcentrations(solute, layer, interval);
            until.step();
            int columns = grid.columns();
            Drape drape = Drape.of(
                    grid,
                    grid.window(),
                    Math.max(grid.rows(), columns),
                    row -> Arrays.copyOfRange(values, row * columns, (row + 1) * columns));
            return ThresholdOutline.of(drape, above);
        });
    }

    /** In kg/length³; none where a cell holds no water at the interval's end. */
    private double[] wetConcentrations(Solute solute, int layer, int interval) {
        Window all = aquifer().grid().window();
        CellGeometry geometry = aquifer().geometry(all);
        Saturation saturation = aquifer().saturation(interval, geometry);
        Concentration.AtInstant found = solute.concentration().orElseThrow().at(interval + 1, layer, all);
        double[] values = found.values();
        for (int cell = 0; cell < values.length; cell++) {
            boolean wet = saturation.thickness(layer * all.size() + cell) > 0;
            double limit = found.limits()[cell];
            double value = Double.isNaN(limit) ? values[cell] : NonDetects.HALF.of(limit);
            values[cell] = wet ? value : Double.NaN;
        }
        return values;
    }

    /**
     * {@return the prism that holds the whole grid}
     *
     * @param name what to call it
     */
    public Prism everything(String name) {
        Grid grid = aquifer().grid();
        double right = grid.x().edge(grid.columns());
        double top = grid.y().edge(grid.rows());
        double[][] corners = {{0, 0}, {right, 0}, {right, top}, {0, top}};
        List<Side> sides = new ArrayList<>();
        for (double[] corner : corners) {
            String side = "side " + (sides.size() + 1);
            sides.add(new Side(side, side, grid.mapX(corner[0], corner[1]), grid.mapY(corner[0], corner[1])));
        }
        int layers = aquifer().layers().size();
        return new Prism(name, List.of(new Ring(1, 0, sides)), new VerticalRange.Layers(0, layers - 1));
    }

    /**
     * {@return the measured panels of a file, by transect and solute}
     *
     * @param file a CSV
     * @throws org.seepledger.fault.DataFault if anything in it is wrong
     */
    public List<MeasuredPanels> panels(Path file) {
        return gate.ask(
                Progress.NONE,
                until -> MeasuredPanels.read(
                        file, file.toString(), aquifer().lengthUnit(), aquifer().timeUnit(), warning -> {}));
    }
}
