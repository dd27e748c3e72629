package org.seepledger.aquifer;

import java.util.List;

/** What is known of blocks of cells by interval: an aquifer as it stands, or one whose worked-out blocks are kept. */
public interface KnownCells {

    /**
     * {@return a window's cells with at least a ring of one cell around them}
     *
     * @param window the window
     * @throws org.seepledger.fault.DataFault if the data are wrong
     */
    CellGeometry geometry(Window window);

    /**
     * {@return what is known of a block of cells in an interval}
     *
     * @param interval the interval, from 0
     * @param geometry the cells, from {@link #geometry}
     * @param wells the wells to count, all wells of the aquifer that stand in the window that was asked for
     * @throws org.seepledger.fault.DataFault if the data are wrong
     */
    IntervalState state(int interval, CellGeometry geometry, List<PlacedWell> wells);
}
