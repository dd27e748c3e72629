package org.seepledger.desktop.origin;

import java.io.IOException;
import java.nio.file.Path;
import java.util.List;
import java.util.Optional;
import org.seepledger.balance.Periods;
import org.seepledger.balance.WellRule;
import org.seepledger.desktop.budget.Reading;
import org.seepledger.desktop.command.CommandText;
import org.seepledger.desktop.session.OpenSet;
import org.seepledger.desktop.session.Opening;
import org.seepledger.desktop.session.RowAsked;
import org.seepledger.desktop.words.Words;
import org.seepledger.io.result.MassUnits;
import org.seepledger.io.result.ResultUnits;
import org.seepledger.job.SoluteBench;
import org.seepledger.job.SoluteTraceJob;
import org.seepledger.job.SoluteTraceRequest;
import org.seepledger.job.TraceJob;
import org.seepledger.job.TraceRequest;
import org.seepledger.job.TracedNumber;
import org.seepledger.ledger.Line;
import org.seepledger.ledger.Period;
import org.seepledger.prism.Prism;
import org.seepledger.progress.Progress;
import org.seepledger.unit.Measure;

/**
 * Which number of which prism is asked about, as the ledger read it then.
 *
 * @param set the set
 * @param prism the prism as it was drawn
 * @param row the row
 * @param period the period
 * @param every how long periods are
 * @param waterYearStart the month in which a water year begins
 * @param rateUnit the unit of rates that the command is to be given; empty for the set's own
 * @param units the units of water's results
 * @param solute how the solute is read whose number it is; empty for water
 */
record Question(
        OpenSet set,
        Prism prism,
        RowAsked row,
        Period period,
        Periods.Every every,
        int waterYearStart,
        Optional<Measure> rateUnit,
        ResultUnits units,
        Optional<OfSolute> solute) {

    private static final int OCTOBER = 10;

    /**
     * How a solute is read.
     *
     * @param name its name
     * @param choice how solutes are balanced
     * @param units the units of masses
     */
    record OfSolute(String name, SoluteBench.Choice choice, MassUnits units) {}

    static Question of(
            OpenSet set, Prism prism, RowAsked row, Reading reading, int interval, Optional<OfSolute> solute) {
        return new Question(
                set,
                prism,
                row,
                reading.period(set, interval),
                reading.every().get(),
                reading.waterYearStart().get(),
                solute.isPresent()
                        ? solute.map(read -> read.units().rate())
                        : Optional.of(reading.rateUnit().get())
                                .filter(unit -> !unit.isEmpty())
                                .map(Measure::of),
                reading.inUse(set),
                solute);
    }

    private String rowName() {
        String layer = row.layer() == Line.ALL_LAYERS ? "*" : String.valueOf(row.layer() + 1);
        return prism.name() + "/" + period.name() + "/" + row.group() + "/" + row.item() + "/" + layer;
    }

    /** What the row is called in a line. */
    String itemWords() {
        return row.layer() == Line.ALL_LAYERS
                ? row.item()
                : Words.of(
                        "ledger.in.layer",
                        row.item(),
                        set.aquifer().layers().get(row.layer()).name());
    }

    TracedNumber answer(int most, Progress progress) {
        List<Period> periods = set.workbench().periods(every, waterYearStart);
        if (solute.isEmpty()) {
            return set.workbench().trace(prism, rowName(), periods, units, most, progress);
        }
        OfSolute read = solute.get();
        return set.workbench()
                .solutes()
                .trace(prism, read.name(), rowName(), periods, read.choice(), read.units(), most, progress);
    }

    private Path aquifer() {
        return set.path().toAbsolutePath().normalize();
    }

    /** The file that the command reads the prism from. */
    Path prisms() {
        return aquifer().resolve(Opening.PRISMS);
    }

    CommandText command() {
        return CommandText.of("trace", aquifer())
                .with("--prisms", prisms())
                .with("--solute", solute.map(OfSolute::name))
                .flag("--dispersion", isDispersed())
                .with("--row", rowName())
                .with("--out", "trace.csv")
                .with(
                        "--every",
                        Optional.of(every)
                                .filter(length -> length != Periods.Every.INTERVAL)
                                .map(CommandText::word))
                .with("--water-year-start", Optional.of(waterYearStart).filter(month -> month != OCTOBER))
                .with("--rate-unit", rateUnit)
                .flag("--clip", true);
    }

    private boolean isDispersed() {
        return solute.filter(read -> read.choice().dispersion()).isPresent();
    }

    /** Writes the whole trace, as the command does. */
    void write(Path out, Progress progress) throws IOException {
        if (solute.isEmpty()) {
            TraceJob.run(request(out), progress);
        } else {
            SoluteTraceJob.run(new SoluteTraceRequest(request(out), solute.get().name(), isDispersed()), progress);
        }
    }

    private TraceRequest request(Path out) {
        return new TraceRequest(
                aquifer(),
                prisms(),
                rowName(),
                out,
                every,
                Optional.empty(),
                waterYearStart,
                rateUnit,
                WellRule.POINT,
                true,
                Runtime.getRuntime().availableProcessors(),
                true);
    }
}
