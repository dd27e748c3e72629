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
        return of(grid, spot.row(), spot.column());
    }

    /**
     * {@return where a cell's centre lies}
     *
     * @param grid the grid
     * @param row its row, from 0 in the north
     * @param column its column, from 0
     */
    public static CellPlace of(Grid grid, int row, int column) {
        int fromSouth = grid.flipped(row);
        double x = grid.x().edge(column) + 0.5 * grid.x().size(column);
        double y = grid.y().edge(fromSouth) + 0.5 * grid.y().size(fromSouth);
        return new CellPlace(grid.mapX(x, y), grid.mapY(x, y));
    }
}
