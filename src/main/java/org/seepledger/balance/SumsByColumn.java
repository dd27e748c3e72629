package org.seepledger.balance;

import org.seepledger.aquifer.Window;

/** A sum for each column of cells of a window; what is added goes to the column that was named last. */
public final class SumsByColumn {

    private final Window window;
    private final double[] sums;
    private int column;

    /**
     * Begins with nothing.
     *
     * @param window the window
     */
    public SumsByColumn(Window window) {
        this.window = window;
        this.sums = new double[window.size()];
    }

    /**
     * Names the column that all that follows goes to.
     *
     * @param cellRow its row in the grid
     * @param cellColumn its column in the grid
     */
    public void at(int cellRow, int cellColumn) {
        column = window.index(cellRow, cellColumn);
    }

    /**
     * Adds to the column's sum.
     *
     * @param amount what is added
     */
    public void add(double amount) {
        sums[column] += amount;
    }

    /**
     * {@return the sum of a column}
     *
     * @param cellRow its row in the grid
     * @param cellColumn its column in the grid
     */
    public double get(int cellRow, int cellColumn) {
        return sums[window.index(cellRow, cellColumn)];
    }
}
