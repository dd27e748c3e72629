package org.seepledger.balance;

/**
 * What the flows of a prism are booked in. Bookings come in an order that does not depend on the amounts, and each is
 * linear in the flows and rates of its column of cells and its neighbours.
 */
interface Bookings {

    /** All that follows is booked in a column of cells, until the next call. */
    void at(int row, int column);

    /** Books a flow through a boundary piece whose outflow density goes from start to end: in and out apart. */
    void throughPiece(int account, double start, double end);

    /** Books a uniform outflow through a face. */
    void throughFace(int account, double out);

    /** Books what a source adds or storage releases; taken if negative. */
    void added(int account, double rate);

    /** Counts what a part of the volume sends out, and the gross flow it is measured against. */
    void fromVolume(double out, double gross);

    /** Counts the area of a cell that takes no part. */
    void inactive(int layer, double area);
}
