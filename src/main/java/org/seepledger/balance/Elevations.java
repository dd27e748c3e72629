package org.seepledger.balance;

import java.util.Arrays;
import java.util.Optional;
import org.seepledger.aquifer.GriddedValues;
import org.seepledger.aquifer.Window;
import org.seepledger.prism.VerticalRange;

/** The elevations of a prism's top and bottom over the columns of a window; infinite where they are the grid's own. */
final class Elevations {

    private final Window window;
    private final double[] top;
    private final double[] bottom;

    Elevations(VerticalRange.Elevations range, Window window) {
        this.window = window;
        this.bottom = read(range.bottom(), window, Double.NEGATIVE_INFINITY);
        this.top = read(range.top(), window, Double.POSITIVE_INFINITY);
        for (int column = 0; column < top.length; column++) {
            top[column] = Math.max(top[column], bottom[column]);
        }
    }

    private static double[] read(Optional<GriddedValues> surface, Window window, double none) {
        double[] values = new double[window.size()];
        Arrays.fill(values, none);
        surface.ifPresent(given -> given.read(0, 0, window, values, 0));
        return values;
    }

    /** The top at a column of cells, not below the bottom; NaN where it has no value. */
    double top(int row, int column) {
        return top[window.index(row, column)];
    }

    /** The bottom at a column of cells; NaN where it has no value. */
    double bottom(int row, int column) {
        return bottom[window.index(row, column)];
    }
}
