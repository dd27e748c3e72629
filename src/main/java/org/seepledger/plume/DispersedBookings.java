package org.seepledger.plume;

import org.seepledger.balance.Bookings;
import org.seepledger.fault.DataFault;

/** Books what disperses through the faces of a prism, in one band and interval. */
final class DispersedBookings implements Bookings {

    private final SoluteChart chart;
    private final Bookings flows;
    private final String solute;
    private int row;
    private int column;

    DispersedBookings(SoluteChart chart, Bookings flows, String solute) {
        this.chart = chart;
        this.flows = flows;
        this.solute = solute;
    }

    @Override
    public void at(int cellRow, int cellColumn) {
        flows.at(cellRow, cellColumn);
        row = cellRow;
        column = cellColumn;
    }

    @Override
    public void throughPiece(int account, double start, double end) {
        flows.throughPiece(chart.dispersion(account), known(start), known(end));
    }

    @Override
    public void throughFace(int account, double out) {
        flows.throughFace(chart.dispersion(account), known(out));
    }

    private double known(double flow) {
        if (Double.isNaN(flow)) {
            throw new DataFault(
                    "dispersion of " + solute,
                    "row " + (row + 1) + ", column " + (column + 1),
                    "no value of concentration, dispersivity or porosity in an active cell there or beside it",
                    "values in each active cell of the prisms and around them",
                    "Give them, or leave dispersion out.");
        }
        return flow;
    }

    @Override
    public void added(int account, double rate) {
        // Sources add no dispersion.
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
