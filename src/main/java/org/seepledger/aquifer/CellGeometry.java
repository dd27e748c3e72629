package org.seepledger.aquifer;

import java.util.List;
import org.seepledger.fault.DataFault;

/**
 * Tops, bottoms and thicknesses of a block of cells.
 *
 * <p>A cell without thickness is <i>pinched out</i>: what lies above and below it are neighbours. Surfaces that cross
 * or part by no more than a millionth of their elevation count as touching; a cell thinner than a billionth of it has no
 * thickness, so that surfaces that are the same but for rounding pinch it out.
 */
public final class CellGeometry {

    private static final double TOUCHING = 1e-6;
    private static final double PINCHED = 1e-9;

    private final Grid grid;
    private final Window inner;
    private final Block block;
    private final double[] top;
    private final double[] bottom;

    private CellGeometry(Grid grid, Window inner, Block block, double[] top, double[] bottom) {
        this.grid = grid;
        this.inner = inner;
        this.block = block;
        this.top = top;
        this.bottom = bottom;
    }

    /**
     * Reads the surfaces of a window and of a ring of one cell around it.
     *
     * @param grid the grid
     * @param layers the layers from the top down
     * @param inner the window
     * @return the cells of all layers
     * @throws DataFault if surfaces cross or layers do not touch
     */
    public static CellGeometry of(Grid grid, List<Layer> layers, Window inner) {
        Window window = inner.widened(1, grid);
        Block block = new Block(window, layers.size());
        double[] top = new double[block.size()];
        double[] bottom = new double[block.size()];
        int size = window.size();
        for (int k = 0; k < layers.size(); k++) {
            Layer layer = layers.get(k);
            if (k > 0) {
                System.arraycopy(bottom, (k - 1) * size, top, k * size, size);
            }
            if (layer.top().isPresent()) {
                layer.top().get().read(k, 0, window, top, k * size);
            }
            layer.bottom().read(k, 0, window, bottom, k * size);
        }
        CellGeometry geometry = new CellGeometry(grid, inner, block, top, bottom);
        geometry.check();
        return geometry;
    }

    /** The same cells, when another part of them is wanted. */
    CellGeometry within(Window window) {
        return new CellGeometry(grid, window, block, top, bottom);
    }

    private void check() {
        int size = block.window().size();
        for (int i = 0; i < top.length; i++) {
            if (top[i] - bottom[i] < -tolerance(i)) {
                throw new DataFault(
                        "the layers",
                        place(i),
                        "a top of " + top[i] + " below a bottom of " + bottom[i],
                        "surfaces that do not cross",
                        "Correct one of the two surfaces there.");
            }
            if (i >= size && Math.abs(top[i] - bottom[i - size]) > tolerance(i)) {
                throw new DataFault(
                        "the layers",
                        place(i),
                        "a top of " + top[i] + " under a layer that ends at " + bottom[i - size],
                        "layers that touch",
                        "Leave the layer's top out, or make the two surfaces the same.");
            }
        }
    }

    private double tolerance(int cell) {
        return TOUCHING * height(cell);
    }

    private double pinch(int cell) {
        return PINCHED * height(cell);
    }

    private double height(int cell) {
        return Math.max(1, Math.max(Math.abs(top[cell]), Math.abs(bottom[cell])));
    }

    /**
     * {@return where a cell is, as users count}
     *
     * @param cell its place in the block
     */
    public String place(int cell) {
        return "layer " + (cell / block.window().size() + 1) + ", row " + (row(cell) + 1) + ", column "
                + (column(cell) + 1);
    }

    private int row(int cell) {
        return block.window().row()
                + cell % block.window().size() / block.window().columns();
    }

    private int column(int cell) {
        return block.window().column() + cell % block.window().columns();
    }

    /** A cell's plan area, in length units squared. */
    double area(int cell) {
        return grid.area(row(cell), column(cell));
    }

    /**
     * {@return the grid}
     */
    public Grid grid() {
        return grid;
    }

    /**
     * {@return the window that was asked for, without the ring}
     */
    public Window inner() {
        return inner;
    }

    /**
     * {@return the block of cells, the ring among them}
     */
    public Block block() {
        return block;
    }

    /**
     * {@return a cell's top, in length units; NaN where a surface has no value}
     *
     * @param cell its place in the block
     */
    public double top(int cell) {
        return top[cell];
    }

    /**
     * {@return a cell's bottom, in length units; NaN where a surface has no value}
     *
     * @param cell its place in the block
     */
    public double bottom(int cell) {
        return bottom[cell];
    }

    /**
     * {@return a cell's thickness, in length units; NaN where a surface has no value}
     *
     * @param cell its place in the block
     */
    public double thickness(int cell) {
        return top[cell] - bottom[cell];
    }

    /**
     * {@return whether a cell has both surfaces and lies open between them}
     *
     * @param cell its place in the block
     */
    public boolean isPresent(int cell) {
        return thickness(cell) > pinch(cell);
    }

    /**
     * {@return the nearest cell above or below a layer that is not pinched out; -1 where there is none}
     *
     * @param layer the layer to start beyond
     * @param direction 1 to go down, -1 to go up
     * @param row its row in the grid
     * @param column its column in the grid
     */
    public int next(int layer, int direction, int row, int column) {
        for (int k = layer + direction; k >= 0 && k < block.layers(); k += direction) {
            int cell = block.cell(k, row, column);
            if (!isPinchedOut(cell)) {
                return cell;
            }
        }
        return -1;
    }

    /**
     * {@return whether a cell has both surfaces and no thickness}
     *
     * @param cell its place in the block
     */
    public boolean isPinchedOut(int cell) {
        return thickness(cell) <= pinch(cell);
    }
}
