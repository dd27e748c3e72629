package org.seepledger.io.submission;

import java.io.IOException;
import java.io.Writer;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import org.apache.commons.csv.CSVPrinter;
import org.seepledger.io.table.CsvText;
import org.seepledger.io.table.NotedCsv;
import org.seepledger.review.check.Beside;

/** Writes {@code side_by_side.csv}: what was submitted beside what was recomputed. */
public final class BesideCsv {

    private static final String[] HEADER = {
        "prism",
        "period",
        "item",
        "counts",
        "submitted",
        "recomputed",
        "difference",
        "unit",
        "percent_of_throughput",
        "agrees",
        "place"
    };

    private BesideCsv() {}

    /**
     * Writes the table.
     *
     * @param file the file
     * @param notes what stands before the rows, a line each
     * @param rows the rows
     * @throws IOException if it cannot be written
     */
    public static void write(Path file, List<String> notes, List<Beside> rows) throws IOException {
        try (Writer text = Files.newBufferedWriter(file)) {
            CSVPrinter printer = NotedCsv.begin(text, notes, HEADER);
            for (Beside row : rows) {
                printer.printRecord(
                        CsvText.text(row.prism()),
                        CsvText.text(row.period()),
                        CsvText.text(row.term()),
                        row.sense(),
                        CsvText.number(row.submitted()),
                        CsvText.number(row.recomputed()),
                        CsvText.number(row.submitted() - row.recomputed()),
                        CsvText.text(row.unit()),
                        CsvText.number(row.share()),
                        row.agrees() ? "yes" : "no",
                        CsvText.text(row.place()));
            }
        }
    }
}
