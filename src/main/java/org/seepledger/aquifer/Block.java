package org.seepledger.aquifer;

/**
 * The cells of a window in every layer, and where their values and those of their faces stand in arrays.
 *
 * @param window the window
 * @param layers the number of layers
 */
public record Block(Window window, int layers) {

    /**
     * {@return the number of cells}
     */
    public int size() {
        return layers * window.size();
    }

    /**
     * {@return where a cell's value stands}
     *
     * @param layer its layer, from 0
     * @param row its row in the grid
     * @param column its column in the grid
     */
    public int cell(int layer, int row, int column) {
        return layer * window.size() + window.index(row, column);
    }

    /**
     * {@return where the flow through an x-face stands: the west face of the cell, or the east face of the one before}
     *
     * @param layer its layer, from 0
     * @param row its row in the grid
     * @param column the column that it is the west face of
     */
    public int xFace(int layer, int row, int column) {
        return (layer * window.rows() + row - window.row()) * (window.columns() + 1) + column - window.column();
    }

    /**
     * {@return where the flow through a y-face stands: the north face of the cell, or the south face of the one before}
     *
     * @param layer its layer, from 0
     * @param row the row that it is the north face of
     * @param column its column in the grid
     */
    public int yFace(int layer, int row, int column) {
        return (layer * (window.rows() + 1) + row - window.row()) * window.columns() + column - window.column();
    }

    /**
     * {@return where the flow through an interface stands: the top of the layer, or the bottom of the one above}
     *
     * @param layer the layer that it is the top of, from 0; the number of layers for the lowest bottom
     * @param row its row in the grid
     * @param column its column in the grid
     */
    public int zFace(int layer, int row, int column) {
        return cell(layer, row, column);
    }

    /**
     * Reads one quantity in every layer.
     *
     * @param values the quantity
     * @param step the interval or instant
     * @return a value per cell
     */
    public double[] read(GriddedValues values, int step) {
        double[] target = new double[size()];
        for (int layer = 0; layer < layers; layer++) {
            values.read(layer, step, window, target, layer * window.size());
        }
        return target;
    }
}
