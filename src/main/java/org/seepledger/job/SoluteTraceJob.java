package org.seepledger.job;

import java.io.IOException;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import org.seepledger.aquifer.Aquifer;
import org.seepledger.balance.Trace;
import org.seepledger.fault.ProgramFault;
import org.seepledger.fault.UsageFault;
import org.seepledger.io.result.MassUnits;
import org.seepledger.io.result.TraceCsv;
import org.seepledger.ledger.SoluteCautions;
import org.seepledger.plume.SoluteBalance;
import org.seepledger.progress.Progress;

/** Where a number of a solute's budget comes from: the stored concentrations that it rests on, each with its weight. */
public final class SoluteTraceJob {

    private final TraceRequest asked;
    private final Subject subject;
    private final Progress progress;
    private final MassUnits units;
    private final String solute;
    private final SoluteBalance.Options options;

    private SoluteTraceJob(SoluteTraceRequest request, Subject subject, Progress progress) {
        this.asked = request.row();
        this.subject = subject;
        this.progress = progress;
        this.units = subject.massUnits(asked.rateUnit(), Optional.empty(), Optional.empty());
        this.solute = request.solute();
        this.options =
                new SoluteBalance.Options(asked.wells(), request.dispersion(), OptionalDouble.empty(), asked.threads());
    }

    /**
     * Does the job.
     *
     * @param request what is asked for
     * @param progress told how far the work is
     * @return the summary, lines of text; the file is in place
     * @throws UsageFault if the request cannot be met, there is no such solute or row, or the row has no weights
     * @throws org.seepledger.fault.DataFault if the data are wrong; nothing is written then
     * @throws ProgramFault if the trace does not add up to the row; nothing is written then
     * @throws org.seepledger.progress.Cancelled if the work was stopped; nothing is written then
     * @throws IOException if a file cannot be read or written
     */
    public static String run(SoluteTraceRequest request, Progress progress) throws IOException {
        TraceRequest row = request.row();
        try (OutputFile out = OutputFile.at(row.out(), row.overwrite(), "# " + TraceCsv.TITLE);
                Subject subject = Subject.open(row.aquifer(), row.prisms(), row.clip())) {
            return new SoluteTraceJob(request, subject, progress).run(out);
        }
    }

    private String run(OutputFile out) throws IOException {
        Aquifer aquifer = subject.aquifer();
        SoluteRow row = SoluteRow.of(
                new SoluteRow.Budget(aquifer, SoluteBench.known(subject.folder().solutes()), solute, options, units),
                asked.row(),
                subject.prisms(),
                subject.periods(asked.every(), asked.periods(), asked.waterYearStart()),
                progress);
        String title = TraceCsv.TITLE + "\"" + row.shortName() + "\" of " + solute + " in \"" + aquifer.name() + "\"";
        Trace.Sum sum;
        try (TraceCsv table = TraceCsv.open(out.path(), subject.statement(title, progress), notes(row.net()))) {
            sum = row.trace(table::line, progress);
        }
        out.publish();
        return "\"" + row.shortName() + "\" of " + solute + ": net rate " + row.net() + " " + units.rate() + "\n"
                + "Value × weight over " + sum.lines() + " lines: " + sum.value() + " " + units.rate() + "\n"
                + "Written to " + asked.out() + "\n";
    }

    private List<String> notes(double net) {
        List<String> notes = new ArrayList<>(List.of(
                "net_rate: " + net + " " + units.rate() + "; value x weight over all lines adds up to it, within "
                        + RowNumber.AGREES + " of the row's gross flow. Lines of the same place add.",
                "value: a concentration as it stands in the file, before scale, offset and unit. weight: what net_rate"
                        + " grows by for each unit of it, while the water's flows, thicknesses, porosity, sorption and decay"
                        + " stand as they are. A non-detect counts half its limit, and has half the weight."));
        SoluteCautions.sentences().forEach(sentence -> notes.add("Caution: " + sentence));
        return notes;
    }
}
