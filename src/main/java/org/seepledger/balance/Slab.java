package org.seepledger.balance;

import org.seepledger.aquifer.CellTerm;

/** How a prism's vertical range meets the cells of a block in one interval. */
interface Slab {

    /** The part of a cell's saturated height that lies in the prism, from 0 to 1. */
    double part(int layer, int row, int column);

    /** How much of a term of a cell counts, from 0 to 1. */
    double counted(CellTerm.Entry entry, int layer, int row, int column);

    /** What the part of a cell within the range sends out through all faces, length³/time, if its plan area is whole. */
    double outflow(int layer, int row, int column);

    /** Books what crosses the lids in a column of cells that the prism covers by a share. */
    void bookLids(int row, int column, double share, Bookings bookings);

    /** Books what crosses the steps of lids between a cell and its western and northern neighbours. */
    void bookRisers(int row, int column, Bookings bookings);
}
