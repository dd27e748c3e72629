package org.seepledger.io.table;

import java.util.Arrays;
import org.seepledger.aquifer.GriddedValues;
import org.seepledger.aquifer.Window;

/**
 * The values of a table as they are kept in its scratch file.
 *
 * <p>A word is the value's bits, but for those of {@code NaN} taken as zero, so that what was never written has no
 * value, and a file with holes is as good as one filled with {@code NaN}.
 */
final class GridValues {

    private static final long NONE = Double.doubleToRawLongBits(Double.NaN);

    /** The word of a place that a line has given without a value: another NaN. */
    private static final long GIVEN_EMPTY = 1;

    private final GridLayout layout;
    private final Scratch scratch;

    GridValues(GridLayout layout, Scratch scratch) {
        this.layout = layout;
        this.scratch = scratch;
    }

    boolean isGiven(long index) {
        return scratch.get(index) != 0;
    }

    double get(long index) {
        return Double.longBitsToDouble(scratch.get(index) ^ NONE);
    }

    void set(long index, double value) {
        scratch.set(index, Double.isNaN(value) ? GIVEN_EMPTY : Double.doubleToRawLongBits(value) ^ NONE);
    }

    /**
     * {@return one value column as a quantity on the grid}
     *
     * @param value the number of the value column among the value columns
     * @param columns the number of columns of the grid
     */
    GriddedValues column(int value, int columns) {
        return new GriddedValues() {
            @Override
            public void read(int layer, int step, Window window, double[] target, int offset) {
                if (!scratch.isOpen()) {
                    throw new IllegalStateException("the table is closed");
                }
                long plane = layout.plane(value, layout.layers() == 1 ? 0 : layer, layout.steps() == 1 ? 0 : step);
                readPlane(plane, columns, window, target, offset);
            }

            @Override
            public boolean changes() {
                return layout.step().isPresent();
            }

            @Override
            public boolean layered() {
                return layout.layer().isPresent();
            }
        };
    }

    private void readPlane(long plane, int columns, Window window, double[] target, int offset) {
        if (layout.placement().count() == 1) {
            Arrays.fill(target, offset, offset + window.size(), get(plane));
            return;
        }
        int at = offset;
        for (int row = window.row(); row < window.rowEnd(); row++) {
            long first = plane + (long) row * columns + window.column();
            for (int column = 0; column < window.columns(); column++) {
                target[at++] = get(first + column);
            }
        }
    }
}
