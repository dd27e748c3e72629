package org.seepledger.job;

import java.util.ArrayList;
import java.util.List;
import org.seepledger.aquifer.Aquifer;
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
        int rows = Math.max(1, CELLS_AT_ONCE / aquifer.grid().columns());
        for (int step = 0; step < steps; step++) {
            for (int layer = 0; layer < layers; layer++) {
                for (int row = 0; row < aquifer.grid().rows(); row += rows) {
                    int height = Math.min(rows, aquifer.grid().rows() - row);
                    read(layer, step, new Window(row, 0, height, aquifer.grid().columns()));
                }
            }
        }
        String unit = quantity.unit().toString();
        return new ValueRange(quantity.name(), unit, least, leastAt, greatest, greatestAt, values, missing);
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
        StringBuilder place = new StringBuilder();
        if (quantity.values().layered()) {
            place.append("layer ").append(layer + 1).append(", ");
        }
        place.append("row ").append(window.row() + cell / window.columns() + 1);
        place.append(", column ").append(window.column() + cell % window.columns() + 1);
        if (quantity.values().changes()) {
            boolean instants = quantity.steps() == StepKind.INSTANT;
            place.append(instants ? ", instant " + step : ", interval " + (step + 1));
        }
        return place.toString();
    }
}
