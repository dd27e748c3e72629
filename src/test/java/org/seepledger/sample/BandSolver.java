package org.seepledger.sample;

/**
 * Solves linear equations whose unknowns meet only those near them in order, by elimination without exchanging rows: for
 * matrices in which the diagonal outweighs the rest.
 */
final class BandSolver {

    private final int size;
    private final int reach;
    private final double[][] rows;

    /**
     * Takes the matrix.
     *
     * @param rows for each equation its coefficients from {@code reach} before the diagonal to {@code reach} after it; changed
     */
    BandSolver(double[][] rows) {
        this.rows = rows;
        this.size = rows.length;
        this.reach = rows[0].length / 2;
        for (int pivot = 0; pivot < size; pivot++) {
            for (int row = pivot + 1; row <= Math.min(size - 1, pivot + reach); row++) {
                double factor = at(row, pivot) / at(pivot, pivot);
                rows[row][place(row, pivot)] = factor;
                for (int column = pivot + 1; column <= Math.min(size - 1, pivot + reach); column++) {
                    rows[row][place(row, column)] -= factor * at(pivot, column);
                }
            }
        }
    }

    private int place(int row, int column) {
        return column - row + reach;
    }

    private double at(int row, int column) {
        return rows[row][place(row, column)];
    }

    double[] solve(double[] right) {
        double[] x = right.clone();
        for (int row = 0; row < size; row++) {
            for (int column = Math.max(0, row - reach); column < row; column++) {
                x[row] -= at(row, column) * x[column];
            }
        }
        for (int row = size - 1; row >= 0; row--) {
            for (int column = row + 1; column <= Math.min(size - 1, row + reach); column++) {
                x[row] -= at(row, column) * x[column];
            }
            x[row] /= at(row, row);
        }
        return x;
    }
}
