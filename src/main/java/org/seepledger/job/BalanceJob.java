package org.seepledger.job;

import java.io.IOException;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import java.util.function.BiConsumer;
import org.seepledger.aquifer.Aquifer;
import org.seepledger.aquifer.Times;
import org.seepledger.balance.Balance;
import org.seepledger.balance.Periods;
import org.seepledger.balance.WaterBalance;
import org.seepledger.fault.UsageFault;
import org.seepledger.io.Unreadable;
import org.seepledger.io.raster.GeoTiffWriter;
import org.seepledger.io.result.BudgetCsv;
import org.seepledger.io.result.ExchangeCsv;
import org.seepledger.io.result.FacesGeoJson;
import org.seepledger.io.result.PrismBudget;
import org.seepledger.io.result.ResultUnits;
import org.seepledger.io.result.Statement;
import org.seepledger.ledger.Ledger;
import org.seepledger.ledger.Period;
import org.seepledger.ledger.PeriodBudget;
import org.seepledger.prism.Prism;
import org.seepledger.progress.Progress;
import org.seepledger.report.BalanceSummary;
import org.seepledger.report.page.PrismPictures;

/** The water budget of prisms: reads, balances, writes the result files. */
public final class BalanceJob {

    private final BalanceRequest request;
    private final Subject subject;
    private final Progress progress;
    private final Stopwatch stopwatch;
    private final ResultUnits units;
    private final List<Period> periods;
    private final ReportFile report;

    private BalanceJob(BalanceRequest request, Subject subject, Stopwatch stopwatch, Progress progress) {
        this.request = request;
        this.subject = subject;
        this.stopwatch = stopwatch;
        this.progress = progress;
        this.units = subject.units(request.rateUnit(), request.volumeUnit());
        this.periods = subject.periods(request.every(), request.periods(), request.waterYearStart());
        this.report = new ReportFile(request.report(), periods);
    }

    /**
     * Does the job.
     *
     * @param request what is asked for
     * @param progress told how far the work is
     * @return what it came to; the files are in place
     * @throws UsageFault if the request cannot be met
     * @throws org.seepledger.fault.DataFault if the data are wrong; nothing is written then
     * @throws org.seepledger.fault.ProgramFault if an identity that must hold does not; nothing is written then
     * @throws org.seepledger.progress.Cancelled if the work was stopped; nothing is written then
     */
    public static BalanceOutcome run(BalanceRequest request, Progress progress) {
        return run(request, (prisms, pictures) -> {}, progress);
    }

    /**
     * Does the job and lets the report's pictures be used otherwise.
     *
     * @param request what is asked for
     * @param also takes the prisms and the pictures of each
     * @param progress told how far the work is
     */
    static BalanceOutcome run(
            BalanceRequest request, BiConsumer<List<Prism>, List<PrismPictures>> also, Progress progress) {
        Stopwatch stopwatch = new Stopwatch();
        try (OutputFolder out = OutputFolder.at(request.out(), "balance", request.overwrite());
                Subject subject = Subject.open(request.aquifer(), request.prisms(), request.clip())) {
            return new BalanceJob(request, subject, stopwatch, progress).run(out, also);
        }
    }

    private BalanceOutcome run(OutputFolder out, BiConsumer<List<Prism>, List<PrismPictures>> also) {
        stopwatch.lap("reading");
        Aquifer aquifer = subject.aquifer();
        Balance balance = WaterBalance.of(aquifer, subject.prisms(), request.wells(), request.threads(), progress);
        stopwatch.lap("balancing");
        Period whole = new Periods(aquifer.times()).record();
        List<PeriodBudget> records =
                balance.ledgers().stream().map(ledger -> ledger.budget(whole)).toList();
        RunWarnings words = new RunWarnings(aquifer, balance.notes());
        subject.warnings().addAll(words.warnings(records));
        subject.notes().addAll(words.remarks(request.wells()));
        List<PrismBudget> budgets = balance.ledgers().stream().map(this::budget).toList();
        also.accept(subject.prisms(), write(out, balance, budgets, records));
        List<String> files = out.written();
        out.publish();
        String summary = BalanceSummary.of(aquifer, balance, budgets, units, subject.warnings(), subject.notes());
        return new BalanceOutcome(
                summary, WorstClosure.of(budgets.stream().flatMap(budget -> budget.periods().stream())), files);
    }

    /** Writes all files; gives the report's pictures. */
    private List<PrismPictures> write(
            OutputFolder out, Balance balance, List<PrismBudget> budgets, List<PeriodBudget> records) {
        Times times = subject.aquifer().times();
        Statement statement =
                subject.statement("Water budget of \"" + subject.aquifer().name() + "\"", progress);
        try {
            BudgetCsv.write(out.file("budget.csv"), statement, budgets, times, units);
            ExchangeCsv.write(out.file("exchange.csv"), statement, balance.exchange(), periods, times, units);
            FacesGeoJson.write(out.file("faces.geojson"), subject.crs(), subject.prisms(), records, units);
            writeImbalance(balance, out);
            List<PrismPictures> pictures =
                    report.write(out, subject, balance, budgets, units, statement, optionsOfResult());
            RunRecord.write(
                    out, "balance", options(), statement, subject.notes(), RunRecord.checks(balance), stopwatch);
            return pictures;
        } catch (IOException e) {
            throw new UsageFault("The results cannot be written beside " + request.out() + " (" + Unreadable.reason(e)
                    + "). Make room or name another folder.");
        }
    }

    private PrismBudget budget(Ledger ledger) {
        return new PrismBudget(
                ledger.prism(), periods.stream().map(ledger::budget).toList());
    }

    private void writeImbalance(Balance balance, OutputFolder out) throws IOException {
        for (int layer = 0; layer < balance.imbalance().layers(); layer++) {
            int index = layer;
            GeoTiffWriter.write(
                    out.file("imbalance_l" + (layer + 1) + ".tif"),
                    subject.aquifer().grid(),
                    balance.imbalance().window(),
                    subject.crs(),
                    row -> balance.imbalance().row(index, row));
        }
    }

    private Map<String, String> options() {
        Map<String, String> options = optionsOfResult();
        options.putAll(report.options());
        options.put("threads", String.valueOf(request.threads()));
        return options;
    }

    /** The options that results depend on. */
    private Map<String, String> optionsOfResult() {
        Map<String, String> options = RunRecord.options(request.aquifer(), request.prisms());
        RunRecord.addPeriods(options, request.every(), request.periods(), request.waterYearStart());
        request.rateUnit().ifPresent(unit -> options.put("rate-unit", unit.toString()));
        request.volumeUnit().ifPresent(unit -> options.put("volume-unit", unit.toString()));
        options.put("wells", request.wells().name().toLowerCase(Locale.ROOT));
        options.put("clip", String.valueOf(request.clip()));
        return options;
    }
}
