package org.seepledger.aquifer;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import org.seepledger.fault.DataFault;

/**
 * A well in its cell. It is taken a hundred-millionth of a cell east and a billionth north of its place, so that it
 * never lies on a side or a grid line.
 *
 * @param well the well
 * @param row its row in the grid
 * @param column its column in the grid
 * @param across how far it lies along x in its cell, from 0 in the west to 1
 * @param up how far it lies along y in its cell, from 0 in the south to 1
 */
public record PlacedWell(Well well, int row, int column, double across, double up) {

    private static final double EAST = 1e-8;
    private static final double NORTH = 1e-9;

    /**
     * {@return a well in its cell}
     *
     * @param well a well on the grid
     * @param grid the grid
     */
    public static PlacedWell of(Well well, Grid grid) {
        double x = grid.snappedX(well.x(), well.y());
        double y = grid.snappedY(well.x(), well.y());
        int column = grid.x().cellAt(x);
        int fromSouth = grid.y().cellAt(y);
        return new PlacedWell(
                well,
                grid.flipped(fromSouth),
                column,
                inside((x - grid.x().edge(column)) / grid.x().size(column), EAST),
                inside((y - grid.y().edge(fromSouth)) / grid.y().size(fromSouth), NORTH));
    }

    private static double inside(double place, double shift) {
        return place + shift < 1 ? place + shift : 1 - shift;
    }

    /**
     * Shares the mean rate of an interval out over the well's layers: by transmissivity behind the screen in each active
     * cell where conductivity is known, else by the length of screen there.
     *
     * @param rate the well's mean rate, length³/time, not 0
     * @param geometry a block of cells that holds the well's
     * @param active whether each of them is active
     * @param conductivity their horizontal conductivity, where known
     * @return a rate per layer that the well reaches
     * @throws DataFault if the screen reaches no active cell
     */
    List<WellRate> shares(double rate, CellGeometry geometry, boolean[] active, Optional<double[]> conductivity) {
        double[] weights = new double[geometry.block().layers()];
        double total = 0;
        for (int layer = 0; layer < weights.length; layer++) {
            int cell = geometry.block().cell(layer, row, column);
            double conducting = conductivity.map(values -> values[cell]).orElse(1.0);
            weights[layer] = active[cell] ? weight(layer, geometry.top(cell), geometry.bottom(cell), conducting) : 0;
            total += weights[layer];
        }
        if (!(total > 0)) {
            throw inInactiveCell();
        }
        List<WellRate> rates = new ArrayList<>();
        for (int layer = 0; layer < weights.length; layer++) {
            if (weights[layer] > 0) {
                rates.add(new WellRate(this, layer, rate * (weights[layer] / total)));
            }
        }
        return rates;
    }

    private double weight(int layer, double top, double bottom, double conducting) {
        if (well.screen() instanceof Screen.Between between) {
            return conducting * Math.max(0, Math.min(top, between.top()) - Math.max(bottom, between.bottom()));
        }
        return ((Screen.InLayer) well.screen()).layer() == layer ? 1 : 0;
    }

    private DataFault inInactiveCell() {
        String where = well.screen() instanceof Screen.InLayer in
                ? "layer " + (in.layer() + 1) + ", row " + (row + 1) + ", column " + (column + 1)
                : "row " + (row + 1) + ", column " + (column + 1);
        return new DataFault(
                well.schedule().get(0).place(),
                "well \"" + well.name() + "\"",
                "no active cell behind its screen (" + where + ")",
                "a well in an active cell",
                "Correct its place or layer, or leave it out while the cell is inactive.");
    }
}
