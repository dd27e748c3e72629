package org.seepledger.sample;

import static java.lang.StrictMath.cos;
import static java.lang.StrictMath.exp;
import static java.lang.StrictMath.sin;
import static java.lang.StrictMath.tanh;

import java.util.stream.DoubleStream;

/**
 * The ground of the terrace, an invention: gravel over silt over sand beside a river, with a scarp down to the flood
 * plain, a clay lens in the gravel, a sandy window in the silt, and a knoll of bedrock that all layers lap onto.
 *
 * <p>Coordinates run along the grid from its corner: x down the valley, y from the flood plain to the hillslope.
 */
final class TerraceGround {

    static final int GRAVEL = 0;
    static final int SILT = 1;
    static final int SAND = 2;

    private static final double[][] COLUMN_RUNS = {
        {80, 6}, {60, 4}, {45, 4}, {35, 4}, {25, 24}, {35, 4}, {45, 4}, {60, 4}, {80, 6}
    };
    private static final double[][] ROW_RUNS = {{60, 2}, {45, 2}, {35, 2}, {25, 22}, {35, 4}, {45, 4}, {60, 5}, {80, 4}
    };
    private static final double[] CONDUCTIVITY = {80, 0.02, 12};
    private static final double[] VERTICAL_SHARE = {0.1, 0.2, 0.1};
    private static final double[] SPREAD = {0.8, 0.9, 0.5};

    private TerraceGround() {}

    static BlockGrid grid() {
        double[] columnEdges = edges(COLUMN_RUNS);
        double[] rowEdges = edges(ROW_RUNS);
        int columns = columnEdges.length - 1;
        int rows = rowEdges.length - 1;
        double[][] surfaces = new double[4][rows * columns];
        for (int row = 0; row < rows; row++) {
            for (int column = 0; column < columns; column++) {
                double x = (columnEdges[column] + columnEdges[column + 1]) / 2;
                double y = (rowEdges[rows - 1 - row] + rowEdges[rows - row]) / 2;
                double[] elevations = elevations(x, y);
                for (int surface = 0; surface < elevations.length; surface++) {
                    surfaces[surface][row * columns + column] = Digits.rounded(elevations[surface], 2);
                }
            }
        }
        return new BlockGrid(columnEdges, rowEdges, surfaces);
    }

    /** Hydraulic conductivity along the layer, m/d; NaN in the knoll. */
    static double horizontal(int layer, double x, double y) {
        if (isKnoll(layer, x, y)) {
            return Double.NaN;
        }
        double clayLens = layer == GRAVEL && Forms.isInside(x, y, 1265, 505, 175, 48) ? -4.2 : 0;
        double sandyWindow = layer == SILT ? 4 * Forms.bump(x, y, 1480, 680, 130, 90) : 0;
        return CONDUCTIVITY[layer] * exp(SPREAD[layer] * Forms.waves(x, y, 1.7 * layer) + clayLens + sandyWindow);
    }

    /** Hydraulic conductivity across the layer, m/d. */
    static double vertical(int layer, double x, double y) {
        return VERTICAL_SHARE[layer] * horizontal(layer, x, y);
    }

    /** Ground, base of the gravel, base of the silt, base of the sand. */
    private static double[] elevations(double x, double y) {
        double scarp = 2.2 * (1 + tanh((y - 445) / 30));
        double ground = 98.6 - 0.0012 * x + scarp + 0.0035 * Math.max(0, y - 480) + 0.15 * sin(x / 140) * cos(y / 120);
        double gravelBase = 88.4 - 0.0011 * x + 0.0024 * y + 0.9 * sin(x / 310 + 0.5) * cos(y / 260);
        double silt = 2.6 + 1.1 * sin(x / 420 - 1) * sin(y / 350) + 0.8 * cos((x - y) / 510);
        double sand = 12.5 + 2.5 * cos(x / 530 + 0.4) + 1.6 * sin(y / 330);
        return new double[] {ground, gravelBase, gravelBase - silt, gravelBase - silt - sand};
    }

    /** The knoll widens downward. */
    private static boolean isKnoll(int layer, double x, double y) {
        return Forms.isInside(x, y, 1900, 1150, 130 + 45 * layer, 95 + 35 * layer);
    }

    /** Edges from runs of equal cells, each a size and a count. */
    private static double[] edges(double[][] runs) {
        DoubleStream.Builder edges = DoubleStream.builder().add(0);
        double edge = 0;
        for (double[] run : runs) {
            for (int cell = 0; cell < run[1]; cell++) {
                edge += run[0];
                edges.add(edge);
            }
        }
        return edges.build().toArray();
    }
}
