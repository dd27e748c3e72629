package org.seepledger.job;

import java.io.IOException;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import java.util.Optional;
import org.seepledger.aquifer.Aquifer;
import org.seepledger.balance.Balance;
import org.seepledger.balance.Periods;
import org.seepledger.balance.WaterBalance;
import org.seepledger.fault.UsageFault;
import org.seepledger.io.Unreadable;
import org.seepledger.io.aquifer.AquiferFolder;
import org.seepledger.io.aquifer.AquiferReader;
import org.seepledger.io.prisms.PrismsReader;
import org.seepledger.io.prisms.SurfaceRasters;
import org.seepledger.io.raster.GeoTiffWriter;
import org.seepledger.io.result.BudgetCsv;
import org.seepledger.io.result.ExchangeCsv;
import org.seepledger.io.result.FacesGeoJson;
import org.seepledger.io.result.FileRecord;
import org.seepledger.io.result.PrismBudget;
import org.seepledger.io.result.ResultUnits;
import org.seepledger.io.result.RunJson;
import org.seepledger.io.result.Statement;
import org.seepledger.io.table.PeriodsTable;
import org.seepledger.ledger.Ledger;
import org.seepledger.ledger.Period;
import org.seepledger.ledger.PeriodBudget;
import org.seepledger.prism.Prism;
import org.seepledger.progress.Progress;
import org.seepledger.report.BalanceSummary;

/** The water budget of prisms: reads, balances, writes the result files. */
public final class BalanceJob {

    private final BalanceRequest request;
    private final Progress progress;
    private final Stopwatch stopwatch = new Stopwatch();
    private final List<String> warnings = new ArrayList<>();
    private final List<String> notes = new ArrayList<>();

    private BalanceJob(BalanceRequest request, Progress progress) {
        this.request = request;
        this.progress = progress;
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
        try (OutputFolder out = OutputFolder.at(request.out(), request.overwrite());
                AquiferFolder folder = AquiferReader.open(request.aquifer())) {
            return new BalanceJob(request, progress).run(folder, out);
        }
    }

    private BalanceOutcome run(AquiferFolder folder, OutputFolder out) {
        try (SurfaceRasters surfaces = new SurfaceRasters(folder.aquifer().grid(), notes::add)) {
            return run(folder, surfaces, out);
        }
    }

    private BalanceOutcome run(AquiferFolder folder, SurfaceRasters surfaces, OutputFolder out) {
        Aquifer aquifer = folder.aquifer();
        warnings.addAll(folder.warnings());
        notes.addAll(folder.notes());
        ResultUnits units = units(aquifer);
        List<Prism> prisms = prisms(folder, surfaces);
        List<Period> periods = periods(aquifer);
        stopwatch.lap("reading");
        Balance balance = WaterBalance.of(aquifer, prisms, request.wells(), request.threads(), progress);
        stopwatch.lap("balancing");
        Period whole = new Periods(aquifer.times()).record();
        List<PeriodBudget> records =
                balance.ledgers().stream().map(ledger -> ledger.budget(whole)).toList();
        RunWarnings words = RunWarnings.of(aquifer, balance);
        warnings.addAll(words.warnings(records));
        notes.addAll(words.remarks(request.wells()));
        List<PrismBudget> budgets = balance.ledgers().stream()
                .map(ledger -> budget(ledger, periods))
                .toList();
        Statement statement = new Statement(
                "Water budget of \"" + aquifer.name() + "\" by seepledger " + Version.text(),
                inputs(folder, surfaces),
                folder.origins(),
                warnings);
        try {
            BudgetCsv.write(out.file("budget.csv"), statement, budgets, aquifer.times(), units);
            ExchangeCsv.write(out.file("exchange.csv"), statement, balance.exchange(), periods, aquifer.times(), units);
            FacesGeoJson.write(out.file("faces.geojson"), crs(folder), prisms, records, units);
            writeImbalance(folder, balance, out);
            writeRecord(out, statement, balance);
        } catch (IOException e) {
            throw new UsageFault("The results cannot be written beside " + request.out() + " (" + Unreadable.reason(e)
                    + "). Make room or name another folder.");
        }
        List<String> files = out.written();
        out.publish();
        String summary = BalanceSummary.of(aquifer, balance, budgets, units, warnings, notes);
        return new BalanceOutcome(summary, worst(budgets), files);
    }

    private ResultUnits units(Aquifer aquifer) {
        try {
            return ResultUnits.of(
                    aquifer.lengthUnit(),
                    aquifer.timeUnit(),
                    request.rateUnit().orElse(null),
                    request.volumeUnit().orElse(null));
        } catch (IllegalArgumentException e) {
            throw new UsageFault(
                    "The unit asked for does not fit: " + e.getMessage() + ". Give a rate as m3/d and a volume as m3.");
        }
    }

    private List<Prism> prisms(AquiferFolder folder, SurfaceRasters surfaces) {
        Aquifer aquifer = folder.aquifer();
        List<Prism> prisms = new PrismsReader(
                        folder.crs(), aquifer.grid(), aquifer.layers().size(), request.clip(), surfaces, notes::add)
                .read(request.prisms(), request.prisms().toString());
        return prisms;
    }

    private List<Period> periods(Aquifer aquifer) {
        Periods periods = new Periods(aquifer.times());
        return request.periods()
                .map(file -> periods.named(PeriodsTable.read(file, file.toString(), aquifer.times(), warnings::add)))
                .orElseGet(() -> periods.every(request.every(), request.waterYearStart()));
    }

    private static PrismBudget budget(Ledger ledger, List<Period> periods) {
        return new PrismBudget(
                ledger.prism(), periods.stream().map(ledger::budget).toList());
    }

    /** A file of the request may have the name of one of the set's: both are listed. */
    private List<FileRecord> inputs(AquiferFolder folder, SurfaceRasters surfaces) {
        List<Map.Entry<String, Path>> files = new ArrayList<>(folder.inputs().entrySet());
        files.add(Map.entry(request.prisms().toString(), request.prisms()));
        files.addAll(surfaces.inputs().entrySet());
        request.periods().ifPresent(file -> files.add(Map.entry(file.toString(), file)));
        progress.begin("fingerprinting inputs", files.size());
        List<FileRecord> records = new ArrayList<>();
        for (Map.Entry<String, Path> file : files) {
            records.add(fingerprint(file.getKey(), file.getValue()));
            progress.step();
        }
        return records;
    }

    private static FileRecord fingerprint(String name, Path file) {
        try {
            return FileRecord.of(name, file);
        } catch (IOException e) {
            throw Unreadable.file(name, e);
        }
    }

    private static Optional<String> crs(AquiferFolder folder) {
        return folder.crs().isLocal()
                ? Optional.empty()
                : folder.crs().code().or(() -> Optional.of(folder.crs().wkt()));
    }

    private void writeImbalance(AquiferFolder folder, Balance balance, OutputFolder out) throws IOException {
        for (int layer = 0; layer < balance.imbalance().layers(); layer++) {
            int index = layer;
            GeoTiffWriter.write(
                    out.file("imbalance_l" + (layer + 1) + ".tif"),
                    folder.aquifer().grid(),
                    balance.imbalance().window(),
                    crs(folder),
                    row -> balance.imbalance().row(index, row));
        }
    }

    private void writeRecord(OutputFolder out, Statement statement, Balance balance) throws IOException {
        List<FileRecord> outputs = new ArrayList<>();
        for (String name : out.written()) {
            outputs.add(FileRecord.of(name, out.file(name)));
        }
        stopwatch.lap("writing");
        Map<String, Double> checks =
                Map.of("largest_difference_between_routes", balance.notes().disagreement());
        RunJson.Run run =
                new RunJson.Run(Version.text(), "balance", options(), statement, notes, checks, stopwatch.seconds());
        RunJson.write(out.file(RunJson.NAME), run, outputs);
    }

    private Map<String, String> options() {
        Map<String, String> options = new LinkedHashMap<>();
        options.put("aquifer", request.aquifer().toString());
        options.put("prisms", request.prisms().toString());
        options.put("every", request.every().name().toLowerCase(Locale.ROOT).replace('_', '-'));
        request.periods().ifPresent(file -> options.put("periods", file.toString()));
        options.put("water-year-start", String.valueOf(request.waterYearStart()));
        request.rateUnit().ifPresent(unit -> options.put("rate-unit", unit.toString()));
        request.volumeUnit().ifPresent(unit -> options.put("volume-unit", unit.toString()));
        options.put("wells", request.wells().name().toLowerCase(Locale.ROOT));
        options.put("clip", String.valueOf(request.clip()));
        options.put("threads", String.valueOf(request.threads()));
        return options;
    }

    private static double worst(List<PrismBudget> budgets) {
        return budgets.stream()
                .flatMap(budget -> budget.periods().stream())
                .mapToDouble(period -> Math.abs(period.totals().closureError()))
                .filter(error -> !Double.isNaN(error))
                .max()
                .orElse(Double.NaN);
    }
}
