package org.seepledger.sample;

import java.util.Arrays;

/**
 * A grid of blocks: columns and rows of any size, and layers between surfaces.
 *
 * <p>A face has a cell behind it (west, south or below) and one ahead (east, north or above), or {@link #OUTSIDE}.
 * Faces across x come first, then those across y, then those across z.
 */
final class BlockGrid {

    /** Stands for the cell beyond an outer face. */
    static final int OUTSIDE = -1;

    private final double[] columnEdges;
    private final double[] rowEdges;
    private final double[][] surfaces;
    private final int[] behind;
    private final int[] ahead;

    /**
     * Makes the grid.
     *
     * @param columnEdges increasing, from the west, in metres
     * @param rowEdges increasing, from the south, in metres
     * @param surfaces elevations: the top of the first layer, then the bottom of each; row-major, row 0 in the north
     */
    BlockGrid(double[] columnEdges, double[] rowEdges, double[][] surfaces) {
        this.columnEdges = columnEdges.clone();
        this.rowEdges = rowEdges.clone();
        this.surfaces = surfaces.clone();
        this.behind = new int[top(0) + (layers() + 1) * cellsInLayer()];
        this.ahead = new int[behind.length];
        Arrays.fill(behind, OUTSIDE);
        Arrays.fill(ahead, OUTSIDE);
        for (int cell = 0; cell < cells(); cell++) {
            ahead[west(cell)] = cell;
            behind[east(cell)] = cell;
            ahead[south(cell)] = cell;
            behind[north(cell)] = cell;
            ahead[bottom(cell)] = cell;
            behind[top(cell)] = cell;
        }
    }

    int columns() {
        return columnEdges.length - 1;
    }

    int rows() {
        return rowEdges.length - 1;
    }

    int layers() {
        return surfaces.length - 1;
    }

    int cellsInLayer() {
        return rows() * columns();
    }

    int cells() {
        return layers() * cellsInLayer();
    }

    int faces() {
        return behind.length;
    }

    int cell(int layer, int row, int column) {
        return (layer * rows() + row) * columns() + column;
    }

    int layer(int cell) {
        return cell / cellsInLayer();
    }

    int row(int cell) {
        return cell / columns() % rows();
    }

    int column(int cell) {
        return cell % columns();
    }

    int west(int cell) {
        return cell + cell / columns();
    }

    int east(int cell) {
        return west(cell) + 1;
    }

    int north(int cell) {
        int facesAcrossX = layers() * rows() * (columns() + 1);
        return facesAcrossX + cell + layer(cell) * columns();
    }

    int south(int cell) {
        return north(cell) + columns();
    }

    int top(int cell) {
        int facesAcrossY = layers() * (rows() + 1) * columns();
        return layers() * rows() * (columns() + 1) + facesAcrossY + cell;
    }

    int bottom(int cell) {
        return top(cell) + cellsInLayer();
    }

    int behind(int face) {
        return behind[face];
    }

    int ahead(int face) {
        return ahead[face];
    }

    /** The size along x. */
    double width(int cell) {
        return columnEdges[column(cell) + 1] - columnEdges[column(cell)];
    }

    /** The size along y. */
    double height(int cell) {
        int edge = rows() - 1 - row(cell);
        return rowEdges[edge + 1] - rowEdges[edge];
    }

    double area(int cell) {
        return width(cell) * height(cell);
    }

    double centreX(int cell) {
        return (columnEdges[column(cell)] + columnEdges[column(cell) + 1]) / 2;
    }

    double centreY(int cell) {
        int edge = rows() - 1 - row(cell);
        return (rowEdges[edge] + rowEdges[edge + 1]) / 2;
    }

    double topElevation(int cell) {
        return surfaces[layer(cell)][cell % cellsInLayer()];
    }

    double bottomElevation(int cell) {
        return surfaces[layer(cell) + 1][cell % cellsInLayer()];
    }

    double thickness(int cell) {
        return topElevation(cell) - bottomElevation(cell);
    }

    /** The top of the first layer (0), or the bottom of a layer (from 1): an elevation per cell in plan. */
    double[] surface(int index) {
        return surfaces[index].clone();
    }

    /** The cell of the first layer at a place that lies on no cell's edge. */
    int cellAt(double x, double y) {
        int column = -Arrays.binarySearch(columnEdges, x) - 2;
        int edge = -Arrays.binarySearch(rowEdges, y) - 2;
        return cell(0, rows() - 1 - edge, column);
    }

    double[] columnEdges() {
        return columnEdges.clone();
    }

    double[] rowEdges() {
        return rowEdges.clone();
    }
}
