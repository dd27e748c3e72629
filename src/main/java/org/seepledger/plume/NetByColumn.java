package org.seepledger.plume;

import org.seepledger.aquifer.Window;
import org.seepledger.balance.Bookings;
import org.seepledger.balance.SumsByColumn;

/** What each column of cells books of a row: a sum of accounts' nets, each so many times. */
final class NetByColumn implements Bookings {

    private final double[] row;
    private final SumsByColumn sums;

    NetByColumn(double[] row, Window window) {
        this.row = row;
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
        sums.add(-row[account] * 0.5 * (start + end));
    }

    @Override
    public void throughFace(int account, double out) {
        sums.add(-row[account] * out);
    }

    @Override
    public void added(int account, double rate) {
        sums.add(row[account] * rate);
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
