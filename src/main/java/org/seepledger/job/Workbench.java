package org.seepledger.job;

import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import org.seepledger.aquifer.Aquifer;
import org.seepledger.aquifer.KeptCells;
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
import org.seepledger.io.prisms.PrismsReader;
import org.seepledger.io.result.Provenance;
import org.seepledger.io.result.ResultUnits;
import org.seepledger.ledger.Period;
import org.seepledger.ledger.PeriodBudget;
import org.seepledger.prism.Prism;
import org.seepledger.progress.Cancelled;
import org.seepledger.progress.Progress;
import org.seepledger.unit.Measure;

/**
 * An aquifer folder kept open, for many questions about it: budgets of prisms that change, and, by its parts, what maps and
 * sections show, solutes, and the files of what is drawn.
 *
 * <p>Questions may come from any thread and many at once. An answer depends on the question alone, not on what was asked
 * before; budgets are those that {@link BalanceJob} makes of the same prisms, digit for digit. A question can be stopped
 * through its progress; closing stops all.
 */
public final class Workbench implements AutoCloseable {

    private static final long MOST_KEPT_BYTES = 512L << 20;

    private final AquiferFolder folder;
    private final DrawingBench drawings;
    private final KeptCells kept;
    private final Gate gate = new Gate();
    private final SoluteBench solutes;
    private final ViewBench views;
    private final ReviewDesk reviews;

    private Workbench(AquiferFolder folder) {
        this.folder = folder;
        this.drawings = new DrawingBench(folder, gate);
        long memory = Runtime.getRuntime().maxMemory() / 4;
        this.kept = new KeptCells(folder.aquifer(), Math.min(MOST_KEPT_BYTES, memory));
        this.solutes = new SoluteBench(folder, kept::around, gate, notes -> drawings.reader(notes::add));
        this.views = new ViewBench(this, gate);
        this.reviews = new ReviewDesk(
                folder.aquifer(), gate, prism -> drawings.reader(note -> {}).admitted(prism), threads());
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

    /** The set's folder, for what stands beside its description. */
    DataFolder besides() {
        return DataFolder.holding(folder.inputs().get(AquiferReader.FILE), AquiferReader.FILE);
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
        List<Prism> admitted = List.of(drawings.reader(notes::add).admitted(prism));
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
            List<Prism> admitted = List.of(drawings.reader(note -> {}).admitted(prism));
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
            PrismsReader reader = drawings.reader(notes::add);
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

    /** {@return the files that prisms and transects are kept in} */
    public DrawingBench drawings() {
        return drawings;
    }

    /** {@return what maps and sections show} */
    public ViewBench views() {
        return views;
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
            List<Prism> admitted = List.of(drawings.reader(note -> {}).admitted(prism));
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

    static int threads() {
        return Math.max(1, Runtime.getRuntime().availableProcessors() - 1);
    }

    /** Stops all questions and closes the set's files. */
    @Override
    public void close() {
        gate.shut(() -> {
            drawings.close();
            folder.close();
        });
    }
}
