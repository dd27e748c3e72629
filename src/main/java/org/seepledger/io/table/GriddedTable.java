package org.seepledger.io.table;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.Locale;
import java.util.Optional;
import org.seepledger.aquifer.GriddedValues;
import org.seepledger.fault.DataFault;
import org.seepledger.unit.Measure;

/**
 * A table of values on the grid, with any number of value columns, read once.
 *
 * <p>Values are given as they stand in the file: neither unit nor scale is applied. They are kept in a temporary file
 * until the table is closed.
 */
public final class GriddedTable implements AutoCloseable {

    /** What of a scratch file with holes one value takes at most: a page of memory. */
    private static final long PAGE = 4_096;

    private final GridLayout layout;
    private final Scratch scratch;
    private final GridValues values;
    private final DataFault[] faults;
    private final int gridColumns;

    private GriddedTable(
            TableReader table, GridLayout layout, Scratch scratch, Frame frame, Repeats repeats, Below below) {
        this.layout = layout;
        this.scratch = scratch;
        this.values = new GridValues(layout, scratch);
        this.faults = new GridFiller(table, layout, values, repeats, below).fill();
        this.gridColumns = frame.grid().columns();
    }

    /**
     * {@return a table, read in one pass}
     *
     * @param file the file
     * @param shownName the file as the user named it
     * @param frame what its lines are placed in
     * @param repeats what lines mean that give the same cell, layer and step
     * @param below what cells mean that begin with {@code <}
     * @throws DataFault if it cannot be read, its header cannot be understood, or a line is not on the grid or, where
     *     that is refused, given twice
     */
    public static GriddedTable open(Path file, String shownName, Frame frame, Repeats repeats, Below below) {
        return open(file, shownName, frame, repeats, below, Path.of(System.getProperty("java.io.tmpdir")));
    }

    static GriddedTable open(
            Path file, String shownName, Frame frame, Repeats repeats, Below below, Path scratchFolder) {
        try (TableReader table = TableReader.open(file, shownName, Long.MAX_VALUE)) {
            GridLayout layout = new GridLayout(table.header(), frame);
            Scratch scratch = new Scratch(scratchFolder, words(layout, file, shownName, scratchFolder));
            try {
                return new GriddedTable(table, layout, scratch, frame, repeats, below);
            } catch (RuntimeException e) {
                scratch.close();
                throw e;
            }
        }
    }

    private static long words(GridLayout layout, Path file, String shownName, Path scratchFolder) {
        long words = layout.size();
        if (words > Scratch.MOST_WORDS) {
            throw tooLarge(shownName, "room for more values than can be kept", "at most " + Scratch.MOST_WORDS);
        }
        try {
            long bytes = Math.min(words * Long.BYTES, Files.size(file) * PAGE);
            long free = Files.getFileStore(scratchFolder).getUsableSpace();
            if (bytes > free) {
                throw tooLarge(shownName, gigabytes(bytes) + " of temporary space", "the free " + gigabytes(free));
            }
            return words;
        } catch (IOException e) {
            throw tooLarge(shownName, "temporary space", "a folder for temporary files");
        }
    }

    private static DataFault tooLarge(String shownName, String found, String expected) {
        return new DataFault(
                shownName,
                "",
                "a table that needs " + found,
                expected,
                "Take columns out that are not needed, or name another temporary folder with java "
                        + "-Djava.io.tmpdir=FOLDER.");
    }

    private static String gigabytes(long bytes) {
        return String.format(Locale.ROOT, "%.1f GB", bytes / 1e9);
    }

    /** {@return the names of the value columns, in order} */
    public List<String> columns() {
        return layout.valueColumns().stream().map(layout.header()::name).toList();
    }

    /** {@return whether lines tell no cells apart; then each holds for the whole grid} */
    public boolean isWholeGrid() {
        return layout.placement().count() == 1;
    }

    /**
     * {@return the value column that is meant: the one asked for, or, if none is, the only one}
     *
     * @param asked the name, without unit
     * @throws DataFault if there is no such column, or none is asked for and there are several
     */
    public String column(Optional<String> asked) {
        if (asked.isPresent()) {
            number(asked.get());
            return asked.get();
        }
        if (columns().size() > 1) {
            throw layout.header()
                    .fault(
                            "the columns " + Shown.list(columns(), 30),
                            "one column of values where no column is named",
                            "Name the one that is meant with \"column\".");
        }
        return columns().get(0);
    }

    private int number(String column) {
        int number = columns().indexOf(column);
        if (number < 0) {
            throw layout.header().missing(column, columns());
        }
        return number;
    }

    /**
     * {@return the unit that a value column's header carries}
     *
     * @param column the name of the column
     * @throws DataFault if there is no such column, or its unit is not known
     */
    public Optional<Measure> unit(String column) {
        return layout.header().unit(layout.valueColumns().get(number(column)));
    }

    /**
     * {@return the unit of a value column that is given at two places: with the column, and where the column is named}
     *
     * @param column the name of the column
     * @param named the unit that is given where the column is named
     * @throws DataFault if there is no such column, its unit is not known, or the two are not the same
     */
    public Optional<Measure> unit(String column, Optional<Measure> named) {
        Optional<Measure> own = unit(column);
        if (own.isEmpty() || named.isEmpty()) {
            return own.or(() -> named);
        }
        Measure unit = own.get();
        if (!unit.isCompatible(named.get()) || unit.in(named.get()) != 1) {
            throw layout.header()
                    .fault(
                            layout.valueColumns().get(number(column)),
                            "the unit " + Shown.text(unit.toString()),
                            Shown.text(named.get().toString()) + ", the unit that is given where the column is named",
                            "Give the unit at one of the two places.");
        }
        return own;
    }

    /**
     * {@return the values of a column, as they stand in the file; {@code NaN} where there is none}
     *
     * @param column the name of the column
     * @param kind what the steps are at which values will be asked for; a table without {@code interval} or
     *     {@code instant} holds at all
     * @throws DataFault if there is no such column, one of its cells is not a number, or the table tells other steps
     *     apart
     */
    public GriddedValues values(String column, StepKind kind) {
        int number = number(column);
        if (faults[number] != null) {
            throw faults[number];
        }
        if (layout.kind() != StepKind.NONE && layout.kind() != kind) {
            throw otherSteps(column, kind);
        }
        return values.column(number, gridColumns);
    }

    private DataFault otherSteps(String column, StepKind kind) {
        String wanted = switch (kind) {
            case NONE ->
                "neither interval nor instant, since what " + Shown.text(column) + " is read for does not change";
            case INTERVAL -> "\"interval\", since " + Shown.text(column) + " is read for intervals";
            case INSTANT -> "\"instant\", since " + Shown.text(column) + " is read for instants";
        };
        return layout.header()
                .fault(
                        layout.step().orElseThrow().column(),
                        "a column of " + layout.kind().name().toLowerCase(Locale.ROOT) + "s",
                        wanted,
                        "Give a table with the right column, or without one where the values hold throughout.");
    }

    /** Gives the temporary space back; values can no longer be read. */
    @Override
    public void close() {
        scratch.close();
    }
}
