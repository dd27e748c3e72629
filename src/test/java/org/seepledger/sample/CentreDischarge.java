package org.seepledger.sample;

/**
 * Specific discharge at the cells' centres, m/d: for each component the mean over the cell's two faces.
 *
 * <p>A face's own is its flow over its wetted area, which has the mean of the two saturated thicknesses. Within a cell
 * the field of the face flows is linear, so this is its exact value at the centre; but the face flows cannot be had back
 * from it.
 *
 * @param x toward the east of the grid, one per cell
 * @param y toward its north
 * @param z upward
 */
record CentreDischarge(double[] x, double[] y, double[] z) {

    /**
     * {@return the discharge at the centres}
     *
     * @param grid the grid
     * @param solution the flows
     */
    static CentreDischarge of(BlockGrid grid, FlowSolution solution) {
        double[] b = solution.saturated();
        double[] flows = solution.faceFlows();
        double[] x = new double[grid.cells()];
        double[] y = new double[grid.cells()];
        double[] z = new double[grid.cells()];
        for (int cell = 0; cell < grid.cells(); cell++) {
            double west = flows[grid.west(cell)] / thickness(grid, grid.west(cell), b);
            double east = flows[grid.east(cell)] / thickness(grid, grid.east(cell), b);
            double south = flows[grid.south(cell)] / thickness(grid, grid.south(cell), b);
            double north = flows[grid.north(cell)] / thickness(grid, grid.north(cell), b);
            x[cell] = (west + east) / 2 / grid.height(cell);
            y[cell] = (south + north) / 2 / grid.width(cell);
            z[cell] = (flows[grid.bottom(cell)] + flows[grid.top(cell)]) / 2 / grid.area(cell);
        }
        return new CentreDischarge(x, y, z);
    }

    private static double thickness(BlockGrid grid, int face, double[] saturated) {
        int behind = grid.behind(face);
        int ahead = grid.ahead(face);
        if (behind == BlockGrid.OUTSIDE || ahead == BlockGrid.OUTSIDE) {
            return saturated[Math.max(behind, ahead)];
        }
        return (saturated[behind] + saturated[ahead]) / 2;
    }
}
