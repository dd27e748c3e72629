package org.seepledger.aquifer;

/** Flow between neighbouring cells by Darcy's law, in one interval. */
final class GradientFaces {

    private final CellGeometry geometry;
    private final Grid grid;
    private final Block block;
    private final Saturation saturation;
    private final double[] heads;
    private final double[] driving;
    private final boolean[] active;

    GradientFaces(CellGeometry geometry, Saturation saturation, double[] heads, boolean[] active) {
        this(geometry, saturation, heads, heads, active);
    }

    private GradientFaces(
            CellGeometry geometry, Saturation saturation, double[] heads, double[] driving, boolean[] active) {
        this.geometry = geometry;
        this.grid = geometry.grid();
        this.block = geometry.block();
        this.saturation = saturation;
        this.heads = heads;
        this.driving = driving;
        this.active = active;
    }

    /** The same conductances, upstream cells and all, under other heads. */
    GradientFaces drivenBy(double[] others) {
        return new GradientFaces(geometry, saturation, heads, others, active);
    }

    void fillX(double[] conductivity, double[] x) {
        Window window = block.window();
        for (int layer = 0; layer < block.layers(); layer++) {
            for (int row = window.row(); row < window.rowEnd(); row++) {
                for (int column = window.column() + 1; column < window.columnEnd(); column++) {
                    int west = block.cell(layer, row, column - 1);
                    double density = lateral(conductivity, west, grid.width(column - 1), west + 1, grid.width(column));
                    x[block.xFace(layer, row, column)] = density * grid.height(row);
                }
            }
        }
    }

    void fillY(double[] conductivity, double[] y) {
        Window window = block.window();
        for (int layer = 0; layer < block.layers(); layer++) {
            for (int row = window.row() + 1; row < window.rowEnd(); row++) {
                for (int column = window.column(); column < window.columnEnd(); column++) {
                    int south = block.cell(layer, row, column);
                    int north = south - window.columns();
                    double density = lateral(conductivity, south, grid.height(row), north, grid.height(row - 1));
                    y[block.yFace(layer, row, column)] = density * grid.width(column);
                }
            }
        }
    }

    /** Flow per width from one cell to the next, whose sizes along the way are given. */
    private double lateral(double[] conductivity, int from, double fromSize, int to, double toSize) {
        if (!active[from] || !active[to]) {
            return 0;
        }
        double fall = driving[from] - driving[to];
        if (saturation.isWaterTable(from)) {
            double resistance = 0.5 * (fromSize / conductivity[from] + toSize / conductivity[to]);
            return fall / resistance * saturation.thickness(heads[from] - heads[to] > 0 ? from : to);
        }
        double resistance = 0.5
                * (fromSize / (conductivity[from] * geometry.thickness(from))
                        + toSize / (conductivity[to] * geometry.thickness(to)));
        return fall / resistance;
    }

    double upward(double[] conductivity, int above, int below, int row, int column) {
        if (above < 0 || below == block.layers()) {
            return 0;
        }
        int upper = block.cell(above, row, column);
        int lower = block.cell(below, row, column);
        double resistance = 0.5
                * (geometry.thickness(upper) / conductivity[upper] + geometry.thickness(lower) / conductivity[lower]);
        return (driving[lower] - driving[upper]) / resistance * grid.area(row, column);
    }
}
