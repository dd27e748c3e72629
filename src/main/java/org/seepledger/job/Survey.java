package org.seepledger.job;

import java.util.ArrayList;
import java.util.List;
import org.seepledger.aquifer.Aquifer;
import org.seepledger.aquifer.Grid;
import org.seepledger.aquifer.GriddedValues;
import org.seepledger.aquifer.Window;
import org.seepledger.io.aquifer.Quantity;
import org.seepledger.io.table.StepKind;
import org.seepledger.progress.Progress;
import org.seepledger.report.ValueRange;

/** Reads every value of a set, band by band, and finds the range of each quantity. */
final class Survey {

    private static final int CELLS_AT_ONCE = 1 << 18;

    private final Aquifer aquifer;
    private final Quantity quantity;
    private double least = Double.NaN;
    private double greatest = Double.NaN;
    private String leastAt = "";
    private String greatestAt = "";
    private long values;
    private long missing;

    private Survey(Aquifer aquifer, Quantity quantity) {
        this.aquifer = aquifer;
        this.quantity = quantity;
    }

    static List<ValueRange> of(Aquifer aquifer, List<Quantity> quantities, Progress progress) {
        progress.begin("reading values", quantities.size());
        List<ValueRange> ranges = new ArrayList<>();
        for (Quantity quantity : quantities) {
            ranges.add(new Survey(aquifer, quantity).range());
            progress.step();
        }
        return ranges;
    }

    private ValueRange range() {
        int intervals = aquifer.times().intervals();
        int steps = quantity.steps() == StepKind.INSTANT ? intervals + 1 : intervals;
        steps = quantity.values().changes() ? steps : 1;
        int layers = quantity.values().layered() ? aquifer.layers().size() : 1;
        List<Window> windows = windows(aquifer.grid());
        for (int step = 0; step < steps; step++) {
            for (int layer = 0; layer < layers; layer++) {
                for (Window window : windows) {
                    read(layer, step, window);
                }
            }
        }
        String unit = quantity.unit().toString();
        return new ValueRange(quantity.name(), unit, least, leastAt, greatest, greatestAt, values, missing);
    }

    /** {@return bands of rows, from the northernmost, that hold a whole grid} */
    static List<Window> windows(Grid grid) {
        int rows = Math.max(1, CELLS_AT_ONCE / grid.columns());
        List<Window> windows = new ArrayList<>();
        for (int row = 0; row < grid.rows(); row += rows) {
            windows.add(new Window(row, 0, Math.min(rows, grid.rows() - row), grid.columns()));
        }
        return windows;
    }

    private void read(int layer, int step, Window window) {
        double[] block = new double[window.size()];
        quantity.values().read(layer, step, window, block, 0);
        for (int i = 0; i < block.length; i++) {
            if (!Double.isFinite(block[i])) {
                missing++;
                continue;
            }
            values++;
            if (!(block[i] >= least)) {
                least = block[i];
                leastAt = place(layer, step, window, i);
            }
            if (!(block[i] <= greatest)) {
                greatest = block[i];
                greatestAt = place(layer, step, window, i);
            }
        }
    }

    private String place(int layer, int step, Window window, int cell) {
        return place(quantity.values(), quantity.steps(), layer, step, window, cell);
    }

    /** {@return where a value stands, as {@code layer 1, row 2, column 3, instant 0}} */
    static String place(GriddedValues values, StepKind steps, int layer, int step, Window window, int cell) {
        StringBuilder place = new StringBuilder();
        if (values.layered()) {
            place.append("layer ").append(layer + 1).append(", ");
        }
        place.append("row ").append(window.row() + cell / window.columns() + 1);
        place.append(", column ").append(window.column() + cell % window.columns() + 1);
        if (values.changes()) {
            place.append(steps == StepKind.INSTANT ? ", instant " + step : ", interval " + (step + 1));
        }
        return place.toString();
    }
}
