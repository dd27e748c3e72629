package org.seepledger.balance;

import java.util.function.Function;
import java.util.function.IntBinaryOperator;
import org.seepledger.aquifer.Window;

/**
 * Learns the weights of values that act on their own column of cells and the eight around it: ones every third cell are
 * booked at once, so that nine bookings serve for any number of values (Curtis, Powell and Reid 1974, J. Inst. Maths
 * Applics 13, 117–119).
 */
public final class OnesApart {

    private static final int APART = 3;

    private OnesApart() {}

    /** What each column of cells books of a row. */
    public interface Columns {
        /**
         * {@return the sum of a column of cells}
         *
         * @param row its row in the grid
         * @param column its column in the grid
         */
        double get(int row, int column);
    }

    /**
     * {@return the weights by cell of a block's window, row-major}
     *
     * @param block the window of the block, with the ring around what is booked
     * @param inner what is booked
     * @param booked books ones where the given cells are true
     */
    public static double[] weights(Window block, Window inner, Function<boolean[], Columns> booked) {
        double[] found = new double[block.size()];
        for (int first = 0; first < APART * APART; first++) {
            int firstRow = first / APART;
            int firstColumn = first % APART;
            Columns sums = booked.apply(lit(block, firstRow, firstColumn));
            addSums(
                    found,
                    inner,
                    sums,
                    (row, column) -> block.index(nearest(row, firstRow), nearest(column, firstColumn)));
        }
        return found;
    }

    private static void addSums(double[] found, Window inner, Columns sums, IntBinaryOperator place) {
        for (int row = inner.row(); row < inner.rowEnd(); row++) {
            for (int column = inner.column(); column < inner.columnEnd(); column++) {
                double sum = sums.get(row, column);
                if (sum != 0) {
                    found[place.applyAsInt(row, column)] += sum;
                }
            }
        }
    }

    private static boolean[] lit(Window block, int firstRow, int firstColumn) {
        boolean[] lit = new boolean[block.size()];
        for (int row = block.row(); row < block.rowEnd(); row++) {
            for (int column = block.column(); column < block.columnEnd(); column++) {
                lit[block.index(row, column)] = row % APART == firstRow && column % APART == firstColumn;
            }
        }
        return lit;
    }

    /** The row or column with a one that is the given one or next to it. */
    private static int nearest(int index, int first) {
        return index + Math.floorMod(first - index + 1, APART) - 1;
    }
}
