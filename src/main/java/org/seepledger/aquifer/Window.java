package org.seepledger.aquifer;

/**
 * A block of cells.
 *
 * @param row the northernmost row, from 0
 * @param column the first column, from 0
 * @param rows the number of rows, at least 1
 * @param columns the number of columns, at least 1
 */
public record Window(int row, int column, int rows, int columns) {

    public Window {
        if (row < 0 || column < 0 || rows < 1 || columns < 1) {
            throw new IllegalArgumentException(
                    "not a block of cells: " + row + ", " + column + ", " + rows + ", " + columns);
        }
    }

    /**
     * {@return the number of cells}
     */
    public int size() {
        return Math.multiplyExact(rows, columns);
    }

    /**
     * {@return the row after the last}
     */
    public int rowEnd() {
        return row + rows;
    }

    /**
     * {@return the column after the last}
     */
    public int columnEnd() {
        return column + columns;
    }

    /**
     * {@return whether a cell lies in the block}
     *
     * @param cellRow the cell's row in the grid
     * @param cellColumn the cell's column in the grid
     */
    public boolean contains(int cellRow, int cellColumn) {
        return cellRow >= row && cellRow < rowEnd() && cellColumn >= column && cellColumn < columnEnd();
    }

    /**
     * {@return whether another block lies in this one}
     *
     * @param other the other block
     */
    public boolean contains(Window other) {
        return contains(other.row(), other.column()) && contains(other.rowEnd() - 1, other.columnEnd() - 1);
    }

    /**
     * {@return the place of a cell in a row-major array of this block}
     *
     * @param cellRow the cell's row in the grid
     * @param cellColumn the cell's column in the grid
     */
    public int index(int cellRow, int cellColumn) {
        return (cellRow - row) * columns + cellColumn - column;
    }

    /**
     * {@return this block with a ring of cells around it, as far as the grid reaches}
     *
     * @param ring the width of the ring in cells
     * @param grid the grid
     */
    public Window widened(int ring, Grid grid) {
        int top = Math.max(0, row - ring);
        int left = Math.max(0, column - ring);
        int bottom = Math.min(grid.rows(), rowEnd() + ring);
        int right = Math.min(grid.columns(), columnEnd() + ring);
        return new Window(top, left, bottom - top, right - left);
    }
}
