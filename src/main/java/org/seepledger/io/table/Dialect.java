package org.seepledger.io.table;

import java.io.BufferedReader;
import java.io.IOException;
import java.nio.file.Path;
import org.apache.commons.csv.CSVFormat;

/**
 * How a table is written.
 *
 * @param separator what stands between cells
 */
record Dialect(char separator) {

    /** The first wins where the header has as many of two. */
    private static final char[] SEPARATORS = {'\t', ';', ','};

    private static final String NOTE = "#";

    /**
     * {@return the dialect of a file, found out from its header}
     *
     * @param file the file
     * @param shownName the file as the user named it
     * @throws IOException if it cannot be read
     */
    static Dialect of(Path file, String shownName) throws IOException {
        try (BufferedReader lines = new BufferedReader(StrictReader.open(file, shownName))) {
            String line = lines.readLine();
            while (line != null && (line.isBlank() || line.startsWith(NOTE))) {
                line = lines.readLine();
            }
            return of(line == null ? "" : line);
        }
    }

    static Dialect of(String header) {
        char best = ',';
        int most = 0;
        for (char separator : SEPARATORS) {
            int count = countOutsideQuotes(header, separator);
            if (count > most) {
                best = separator;
                most = count;
            }
        }
        return new Dialect(best);
    }

    private static int countOutsideQuotes(String header, char separator) {
        int count = 0;
        boolean quoted = false;
        for (int i = 0; i < header.length(); i++) {
            char c = header.charAt(i);
            quoted ^= c == '"';
            count += c == separator && !quoted ? 1 : 0;
        }
        return count;
    }

    /**
     * {@return whether a comma may be the decimal sign}
     */
    boolean allowsDecimalComma() {
        return separator != ',';
    }

    /**
     * {@return the dialect in the parser's terms}
     */
    CSVFormat format() {
        return CSVFormat.RFC4180
                .builder()
                .setDelimiter(separator)
                .setCommentMarker(NOTE.charAt(0))
                .setIgnoreEmptyLines(true)
                .setIgnoreSurroundingSpaces(true)
                .get();
    }
}
