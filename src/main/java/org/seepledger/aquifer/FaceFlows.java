package org.seepledger.aquifer;

import java.util.Optional;

/**
 * Flows through the faces of a block of cells in one interval, length³/time, positive toward +x, +y and up.
 *
 * <p>A pinched-out cell carries through its interfaces what flows between the active cells above and below it. Faces of
 * other inactive cells carry nothing. On the rim of the block the values hold only where the rim is the grid's own.
 *
 * @param block the cells
 * @param x through x-faces, placed as {@link Block#xFace} says
 * @param y through y-faces, placed as {@link Block#yFace} says
 * @param z through interfaces, placed as {@link Block#zFace} says
 * @param active whether each cell is active
 * @param mismatch where two given values of one face differ the most, if any do
 */
public record FaceFlows(
        Block block, double[] x, double[] y, double[] z, boolean[] active, Optional<FaceMismatch> mismatch) {

    /** Flows that are all zero, to be filled. */
    static FaceFlows still(Block block, boolean[] active) {
        int rows = block.window().rows();
        int columns = block.window().columns();
        return new FaceFlows(
                block,
                new double[block.layers() * rows * (columns + 1)],
                new double[block.layers() * (rows + 1) * columns],
                new double[(block.layers() + 1) * rows * columns],
                active,
                Optional.empty());
    }

    /**
     * {@return what a cell gains through its six faces, length³/time}
     *
     * @param layer its layer
     * @param row its row in the grid
     * @param column its column in the grid
     */
    public double gain(int layer, int row, int column) {
        return x[block.xFace(layer, row, column)]
                - x[block.xFace(layer, row, column + 1)]
                + (y[block.yFace(layer, row + 1, column)] - y[block.yFace(layer, row, column)])
                + (z[block.zFace(layer + 1, row, column)] - z[block.zFace(layer, row, column)]);
    }

    /**
     * {@return the sum of the magnitudes of the flows through a cell's six faces, length³/time}
     *
     * @param layer its layer
     * @param row its row in the grid
     * @param column its column in the grid
     */
    public double gross(int layer, int row, int column) {
        return Math.abs(x[block.xFace(layer, row, column)])
                + Math.abs(x[block.xFace(layer, row, column + 1)])
                + Math.abs(y[block.yFace(layer, row + 1, column)])
                + Math.abs(y[block.yFace(layer, row, column)])
                + Math.abs(z[block.zFace(layer + 1, row, column)])
                + Math.abs(z[block.zFace(layer, row, column)]);
    }
}
