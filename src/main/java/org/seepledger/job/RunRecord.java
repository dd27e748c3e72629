package org.seepledger.job;

import java.io.IOException;
import java.nio.file.Path;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import java.util.Optional;
import org.seepledger.balance.Balance;
import org.seepledger.balance.Periods;
import org.seepledger.io.result.FileRecord;
import org.seepledger.io.result.RunJson;
import org.seepledger.io.result.Statement;

/** What a run that writes a folder says of itself: the last of its files. */
final class RunRecord {

    private RunRecord() {}

    /** The options that every run about prisms has, as they took effect. */
    static Map<String, String> options(Path aquifer, Path prisms) {
        Map<String, String> options = new LinkedHashMap<>();
        options.put("aquifer", aquifer.toString());
        options.put("prisms", prisms.toString());
        return options;
    }

    /** Adds the options that say which periods a budget is struck for. */
    static void addPeriods(
            Map<String, String> options, Periods.Every every, Optional<Path> periods, int waterYearStart) {
        options.put("every", every.name().toLowerCase(Locale.ROOT).replace('_', '-'));
        periods.ifPresent(file -> options.put("periods", file.toString()));
        options.put("water-year-start", String.valueOf(waterYearStart));
    }

    /** What a balance checked of itself, by name. */
    static Map<String, Double> checks(Balance balance) {
        return Map.of("largest_difference_between_routes", balance.notes().disagreement());
    }

    /** Writes the record of a run whose other files are all there. */
    static void write(
            OutputFolder out,
            String command,
            Map<String, String> options,
            Statement statement,
            List<String> notes,
            Map<String, Double> checks,
            Stopwatch stopwatch)
            throws IOException {
        List<FileRecord> outputs = out.records();
        stopwatch.lap("writing");
        RunJson.Run run =
                new RunJson.Run(Version.text(), command, options, statement, notes, checks, stopwatch.seconds());
        RunJson.write(out.file(RunJson.NAME), run, outputs);
    }
}
