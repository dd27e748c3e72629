package org.seepledger.io.table;

import java.io.IOException;
import java.io.Writer;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.function.UnaryOperator;
import org.apache.commons.csv.CSVPrinter;

/** Copies a table with other headings or other texts in some columns; all other cells stay as they are written. */
public final class TableCopy {

    private TableCopy() {}

    /**
     * A column of the copy.
     *
     * @param heading its heading; empty for a column that is left out
     * @param cell what becomes of the text of a cell; an empty cell stays empty
     */
    public record Column(String heading, UnaryOperator<String> cell) {}

    /**
     * Copies a table.
     *
     * @param from the table
     * @param shownName the table as the user named it
     * @param columns one for each column of the table
     * @param to the copy
     * @throws IOException if it cannot be written
     * @throws org.seepledger.fault.DataFault if the table cannot be read
     */
    public static void write(Path from, String shownName, List<Column> columns, Path to) throws IOException {
        try (TableReader table = TableReader.open(from, shownName, Long.MAX_VALUE);
                Writer text = Files.newBufferedWriter(to);
                CSVPrinter printer = new CSVPrinter(text, table.dialect().format())) {
            for (String note : table.headerLine().notes()) {
                printer.printComment(note);
            }
            for (Column column : columns) {
                if (!column.heading().isEmpty()) {
                    printer.print(column.heading());
                }
            }
            printer.println();
            while (table.next()) {
                for (int i = 0; i < columns.size(); i++) {
                    if (!columns.get(i).heading().isEmpty()) {
                        String cell = table.text(i);
                        printer.print(
                                cell.isEmpty() ? cell : columns.get(i).cell().apply(cell));
                    }
                }
                printer.println();
            }
        }
    }
}
