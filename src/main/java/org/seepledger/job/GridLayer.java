package org.seepledger.job;

import java.util.stream.DoubleStream;
import org.seepledger.aquifer.Window;

/**
 * A quantity in one layer over a window of the grid, a value for each square of cells.
 *
 * @param window the window
 * @param stride how many cells a square has along each side; squares at the window's south and east may have fewer
 * @param values the mean over each square's cells that have a value, row-major, row 0 northernmost; {@code NaN} where
 *     none has
 * @param limits of non-detects, the mean over each square's; {@code NaN} where none is. A square of non-detects alone has no
 *     value
 */
public record GridLayer(Window window, int stride, double[] values, double[] limits) {

    /**
     * {@return how many rows of squares there are}
     */
    public int rows() {
        return squares(window.rows(), stride);
    }

    /**
     * {@return how many columns of squares there are}
     */
    public int columns() {
        return squares(window.columns(), stride);
    }

    /**
     * {@return the value of a square}
     *
     * @param row its row of squares, from 0 in the north
     * @param column its column of squares, from 0 in the west
     */
    public double at(int row, int column) {
        return values[row * columns() + column];
    }

    /** {@return whether there is a non-detect anywhere} */
    public boolean hasNonDetects() {
        return DoubleStream.of(limits).anyMatch(limit -> !Double.isNaN(limit));
    }

    static int squares(int cells, int stride) {
        return (cells + stride - 1) / stride;
    }
}
