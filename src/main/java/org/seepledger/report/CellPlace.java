package org.seepledger.report;

import org.seepledger.aquifer.Grid;
import org.seepledger.balance.HotSpot;

/**
 * Where the centre of a cell lies on the map.
 *
 * @param x map x
 * @param y map y
 */
public record CellPlace(double x, double y) {

    /**
     * {@return where a cell's centre lies}
     *
     * @param grid the grid
     * @param spot the cell
     */
    public static CellPlace of(Grid grid, HotSpot spot) {
        int fromSouth = grid.flipped(spot.row());
        double x = grid.x().edge(spot.column()) + 0.5 * grid.x().size(spot.column());
        double y = grid.y().edge(fromSouth) + 0.5 * grid.y().size(fromSouth);
        return new CellPlace(grid.mapX(x, y), grid.mapY(x, y));
    }
}
