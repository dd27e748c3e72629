package org.seepledger.sample;

import static java.lang.StrictMath.cos;
import static java.lang.StrictMath.exp;
import static java.lang.StrictMath.sin;
import static java.lang.StrictMath.tanh;

/**
 * The ground of the valley, an invention: gravel under a cover of loam, clay that is missing under a part of the valley,
 * and an older gravel in a channel below. Rock on both sides closes the valley, and ends the deeper layers first.
 *
 * <p>Coordinates run from the grid's south-western corner: x down the valley, y to the north.
 */
final class ValleyGround {

    static final int GRAVEL = 0;
    static final int CLAY = 1;
    static final int OLD_GRAVEL = 2;

    static final double CELL = 50;
    static final int COLUMNS = 60;
    static final int ROWS = 48;

    /** Vertical conductivity as a share of the horizontal one, by layer. */
    static final double[] VERTICAL_SHARE = {0.1, 0.05, 0.1};

    /** Of each layer, 1/m. */
    static final double[] SPECIFIC_STORAGE = {0.00008, 0.0001, 0.00002};

    private static final double[] CONDUCTIVITY = {30, 0.15, 22};
    private static final double[] SPREAD = {0.33, 0.3, 0.4};
    private static final double LEAST_CLAY = 0.3;

    private ValleyGround() {}

    static BlockGrid grid() {
        double[][] surfaces = new double[4][ROWS * COLUMNS];
        for (int row = 0; row < ROWS; row++) {
            for (int column = 0; column < COLUMNS; column++) {
                double[] elevations = elevations((column + 0.5) * CELL, (ROWS - row - 0.5) * CELL);
                for (int surface = 0; surface < elevations.length; surface++) {
                    surfaces[surface][row * COLUMNS + column] = Digits.rounded(elevations[surface], 2);
                }
            }
        }
        return new BlockGrid(edges(COLUMNS), edges(ROWS), surfaces);
    }

    /** Hydraulic conductivity along the layer, m/d to a thousandth; NaN in rock. */
    static double horizontal(int layer, double x, double y) {
        double conductivity = CONDUCTIVITY[layer] * exp(SPREAD[layer] * Forms.waves(x, y, 1.7 * layer));
        return isRock(layer, x, y) ? Double.NaN : Digits.rounded(conductivity, 3);
    }

    /** Hydraulic conductivity across the layer, m/d. */
    static double vertical(int layer, double x, double y) {
        return VERTICAL_SHARE[layer] * horizontal(layer, x, y);
    }

    /** Fraction of the volume that drains, to a thousandth. */
    static double specificYield(int layer, double x, double y) {
        return Digits.rounded(0.17 + 0.025 * Forms.waves(y, x, 0.4), 3);
    }

    /** Where the river's middle would be without its bends. */
    static double axis(double x) {
        return 1130 + 130 * sin(x / 620);
    }

    /** How high the river stands at its normal stage, and about how high the water table. */
    static double riverLevel(double x) {
        return 102.4 - 0.0015 * x;
    }

    /** Base of the loam, of the gravel, of the clay, of the old gravel. */
    private static double[] elevations(double x, double y) {
        double fromAxis = Math.abs(y - axis(x));
        double level = riverLevel(x);
        double loamBase = level + 0.45 + 2.1 * (1 + tanh((fromAxis - 430) / 110)) + 0.12 * sin(x / 170) * cos(y / 130);
        double gravelBase = level - 8.6 + 0.0012 * fromAxis + 0.9 * sin(x / 410 + 0.5) * cos(y / 330);
        double clayBase = Digits.rounded(gravelBase, 2) - clay(x, y);
        double oldGravel = 8.5 - 0.003 * fromAxis + 1.4 * cos(x / 530 + 0.4);
        return new double[] {loamBase, gravelBase, clayBase, clayBase - oldGravel};
    }

    /** Thickness of the clay to a centimetre: none, or enough to lay. */
    private static double clay(double x, double y) {
        double laid = 3.6 + 1.2 * sin(x / 480 - 1) * sin(y / 390);
        double left = laid - 9 * Forms.bump(x, y, 2080, 900, 480, 360);
        return left < LEAST_CLAY ? 0 : Digits.rounded(left, 2);
    }

    /** The valley's sides, with a spur of rock from the north; the deeper layers are narrower. */
    private static boolean isRock(int layer, double x, double y) {
        double south = 130 + 70 * sin(x / 340) + 130 * layer;
        double north = 2270 - 80 * cos(x / 290) - 130 * layer;
        double spur = north - (480 + 40 * layer) * Forms.bump(x, 0, 2350, 0, 190 + 40 * layer, 1);
        return y < south || y > spur;
    }

    private static double[] edges(int count) {
        double[] edges = new double[count + 1];
        for (int edge = 0; edge <= count; edge++) {
            edges[edge] = edge * CELL;
        }
        return edges;
    }
}
