package org.seepledger.io.table;

import java.io.IOException;
import java.io.UncheckedIOException;
import java.nio.file.FileSystemException;
import java.nio.file.NoSuchFileException;
import java.nio.file.Path;
import java.util.Iterator;
import java.util.List;
import java.util.stream.StreamSupport;
import org.apache.commons.csv.CSVException;
import org.apache.commons.csv.CSVParser;
import org.apache.commons.csv.CSVRecord;
import org.seepledger.fault.DataFault;

/** Reads a table line by line, in whatever dialect it is written. */
final class TableReader implements AutoCloseable {

    private static final String PLAIN_NUMBERS =
            "Write plain numbers, without thousands separators and with one decimal "
                    + "sign in the whole file; leave the cell empty where there is no value.";

    private final String shownName;
    private final StrictReader text;
    private final CSVParser parser;
    private final Iterator<CSVRecord> records;
    private final Decimals decimals;
    private final long mostLines;
    private final Dialect dialect;
    private final Header header;
    private final Line headerLine;
    private CSVRecord current;
    private long lines;

    private TableReader(String shownName, StrictReader text, Dialect dialect, long mostLines) throws IOException {
        this.shownName = shownName;
        this.text = text;
        this.parser = dialect.format().parse(text);
        this.records = parser.iterator();
        this.dialect = dialect;
        this.decimals = new Decimals(dialect);
        this.mostLines = mostLines;
        this.header = readHeader();
        this.headerLine = current();
    }

    /**
     * A line as it is written.
     *
     * @param notes the notes above it
     * @param cells its cells
     */
    record Line(List<String> notes, List<String> cells) {}

    /**
     * {@return a reader that stands before the first line below the header}
     *
     * @param file the file
     * @param shownName the file as the user named it
     * @param mostLines how many lines of values it may have
     * @throws DataFault if the file cannot be read or has no header
     */
    static TableReader open(Path file, String shownName, long mostLines) {
        try {
            Dialect dialect = Dialect.of(file, shownName);
            StrictReader text = StrictReader.open(file, shownName);
            try {
                return new TableReader(shownName, text, dialect, mostLines);
            } catch (IOException | RuntimeException e) {
                text.close();
                throw e;
            }
        } catch (IOException e) {
            throw unreadable(shownName, e);
        }
    }

    private Header readHeader() {
        if (!advance()) {
            throw new DataFault(
                    shownName, "", "no line but notes", "a header line and lines below it", "Check the file.");
        }
        boolean numbers = StreamSupport.stream(current.spliterator(), false).allMatch(TableReader::isNumber);
        Header read = new Header(shownName, line(), current.toList());
        if (numbers) {
            throw read.fault(
                    "a line of numbers",
                    "a header line with the names of the columns",
                    "Write one above the values, without # before it.");
        }
        return read;
    }

    private static boolean isNumber(String cell) {
        try {
            new Decimals(new Dialect(';')).number(cell, "");
            return true;
        } catch (NumberFormatException e) {
            return false;
        }
    }

    Header header() {
        return header;
    }

    /**
     * {@return whether there is one more line of values, which then is the current one}
     *
     * @throws DataFault if the line cannot be parsed or has not as many cells as the header
     */
    boolean next() {
        while (advance()) {
            if (!isBlank()) {
                checkLine();
                return true;
            }
        }
        return false;
    }

    private boolean advance() {
        text.beginLineOfValues(parser.getCurrentLineNumber() + 1);
        try {
            boolean more = records.hasNext();
            current = more ? records.next() : null;
            return more;
        } catch (UncheckedIOException e) {
            throw broken(e.getCause());
        }
    }

    private boolean isBlank() {
        for (String cell : current) {
            if (!cell.isBlank()) {
                return false;
            }
        }
        return true;
    }

    private void checkLine() {
        if (current.size() != header.size()) {
            throw fault(
                    current.size() + (current.size() == 1 ? " cell" : " cells"),
                    header.size() + ", as in the header",
                    "Where commas are decimal signs, separate the cells by ; or tabs.");
        }
        lines++;
        if (lines > mostLines) {
            throw fault("more lines of values", "at most " + mostLines, "Split the table.");
        }
    }

    Dialect dialect() {
        return dialect;
    }

    /** {@return the header as it is written} */
    Line headerLine() {
        return headerLine;
    }

    /** {@return the current line as it is written} */
    Line current() {
        String notes = current.getComment();
        return new Line(notes == null ? List.of() : List.of(notes.split("\\R")), current.toList());
    }

    /** {@return the file as the user named it} */
    String shownName() {
        return shownName;
    }

    /** {@return where the current line ends, from 1} */
    long line() {
        return parser.getCurrentLineNumber();
    }

    /** {@return the text of a cell of the current line, without blanks around it} */
    String text(int column) {
        return current.get(column).strip();
    }

    /**
     * {@return the number in a cell of the current line, NaN where it has none}
     *
     * @param column the column
     * @throws DataFault if it is not a number
     */
    double number(int column) {
        return number(column, "a number", PLAIN_NUMBERS);
    }

    double number(int column, String expected, String remedy) {
        String cell = text(column);
        try {
            return decimals.number(cell, expected);
        } catch (NumberFormatException e) {
            throw fault(column, Shown.text(cell), e.getMessage(), remedy);
        }
    }

    /**
     * {@return the number in a cell of the current line that may be below a limit, NaN where it has none}
     *
     * @param column the column
     * @param below what a cell means that begins with {@code <}
     * @throws DataFault if it is not a number
     */
    double number(int column, Below below) {
        if (below == Below.REFUSED || !text(column).startsWith("<")) {
            double value = number(column);
            return below == Below.LIMIT_ALONE ? Double.NaN : value;
        }
        String cell = text(column);
        try {
            double limit = decimals.number(cell.substring(1).strip(), "a number after <");
            if (!Double.isNaN(limit)) {
                return limit;
            }
        } catch (NumberFormatException e) {
            throw fault(column, Shown.text(cell), e.getMessage(), PLAIN_NUMBERS);
        }
        throw fault(column, Shown.text(cell), "a number after <", "Write the limit, as <0.5.");
    }

    /**
     * {@return what was made of a number in a cell of the current line}
     *
     * @param column the column
     * @param value what was made of it
     * @throws DataFault if that is infinite
     */
    double finite(int column, double value) {
        if (Double.isInfinite(value)) {
            throw fault(
                    column, Shown.text(text(column)), "a number within the range of double precision", PLAIN_NUMBERS);
        }
        return value;
    }

    /**
     * {@return the number in a cell of the current line, which must have one}
     *
     * @param column the column
     * @param remedy what the user can do if it has none
     * @throws DataFault if it has none
     */
    double required(int column, String remedy) {
        double value = number(column);
        if (Double.isNaN(value)) {
            throw fault(column, Shown.cell(text(column)), "a number", remedy);
        }
        return value;
    }

    /**
     * {@return the name in a cell of the current line}
     *
     * @param column the column
     * @throws DataFault if it is empty
     */
    String name(int column) {
        String name = text(column);
        if (name.isEmpty()) {
            throw fault(column, "an empty cell", "a name", "Write one.");
        }
        return name;
    }

    /** {@return a fault in the current line} */
    DataFault fault(String found, String expected, String remedy) {
        return new DataFault(shownName, "line " + line(), found, expected, remedy);
    }

    /** {@return a fault in a cell of the current line} */
    DataFault fault(int column, String found, String expected, String remedy) {
        String place = "line " + line() + ", column " + Shown.text(header.name(column));
        return new DataFault(shownName, place, found, expected, remedy);
    }

    /** {@return the current line, for messages: file and line} */
    String place() {
        return shownName + ", line " + line();
    }

    private DataFault broken(IOException cause) {
        if (!(cause instanceof CSVException)) {
            return unreadable(shownName, cause);
        }
        return fault(
                "a quotation mark that is not closed, or text after a closed one",
                "cells as in RFC 4180",
                "Close the quotation mark, or write one inside a quoted cell twice.");
    }

    private static DataFault unreadable(String shownName, IOException cause) {
        String reason = cause instanceof FileSystemException system ? system.getReason() : cause.getMessage();
        String found = cause instanceof NoSuchFileException
                ? "no such file"
                : "a file that cannot be read" + (reason == null ? "" : " (" + reason + ")");
        return new DataFault(shownName, "", found, "a table as CSV", "Check the name and who may read it.");
    }

    @Override
    public void close() {
        try {
            parser.close();
        } catch (IOException e) {
            throw unreadable(shownName, e);
        }
    }
}
