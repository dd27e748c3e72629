package org.seepledger.sample;

/**
 * A well with its screen in one layer.
 *
 * @param name its name
 * @param category what its water is for
 * @param x along-grid x, m
 * @param y along-grid y, m
 * @param layer from 0
 * @param screen length of the screen, which begins {@value #SUMP} m above the layer's bottom, m
 * @param rate m³/d, negative where it takes water out
 */
record Well(String name, String category, double x, double y, int layer, double screen, double rate) {

    private static final double SUMP = 0.5;

    int cell(BlockGrid grid) {
        return layer * grid.cellsInLayer() + grid.cellAt(x, y);
    }

    double screenBottom(BlockGrid grid) {
        return grid.bottomElevation(cell(grid)) + SUMP;
    }

    double screenTop(BlockGrid grid) {
        return screenBottom(grid) + screen;
    }
}
