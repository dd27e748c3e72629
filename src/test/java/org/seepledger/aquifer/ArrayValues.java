package org.seepledger.aquifer;

import java.util.Arrays;
import java.util.List;

/** Values from arrays, for tests: {@code values[step][layer][row * columns + column]}. */
public record ArrayValues(int columns, double[][][] values) implements GriddedValues {

    public static ArrayValues steady(int columns, double[]... layers) {
        return new ArrayValues(columns, new double[][][] {layers});
    }

    @Override
    public void read(int layer, int step, Window window, double[] target, int offset) {
        double[][] layers = values[changes() ? step : 0];
        double[] from = layers[layered() ? layer : 0];
        for (int row = 0; row < window.rows(); row++) {
            int start = (window.row() + row) * columns + window.column();
            System.arraycopy(from, start, target, offset + row * window.columns(), window.columns());
        }
    }

    /** Each array counts as a file of its own; a dry cell's infinite head as a number that nothing is multiplied by. */
    @Override
    public List<Stored> stored(int layer, int step, Window window) {
        double[] block = new double[window.size()];
        read(layer, step, window, block, 0);
        Arrays.setAll(block, i -> Double.isInfinite(block[i]) ? -999 : block[i]);
        String place = "step " + (changes() ? step : 0) + ", layer " + (layered() ? layer : 0);
        return List.of(new Stored("array " + System.identityHashCode(values), place, false, block, 1));
    }

    @Override
    public boolean changes() {
        return values.length > 1;
    }

    @Override
    public boolean layered() {
        return values[0].length > 1;
    }
}
