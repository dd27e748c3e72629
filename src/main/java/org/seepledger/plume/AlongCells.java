package org.seepledger.plume;

import org.seepledger.aquifer.IntervalState;
import org.seepledger.balance.Bookings;
import org.seepledger.balance.Tally;

/** Books what a {@link CarriedField} carries through the faces of a prism and by its sources; storage has rows elsewhere. */
final class AlongCells implements Bookings {

    private final IntervalState state;
    private final Tally tally;
    private int giver;

    AlongCells(IntervalState state, Tally tally) {
        this.state = state;
        this.tally = tally;
    }

    @Override
    public void at(int row, int column) {
        // Sums are the same wherever something is booked.
    }

    @Override
    public void throughPiece(int account, double start, double end) {
        tally.throughPiece(account, start, end);
    }

    @Override
    public void throughFace(int account, double out) {
        tally.throughFace(account, out);
    }

    @Override
    public void from(int cell, int ofWhich) {
        giver = ofWhich;
    }

    @Override
    public void added(int account, double rate) {
        boolean term = giver < state.terms().size();
        if (!(term && state.terms().get(giver).storage())) {
            tally.added(account, rate);
        }
    }

    @Override
    public void fromVolume(double out, double gross) {
        // Both routes are the water's.
    }

    @Override
    public void inactive(int layer, double area) {
        // The water's budget tells the area that takes no part.
    }
}
