package org.seepledger.io.table;

import java.io.IOException;
import java.io.Writer;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.HashSet;
import java.util.List;
import java.util.OptionalInt;
import java.util.Set;
import org.apache.commons.csv.CSVPrinter;
import org.seepledger.aquifer.PlacedWell;
import org.seepledger.aquifer.Screen;
import org.seepledger.aquifer.Well;
import org.seepledger.prism.Surroundings;

/** Copies those lines of a table that are for some cells of the grid; cells of text stay as they are. */
public final class TableCut implements AutoCloseable {

    private final TableReader table;
    private final CSVPrinter printer;

    private TableCut(Path from, String shownName, Path to) throws IOException {
        table = TableReader.open(from, shownName, Long.MAX_VALUE);
        Writer text = Files.newBufferedWriter(to);
        printer = new CSVPrinter(text, table.dialect().format());
        write(table.headerLine());
    }

    /**
     * Copies a table of values on the grid. Lines that hold for the whole grid stay.
     *
     * @param from the table
     * @param shownName the table as the user named it
     * @param frame what its lines are placed in
     * @param cells the cells whose lines stay
     * @param to the copy
     * @throws IOException if it cannot be written
     */
    public static void ofCells(Path from, String shownName, Frame frame, Surroundings cells, Path to)
            throws IOException {
        try (TableCut cut = new TableCut(from, shownName, to)) {
            Placement placement = Placement.of(cut.table.header(), frame);
            int columns = frame.grid().columns();
            while (cut.table.next()) {
                long place = placement.index(cut.table);
                boolean wholeGrid = placement instanceof Placement.WholeGrid;
                if (wholeGrid || cells.holds((int) (place / columns), (int) (place % columns))) {
                    cut.write(cut.table.current());
                }
            }
        }
    }

    /**
     * Copies a table of points. The first line of each category stays wherever its point is, so that a budget has the same
     * rows.
     *
     * @param from the table
     * @param shownName the table as the user named it
     * @param frame what its lines are placed in
     * @param cells the cells whose points stay
     * @param to the copy
     * @throws IOException if it cannot be written
     */
    public static void ofPoints(Path from, String shownName, Frame frame, Surroundings cells, Path to)
            throws IOException {
        try (TableCut cut = new TableCut(from, shownName, to)) {
            Header header = cut.table.header();
            int x = header.required("x");
            int y = header.required("y");
            OptionalInt category = header.known("category");
            Set<String> categories = new HashSet<>();
            while (cut.table.next()) {
                boolean first = categories.add(category.isPresent() ? cut.table.text(category.getAsInt()) : "");
                Well point =
                        new Well("", "", cut.table.number(x), cut.table.number(y), new Screen.InLayer(0), List.of());
                PlacedWell placed = PlacedWell.of(point, frame.grid());
                if (first || cells.holds(placed.row(), placed.column())) {
                    cut.write(cut.table.current());
                }
            }
        }
    }

    private void write(TableReader.Line line) throws IOException {
        for (String note : line.notes()) {
            printer.printComment(note);
        }
        printer.printRecord(line.cells());
    }

    @Override
    public void close() throws IOException {
        table.close();
        printer.close();
    }
}
