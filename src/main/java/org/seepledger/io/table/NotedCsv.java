package org.seepledger.io.table;

import java.io.IOException;
import java.io.Writer;
import java.util.List;
import org.apache.commons.csv.CSVFormat;
import org.apache.commons.csv.CSVPrinter;

/** How every table that the program writes begins: notes, each a line after a hash, and a header; as RFC 4180 has it. */
public final class NotedCsv {

    private NotedCsv() {}

    /**
     * Begins a table.
     *
     * @param text where to
     * @param notes what stands before the header, a line each
     * @param header the names of its columns
     * @return what prints the rows
     * @throws IOException if it cannot be written
     */
    public static CSVPrinter begin(Writer text, List<String> notes, String... header) throws IOException {
        for (String line : notes) {
            text.write("# " + line + "\r\n");
        }
        CSVPrinter rows = new CSVPrinter(text, CSVFormat.RFC4180);
        rows.printRecord((Object[]) header);
        return rows;
    }
}
