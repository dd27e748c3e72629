package org.seepledger.aquifer;

import java.util.List;
import java.util.Optional;
import java.util.stream.Stream;

/**
 * Specific discharge at cell centres.
 *
 * <p>A face's flow is the linear interpolation between the two centres, distance-weighted, times the face's width, times
 * the mean of the two saturated thicknesses; vertically, between layer centres, times the cell's area. At an open outer
 * face the two nearest centres are extrapolated linearly (one: taken as it is). A field of this kind need not balance in
 * each cell; what does not, stays visible as imbalance.
 *
 * @param x specific discharge along x, length/time, by interval
 * @param y along y
 * @param z upward; empty where none was given: no vertical flow
 * @param mapComponents whether x and y mean east and north rather than the grid's axes
 * @param outerFaces which outer faces let water through
 */
public record DarcyFlux(
        GriddedValues x, GriddedValues y, Optional<GriddedValues> z, boolean mapComponents, OuterFaces outerFaces)
        implements Flow {

    @Override
    public String given() {
        return "specific discharge at cell centres";
    }

    @Override
    public boolean closedSides() {
        return !outerFaces.sides();
    }

    @Override
    public FaceFlows faceFlows(int interval, CellGeometry geometry, Saturation saturation) {
        Block block = geometry.block();
        double[] qx = block.read(x, interval);
        double[] qy = block.read(y, interval);
        double[] qz = z.map(values -> block.read(values, interval)).orElseGet(() -> new double[block.size()]);
        boolean[] active = saturation.active();
        for (int i = 0; i < active.length; i++) {
            active[i] &= !Double.isNaN(qx[i]) && !Double.isNaN(qy[i]) && !Double.isNaN(qz[i]);
        }
        return flows(qx, qy, qz, geometry, saturation, active);
    }

    @Override
    public List<GriddedValues> drivers(Aquifer aquifer) {
        return Stream.concat(Stream.of(x, y), z.stream()).toList();
    }

    @Override
    public LinearFlow linear(int interval, CellGeometry geometry, Saturation saturation, boolean[] active) {
        double[] still = new double[geometry.block().size()];
        return q -> flows(q[0], q[1], z.isPresent() ? q[2] : still, geometry, saturation, active);
    }

    private FaceFlows flows(
            double[] qx, double[] qy, double[] qz, CellGeometry geometry, Saturation saturation, boolean[] active) {
        Block block = geometry.block();
        if (mapComponents) {
            turn(qx, qy, geometry.grid());
        }
        FaceFlows flows = FaceFlows.still(block, active);
        new HorizontalFaces(geometry, saturation, flows, outerFaces.sides()).fill(qx, qy);
        VerticalFaces columns = new VerticalFaces(geometry, active);
        columns.fill(
                flows.z(),
                (above, below, row, column) -> vertical(qz, geometry, columns, above, below, row, column)
                        * geometry.grid().area(row, column));
        return flows;
    }

    private double vertical(
            double[] q, CellGeometry geometry, VerticalFaces columns, int above, int below, int row, int column) {
        Block block = geometry.block();
        if (above < 0) {
            int next = columns.neighbour(below, 1, row, column);
            return outerFaces.top() ? vertical(q, geometry, block.cell(below, row, column), next, row, column) : 0;
        }
        if (below == block.layers()) {
            int next = columns.neighbour(above, -1, row, column);
            return outerFaces.bottom() ? vertical(q, geometry, block.cell(above, row, column), next, row, column) : 0;
        }
        int upper = block.cell(above, row, column);
        int lower = block.cell(below, row, column);
        return between(q[upper], geometry.thickness(upper), q[lower], geometry.thickness(lower));
    }

    /** Flux through the outer face of a cell whose inner neighbour is in a layer, or -1. */
    private static double vertical(double[] q, CellGeometry geometry, int edge, int layer, int row, int column) {
        if (layer < 0) {
            return q[edge];
        }
        int next = geometry.block().cell(layer, row, column);
        return beyond(q[edge], geometry.thickness(edge), q[next], geometry.thickness(next));
    }

    private static void turn(double[] qx, double[] qy, Grid grid) {
        double cosine = grid.cosine();
        double sine = grid.sine();
        for (int i = 0; i < qx.length; i++) {
            double east = qx[i];
            double north = qy[i];
            qx[i] = east * cosine + north * sine;
            qy[i] = north * cosine - east * sine;
        }
    }

    /** Interpolates a centred component to the face between two cells of given sizes along its axis. */
    static double between(double first, double firstSize, double second, double secondSize) {
        return (first * secondSize + second * firstSize) / (firstSize + secondSize);
    }

    /** Extrapolates a centred component to the outer face of a cell, away from the next one. */
    static double beyond(double edge, double edgeSize, double next, double nextSize) {
        return edge + (edge - next) * edgeSize / (edgeSize + nextSize);
    }
}
