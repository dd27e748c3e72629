package org.seepledger.balance;

import org.seepledger.aquifer.CellTerm;

/** How a prism's vertical range meets the cells of a block in one interval. */
interface Slab {

    /** The part of a cell's saturated height below the prism's bottom, from 0 to 1. */
    double low(int layer, int row, int column);

    /** The part of a cell's saturated height below the prism's top, from 0 to 1, not less than {@link #low}. */
    double high(int layer, int row, int column);

    /** The part of a cell's saturated height that lies in the prism. */
    default double part(int layer, int row, int column) {
        return high(layer, row, column) - low(layer, row, column);
    }

    /** How much of a term of a cell counts, from 0 to 1. */
    double counted(CellTerm.Entry entry, int layer, int row, int column);

    /** What the part of a cell within the range sends out through all faces, length³/time, if its plan area is whole. */
    double outflow(int layer, int row, int column);

    /** The magnitudes that {@link #outflow} is made of, summed: what its rounding is measured against. */
    double gross(int layer, int row, int column);

    /**
     * The elevation of the prism's top at a column of cells, in length units; NaN where the range misses the column, or the
     * uppermost cell's top is not known, through which nothing flows.
     */
    double top(int row, int column);

    /** The elevation of the prism's bottom at a column of cells; NaN as for the top. */
    double bottom(int row, int column);

    /** The layer in which the top lies; only where the range does not miss the column. */
    int topLayer(int row, int column);

    /** The layer in which the bottom lies. */
    int bottomLayer(int row, int column);

    /** The upward flow through the top of a whole column of cells, length³/time. */
    double upwardAtTop(int row, int column);

    /** The upward flow through the bottom of a whole column of cells, length³/time. */
    double upwardAtBottom(int row, int column);

    /** The cell just below the prism's top; only where the range does not miss the column. */
    int cellBelowTop(int row, int column);

    /** The cell just above the prism's top, the same as below it where the top cuts a cell; -1 beyond the grid. */
    int cellAboveTop(int row, int column);

    /** The cell just above the prism's bottom. */
    int cellAboveBottom(int row, int column);

    /** The cell just below the prism's bottom, the same as above it where the bottom cuts a cell; -1 beyond the grid. */
    int cellBelowBottom(int row, int column);

    /** The elevation from which on the range holds cells of a column, in length units; may be infinite. */
    double floor(int row, int column);

    /** The elevation up to which the range holds cells of a column; may be infinite. */
    double ceiling(int row, int column);

    /** Whether the lids may have steps within a layer. */
    boolean hasRisers();
}
