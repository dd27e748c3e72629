package org.seepledger.balance;

import java.util.Arrays;
import org.seepledger.aquifer.Window;

/**
 * What each cell gains that nothing accounts for: inflow through its faces, sources and release from storage, length³/time,
 * mean over the record. Bands write their own rows.
 */
public final class Imbalance {

    private final Window window;
    private final double[][] layers;

    Imbalance(Window window, int layers) {
        this.window = window;
        this.layers = new double[layers][window.size()];
        for (double[] layer : this.layers) {
            Arrays.fill(layer, Double.NaN);
        }
    }

    void add(int layer, int row, int column, double mean) {
        int cell = window.index(row, column);
        layers[layer][cell] = Double.isNaN(layers[layer][cell]) ? mean : layers[layer][cell] + mean;
    }

    /**
     * {@return the cells that it is known for}
     */
    public Window window() {
        return window;
    }

    /**
     * {@return the number of layers}
     */
    public int layers() {
        return layers.length;
    }

    /**
     * {@return a cell's imbalance, length³/time; NaN where the cell is never active}
     *
     * @param layer its layer, from 0
     * @param row its row in the grid
     * @param column its column in the grid
     */
    public double at(int layer, int row, int column) {
        return layers[layer][window.index(row, column)];
    }

    /**
     * {@return the imbalances of a row of the window, west to east}
     *
     * @param layer the layer, from 0
     * @param row its row in the grid
     */
    public double[] row(int layer, int row) {
        int from = window.index(row, window.column());
        return Arrays.copyOfRange(layers[layer], from, from + window.columns());
    }
}
