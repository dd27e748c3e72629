package org.seepledger.job;

import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.function.Consumer;
import org.seepledger.aquifer.Aquifer;
import org.seepledger.aquifer.GriddedValues;
import org.seepledger.aquifer.KeptCells;
import org.seepledger.aquifer.Window;
import org.seepledger.balance.Balance;
import org.seepledger.balance.Periods;
import org.seepledger.balance.Span;
import org.seepledger.balance.Trace;
import org.seepledger.balance.WaterBalance;
import org.seepledger.balance.WellRule;
import org.seepledger.balance.Whereabouts;
import org.seepledger.fault.UsageFault;
import org.seepledger.io.DataFolder;
import org.seepledger.io.aquifer.AquiferFolder;
import org.seepledger.io.aquifer.AquiferReader;
import org.seepledger.io.crs.PlanCrs;
import org.seepledger.io.prisms.DrawingReader;
import org.seepledger.io.prisms.DrawingWriter;
import org.seepledger.io.prisms.PrismsReader;
import org.seepledger.io.prisms.SurfaceRasters;
import org.seepledger.io.result.Provenance;
import org.seepledger.io.result.ResultUnits;
import org.seepledger.ledger.Period;
import org.seepledger.ledger.PeriodBudget;
import org.seepledger.picture.Body;
import org.seepledger.picture.NearbyWell;
import org.seepledger.picture.Picture;
import org.seepledger.picture.Profile;
import org.seepledger.picture.Section;
import org.seepledger.picture.SectionLine;
import org.seepledger.prism.Prism;
import org.seepledger.progress.Cancelled;
import org.seepledger.progress.Progress;
import org.seepledger.sketch.Drawing;
import org.seepledger.sketch.Limit;
import org.seepledger.unit.Measure;

/**
 * An aquifer folder kept open, for many questions about it: budgets of prisms that change, and what a map shows.
 *
 * <p>Questions may come from any thread and many at once. An answer depends on the question alone, not on what was asked
 * before; budgets are those that {@link BalanceJob} makes of the same prisms, digit for digit. A question can be stopped
 * through its progress; closing stops all.
 */
public final class Workbench implements AutoCloseable {

    private static final long MOST_KEPT_BYTES = 512L << 20;

    private final AquiferFolder folder;
    private final SurfaceRasters surfaces;
    private final KeptCells kept;
    private final Gate gate = new Gate();
    private final SoluteBench solutes;
    private final ReviewDesk reviews;

    private Workbench(AquiferFolder folder) {
        this.folder = folder;
        this.surfaces = new SurfaceRasters(folder.aquifer().grid(), note -> {});
        long memory = Runtime.getRuntime().maxMemory() / 4;
        this.kept = new KeptCells(folder.aquifer(), Math.min(MOST_KEPT_BYTES, memory));
        this.solutes = new SoluteBench(folder, kept::around, gate, notes -> reader(notes::add));
        this.reviews = new ReviewDesk(
                folder.aquifer(), gate, prism -> reader(note -> {}).admitted(prism), threads());
    }

    /**
     * Opens an aquifer folder.
     *
     * @param folder the folder
     * @return it, to be closed
     * @throws org.seepledger.fault.DataFault if something is wrong with it
     */
    public static Workbench open(Path folder) {
        return new Workbench(AquiferReader.open(folder));
    }

    /**
     * {@return the aquifer}
     */
    public Aquifer aquifer() {
        return folder.aquifer();
    }

    /**
     * {@return its plan coordinate system}
     */
    public PlanCrs crs() {
        return folder.crs();
    }

    /**
     * {@return what the reader of any result must know}
     */
    public List<String> warnings() {
        return folder.warnings();
    }

    /**
     * {@return lesser remarks}
     */
    public List<String> notes() {
        return folder.notes();
    }

    /**
     * {@return what the set states of where its terms come from: of flow, of storage if there is any, then of each source}
     */
    public List<Provenance> origins() {
        return folder.origins();
    }

    /** {@return whether concentrations of a solute are given, so that its budget can be struck} */
    public boolean hasSolutes() {
        return folder.solutes().stream()
                .anyMatch(solute -> solute.concentration().isPresent());
    }

    /**
     * {@return the periods of its record}
     *
     * @param every how often a budget is struck
     * @param waterYearStart the month in which a water year begins, 1 to 12
     * @throws org.seepledger.fault.DataFault if calendar periods are asked for and the set has no start date
     */
    public List<Period> periods(Periods.Every every, int waterYearStart) {
        return new Periods(aquifer().times()).every(every, waterYearStart);
    }

    /**
     * {@return the units of results}
     *
     * @param rate the unit of rates; empty for the set's own
     * @param volume the unit of volumes; empty for the set's own
     * @throws UsageFault if one of them does not measure that
     */
    public ResultUnits units(Optional<Measure> rate, Optional<Measure> volume) {
        return Subject.units(aquifer(), rate, volume);
    }

    /**
     * {@return the prisms of a file as they stand there, even beyond the grid; the rasters that they name stay open as long as the workbench}
     *
     * @param file a GeoJSON file
     * @throws org.seepledger.fault.DataFault if anything in it is wrong
     */
    public PrismsFile read(Path file) {
        return gate.ask(Progress.NONE, progress -> {
            List<String> notes = new ArrayList<>();
            synchronized (surfaces) {
                return new PrismsFile(reader(notes::add).asDrawn(file, file.toString()), notes);
            }
        });
    }

    /**
     * {@return the drawing that a file holds, to go on with it, and the surfaces that it names; their rasters stay open as
     * long as the workbench}
     *
     * @param file a GeoJSON file
     * @throws org.seepledger.fault.DataFault if it is damaged, or a surface cannot be read
     */
    public DrawingFile drawing(Path file) {
        return gate.ask(Progress.NONE, progress -> {
            List<String> notes = new ArrayList<>();
            String shown = file.toString();
            Drawing drawing = new DrawingReader(crs(), aquifer().layers().size(), notes::add).read(file, shown);
            synchronized (surfaces) {
                return DrawingFile.of(drawing, DataFolder.holding(file, shown), surfaces, notes);
            }
        });
    }

    /**
     * {@return the elevations of a surface raster, which prisms may then name as their top or bottom; it stays open as long as
     * the workbench}
     *
     * @param file the file that the prisms are kept in, from whose folder the surface is named
     * @param surface the surface
     * @throws org.seepledger.fault.DataFault if it is not there, leads out of the folder, or does not match the grid
     */
    public GriddedValues surface(Path file, Limit.Surface surface) {
        return gate.ask(Progress.NONE, progress -> {
            DataFolder folder = DataFolder.holding(file, file.toString());
            synchronized (surfaces) {
                return surfaces.read(folder.resolve(surface.path(), "a top or bottom"), surface.path());
            }
        });
    }

    /**
     * {@return a picture that lies under the map}
     *
     * @param file a GeoTIFF in the aquifer's coordinate system
     * @param progress told how far the reading is
     * @throws org.seepledger.fault.DataFault if it cannot be read, or lies in another system
     */
    public GroundPicture ground(Path file, Progress progress) {
        return gate.ask(progress, until -> GroundPicture.read(file, crs(), until));
    }

    /**
     * Writes a drawing; the file appears whole or not at all.
     *
     * @param file the file, which is replaced if it exists
     * @param drawing the drawing
     * @throws UsageFault if it cannot be written
     */
    public void write(Path file, Drawing drawing) {
        DrawingWriter.write(file, crs().name(), drawing);
    }

    /**
     * Makes sure that a file holds a drawing and nothing else.
     *
     * @param file the file
     * @param drawing the drawing
     * @throws UsageFault if it does not
     */
    public void mustHold(Path file, Drawing drawing) {
        if (!drawing(file).drawing().equals(drawing)) {
            throw new UsageFault("The file " + file + " holds other prisms than are drawn: it was changed meanwhile."
                    + " Save the drawing, then go on.");
        }
    }

    /** The set's folder, for what stands beside its description. */
    DataFolder besides() {
        return DataFolder.holding(folder.inputs().get(AquiferReader.FILE), AquiferReader.FILE);
    }

    private PrismsReader reader(Consumer<String> notes) {
        return new PrismsReader(folder.crs(), aquifer().grid(), aquifer().layers(), true, surfaces, notes, notes);
    }

    /**
     * Strikes the budgets of prisms in one interval, each prism by itself. Quick for a prism that was asked about before and
     * has moved a little.
     *
     * @param prisms the prisms; what lies beyond the grid is cut off
     * @param interval the interval, from 0
     * @param progress told how far the work is
     * @return their budgets, in their order
     * @throws org.seepledger.fault.DataFault if a prism is no polygon or lies off the grid, or the data are wrong
     * @throws Cancelled if the work was stopped
     */
    public List<IntervalBudget> budgets(List<Prism> prisms, int interval, Progress progress) {
        return gate.ask(progress, until -> {
            List<IntervalBudget> budgets = new ArrayList<>();
            for (Prism prism : prisms) {
                budgets.add(budget(prism, interval, until));
            }
            return budgets;
        });
    }

    private IntervalBudget budget(Prism prism, int interval, Progress progress) {
        List<String> notes = new ArrayList<>();
        List<Prism> admitted = List.of(reader(notes::add).admitted(prism));
        Balance balance =
                WaterBalance.of(aquifer(), kept::around, Span.only(interval), admitted, WellRule.POINT, 1, progress);
        Period period = periods(Periods.Every.INTERVAL, 1).get(interval);
        PeriodBudget budget = balance.ledgers().get(0).budget(period);
        double area = balance.cuts().get(0).area();
        return new IntervalBudget(
                prism, area, interval, budget, balance.whereabouts().get(0), notes);
    }

    /**
     * Looks where a prism does not close in a period.
     *
     * @param prism the prism; what lies beyond the grid is cut off
     * @param period the period
     * @param progress told how far the work is
     * @return the cells furthest from balance, mean over all intervals that the period takes part of
     * @throws org.seepledger.fault.DataFault if the prism is no polygon or lies off the grid, or the data are wrong
     * @throws Cancelled if the work was stopped
     */
    public Whereabouts whereabouts(Prism prism, Period period, Progress progress) {
        return gate.ask(progress, until -> {
            List<Period.Part> parts = period.parts();
            Span span = new Span(
                    parts.get(0).interval(), parts.get(parts.size() - 1).interval() + 1);
            List<Prism> admitted = List.of(reader(note -> {}).admitted(prism));
            return WaterBalance.of(aquifer(), kept::around, span, admitted, WellRule.POINT, 1, until)
                    .whereabouts()
                    .get(0);
        });
    }

    /**
     * Balances prisms over the whole record, with what they give to each other.
     *
     * @param prisms at least one prism; what lies beyond the grid is cut off
     * @param progress told how far the work is
     * @return the balance
     * @throws org.seepledger.fault.DataFault if a prism is no polygon or lies off the grid, or the data are wrong
     * @throws Cancelled if the work was stopped
     */
    public RecordBudget record(List<Prism> prisms, Progress progress) {
        return gate.ask(progress, until -> {
            List<String> notes = new ArrayList<>();
            PrismsReader reader = reader(notes::add);
            List<Prism> admitted = prisms.stream().map(reader::admitted).toList();
            Balance balance = WaterBalance.of(aquifer(), admitted, WellRule.POINT, threads(), until);
            Period whole = new Periods(aquifer().times()).record();
            List<PeriodBudget> records = balance.ledgers().stream()
                    .map(ledger -> ledger.budget(whole))
                    .toList();
            RunWarnings words = new RunWarnings(aquifer(), balance.notes());
            notes.addAll(words.remarks(WellRule.POINT));
            return new RecordBudget(prisms, balance, words.warnings(records), notes);
        });
    }

    /** {@return what answers questions about solutes} */
    public SoluteBench solutes() {
        return solutes;
    }

    /** {@return what reviews submitted budgets without writing} */
    public ReviewDesk reviews() {
        return reviews;
    }

    /**
     * Traces a row of a prism's budget to the stored values that it rests on.
     *
     * @param prism the prism; what lies beyond the grid is cut off
     * @param row the row, as {@code PRISM/PERIOD/GROUP/ITEM/LAYER}; the layer of a total or of an item over all layers is {@code *}
     * @param periods the periods that one of is named
     * @param units the units of results
     * @param most how many values are kept, those that contribute the most
     * @param progress told how far the work is
     * @return the number and its values
     * @throws UsageFault if there is no such row, it has no number, or it is no sum
     * @throws org.seepledger.fault.DataFault if the data are wrong
     * @throws Cancelled if the work was stopped
     */
    public TracedNumber trace(
            Prism prism, String row, List<Period> periods, ResultUnits units, int most, Progress progress) {
        return gate.ask(progress, until -> {
            List<Prism> admitted = List.of(reader(note -> {}).admitted(prism));
            BudgetRow named = BudgetRow.of(row, aquifer(), admitted, periods);
            Balance balance = WaterBalance.of(aquifer(), admitted, WellRule.POINT, threads(), until);
            RowNumber number = RowNumber.of(named, balance.ledgers().get(0), units);
            LargestLines lines = new LargestLines(most);
            Trace.Sum sum = Trace.of(
                    aquifer(),
                    named.prism(),
                    WellRule.POINT,
                    number.traced(),
                    named.period(),
                    units.rateFactor(),
                    lines,
                    until);
            number.mustBe(sum);
            return new TracedNumber(
                    row,
                    named.period(),
                    number.net(),
                    TracedNumber.Units.of(units),
                    sum.value(),
                    sum.lines(),
                    lines.lines());
        });
    }

    /**
     * {@return what a map can show of the set}
     *
     * @throws Cancelled if the workbench was closed
     */
    public List<MapQuantity> quantities() {
        gate.mustBeOpen();
        return new LayerReading(aquifer(), solutes.solutes(), Progress.NONE).quantities();
    }

    /**
     * Reads what a map shows of one layer.
     *
     * @param quantity one of {@link #quantities()}
     * @param layer the layer, from 0
     * @param interval the interval, from 0
     * @param window the cells
     * @param stride how many cells make one value along each side, at least 1
     * @param progress told how far the work is
     * @return the values
     * @throws org.seepledger.fault.DataFault if the data are wrong
     * @throws Cancelled if the work was stopped
     */
    public GridLayer layer(
            MapQuantity quantity, int layer, int interval, Window window, int stride, Progress progress) {
        return gate.ask(
                progress,
                until -> new LayerReading(aquifer(), solutes.solutes(), until)
                        .layer(quantity, layer, interval, window, stride));
    }

    /**
     * {@return a map on paper of what a view shows}
     *
     * @param asked what it is to show
     * @param progress told how far the work is
     * @throws org.seepledger.fault.DataFault if the data are wrong, or the selected prism has no budget
     * @throws Cancelled if the work was stopped
     */
    public Picture map(MapAsked asked, Progress progress) {
        return new MapOnPaper(this, asked, progress).drawn();
    }

    /**
     * Reads horizontal flux for arrows on a map.
     *
     * @param layer the layer, from 0
     * @param interval the interval, from 0
     * @param window the cells
     * @param stride how many cells make one arrow along each side, at least 1
     * @param progress told how far the work is
     * @return the field
     * @throws org.seepledger.fault.DataFault if the data are wrong
     * @throws Cancelled if the work was stopped
     */
    public FluxField flux(int layer, int interval, Window window, int stride, Progress progress) {
        return gate.ask(
                progress,
                until -> new LayerReading(aquifer(), solutes.solutes(), until).flux(layer, interval, window, stride));
    }

    /**
     * {@return the wells, in the order in which the set names them}
     *
     * @param interval the interval that rates are for, from 0
     */
    public List<WellPlace> wells(int interval) {
        return WellPlace.of(aquifer(), interval);
    }

    /**
     * Cuts the aquifer along a line.
     *
     * @param line the line
     * @param quantity one of {@link #quantities()}, to be shown as colour; empty for none
     * @param interval the interval, from 0, whose begin and end water levels are those of
     * @param progress told how far the reading is
     * @return what stands along it; nothing where it lies off the grid
     * @throws org.seepledger.fault.DataFault if the data are wrong
     * @throws Cancelled if the work was stopped
     */
    public Profile profile(SectionLine line, Optional<MapQuantity> quantity, int interval, Progress progress) {
        Optional<Profile.LayerValues> values = quantity.map(shown -> (layer, window) ->
                new LayerReading(aquifer(), solutes.solutes(), Progress.NONE).cells(shown, layer, interval, window)[0]);
        return gate.ask(progress, until -> Profile.along(line, aquifer(), interval, interval + 1, values, until));
    }

    /**
     * Puts prisms and wells into a section; quick, so that it follows prisms while they are drawn.
     *
     * @param profile what stands along its line
     * @param prisms the prisms as they are drawn, even beyond the grid
     * @param within how far from the line wells are shown, in length units
     * @param progress told how far the work is
     * @return the section, without colours, and with nothing standing out
     * @throws org.seepledger.fault.DataFault if a prism's surface cannot be read
     * @throws Cancelled if the work was stopped
     */
    public Section section(Profile profile, List<Prism> prisms, double within, Progress progress) {
        return gate.ask(progress, until -> {
            List<Body> bodies = new ArrayList<>();
            for (Prism prism : prisms) {
                until.step();
                bodies.add(Body.of(prism, profile));
            }
            boolean moves = aquifer().head().filter(GriddedValues::changes).isPresent();
            return new Section(
                    profile,
                    aquifer().layers(),
                    aquifer().lengthUnit().toString(),
                    moves ? Optional.of("interval") : Optional.empty(),
                    bodies,
                    NearbyWell.of(aquifer(), profile, within),
                    within,
                    Optional.empty(),
                    Section.Light.NONE);
        });
    }

    static int threads() {
        return Math.max(1, Runtime.getRuntime().availableProcessors() - 1);
    }

    /** Stops all questions and closes the set's files. */
    @Override
    public void close() {
        gate.shut(() -> {
            surfaces.close();
            folder.close();
        });
    }
}
