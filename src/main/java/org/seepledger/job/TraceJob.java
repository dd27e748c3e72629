package org.seepledger.job;

import java.io.IOException;
import java.util.List;
import java.util.Optional;
import org.seepledger.aquifer.Aquifer;
import org.seepledger.balance.Trace;
import org.seepledger.balance.WaterBalance;
import org.seepledger.fault.ProgramFault;
import org.seepledger.fault.UsageFault;
import org.seepledger.io.result.ResultUnits;
import org.seepledger.io.result.Statement;
import org.seepledger.io.result.TraceCsv;
import org.seepledger.ledger.Ledger;
import org.seepledger.progress.Progress;

/** Where a number of a budget comes from: the stored values that it rests on, each with its weight. */
public final class TraceJob {

    private final TraceRequest request;
    private final Subject subject;
    private final Progress progress;

    private TraceJob(TraceRequest request, Subject subject, Progress progress) {
        this.request = request;
        this.subject = subject;
        this.progress = progress;
    }

    /**
     * Does the job.
     *
     * @param request what is asked for
     * @param progress told how far the work is
     * @return the summary, lines of text; the file is in place
     * @throws UsageFault if the request cannot be met, there is no such row, or it has no number
     * @throws org.seepledger.fault.DataFault if the data are wrong; nothing is written then
     * @throws ProgramFault if the trace does not add up to the row; nothing is written then
     * @throws org.seepledger.progress.Cancelled if the work was stopped; nothing is written then
     * @throws IOException if a file cannot be read or written
     */
    public static String run(TraceRequest request, Progress progress) throws IOException {
        try (OutputFile out = OutputFile.at(request.out(), request.overwrite(), "# " + TraceCsv.TITLE);
                Subject subject = Subject.open(request.aquifer(), request.prisms(), request.clip())) {
            return new TraceJob(request, subject, progress).run(out);
        }
    }

    private String run(OutputFile out) throws IOException {
        Aquifer aquifer = subject.aquifer();
        ResultUnits units = subject.units(request.rateUnit(), Optional.empty());
        BudgetRow row = BudgetRow.of(
                request.row(),
                aquifer,
                subject.prisms(),
                subject.periods(request.every(), request.periods(), request.waterYearStart()));
        Ledger ledger = WaterBalance.of(aquifer, List.of(row.prism()), request.wells(), request.threads(), progress)
                .ledgers()
                .get(0);
        RowNumber number = RowNumber.of(row, ledger, units);
        String title = TraceCsv.TITLE + "\"" + row.shortName() + "\" in \"" + aquifer.name() + "\"";
        Statement statement = subject.statement(title, progress);
        Trace.Sum sum;
        try (TraceCsv table = TraceCsv.open(out.path(), statement, notes(number, units))) {
            sum = Trace.of(
                    aquifer,
                    row.prism(),
                    request.wells(),
                    number.traced(),
                    row.period(),
                    units.rateFactor(),
                    table::line,
                    progress);
        }
        number.mustBe(sum);
        out.publish();
        return summary(row, number, sum, units);
    }

    private List<String> notes(RowNumber number, ResultUnits units) {
        return List.of(
                "net_rate: " + number.net() + " " + units.rate()
                        + "; value x weight over all lines adds up to it, within " + RowNumber.AGREES
                        + " of the row's gross flow. Lines of the same place add.",
                "value: as it stands in the file, before scale, offset and unit. weight: what net_rate grows by for each"
                        + " unit of it, all else, saturated thickness among it, as it stands. Flow was given as "
                        + subject.aquifer().flow().given() + ".",
                "An offset and a number in aquifer.json are lines of their own. A dry cell's head has weight 0, and its"
                        + " bottom stands in for it.");
    }

    private String summary(BudgetRow row, RowNumber number, Trace.Sum sum, ResultUnits units) {
        return "\"" + row.shortName() + "\": net rate " + number.net() + " " + units.rate() + "\n"
                + "Value × weight over " + sum.lines() + " lines: " + sum.value() + " " + units.rate() + "\n"
                + "Written to " + request.out() + "\n";
    }
}
