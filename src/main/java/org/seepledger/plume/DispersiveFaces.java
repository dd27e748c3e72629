package org.seepledger.plume;

import java.util.Optional;
import org.seepledger.aquifer.Block;
import org.seepledger.aquifer.CellGeometry;
import org.seepledger.aquifer.FaceFlows;
import org.seepledger.aquifer.Grid;
import org.seepledger.aquifer.IntervalState;
import org.seepledger.aquifer.Solute;
import org.seepledger.aquifer.Window;

/**
 * Dispersive flow through the faces of a block of cells: −(α|q| + θ τ D) ∇C with the full tensor of Burnett and Frind
 * (1987, Water Resources Research 23, 695–705), written with specific discharge q, since effective porosity × (α q/effective
 * porosity) is α q: along x
 *
 * <pre>
 * xx: (αL qx² + αT qy² + αV qz²) ÷ |q| + θ τ D     xy: (αL − αT) qx qy ÷ |q|     xz: (αL − αV) qx qz ÷ |q|
 * </pre>
 *
 * <p>and so on along y; zz: (αL qz² + αV (qx² + qy²)) ÷ |q| + θ τ D, yz as xz. Discharge and gradient along a face's normal are
 * those between the two cells; across it the means of the two cells' own, centred where both neighbours are active, one-sided
 * where one is. A face's height is the mean of the two saturated thicknesses. Nothing disperses through the grid's outer
 * faces and those of inactive cells; active cells above and below a pinched-out one are neighbours.
 */
final class DispersiveFaces {

    private final CellGeometry geometry;
    private final Grid grid;
    private final Block block;
    private final IntervalState state;
    private final FaceFlows water;
    private final double[] porosity;
    private final double[] longitudinal;
    private final double[] transverse;
    private final double[] vertical;
    private final double[] diffusion;

    /** Reads the coefficients of a solute in the block of an interval. */
    DispersiveFaces(IntervalState state, Matrix matrix, Solute.Dispersion given) {
        this.state = state;
        this.water = state.flows();
        this.geometry = state.geometry();
        this.grid = geometry.grid();
        this.block = geometry.block();
        this.porosity = matrix.porosity();
        this.longitudinal = block.read(given.longitudinal(), 0);
        this.transverse = block.read(given.transverse(), 0);
        this.vertical = block.read(given.vertical(), 0);
        this.diffusion = block.read(given.diffusion(), 0);
        double[] tortuosity = block.read(given.tortuosity(), 0);
        for (int cell = 0; cell < tortuosity.length; cell++) {
            diffusion[cell] *= tortuosity[cell];
        }
    }

    /** A vector along x, y (north) and z (up). */
    private record Vector(double x, double y, double z) {

        Vector meanWith(Vector other) {
            return new Vector(0.5 * (x + other.x), 0.5 * (y + other.y), 0.5 * (z + other.z));
        }

        double length() {
            return Math.sqrt(x * x + y * y + z * z);
        }
    }

    /** The flows, mass/time, for concentrations in mass/length³. */
    FaceFlows of(double[] concentrations) {
        Window window = block.window();
        int rows = window.rows();
        int columns = window.columns();
        FaceFlows flows = new FaceFlows(
                block,
                new double[water.x().length],
                new double[water.y().length],
                new double[water.z().length],
                water.active(),
                Optional.empty());
        for (int layer = 0; layer < block.layers(); layer++) {
            for (int row = window.row(); row < window.row() + rows; row++) {
                for (int column = window.column(); column < window.column() + columns; column++) {
                    if (water.active()[block.cell(layer, row, column)]) {
                        fillWest(flows.x(), concentrations, layer, row, column);
                        fillNorth(flows.y(), concentrations, layer, row, column);
                        fillTop(flows.z(), concentrations, layer, row, column);
                    }
                }
            }
        }
        return flows;
    }

    private void fillWest(double[] x, double[] c, int layer, int row, int column) {
        int east = block.cell(layer, row, column);
        int west = activeAt(layer, row, column - 1);
        double area = west < 0 ? 0 : grid.height(row) * meanThickness(west, east);
        if (area > 0) {
            int face = block.xFace(layer, row, column);
            double step = 0.5 * (grid.width(column - 1) + grid.width(column));
            Vector across = discharge(layer, row, column - 1).meanWith(discharge(layer, row, column));
            Vector slope = gradient(c, layer, row, column - 1).meanWith(gradient(c, layer, row, column));
            Vector q = new Vector(water.x()[face] / area, across.y, across.z);
            Vector g = new Vector((c[east] - c[west]) / step, slope.y, slope.z);
            x[face] = -area * (g.x * along(q, q.x, west, east) + crossed(q.x, q, g, west, east, 0));
        }
    }

    private void fillNorth(double[] y, double[] c, int layer, int row, int column) {
        int south = block.cell(layer, row, column);
        int north = activeAt(layer, row - 1, column);
        double area = north < 0 ? 0 : grid.width(column) * meanThickness(north, south);
        if (area > 0) {
            int face = block.yFace(layer, row, column);
            double step = 0.5 * (grid.height(row - 1) + grid.height(row));
            Vector across = discharge(layer, row - 1, column).meanWith(discharge(layer, row, column));
            Vector slope = gradient(c, layer, row - 1, column).meanWith(gradient(c, layer, row, column));
            Vector q = new Vector(across.x, water.y()[face] / area, across.z);
            Vector g = new Vector(slope.x, (c[north] - c[south]) / step, slope.z);
            y[face] = -area * (g.y * along(q, q.y, north, south) + crossed(q.y, q, g, north, south, 1));
        }
    }

    private void fillTop(double[] z, double[] c, int layer, int row, int column) {
        int lower = block.cell(layer, row, column);
        int upper = geometry.next(layer, -1, row, column);
        if (upper < 0 || !water.active()[upper]) {
            return;
        }
        int upperLayer = upper / block.window().size();
        double area = grid.area(row, column);
        int face = block.zFace(layer, row, column);
        Vector across = discharge(upperLayer, row, column).meanWith(discharge(layer, row, column));
        Vector slope = gradient(c, upperLayer, row, column).meanWith(gradient(c, layer, row, column));
        Vector q = new Vector(across.x, across.y, water.z()[face] / area);
        Vector g = new Vector(slope.x, slope.y, (c[upper] - c[lower]) / (middle(upper) - middle(lower)));
        double flow = -area * (g.z * upright(q, upper, lower) + crossed(q.z, q, g, upper, lower, 2));
        for (int k = upperLayer + 1; k <= layer; k++) {
            z[block.zFace(k, row, column)] = flow;
        }
    }

    /** The tensor's entry for a horizontal normal, along which discharge is given. */
    private double along(Vector q, double normal, int one, int other) {
        double size = q.length();
        double lateral = q.x * q.x + q.y * q.y - normal * normal;
        double mechanical = size == 0
                ? 0
                : (mean(longitudinal, one, other) * normal * normal
                                + mean(transverse, one, other) * lateral
                                + mean(vertical, one, other) * q.z * q.z)
                        / size;
        return mechanical + diffused(one, other);
    }

    private double upright(Vector q, int one, int other) {
        double size = q.length();
        double mechanical = size == 0
                ? 0
                : (mean(longitudinal, one, other) * q.z * q.z + mean(vertical, one, other) * (q.x * q.x + q.y * q.y))
                        / size;
        return mechanical + diffused(one, other);
    }

    /** What gradients along the two other axes add: 0 for x, 1 for y, 2 for z as the normal. */
    private double crossed(double normal, Vector q, Vector g, int one, int other, int axis) {
        double size = q.length();
        if (size == 0) {
            return 0;
        }
        double flat = mean(longitudinal, one, other) - mean(transverse, one, other);
        double steep = mean(longitudinal, one, other) - mean(vertical, one, other);
        double withX = axis == 0 ? 0 : (axis == 1 ? flat : steep) * q.x * g.x;
        double withY = axis == 1 ? 0 : (axis == 0 ? flat : steep) * q.y * g.y;
        double withZ = axis == 2 ? 0 : steep * q.z * g.z;
        return normal * (withX + withY + withZ) / size;
    }

    private double diffused(int one, int other) {
        return 0.5 * (porosity[one] * diffusion[one] + porosity[other] * diffusion[other]);
    }

    private static double mean(double[] values, int one, int other) {
        return 0.5 * (values[one] + values[other]);
    }

    private double meanThickness(int one, int other) {
        return 0.5 * (state.saturation().thickness(one) + state.saturation().thickness(other));
    }

    private double middle(int cell) {
        return 0.5 * (geometry.top(cell) + geometry.bottom(cell));
    }

    /** A cell's mean specific discharge. */
    private Vector discharge(int layer, int row, int column) {
        int cell = block.cell(layer, row, column);
        double thickness = state.saturation().thickness(cell);
        double x = water.x()[block.xFace(layer, row, column)] + water.x()[block.xFace(layer, row, column + 1)];
        double y = water.y()[block.yFace(layer, row, column)] + water.y()[block.yFace(layer, row + 1, column)];
        double z = water.z()[block.zFace(layer, row, column)] + water.z()[block.zFace(layer + 1, row, column)];
        return new Vector(
                thickness > 0 ? 0.5 * x / (grid.height(row) * thickness) : 0,
                thickness > 0 ? 0.5 * y / (grid.width(column) * thickness) : 0,
                0.5 * z / grid.area(row, column));
    }

    /** A cell's gradient of concentration. */
    private Vector gradient(double[] c, int layer, int row, int column) {
        int cell = block.cell(layer, row, column);
        int west = activeAt(layer, row, column - 1);
        int east = activeAt(layer, row, column + 1);
        int north = activeAt(layer, row - 1, column);
        int south = activeAt(layer, row + 1, column);
        int above = geometry.next(layer, -1, row, column);
        int below = geometry.next(layer, 1, row, column);
        double toWest = west < 0 ? 0 : 0.5 * (grid.width(column - 1) + grid.width(column));
        double toEast = east < 0 ? 0 : 0.5 * (grid.width(column + 1) + grid.width(column));
        double toNorth = north < 0 ? 0 : 0.5 * (grid.height(row - 1) + grid.height(row));
        double toSouth = south < 0 ? 0 : 0.5 * (grid.height(row + 1) + grid.height(row));
        boolean up = above >= 0 && water.active()[above];
        boolean down = below >= 0 && water.active()[below];
        double upward = up ? middle(above) - middle(cell) : 0;
        double downward = down ? middle(cell) - middle(below) : 0;
        return new Vector(
                slope(c, west < 0 ? cell : west, east < 0 ? cell : east, toWest + toEast),
                slope(c, south < 0 ? cell : south, north < 0 ? cell : north, toNorth + toSouth),
                slope(c, down ? below : cell, up ? above : cell, upward + downward));
    }

    private static double slope(double[] c, int from, int to, double distance) {
        return distance == 0 ? 0 : (c[to] - c[from]) / distance;
    }

    /** An active cell of the block; -1 where there is none. */
    private int activeAt(int layer, int row, int column) {
        if (!block.window().contains(row, column)) {
            return -1;
        }
        int cell = block.cell(layer, row, column);
        return water.active()[cell] ? cell : -1;
    }
}
