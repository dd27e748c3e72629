package org.seepledger.aquifer;

import java.util.function.IntToDoubleFunction;

/** Fills the x- and y-faces of a block from specific discharge at cell centres. */
final class HorizontalFaces {

    private final Grid grid;
    private final Block block;
    private final Saturation saturation;
    private final FaceFlows flows;
    private final boolean open;

    HorizontalFaces(CellGeometry geometry, Saturation saturation, FaceFlows flows, boolean open) {
        this.grid = geometry.grid();
        this.block = geometry.block();
        this.saturation = saturation;
        this.flows = flows;
        this.open = open;
    }

    void fill(double[] qx, double[] qy) {
        Window window = block.window();
        for (int layer = 0; layer < block.layers(); layer++) {
            for (int row = window.row(); row < window.rowEnd(); row++) {
                fillRow(layer, row, qx);
            }
            for (int column = window.column(); column < window.columnEnd(); column++) {
                fillColumn(layer, column, qy);
            }
        }
    }

    private void fillRow(int layer, int row, double[] qx) {
        Window window = block.window();
        double width = grid.height(row);
        for (int column = window.column(); column <= window.columnEnd(); column++) {
            int east = column < window.columnEnd() ? block.cell(layer, row, column) : -1;
            int west = column > window.column() ? block.cell(layer, row, column - 1) : -1;
            double flux = 0;
            if (west >= 0 && east >= 0) {
                flux = inner(qx, west, grid.width(column - 1), east, grid.width(column));
            } else if (column == 0) {
                flux = outer(qx, east, grid.width(0), column + 1 < window.columnEnd() ? east + 1 : -1, grid::width, 1);
            } else if (column == grid.columns()) {
                int next = column - 2 >= window.column() ? west - 1 : -1;
                flux = outer(qx, west, grid.width(column - 1), next, grid::width, column - 2);
            }
            flows.x()[block.xFace(layer, row, column)] = flux * width;
        }
    }

    private void fillColumn(int layer, int column, double[] qy) {
        Window window = block.window();
        double width = grid.width(column);
        int stride = window.columns();
        for (int row = window.row(); row <= window.rowEnd(); row++) {
            int south = row < window.rowEnd() ? block.cell(layer, row, column) : -1;
            int north = row > window.row() ? block.cell(layer, row - 1, column) : -1;
            double flux = 0;
            if (north >= 0 && south >= 0) {
                flux = inner(qy, north, grid.height(row - 1), south, grid.height(row));
            } else if (row == 0) {
                int next = row + 1 < window.rowEnd() ? south + stride : -1;
                flux = outer(qy, south, grid.height(0), next, grid::height, 1);
            } else if (row == grid.rows()) {
                int next = row - 2 >= window.row() ? north - stride : -1;
                flux = outer(qy, north, grid.height(row - 1), next, grid::height, row - 2);
            }
            flows.y()[block.yFace(layer, row, column)] = flux * width;
        }
    }

    /** Flow per width between two cells; nothing where one is inactive. */
    private double inner(double[] q, int first, double firstSize, int second, double secondSize) {
        if (!flows.active()[first] || !flows.active()[second]) {
            return 0;
        }
        double thickness = 0.5 * (saturation.thickness(first) + saturation.thickness(second));
        return DarcyFlux.between(q[first], firstSize, q[second], secondSize) * thickness;
    }

    /** Flow per width through the outer face of a cell. */
    private double outer(double[] q, int cell, double size, int next, IntToDoubleFunction sizes, int nextIndex) {
        if (!open || !flows.active()[cell]) {
            return 0;
        }
        boolean alone = next < 0 || !flows.active()[next];
        double flux = alone ? q[cell] : DarcyFlux.beyond(q[cell], size, q[next], sizes.applyAsDouble(nextIndex));
        return flux * saturation.thickness(cell);
    }
}
