package org.seepledger.job;

import java.io.IOException;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import java.util.OptionalDouble;
import java.util.stream.IntStream;
import org.seepledger.aquifer.Aquifer;
import org.seepledger.aquifer.Solute;
import org.seepledger.aquifer.Times;
import org.seepledger.balance.Balance;
import org.seepledger.balance.Periods;
import org.seepledger.balance.WaterBalance;
import org.seepledger.fault.DataFault;
import org.seepledger.fault.UsageFault;
import org.seepledger.io.Unreadable;
import org.seepledger.io.aquifer.AquiferReader;
import org.seepledger.io.prisms.TransectsReader;
import org.seepledger.io.result.MassCsv;
import org.seepledger.io.result.MassUnits;
import org.seepledger.io.result.PlumeCsv;
import org.seepledger.io.result.Statement;
import org.seepledger.io.result.TransectCsv;
import org.seepledger.io.result.TrendCsv;
import org.seepledger.io.table.MeasuredPanels;
import org.seepledger.ledger.Period;
import org.seepledger.ledger.PeriodBudget;
import org.seepledger.plume.Crossing;
import org.seepledger.plume.Plume;
import org.seepledger.plume.SoluteBalance;
import org.seepledger.plume.TransectFlows;
import org.seepledger.prism.Transect;
import org.seepledger.progress.Progress;
import org.seepledger.report.PlumeResult;
import org.seepledger.report.PlumeSummary;
import org.seepledger.unit.Measure;

/** The solute budget of prisms: reads, balances water and solutes, writes the result files. */
public final class PlumeJob {

    private final PlumeRequest request;
    private final Subject subject;
    private final Progress progress;
    private final Stopwatch stopwatch;
    private final MassUnits units;
    private final List<Period> periods;
    private final OptionalDouble above;
    private final ReportFile report;
    private List<MeasuredPanels> measured = List.of();
    private List<Crossing> crossings = List.of();

    private PlumeJob(PlumeRequest request, Subject subject, Stopwatch stopwatch, Progress progress) {
        this.request = request;
        this.subject = subject;
        this.stopwatch = stopwatch;
        this.progress = progress;
        this.units = subject.massUnits(request.rateUnit(), request.massUnit(), request.volumeUnit());
        this.periods = subject.periods(request.every(), request.periods(), request.waterYearStart());
        this.above = request.above()
                .map(threshold ->
                        OptionalDouble.of(threshold.kilograms(subject.aquifer().lengthUnit())))
                .orElse(OptionalDouble.empty());
        this.report = new ReportFile(request.report(), periods);
    }

    /**
     * Does the job.
     *
     * @param request what is asked for
     * @param progress told how far the work is
     * @return what it came to; the files are in place
     * @throws UsageFault if the request cannot be met
     * @throws DataFault if the data are wrong; nothing is written then
     * @throws org.seepledger.fault.ProgramFault if an identity that must hold does not; nothing is written then
     * @throws org.seepledger.progress.Cancelled if the work was stopped; nothing is written then
     */
    public static PlumeOutcome run(PlumeRequest request, Progress progress) {
        Stopwatch stopwatch = new Stopwatch();
        try (OutputFolder out = OutputFolder.at(request.out(), "plume", request.overwrite());
                Subject subject = Subject.open(request.aquifer(), request.prisms(), request.clip())) {
            return new PlumeJob(request, subject, stopwatch, progress).run(out);
        }
    }

    private PlumeOutcome run(OutputFolder out) {
        stopwatch.lap("reading");
        Aquifer aquifer = subject.aquifer();
        List<Solute> solutes = solutes();
        List<Transect> transects = transects();
        Balance water = WaterBalance.of(aquifer, subject.prisms(), request.wells(), request.threads(), progress);
        stopwatch.lap("balancing water");
        List<Plume> plumes = SoluteBalance.of(
                aquifer,
                solutes,
                subject.prisms(),
                new SoluteBalance.Options(request.wells(), request.dispersion(), above, request.threads()),
                progress);
        if (!transects.isEmpty()) {
            crossings = TransectFlows.of(aquifer, solutes, transects, progress);
        }
        stopwatch.lap("balancing solutes");
        Period whole = new Periods(aquifer.times()).record();
        List<PeriodBudget> records =
                water.ledgers().stream().map(ledger -> ledger.budget(whole)).toList();
        RunWarnings ofWater = new RunWarnings(aquifer, water.notes());
        PlumeWarnings ofSolutes = new PlumeWarnings(aquifer, request.dispersion());
        subject.warnings().addAll(ofWater.warnings(records));
        subject.warnings().addAll(ofSolutes.warnings(plumes));
        subject.notes().addAll(ofWater.remarks(request.wells()));
        subject.notes().addAll(ofSolutes.remarks(solutes, plumes));
        int each = solutes.size();
        List<PlumeResult> results = IntStream.range(0, plumes.size())
                .mapToObj(i -> PlumeResult.of(aquifer, plumes.get(i), periods, records.get(i / each), above))
                .toList();
        write(out, results, water);
        List<String> files = out.written();
        out.publish();
        String summary = PlumeSummary.of(aquifer, results, units, subject.warnings(), subject.notes());
        return new PlumeOutcome(
                summary,
                WorstClosure.of(results.stream().flatMap(result -> result.budget().periods().stream())),
                files);
    }

    private List<Solute> solutes() {
        List<Solute> solutes = SoluteBench.known(subject.folder().solutes());
        if (solutes.isEmpty()) {
            throw new DataFault(
                    AquiferReader.FILE,
                    "solutes",
                    "no solute with a \"concentration\"",
                    "at least one",
                    "Describe it; docs/formats.md, section 1, says how.");
        }
        subject.folder().solutes().stream()
                .filter(solute -> solute.concentration().isEmpty())
                .forEach(solute ->
                        subject.notes().add("No concentration is given for " + solute.name() + ": it is left out."));
        return solutes;
    }

    /** Reads what is to be crossed; drawn transects are the result, measured ones are kept as they are. */
    private List<Transect> transects() {
        Aquifer aquifer = subject.aquifer();
        measured = request.panels()
                .map(file -> MeasuredPanels.read(
                        subject.alsoReads(file),
                        file.toString(),
                        aquifer.lengthUnit(),
                        aquifer.timeUnit(),
                        subject.warnings()::add))
                .orElse(List.of());
        return request.transects()
                .map(file -> new TransectsReader(subject.folder().crs(), aquifer.grid(), subject.notes()::add)
                        .read(subject.alsoReads(file), file.toString()))
                .orElse(List.of());
    }

    private void write(OutputFolder out, List<PlumeResult> results, Balance water) {
        List<Plume> plumes = results.stream().map(PlumeResult::plume).toList();
        Aquifer aquifer = subject.aquifer();
        Times times = aquifer.times();
        Statement statement = subject.statement("Solute budget of \"" + aquifer.name() + "\"", progress);
        Measure length = aquifer.lengthUnit();
        try {
            PlumeCsv.write(out.file("plume.csv"), statement, plumes, periods, times, units);
            MassCsv.write(out.file("mass.csv"), statement, plumes, times, units, length, above);
            TrendCsv.write(out.file("trend.csv"), statement, plumes, times, aquifer.grid(), units, length);
            if (!crossings.isEmpty() || !measured.isEmpty()) {
                TransectCsv.write(
                        out.file("transect.csv"), statement, crossings, measured, periods, times, units, length);
            }
            Map<String, String> ofResult = optionsOfResult();
            report.write(out, subject, results, crossings, measured, units, statement, ofResult);
            RunRecord.write(out, "plume", options(), statement, subject.notes(), RunRecord.checks(water), stopwatch);
        } catch (IOException e) {
            throw new UsageFault("The results cannot be written beside " + request.out() + " (" + Unreadable.reason(e)
                    + "). Make room or name another folder.");
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
        options.put("rate-unit", units.rate().toString());
        options.put("mass-unit", units.mass().toString());
        options.put("volume-unit", units.volume().toString());
        options.put("wells", request.wells().name().toLowerCase(Locale.ROOT));
        options.put("dispersion", String.valueOf(request.dispersion()));
        request.above().ifPresent(threshold -> options.put("above", threshold.toString()));
        request.transects().ifPresent(file -> options.put("transects", file.toString()));
        request.panels().ifPresent(file -> options.put("panels", file.toString()));
        options.put("clip", String.valueOf(request.clip()));
        return options;
    }
}
