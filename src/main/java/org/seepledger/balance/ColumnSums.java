package org.seepledger.balance;

import org.seepledger.aquifer.Window;

/** What each column of cells books of a row, with known slopes. */
final class ColumnSums implements Bookings {

    private final Slopes slopes;
    private final SumsByColumn sums;
    private int booking;

    ColumnSums(Slopes slopes, Window window) {
        this.slopes = slopes;
        this.sums = new SumsByColumn(window);
    }

    /** The sum of a column of cells. */
    double get(int cellRow, int cellColumn) {
        return sums.get(cellRow, cellColumn);
    }

    @Override
    public void at(int cellRow, int cellColumn) {
        sums.at(cellRow, cellColumn);
    }

    @Override
    public void throughPiece(int account, double start, double end) {
        sums.add(slopes.get(booking++) * start);
        sums.add(slopes.get(booking++) * end);
    }

    @Override
    public void throughFace(int account, double out) {
        sums.add(slopes.get(booking++) * out);
    }

    @Override
    public void added(int account, double rate) {
        sums.add(slopes.get(booking++) * rate);
    }

    @Override
    public void fromVolume(double out, double gross) {
        // The other route to the same flow is no part of a row.
    }

    @Override
    public void inactive(int layer, double area) {
        // Cells that take no part have nothing that a row could rest on.
    }
}
