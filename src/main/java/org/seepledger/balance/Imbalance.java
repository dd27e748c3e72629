package org.seepledger.balance;

import java.util.Arrays;
import org.seepledger.aquifer.CellTerm;
import org.seepledger.aquifer.FaceFlows;
import org.seepledger.aquifer.IntervalState;
import org.seepledger.aquifer.WellRate;
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

    /** Adds what the cells of a window gain in one interval, times its share of the time. */
    void add(IntervalState state, Window rows, double weight) {
        for (int layer = 0; layer < layers.length; layer++) {
            double[] gains = gains(state, layer, rows);
            for (int i = 0; i < gains.length; i++) {
                if (!Double.isNaN(gains[i])) {
                    int row = rows.row() + i / rows.columns();
                    int cell = window.index(row, rows.column() + i % rows.columns());
                    double mean = gains[i] * weight;
                    layers[layer][cell] = Double.isNaN(layers[layer][cell]) ? mean : layers[layer][cell] + mean;
                }
            }
        }
    }

    /**
     * {@return what each cell of a window gains in an interval that nothing accounts for, length³/time, row-major, row 0
     * northernmost; NaN where it is inactive}
     *
     * @param state what is known of the interval
     * @param layer the layer, from 0
     * @param wanted the window, within that of the state and without its ring
     */
    public static double[] gains(IntervalState state, int layer, Window wanted) {
        FaceFlows flows = state.flows();
        double[] gains = added(state, layer, wanted);
        for (int row = wanted.row(); row < wanted.rowEnd(); row++) {
            for (int column = wanted.column(); column < wanted.columnEnd(); column++) {
                int place = wanted.index(row, column);
                boolean active = flows.active()[flows.block().cell(layer, row, column)];
                gains[place] = active ? flows.gain(layer, row, column) + gains[place] : Double.NaN;
            }
        }
        return gains;
    }

    /** What sources, storage and wells add to each cell. */
    private static double[] added(IntervalState state, int layer, Window wanted) {
        double[] added = new double[wanted.size()];
        for (CellTerm term : state.terms()) {
            for (int row = wanted.row(); row < wanted.rowEnd(); row++) {
                int first = state.flows().block().cell(layer, row, wanted.column());
                int place = wanted.index(row, wanted.column());
                for (int i = 0; i < wanted.columns(); i++) {
                    added[place + i] += term.rates()[first + i];
                }
            }
        }
        for (WellRate rate : state.wells()) {
            int row = rate.well().row();
            int column = rate.well().column();
            if (rate.layer() == layer && wanted.contains(row, column)) {
                added[wanted.index(row, column)] += rate.rate();
            }
        }
        return added;
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
