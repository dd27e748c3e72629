package org.seepledger.desktop.map;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import org.seepledger.aquifer.Axis;
import org.seepledger.aquifer.Grid;

/**
 * Values on a lattice, and the same reduced to half the rows and columns again and again: the mean of those of four that
 * have a value.
 */
final class Pyramid {

    /** Texels along a tile's side. */
    static final int TILE = 256;

    /** A few times the rounding of a value that is kept in single precision. */
    private static final float ROUNDING = 5e-7f;

    private final Lattice lattice;
    private final List<Level> levels;

    /**
     * One level.
     *
     * @param columns texels in a row
     * @param rows rows of texels
     * @param values row by row; NaN where there is none
     */
    record Level(int columns, int rows, float[] values) {

        float at(int row, int column) {
            return values[row * columns + column];
        }

        double[] doubles() {
            double[] all = new double[values.length];
            Arrays.setAll(all, i -> values[i]);
            return all;
        }

        Level reduced() {
            int across = (columns + 1) / 2;
            int down = (rows + 1) / 2;
            float[] means = new float[across * down];
            for (int row = 0; row < down; row++) {
                for (int column = 0; column < across; column++) {
                    means[row * across + column] = mean(2 * row, 2 * column);
                }
            }
            return new Level(across, down, means);
        }

        private float mean(int row, int column) {
            double sum = 0;
            int count = 0;
            for (int i = row; i < Math.min(row + 2, rows); i++) {
                for (int j = column; j < Math.min(column + 2, columns); j++) {
                    float value = at(i, j);
                    if (!Float.isNaN(value)) {
                        sum += value;
                        count++;
                    }
                }
            }
            return count == 0 ? Float.NaN : (float) (sum / count);
        }
    }

    private Pyramid(Lattice lattice, List<Level> levels) {
        this.lattice = lattice;
        this.levels = levels;
    }

    /**
     * Reduces values.
     *
     * @param lattice where they are shown
     * @param cells a value per cell of its grid, row-major, row 0 northernmost
     */
    static Pyramid of(Lattice lattice, double[] cells) {
        float[] values = new float[lattice.rows() * lattice.columns()];
        int width = lattice.grid().columns();
        for (int row = 0; row < lattice.rows(); row++) {
            for (int column = 0; column < lattice.columns(); column++) {
                values[row * lattice.columns() + column] =
                        (float) cells[lattice.row(row) * width + lattice.column(column)];
            }
        }
        List<Level> levels = new ArrayList<>(List.of(new Level(lattice.columns(), lattice.rows(), values)));
        Level last = levels.get(0);
        while (last.columns() > TILE || last.rows() > TILE) {
            last = last.reduced();
            levels.add(last);
        }
        return new Pyramid(lattice, levels);
    }

    /** The value at a place; NaN off the grid. */
    float at(double mapX, double mapY) {
        Grid grid = lattice.grid();
        int column = (int) Math.floor(grid.localX(mapX, mapY) / lattice.stepX());
        int fromSouth = (int) Math.floor(grid.localY(mapX, mapY) / lattice.stepY());
        boolean on = column >= 0 && fromSouth >= 0 && column < lattice.columns() && fromSouth < lattice.rows();
        return on ? levels.get(0).at(lattice.rows() - 1 - fromSouth, column) : Float.NaN;
    }

    /** The values of a row of cells, west to east; of an uneven grid those of the texels in the middle of cells. */
    double[] cells(int row) {
        Axis x = lattice.grid().x();
        Axis y = lattice.grid().y();
        int fromSouth = lattice.grid().flipped(row);
        int texelRow = lattice.rows() - 1 - (int) ((y.edge(fromSouth) + y.size(fromSouth) / 2) / lattice.stepY());
        double[] values = new double[x.count()];
        for (int column = 0; column < values.length; column++) {
            int texel = (int) ((x.edge(column) + x.size(column) / 2) / lattice.stepX());
            values[column] = levels.get(0).at(texelRow, texel);
        }
        return values;
    }

    /** Whether all values are one but for rounding, so that lines between them would mean nothing. */
    boolean isFlat() {
        float least = Float.POSITIVE_INFINITY;
        float greatest = Float.NEGATIVE_INFINITY;
        for (float value : levels.get(0).values()) {
            if (Float.isFinite(value)) {
                least = Math.min(least, value);
                greatest = Math.max(greatest, value);
            }
        }
        return greatest - least <= ROUNDING * Math.max(Math.abs(least), Math.abs(greatest));
    }

    Lattice lattice() {
        return lattice;
    }

    /** How many levels there are; level 0 has all texels. */
    int levels() {
        return levels.size();
    }

    Level level(int level) {
        return levels.get(level);
    }

    /** The level whose texels are at least one device pixel, as far as there is one. */
    int levelFor(double devicePixelsPerPlanUnit) {
        double texel = Math.min(lattice.stepX(), lattice.stepY()) * devicePixelsPerPlanUnit;
        int level = (int) Math.ceil(Math.log(1 / texel) / Math.log(2) - 1e-9);
        return Math.max(0, Math.min(levels.size() - 1, level));
    }
}
