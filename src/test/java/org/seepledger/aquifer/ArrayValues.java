package org.seepledger.aquifer;

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

    @Override
    public boolean changes() {
        return values.length > 1;
    }

    @Override
    public boolean layered() {
        return values[0].length > 1;
    }
}
