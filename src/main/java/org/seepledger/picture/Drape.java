package org.seepledger.picture;

import java.util.stream.IntStream;
import org.seepledger.aquifer.Axis;
import org.seepledger.aquifer.Grid;
import org.seepledger.aquifer.GriddedValues;
import org.seepledger.aquifer.Window;

/**
 * Values of one layer to be laid over a map: those of every cell of a window or, where that would be too many, of the
 * middle cell of each block of n by m.
 */
public final class Drape {

    /** Pixels along the longer side of an uneven grid's image, where they must stand for cells of all sizes. */
    private static final int FINE = 640;

    private final Grid grid;
    private final int[] rowEdges;
    private final int[] columnEdges;
    private final double[] values;

    private Drape(Grid grid, int[] rowEdges, int[] columnEdges, double[] values) {
        this.grid = grid;
        this.rowEdges = rowEdges;
        this.columnEdges = columnEdges;
        this.values = values;
    }

    /** Gives the values of a row of cells. */
    public interface Rows {
        /**
         * {@return the values of a window's cells in one row, west to east}
         *
         * @param row the row in the grid
         */
        double[] row(int row);
    }

    /**
     * Reads values row by row.
     *
     * @param values what to read
     * @param layer the layer, from 0
     * @param step the interval or instant, from 0
     * @param grid the grid
     * @param window the cells to show
     * @param most how many rows and columns may be kept
     * @return the values
     */
    public static Drape of(GriddedValues values, int layer, int step, Grid grid, Window window, int most) {
        return of(grid, window, most, row -> {
            double[] target = new double[window.columns()];
            Window line = new Window(row, window.column(), 1, window.columns());
            values.read(layer, step, line, target, 0);
            return target;
        });
    }

    /**
     * Takes values row by row.
     *
     * @param grid the grid
     * @param window the cells to show
     * @param most how many rows and columns may be kept
     * @param source gives the rows
     * @return the values
     */
    public static Drape of(Grid grid, Window window, int most, Rows source) {
        int[] rowEdges = blocks(window.row(), window.rows(), most);
        int[] columnEdges = blocks(window.column(), window.columns(), most);
        int columns = columnEdges.length - 1;
        double[] values = new double[(rowEdges.length - 1) * columns];
        for (int i = 0; i < rowEdges.length - 1; i++) {
            double[] row = source.row(middle(rowEdges, i));
            for (int j = 0; j < columns; j++) {
                values[i * columns + j] = row[middle(columnEdges, j) - window.column()];
            }
        }
        return new Drape(grid, rowEdges, columnEdges, values);
    }

    /** The grid lines between as many blocks of cells as may be kept; the last block may be smaller. */
    private static int[] blocks(int from, int count, int most) {
        int stride = (count + most - 1) / most;
        int[] edges = new int[(count + stride - 1) / stride + 1];
        for (int i = 0; i < edges.length; i++) {
            edges[i] = from + Math.min(i * stride, count);
        }
        return edges;
    }

    /** The cell in the middle of a block, which stands for it. */
    private static int middle(int[] edges, int block) {
        return (edges[block] + edges[block + 1] - 1) / 2;
    }

    /** {@return the values, row by row, the northernmost first; not finite where there is none} */
    public double[] values() {
        return values.clone();
    }

    int rows() {
        return rowEdges.length - 1;
    }

    int columns() {
        return columnEdges.length - 1;
    }

    double value(int i, int j) {
        return values[i * columns() + j];
    }

    /** Where the middle of a value's cell is along the grid's x axis. */
    double localX(int j) {
        return middle(grid.x(), middle(columnEdges, j));
    }

    /** Where the middle of a value's cell is along the grid's y axis. */
    double localY(int i) {
        return middle(grid.y(), grid.flipped(middle(rowEdges, i)));
    }

    /** The map x and y of the upper left corner of a value's block of cells. */
    double[] corner(int i, int j) {
        double x = grid.x().edge(columnEdges[j]);
        double y = grid.y().edge(grid.rows() - rowEdges[i]);
        return new double[] {grid.mapX(x, y), grid.mapY(x, y)};
    }

    Grid grid() {
        return grid;
    }

    /** {@return the map x of a cell's middle} */
    double mapX(int row, int column) {
        return grid.mapX(middle(grid.x(), column), middle(grid.y(), grid.flipped(row)));
    }

    /** {@return the map y of a cell's middle} */
    double mapY(int row, int column) {
        return grid.mapY(middle(grid.x(), column), middle(grid.y(), grid.flipped(row)));
    }

    private static double middle(Axis axis, int cell) {
        return axis.edge(cell) + axis.size(cell) / 2;
    }

    /**
     * {@return the values as pixels}
     *
     * @param frame where map coordinates come to
     * @param scale which colour a value has
     * @param opacity of the pixels, from 0 to 1
     */
    public Mark.Image image(MapFrame frame, ValueScale scale, double opacity) {
        double[] x = IntStream.of(columnEdges).mapToDouble(grid.x()::edge).toArray();
        double[] y = IntStream.of(rowEdges)
                .mapToDouble(line -> grid.y().edge(grid.rows() - line))
                .toArray();
        int[] across = pixels(x);
        int[] down = pixels(y);
        int[] argb = new int[across.length * down.length];
        for (int i = 0; i < down.length; i++) {
            for (int j = 0; j < across.length; j++) {
                argb[i * across.length + j] = scale.argb(value(down[i], across[j]), opacity);
            }
        }
        double[] placement = placement(frame, x, y, across.length, down.length);
        return new Mark.Image(across.length, down.length, argb, placement);
    }

    private double[] placement(MapFrame frame, double[] x, double[] y, int across, int down) {
        double stepX = (x[x.length - 1] - x[0]) / across * frame.scale();
        double stepY = (y[y.length - 1] - y[0]) / down * frame.scale();
        return new double[] {
            stepX * grid.cosine(),
            -stepX * grid.sine(),
            -stepY * grid.sine(),
            -stepY * grid.cosine(),
            frame.x(grid.mapX(x[0], y[0])),
            frame.y(grid.mapY(x[0], y[0]))
        };
    }

    /** Which of the values each pixel shows: one pixel per value where they are evenly spaced. */
    private static int[] pixels(double[] edges) {
        int count = edges.length - 1;
        double length = edges[count] - edges[0];
        boolean even = true;
        for (int i = 0; i < count; i++) {
            even &= Math.abs((edges[i + 1] - edges[i]) * count - length) < 1e-6 * Math.abs(length);
        }
        int[] pixels = new int[even ? count : Math.max(FINE, count)];
        for (int pixel = 0, at = 0; pixel < pixels.length; pixel++) {
            double place = edges[0] + length * (pixel + 0.5) / pixels.length;
            while (!even && (place - edges[at + 1]) * length > 0) {
                at++;
            }
            pixels[pixel] = even ? pixel : at;
        }
        return pixels;
    }
}
