package org.seepledger.desktop.map;

import org.seepledger.aquifer.Axis;
import org.seepledger.aquifer.Grid;

/**
 * An even lattice of texels over a grid: its own cells where they are even, else small enough for its smallest cells, as
 * far as memory allows. Row 0 is at the greatest local y.
 */
final class Lattice {

    private static final int MOST = 4096;

    private final Grid grid;
    private final int[] columns;
    private final int[] rows;
    private final double stepX;
    private final double stepY;

    private Lattice(Grid grid, int[] columns, int[] rows) {
        this.grid = grid;
        this.columns = columns;
        this.rows = rows;
        this.stepX = grid.x().edge(grid.columns()) / columns.length;
        this.stepY = grid.y().edge(grid.rows()) / rows.length;
    }

    static Lattice of(Grid grid) {
        int[] columns = cells(grid.x());
        int[] up = cells(grid.y());
        int[] rows = new int[up.length];
        for (int i = 0; i < rows.length; i++) {
            rows[i] = grid.flipped(up[up.length - 1 - i]);
        }
        return new Lattice(grid, columns, rows);
    }

    private static int[] cells(Axis axis) {
        double length = axis.edge(axis.count());
        int count = axis.isEven()
                ? axis.count()
                : (int) Math.max(axis.count(), Math.min(MOST, Math.ceil(length / axis.smallest())));
        int[] cells = new int[count];
        for (int i = 0; i < count; i++) {
            cells[i] = axis.isEven() ? i : Math.min(axis.count() - 1, axis.cellAt(length * (i + 0.5) / count));
        }
        return cells;
    }

    int columns() {
        return columns.length;
    }

    int rows() {
        return rows.length;
    }

    /** The column of cells that a column of texels shows. */
    int column(int texel) {
        return columns[texel];
    }

    /** The row of cells that a row of texels shows. */
    int row(int texel) {
        return rows[texel];
    }

    Grid grid() {
        return grid;
    }

    double stepX() {
        return stepX;
    }

    double stepY() {
        return stepY;
    }
}
