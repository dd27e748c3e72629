package org.seepledger.io.result;

import java.io.IOException;
import java.io.UncheckedIOException;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import org.seepledger.io.table.CsvText;

/** Writes a trace: notes, a header {@code file,place,value,weight}, a line for each stored number. */
public final class TraceCsv implements AutoCloseable {

    /** How the title of every trace begins. */
    public static final String TITLE = "Trace of ";

    private final ResultTable rows;

    private TraceCsv(ResultTable rows) {
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
        List<String> notes = new ArrayList<>(statement.lines());
        more.forEach(line -> notes.add(line.replaceAll("\\p{Cntrl}+", " ")));
        return new TraceCsv(ResultTable.open(file, notes, "file", "place", "value", "weight"));
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
            rows.cell(CsvText.text(file));
            rows.cell(CsvText.text(place));
            rows.cell(CsvText.number(value));
            rows.cell(CsvText.number(weight));
            rows.endRow();
        } catch (IOException e) {
            throw new UncheckedIOException(e);
        }
    }

    @Override
    public void close() throws IOException {
        rows.close();
    }
}
