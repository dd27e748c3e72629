package org.seepledger.io.result;

import java.io.IOException;
import java.io.Writer;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import org.apache.commons.csv.CSVPrinter;
import org.seepledger.aquifer.Times;
import org.seepledger.io.table.CsvText;
import org.seepledger.io.table.NotedCsv;
import org.seepledger.ledger.Period;

/** A table of results being written: notes, a header, rows cell by cell, as RFC 4180 has it. */
final class ResultTable implements AutoCloseable {

    private final Writer text;
    private final CSVPrinter rows;

    private ResultTable(Writer text, CSVPrinter rows) {
        this.text = text;
        this.rows = rows;
    }

    /** Begins a table with its notes, a line each, and header. */
    static ResultTable open(Path file, List<String> notes, String... header) throws IOException {
        Writer text = Files.newBufferedWriter(file);
        return new ResultTable(text, NotedCsv.begin(text, notes, header));
    }

    /** Writes one cell. */
    void cell(String cell) throws IOException {
        rows.print(cell);
    }

    /** Writes cells. */
    void cells(String... cells) throws IOException {
        for (String cell : cells) {
            rows.print(cell);
        }
    }

    /** Writes four cells: begin and end of a period, as times and as dates where there are dates. */
    void span(Period period, Times times) throws IOException {
        rows.print(CsvText.number(period.from()));
        rows.print(CsvText.number(period.to()));
        rows.print(times.isoDate(period.from()).orElse(""));
        rows.print(times.isoDate(period.to()).orElse(""));
    }

    void endRow() throws IOException {
        rows.println();
    }

    @Override
    public void close() throws IOException {
        text.close();
    }
}
