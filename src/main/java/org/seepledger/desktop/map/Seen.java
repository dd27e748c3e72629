package org.seepledger.desktop.map;

import java.util.Optional;
import org.seepledger.aquifer.Grid;
import org.seepledger.aquifer.Window;

/** Which cells are seen, as blocks that begin and end where squares of cells do. */
final class Seen {

    private Seen() {}

    /** The cells that are seen; empty if none is. */
    static Optional<Window> of(Grid grid, Camera camera, int stride) {
        Extent seen = Extent.inGrid(grid, camera);
        double width = grid.x().edge(grid.columns());
        double height = grid.y().edge(grid.rows());
        if (seen.east() <= 0 || seen.west() >= width || seen.north() <= 0 || seen.south() >= height) {
            return Optional.empty();
        }
        int firstRow = grid.flipped(grid.y().nearest(seen.north()));
        int lastRow = grid.flipped(grid.y().nearest(seen.south()));
        return Optional.of(snapped(
                grid,
                stride,
                firstRow,
                lastRow,
                grid.x().nearest(seen.west()),
                grid.x().nearest(seen.east())));
    }

    /** A block with as much again around it, half on each side. */
    static Window around(Grid grid, Window window, int stride) {
        int down = window.rows() / 2;
        int across = window.columns() / 2;
        return snapped(
                grid,
                stride,
                window.row() - down,
                window.rowEnd() - 1 + down,
                window.column() - across,
                window.columnEnd() - 1 + across);
    }

    private static Window snapped(Grid grid, int stride, int firstRow, int lastRow, int firstColumn, int lastColumn) {
        int row = Math.max(0, firstRow) / stride * stride;
        int column = Math.max(0, firstColumn) / stride * stride;
        int rows = Math.min(grid.rows(), (lastRow / stride + 1) * stride) - row;
        int columns = Math.min(grid.columns(), (lastColumn / stride + 1) * stride) - column;
        return new Window(row, column, rows, columns);
    }
}
