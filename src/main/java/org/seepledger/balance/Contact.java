package org.seepledger.balance;

import java.util.List;
import java.util.Map;
import java.util.Optional;
import org.seepledger.aquifer.FaceFlows;
import org.seepledger.aquifer.Grid;
import org.seepledger.aquifer.IntervalState;
import org.seepledger.aquifer.Window;
import org.seepledger.prism.Coverage;
import org.seepledger.prism.PlanOverlap;
import org.seepledger.prism.SharedPieces;

/**
 * Where two prisms touch: shared parts of sides, as far up and down as both reach, and lids that lie on each other where
 * one prism stands on the other. Books what flows from the one to the other under outflow, what flows back under inflow.
 */
final class Contact {

    /** How near, as a share of its elevation, two lids must be to lie on each other. */
    private static final double TOUCHING = 1e-9;

    private final int oneIndex;
    private final int otherIndex;
    private final PrismAccounts one;
    private final PrismAccounts other;
    private final List<SharedPieces.Part> parts;
    private final Optional<Coverage> common;

    private Contact(List<PrismAccounts> prisms, int oneIndex, int otherIndex, Grid grid) {
        this.oneIndex = oneIndex;
        this.otherIndex = otherIndex;
        this.one = prisms.get(oneIndex);
        this.other = prisms.get(otherIndex);
        this.parts = SharedPieces.of(one.cut(), other.cut(), grid);
        this.common = PlanOverlap.of(one.cut(), other.cut(), grid);
    }

    /** The contact of two prisms; empty where they do not touch in plan. */
    static Optional<Contact> between(List<PrismAccounts> prisms, int one, int other, Grid grid) {
        Contact contact = new Contact(prisms, one, other, grid);
        return contact.parts.isEmpty() && contact.common.isEmpty() ? Optional.empty() : Optional.of(contact);
    }

    int one() {
        return oneIndex;
    }

    int other() {
        return otherIndex;
    }

    static Tally emptyTally() {
        return new Tally(1, 0);
    }

    /** Books what one band of rows holds of the contact. */
    void book(IntervalState state, Slab ofOne, Slab ofOther, Tally tally) {
        bookSides(state, ofOne, ofOther, tally);
        Window rows = state.geometry().inner();
        common.ifPresent(coverage -> {
            int from = Math.max(rows.row(), coverage.window().row());
            int to = Math.min(rows.rowEnd(), coverage.window().rowEnd());
            for (int row = from; row < to; row++) {
                for (int column = coverage.firstColumn(row); column < coverage.columnEnd(row); column++) {
                    bookLids(coverage, ofOne, ofOther, row, column, tally);
                    bookRisers(state, coverage, ofOne, ofOther, row, column, tally);
                }
            }
        });
    }

    private void bookSides(IntervalState state, Slab ofOne, Slab ofOther, Tally tally) {
        Window rows = state.geometry().inner();
        Map<Integer, double[]> carried = one.carriedForWells(state.wells());
        for (SharedPieces.Part part : parts) {
            int row = one.cut().pieces().row(part.piece());
            if (row < rows.row() || row >= rows.rowEnd()) {
                continue;
            }
            int column = one.cut().pieces().column(part.piece());
            for (int layer = one.chart().first(); layer <= one.chart().last(); layer++) {
                if (other.chart().holds(layer)) {
                    double low = Math.max(
                            ofOne.low(layer, row, column), ofOther.low(layer, part.otherRow(), part.otherColumn()));
                    double high = Math.min(
                            ofOne.high(layer, row, column), ofOther.high(layer, part.otherRow(), part.otherColumn()));
                    double height = Math.max(0, high - low) * (part.to() - part.from());
                    double[] density = one.density(state.flows(), part.piece(), layer, carried.get(part.piece()));
                    double rise = density[1] - density[0];
                    tally.throughPiece(
                            0, height * (density[0] + part.from() * rise), height * (density[0] + part.to() * rise));
                }
            }
        }
    }

    private static void bookLids(Coverage coverage, Slab ofOne, Slab ofOther, int row, int column, Tally tally) {
        double share = coverage.share(row, column);
        if (meet(ofOne.bottom(row, column), ofOther.top(row, column))) {
            tally.throughFace(0, -share * ofOne.upwardAtBottom(row, column));
        }
        if (meet(ofOne.top(row, column), ofOther.bottom(row, column))) {
            tally.throughFace(0, share * ofOne.upwardAtTop(row, column));
        }
    }

    private void bookRisers(
            IntervalState state, Coverage coverage, Slab ofOne, Slab ofOther, int row, int column, Tally tally) {
        FaceFlows flows = state.flows();
        for (int layer = 0; layer < flows.block().layers(); layer++) {
            Riser.around(flows, coverage, layer, row, column, riser -> bookRiser(riser, ofOne, ofOther, tally));
        }
    }

    /** What leaves the one prism sideways at some height enters the other where that reaches to the same height. */
    private static void bookRiser(Riser riser, Slab ofOne, Slab ofOther, Tally tally) {
        tally.throughFace(0, riser.between(ofOne, ofOther));
        tally.throughFace(0, -riser.between(ofOther, ofOne));
    }

    private static boolean meet(double one, double other) {
        return Math.abs(one - other) <= TOUCHING * Math.max(1, Math.abs(one));
    }
}
