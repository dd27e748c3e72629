package org.seepledger.io.table;

import java.util.List;
import java.util.Optional;
import org.seepledger.fault.DataFault;

/** Takes the values of a table over, line by line. */
final class GridFiller {

    private final TableReader table;
    private final GridLayout layout;
    private final GridValues values;
    private final Repeats repeats;
    private final Below below;
    private final List<Integer> columns;
    private final DataFault[] faults;
    private final double[] line;

    GridFiller(TableReader table, GridLayout layout, GridValues values, Repeats repeats, Below below) {
        this.table = table;
        this.layout = layout;
        this.values = values;
        this.repeats = repeats;
        this.below = below;
        this.columns = layout.valueColumns();
        this.faults = new DataFault[columns.size()];
        this.line = new double[columns.size()];
    }

    /**
     * {@return for each value column the first cell that is not a number, or null}
     *
     * <p>They are no fault of the table: the column may be one that nobody asks for, as remarks.
     *
     * @throws DataFault if a line is not on the grid, or gives a place twice that may not be
     */
    DataFault[] fill() {
        while (table.next()) {
            long cell = layout.placement().index(table);
            int layer = index(layout.layer());
            int step = index(layout.step());
            readLine();
            for (int k = first(layer); k < end(layer, layout.layers()); k++) {
                for (int s = first(step); s < end(step, layout.steps()); s++) {
                    put(k, s, cell);
                }
            }
        }
        return faults;
    }

    /** In a table whose lines add, an empty cell would add to every layer or step: hardly what was meant. */
    private int index(Optional<Ordinal> ordinal) {
        if (ordinal.isEmpty()) {
            return 0;
        }
        return repeats == Repeats.ADDED
                ? ordinal.get().index(table)
                : ordinal.get().indexOrAll(table);
    }

    private static int first(int index) {
        return index == Ordinal.ALL ? 0 : index;
    }

    private static int end(int index, int count) {
        return index == Ordinal.ALL ? count : index + 1;
    }

    private void readLine() {
        for (int value = 0; value < line.length; value++) {
            line[value] = Double.NaN;
            if (faults[value] == null) {
                try {
                    line[value] = table.number(columns.get(value), below);
                } catch (DataFault fault) {
                    faults[value] = fault;
                }
            }
        }
    }

    private void put(int layer, int step, long cell) {
        boolean given = values.isGiven(layout.plane(0, layer, step) + cell);
        if (given && repeats == Repeats.REFUSED) {
            throw twice(layer, step, cell);
        }
        for (int value = 0; value < line.length; value++) {
            long index = layout.plane(value, layer, step) + cell;
            double before = given ? values.get(index) : Double.NaN;
            double now = line[value];
            if (Double.isNaN(before)) {
                values.set(index, now);
            } else if (!Double.isNaN(now)) {
                values.set(index, before + now);
            }
        }
    }

    private DataFault twice(int layer, int step, long cell) {
        StringBuilder place = new StringBuilder("a second line for ");
        place.append(layout.placement().describe(cell));
        layout.layer().ifPresent(ordinal -> place.append(", layer ").append(layer + ordinal.first()));
        layout.step()
                .ifPresent(ordinal -> place.append(", ")
                        .append(table.header().name(ordinal.column()))
                        .append(' ')
                        .append(step + ordinal.first()));
        return table.fault(
                place.toString(),
                "one line for each place and time",
                "Take one of the lines out, or add the columns that tell them apart (x and y, or row and col; layer; "
                        + "interval or instant).");
    }
}
