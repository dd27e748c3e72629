package org.seepledger.io.submission;

import com.fasterxml.jackson.databind.JsonNode;
import java.io.IOException;
import java.io.Reader;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import org.apache.commons.csv.CSVFormat;
import org.apache.commons.csv.CSVParser;
import org.apache.commons.csv.CSVRecord;
import org.seepledger.fault.DataFault;
import org.seepledger.io.JsonFile;
import org.seepledger.io.Unreadable;
import org.seepledger.io.result.FileRecord;
import org.seepledger.io.result.RunJson;
import org.seepledger.review.change.RecordedRow;

/**
 * What a run of {@code balance} left in its folder.
 *
 * @param folder the folder as the user named it
 * @param options its options
 * @param inputs its inputs with their fingerprints
 * @param rows its budget
 */
public record RunFolder(Path folder, Map<String, String> options, List<FileRecord> inputs, List<RecordedRow> rows) {

    private static final String BUDGET = "budget.csv";

    /** Copies the collections. */
    public RunFolder {
        options = new LinkedHashMap<>(options);
        inputs = List.copyOf(inputs);
        rows = List.copyOf(rows);
    }

    /**
     * {@return what a folder holds}
     *
     * @param folder the folder
     * @throws DataFault if it is not what a run of {@code balance} wrote, or was changed since
     */
    public static RunFolder read(Path folder) {
        Path record = folder.resolve(RunJson.NAME);
        String command = RunJson.command(record);
        if (!command.equals("balance")) {
            throw new DataFault(
                    record.toString(),
                    "command",
                    "\"" + command + "\"",
                    "\"balance\"",
                    "Name two folders that seepledger balance wrote.");
        }
        checkUnchanged(folder, record);
        JsonNode root = JsonFile.read(record, record.toString());
        Map<String, String> options = new LinkedHashMap<>();
        root.path("options")
                .fieldNames()
                .forEachRemaining(name ->
                        options.put(name, root.path("options").path(name).asText()));
        List<FileRecord> inputs = new ArrayList<>();
        root.path("inputs")
                .forEach(input -> inputs.add(new FileRecord(
                        input.path("name").asText(),
                        input.path("bytes").asLong(),
                        input.path("sha256").asText())));
        return new RunFolder(folder, options, inputs, rows(folder.resolve(BUDGET)));
    }

    private static void checkUnchanged(Path folder, Path record) {
        FileRecord recorded = RunJson.outputs(record).stream()
                .filter(output -> output.name().equals(BUDGET))
                .findFirst()
                .orElseThrow(() ->
                        new DataFault(record.toString(), "outputs", "no " + BUDGET, "one", "Strike the budget again."));
        Path budget = folder.resolve(BUDGET);
        try {
            if (!FileRecord.of(BUDGET, budget).equals(recorded)) {
                throw new DataFault(
                        budget.toString(),
                        "",
                        "a file that was changed after the run",
                        "the one that the run wrote",
                        "Strike the budget again.");
            }
        } catch (IOException e) {
            throw Unreadable.file(budget.toString(), e);
        }
    }

    private static List<RecordedRow> rows(Path file) {
        CSVFormat format = CSVFormat.RFC4180
                .builder()
                .setCommentMarker('#')
                .setHeader()
                .setSkipHeaderRecord(true)
                .get();
        List<RecordedRow> rows = new ArrayList<>();
        try (Reader text = Files.newBufferedReader(file);
                CSVParser parser = format.parse(text)) {
            for (CSVRecord row : parser) {
                rows.add(new RecordedRow(
                        row.get("prism"),
                        row.get("period"),
                        number(row.get("from")),
                        number(row.get("to")),
                        row.get("group"),
                        row.get("item"),
                        row.get("layer"),
                        number(row.get("net_rate")),
                        number(row.get("net_volume")),
                        row.get("rate_unit"),
                        row.get("volume_unit")));
            }
            return rows;
        } catch (IOException e) {
            throw Unreadable.file(file.toString(), e);
        }
    }

    private static double number(String text) {
        return text.isEmpty() ? Double.NaN : Double.parseDouble(text);
    }

    /**
     * {@return the inputs by name}
     */
    public Map<String, String> hashes() {
        Map<String, String> hashes = new LinkedHashMap<>();
        inputs.forEach(input -> hashes.put(input.name(), input.sha256()));
        return hashes;
    }
}
