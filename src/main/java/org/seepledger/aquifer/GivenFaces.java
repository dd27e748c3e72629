package org.seepledger.aquifer;

import java.util.Arrays;
import java.util.Iterator;
import java.util.Optional;

/** Puts given face values of one interval in their places. */
final class GivenFaces {

    private final CellGeometry geometry;
    private final Block block;
    private final double[] east;
    private final double[] north;
    private final double[] up;
    private final Optional<double[]> west;
    private final Optional<double[]> south;
    private final Optional<double[]> down;
    private final boolean[] active;
    private FaceMismatch worst;

    private GivenFaces(GivenFaceFlow given, Iterator<double[]> values, CellGeometry geometry, boolean[] active) {
        this.geometry = geometry;
        this.block = geometry.block();
        this.east = values.next();
        this.north = values.next();
        this.up = given.up().map(there -> values.next()).orElseGet(() -> new double[block.size()]);
        this.west = given.west().map(there -> values.next());
        this.south = given.south().map(there -> values.next());
        this.down = given.down().map(there -> values.next());
        this.active = active;
    }

    /** Faces with given values, in the order of the flow's drivers. */
    static GivenFaces of(GivenFaceFlow given, double[][] values, CellGeometry geometry, boolean[] active) {
        return new GivenFaces(given, Arrays.asList(values).iterator(), geometry, active);
    }

    /** Faces with the values of an interval; cells without one of the first three are inactive. */
    static GivenFaces read(GivenFaceFlow given, int interval, CellGeometry geometry, Saturation saturation) {
        Iterator<double[]> values = given.drivers().stream()
                .map(quantity -> geometry.block().read(quantity, interval))
                .iterator();
        GivenFaces faces = new GivenFaces(given, values, geometry, saturation.active());
        for (int i = 0; i < faces.active.length; i++) {
            faces.active[i] &=
                    !Double.isNaN(faces.east[i]) && !Double.isNaN(faces.north[i]) && !Double.isNaN(faces.up[i]);
        }
        return faces;
    }

    FaceFlows fill() {
        FaceFlows flows = FaceFlows.still(block, active);
        Window window = block.window();
        for (int layer = 0; layer < block.layers(); layer++) {
            for (int row = window.row(); row < window.rowEnd(); row++) {
                for (int column = window.column(); column < window.columnEnd(); column++) {
                    int cell = block.cell(layer, row, column);
                    if (active[cell]) {
                        fillX(flows.x(), cell, layer, row, column);
                        fillY(flows.y(), cell, layer, row, column);
                    }
                }
            }
        }
        new VerticalFaces(geometry, active).fill(flows.z(), this::vertical);
        return new FaceFlows(block, flows.x(), flows.y(), flows.z(), active, Optional.ofNullable(worst));
    }

    private void fillX(double[] x, int cell, int layer, int row, int column) {
        boolean outer = column + 1 == geometry.grid().columns();
        boolean inBlock = column + 1 < block.window().columnEnd();
        if (outer || (inBlock && active[cell + 1])) {
            x[block.xFace(layer, row, column + 1)] = east[cell];
        }
        if (column == 0) {
            x[block.xFace(layer, row, 0)] = value(west, cell);
        }
        if (!outer && inBlock && active[cell + 1] && west.isPresent()) {
            compare(east[cell], west.get()[cell + 1], "east", layer, row, column);
        }
    }

    private void fillY(double[] y, int cell, int layer, int row, int column) {
        int above = cell - block.window().columns();
        boolean inBlock = row > block.window().row();
        if (row == 0 || (inBlock && active[above])) {
            y[block.yFace(layer, row, column)] = north[cell];
        }
        if (row + 1 == geometry.grid().rows()) {
            y[block.yFace(layer, row + 1, column)] = value(south, cell);
        }
        if (row > 0 && inBlock && active[above] && south.isPresent()) {
            compare(north[cell], south.get()[above], "north", layer, row, column);
        }
    }

    private double vertical(int above, int below, int row, int column) {
        if (below == block.layers()) {
            return value(down, block.cell(above, row, column));
        }
        int cell = block.cell(below, row, column);
        if (above >= 0 && down.isPresent()) {
            compare(up[cell], down.get()[block.cell(above, row, column)], "up", below, row, column);
        }
        return up[cell];
    }

    private void compare(double own, double opposite, String face, int layer, int row, int column) {
        double difference = Math.abs(own - opposite);
        if (difference > 0 && (worst == null || difference > worst.difference())) {
            worst = new FaceMismatch(difference, face, layer, row, column);
        }
    }

    private static double value(Optional<double[]> values, int cell) {
        double value = values.map(array -> array[cell]).orElse(0.0);
        return Double.isNaN(value) ? 0 : value;
    }
}
