package org.seepledger.io.table;

import java.util.Arrays;
import org.seepledger.aquifer.Grid;
import org.seepledger.aquifer.Times;

/**
 * What the lines of a table are placed in.
 *
 * @param grid the grid in plan
 * @param layers the number of layers, at least 1
 * @param times the instants
 */
public record Frame(Grid grid, int layers, Times times) {

    /** Checks the number of layers. */
    public Frame {
        if (layers < 1) {
            throw new IllegalArgumentException("there must be at least one layer");
        }
    }

    /** {@return the part of the map that the grid lies in, for messages} */
    String extent() {
        double east = grid.x().edge(grid.columns());
        double north = grid.y().edge(grid.rows());
        double[] x = {grid.mapX(0, 0), grid.mapX(east, 0), grid.mapX(0, north), grid.mapX(east, north)};
        double[] y = {grid.mapY(0, 0), grid.mapY(east, 0), grid.mapY(0, north), grid.mapY(east, north)};
        Arrays.sort(x);
        Arrays.sort(y);
        String turned = grid.rotation() == 0 ? "" : ", turned by " + CsvText.number(grid.rotation()) + " degrees";
        return "x " + CsvText.number(x[0]) + " to " + CsvText.number(x[3]) + " and y " + CsvText.number(y[0]) + " to "
                + CsvText.number(y[3]) + turned;
    }
}
