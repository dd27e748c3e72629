package org.seepledger.cli;

import java.io.IOException;
import java.io.UncheckedIOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.stream.Collectors;
import org.apache.commons.csv.CSVFormat;
import org.apache.commons.csv.CSVParser;
import org.apache.commons.csv.CSVRecord;

/** A {@code budget.csv}, read by Commons CSV as RFC 4180 says. */
record Budget(List<String> notes, List<CSVRecord> rows) {

    static Budget of(Path folder) {
        try {
            String text = Files.readString(folder.resolve("budget.csv"));
            List<String> notes =
                    text.lines().takeWhile(line -> line.startsWith("#")).toList();
            String table = text.substring(
                    notes.stream().mapToInt(note -> note.length() + 2).sum());
            CSVFormat format = CSVFormat.RFC4180
                    .builder()
                    .setHeader()
                    .setSkipHeaderRecord(true)
                    .get();
            try (CSVParser parser = CSVParser.parse(table, format)) {
                return new Budget(notes, parser.getRecords());
            }
        } catch (IOException e) {
            throw new UncheckedIOException(e);
        }
    }

    CSVRecord row(String prism, String period, String group, String item, String layer) {
        List<CSVRecord> found = rows.stream()
                .filter(row -> row.get("prism").equals(prism)
                        && row.get("period").equals(period)
                        && row.get("group").equals(group)
                        && row.get("item").equals(item)
                        && row.get("layer").equals(layer))
                .toList();
        if (found.size() != 1) {
            throw new AssertionError(found.size() + " rows for " + List.of(prism, period, group, item, layer));
        }
        return found.get(0);
    }

    double number(String column, String prism, String period, String group, String item, String layer) {
        return Double.parseDouble(row(prism, period, group, item, layer).get(column));
    }

    /** The rows as lines of text, digit for digit. */
    String table() {
        return rows.stream().map(row -> String.join("|", row.toList())).collect(Collectors.joining("\n"));
    }
}
