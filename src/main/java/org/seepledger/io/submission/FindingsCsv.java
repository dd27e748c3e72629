package org.seepledger.io.submission;

import java.io.IOException;
import java.io.Writer;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import org.apache.commons.csv.CSVPrinter;
import org.seepledger.io.table.CsvText;
import org.seepledger.io.table.NotedCsv;
import org.seepledger.review.check.Finding;

/** Writes {@code findings.csv}. */
public final class FindingsCsv {

    private static final String[] HEADER = {
        "severity", "code", "prism", "period", "item", "submitted", "recomputed", "unit", "ratio", "message"
    };

    private FindingsCsv() {}

    /**
     * Writes findings.
     *
     * @param file the file
     * @param notes what stands before the rows, a line each
     * @param findings the findings, in the order of rows
     * @throws IOException if it cannot be written
     */
    public static void write(Path file, List<String> notes, List<Finding> findings) throws IOException {
        try (Writer text = Files.newBufferedWriter(file)) {
            CSVPrinter rows = NotedCsv.begin(text, notes, HEADER);
            for (Finding finding : findings) {
                rows.printRecord(
                        finding.severity(),
                        finding.code(),
                        CsvText.text(finding.prism()),
                        CsvText.text(finding.period()),
                        CsvText.text(finding.item()),
                        CsvText.number(finding.submitted()),
                        CsvText.number(finding.recomputed()),
                        CsvText.text(finding.unit()),
                        CsvText.number(finding.ratio()),
                        CsvText.text(finding.message()));
            }
        }
    }
}
