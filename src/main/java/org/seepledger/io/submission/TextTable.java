package org.seepledger.io.submission;

import java.io.IOException;
import java.io.StringReader;
import java.io.UncheckedIOException;
import java.nio.ByteBuffer;
import java.nio.charset.CharacterCodingException;
import java.nio.charset.Charset;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import org.apache.commons.csv.CSVFormat;
import org.apache.commons.csv.CSVParser;
import org.apache.commons.csv.CSVRecord;
import org.seepledger.fault.DataFault;
import org.seepledger.review.sheet.Sheet;

/** Reads a table that is written as text. */
final class TextTable {

    private static final char[] SEPARATORS = {'\t', ';', ','};
    private static final int LINES_LOOKED_AT = 200;
    private static final Charset WESTERN = Charset.forName("windows-1252");

    private TextTable() {}

    static Sheet read(Path file, String shownFile) throws IOException {
        String text = text(Files.readAllBytes(file), shownFile);
        char separator = separator(text);
        CSVFormat format = CSVFormat.RFC4180
                .builder()
                .setDelimiter(separator)
                .setIgnoreEmptyLines(false)
                .get();
        try (CSVParser parser = format.parse(new StringReader(text))) {
            return new Sheet("", separator != ',', rows(parser, shownFile));
        } catch (UncheckedIOException | IOException e) {
            throw new DataFault(
                    shownFile,
                    "",
                    "a quotation mark that is not closed, or text behind a closed one",
                    "cells as in RFC 4180",
                    "Save the table as CSV anew.");
        }
    }

    /** UTF-8 where it is that, else the code page that western spreadsheets write. */
    private static String text(byte[] bytes, String shownFile) {
        String text;
        try {
            text = StandardCharsets.UTF_8
                    .newDecoder()
                    .decode(ByteBuffer.wrap(bytes))
                    .toString();
        } catch (CharacterCodingException e) {
            text = new String(bytes, WESTERN);
        }
        if (text.indexOf('\0') >= 0) {
            throw new DataFault(
                    shownFile,
                    "",
                    "bytes that are no text",
                    "a budget as CSV or XLSX",
                    "Save the table as CSV in UTF-8, or as XLSX.");
        }
        return text.startsWith("\uFEFF") ? text.substring(1) : text;
    }

    private static List<List<String>> rows(CSVParser parser, String shownFile) {
        List<List<String>> rows = new ArrayList<>();
        long begin = 0;
        long cells = 0;
        for (CSVRecord line : parser) {
            while (rows.size() < begin) {
                rows.add(List.of());
            }
            begin = parser.getCurrentLineNumber();
            cells += line.size();
            check(line, rows.size(), cells, shownFile);
            boolean note =
                    line.get(0).startsWith("#") || rows.isEmpty() && line.get(0).matches("sep=.");
            rows.add(note ? List.of() : line.toList());
        }
        return rows;
    }

    private static void check(CSVRecord line, int row, long cells, String shownFile) {
        String place = "line " + (row + 1);
        if (row >= SubmissionFile.MOST_ROWS) {
            throw SubmissionFile.tooMuch(shownFile, place, "more lines", SubmissionFile.MOST_ROWS + " lines");
        }
        if (line.size() > SubmissionFile.MOST_COLUMNS) {
            throw SubmissionFile.tooMuch(
                    shownFile, place, line.size() + " cells", SubmissionFile.MOST_COLUMNS + " cells in a line");
        }
        if (cells > SubmissionFile.MOST_CELLS) {
            throw SubmissionFile.tooMuch(shownFile, place, "more cells", SubmissionFile.MOST_CELLS + " cells");
        }
        for (String cell : line) {
            if (cell.length() > SubmissionFile.LONGEST_CELL) {
                throw SubmissionFile.tooMuch(
                        shownFile,
                        place,
                        "a cell of " + cell.length() + " characters",
                        SubmissionFile.LONGEST_CELL + " characters");
            }
        }
    }

    /** The separator that lines have outside quotation marks; beside another, a comma is the decimal sign or parts thousands. */
    private static char separator(String text) {
        List<String> lines = text.lines()
                .filter(line -> !line.isBlank() && !line.startsWith("#"))
                .limit(LINES_LOOKED_AT)
                .toList();
        if (!lines.isEmpty() && lines.get(0).matches("sep=.")) {
            return lines.get(0).charAt(4);
        }
        for (char separator : SEPARATORS) {
            long once =
                    lines.stream().filter(line -> count(line, separator) > 0).count();
            long often =
                    lines.stream().filter(line -> count(line, separator) > 1).count();
            if (separator == ',' || often > 1 || once > 0.5 * lines.size()) {
                return separator;
            }
        }
        return ',';
    }

    private static int count(String line, char separator) {
        boolean quoted = false;
        int count = 0;
        for (int i = 0; i < line.length(); i++) {
            quoted ^= line.charAt(i) == '"';
            count += line.charAt(i) == separator && !quoted ? 1 : 0;
        }
        return count;
    }
}
