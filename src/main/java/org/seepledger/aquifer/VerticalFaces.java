package org.seepledger.aquifer;

/**
 * Walks each column of cells from the top down and fills the interfaces between neighbours.
 *
 * <p>A pinched-out cell is passed through: the active cells above and below it are neighbours, and each interface
 * between them carries their flow. Any other inactive cell cuts the column: nothing flows past it.
 */
final class VerticalFaces {

    /** Gives the upward flow between two vertical neighbours. */
    interface Between {

        /**
         * {@return the upward flow, length³/time}
         *
         * @param above the upper cell's layer; -1 at the outer top
         * @param below the lower cell's layer; the number of layers at the outer bottom
         * @param row their row in the grid
         * @param column their column in the grid
         */
        double flow(int above, int below, int row, int column);
    }

    private final CellGeometry geometry;
    private final boolean[] active;

    VerticalFaces(CellGeometry geometry, boolean[] active) {
        this.geometry = geometry;
        this.active = active;
    }

    void fill(double[] z, Between between) {
        Window window = geometry.block().window();
        for (int row = window.row(); row < window.rowEnd(); row++) {
            for (int column = window.column(); column < window.columnEnd(); column++) {
                fillColumn(z, between, row, column);
            }
        }
    }

    private void fillColumn(double[] z, Between between, int row, int column) {
        Block block = geometry.block();
        int above = -1;
        boolean joined = true;
        for (int layer = 0; layer <= block.layers(); layer++) {
            boolean outside = layer == block.layers();
            if (!outside && geometry.isPinchedOut(block.cell(layer, row, column))) {
                continue;
            }
            boolean live = outside || active[block.cell(layer, row, column)];
            if (live && joined && !(outside && above < 0)) {
                double flow = between.flow(above, layer, row, column);
                for (int k = above + 1; k <= layer; k++) {
                    z[block.zFace(k, row, column)] = flow;
                }
            }
            above = layer;
            joined = live;
        }
    }

    /** The active neighbour of a cell in a direction (+1 down, -1 up), as its layer; -1 where there is none. */
    int neighbour(int layer, int direction, int row, int column) {
        Block block = geometry.block();
        for (int next = layer + direction; next >= 0 && next < block.layers(); next += direction) {
            int cell = block.cell(next, row, column);
            if (!geometry.isPinchedOut(cell)) {
                return active[cell] ? next : -1;
            }
        }
        return -1;
    }
}
