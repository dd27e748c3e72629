package org.seepledger.balance;

import java.util.Arrays;

/**
 * How much a row grows with each booking, in the order of bookings.
 *
 * <p>A net grows evenly with whatever is booked. A gross flow does so as long as signs stand: what is counted is the
 * part of a piece on which the flow goes that way now. Both are homogeneous of degree one, so that slopes times bookings
 * add up to the row (Euler's theorem).
 */
final class Slopes implements Bookings {

    private final TracedRow row;
    private double[] slopes = new double[1024];
    private int count;

    Slopes(TracedRow row) {
        this.row = row;
    }

    @Override
    public void at(int cellRow, int cellColumn) {
        // What a row grows by is the same wherever something is booked.
    }

    @Override
    public void throughPiece(int account, double start, double end) {
        boolean turns = start < 0 && end > 0 || start > 0 && end < 0;
        double turn = turns ? start / (start - end) : 1;
        boolean outFirst = start > 0 || start == 0 && end >= 0;
        double first = outFirst ? row.outflow(account) : -row.inflow(account);
        double second = outFirst ? -row.inflow(account) : row.outflow(account);
        double endShare = 0.5 * turn * turn;
        double startShare = turn - endShare;
        add(first * startShare + second * (0.5 - startShare));
        add(first * endShare + second * (0.5 - endShare));
    }

    @Override
    public void throughFace(int account, double out) {
        add(out >= 0 ? row.outflow(account) : -row.inflow(account));
    }

    @Override
    public void added(int account, double rate) {
        add(rate >= 0 ? row.inflow(account) : -row.outflow(account));
    }

    @Override
    public void fromVolume(double out, double gross) {
        // The other route to the same flow is no part of a row.
    }

    @Override
    public void inactive(int layer, double area) {
        // Cells that take no part have nothing that a row could rest on.
    }

    private void add(double slope) {
        if (count == slopes.length) {
            slopes = Arrays.copyOf(slopes, 2 * count);
        }
        slopes[count++] = slope;
    }

    /** The slope of a booking; a piece has two, of where it starts and where it ends. */
    double get(int booking) {
        return slopes[booking];
    }

    /** Whether the row rests on nothing that was booked. */
    boolean areZero() {
        return Arrays.stream(slopes, 0, count).allMatch(slope -> slope == 0);
    }
}
