package org.seepledger.io.result;

import java.io.IOException;
import java.io.UncheckedIOException;
import java.io.Writer;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import org.apache.commons.csv.CSVFormat;
import org.apache.commons.csv.CSVPrinter;
import org.seepledger.io.table.CsvText;

/** Writes a trace: notes, a header {@code file,place,value,weight}, a line for each stored number. */
public final class TraceCsv implements AutoCloseable {

    /** How the title of every trace begins. */
    public static final String TITLE = "Trace of ";

    private final CSVPrinter rows;

    private TraceCsv(CSVPrinter rows) {
        this.rows = rows;
    }

    /**
     * Opens a file and writes what stands before the lines.
     *
     * @param file the file
     * @param statement what it rests on; its title begins with {@link #TITLE}
     * @param more further notes, a line each
     * @return the table, to be closed
     * @throws IOException if it cannot be written
     */
    public static TraceCsv open(Path file, Statement statement, List<String> more) throws IOException {
        Writer text = Files.newBufferedWriter(file);
        for (String line : statement.lines()) {
            text.write("# " + line + "\r\n");
        }
        for (String line : more) {
            text.write("# " + line.replaceAll("\\p{Cntrl}+", " ") + "\r\n");
        }
        CSVPrinter printer = new CSVPrinter(text, CSVFormat.RFC4180);
        printer.printRecord("file", "place", "value", "weight");
        return new TraceCsv(printer);
    }

    /**
     * Writes a line.
     *
     * @param file the file that a number stands in
     * @param place where in the file
     * @param value the number
     * @param weight what it counts
     */
    public void line(String file, String place, double value, double weight) {
        try {
            rows.printRecord(CsvText.text(file), CsvText.text(place), CsvText.number(value), CsvText.number(weight));
        } catch (IOException e) {
            throw new UncheckedIOException(e);
        }
    }

    @Override
    public void close() throws IOException {
        rows.close();
    }
}
