package org.seepledger.balance;

/**
 * What the flows of a prism are booked in. Bookings come in an order that does not depend on the amounts, and each is
 * linear in the flows and rates of its column of cells and its neighbours.
 *
 * <p>Who books what the water carries is told, too, from which cells it comes and what the prism holds; water alone is
 * the same wherever it comes from. Cells are told by their places in the block, -1 beyond the grid.
 */
public interface Bookings {

    /**
     * All that follows is booked in a column of cells, until the next call.
     *
     * @param row its row in the grid
     * @param column its column in the grid
     */
    void at(int row, int column);

    /**
     * What flows out through pieces and faces, until the next call, comes from one cell, and what flows in from another.
     *
     * @param inside the cell on the prism's side
     * @param outside the cell on the other side; the same where a piece or lid runs through a cell
     */
    default void between(int inside, int outside) {
        // Water is the same from both.
    }

    /**
     * Books a flow through a boundary piece whose outflow density goes from start to end: in and out apart.
     *
     * @param account the account
     * @param start outflow density where the piece begins, over its whole length
     * @param end outflow density where it ends
     */
    void throughPiece(int account, double start, double end);

    /**
     * Books a uniform outflow through a face.
     *
     * @param account the account
     * @param out what flows out
     */
    void throughFace(int account, double out);

    /**
     * The prism holds a part of an active cell.
     *
     * @param layer the cell's layer
     * @param cell the cell
     * @param share the share of its plan area
     * @param floor the elevation from which on the prism holds it; may be infinite
     * @param ceiling the elevation up to which the prism holds it; may be infinite
     */
    default void holds(int layer, int cell, double share, double floor, double ceiling) {
        // What water a prism holds is no part of its budget.
    }

    /**
     * What is added next in a cell comes from one of the state's terms or wells.
     *
     * @param cell the cell
     * @param giver the term's place among the state's terms; the well's among its wells, counted on after the terms
     */
    default void from(int cell, int giver) {
        // Water is the same from all.
    }

    /**
     * Books what a source adds or storage releases; taken if negative.
     *
     * @param account the account
     * @param rate what is added
     */
    void added(int account, double rate);

    /**
     * Counts what a part of the volume sends out, and the gross flow it is measured against.
     *
     * @param out what it sends out
     * @param gross the gross flow
     */
    void fromVolume(double out, double gross);

    /**
     * Counts the area of a cell that takes no part.
     *
     * @param layer its layer, counted from the prism's first
     * @param area the area
     */
    void inactive(int layer, double area);
}
