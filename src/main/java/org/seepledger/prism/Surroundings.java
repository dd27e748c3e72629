package org.seepledger.prism;

import java.util.BitSet;
import java.util.List;
import org.seepledger.aquifer.Grid;
import org.seepledger.aquifer.Window;

/**
 * The columns of cells that prisms touch and a ring of one around them: all that the prisms' budgets rest on.
 *
 * <p>One is enough: flow through a face rests on the two cells beside it, and at an open outer face of the grid on the two
 * nearest, of which the second is a neighbour of the cell touched.
 */
public final class Surroundings {

    private final Window window;
    private final BitSet held = new BitSet();

    private Surroundings(Window window) {
        this.window = window;
    }

    /**
     * {@return the surroundings of prisms}
     *
     * @param cuts at least one prism, cut by the grid
     * @param grid the grid
     */
    public static Surroundings of(List<PrismCut> cuts, Grid grid) {
        Surroundings surroundings = new Surroundings(grid.window());
        for (PrismCut cut : cuts) {
            Coverage coverage = cut.coverage();
            Window rows = coverage.window();
            for (int row = rows.row(); row < rows.rowEnd(); row++) {
                for (int column = coverage.firstColumn(row); column < coverage.columnEnd(row); column++) {
                    if (coverage.share(row, column) != 0 || coverage.isCut(row, column)) {
                        surroundings.add(new Window(row, column, 1, 1).widened(1, grid));
                    }
                }
            }
        }
        return surroundings;
    }

    private void add(Window cells) {
        for (int row = cells.row(); row < cells.rowEnd(); row++) {
            held.set(window.index(row, cells.column()), window.index(row, cells.columnEnd() - 1) + 1);
        }
    }

    /**
     * {@return whether a column of cells is one of them}
     *
     * @param row its row in the grid
     * @param column its column in the grid
     */
    public boolean holds(int row, int column) {
        return held.get(window.index(row, column));
    }

    /**
     * {@return whether any column of cells in a row of the grid is one of them}
     *
     * @param row the row
     */
    public boolean touchRow(int row) {
        int next = held.nextSetBit(window.index(row, 0));
        return next >= 0 && next < window.index(row, 0) + window.columns();
    }

    /**
     * {@return how many columns of cells they are}
     */
    public int count() {
        return held.cardinality();
    }
}
