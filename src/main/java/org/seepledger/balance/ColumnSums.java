package org.seepledger.balance;

import org.seepledger.aquifer.Window;

/** What each column of cells books of a row, with known slopes. */
final class ColumnSums implements Bookings {

    private final Slopes slopes;
    private final Window window;
    private final double[] sums;
    private int column;
    private int booking;

    ColumnSums(Slopes slopes, Window window) {
        this.slopes = slopes;
        this.window = window;
        this.sums = new double[window.size()];
    }

    /** The sum of a column of cells. */
    double get(int cellRow, int cellColumn) {
        return sums[window.index(cellRow, cellColumn)];
    }

    @Override
    public void at(int cellRow, int cellColumn) {
        column = window.index(cellRow, cellColumn);
    }

    @Override
    public void throughPiece(int account, double start, double end) {
        sums[column] += slopes.get(booking++) * start;
        sums[column] += slopes.get(booking++) * end;
    }

    @Override
    public void throughFace(int account, double out) {
        sums[column] += slopes.get(booking++) * out;
    }

    @Override
    public void added(int account, double rate) {
        sums[column] += slopes.get(booking++) * rate;
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
