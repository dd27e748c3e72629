package org.seepledger.sample;

/**
 * The steady flow under the depot: one layer of even cells, eastward in gentle bends, fed by recharge and a leak, so that
 * each cell balances. Rows are counted from the south here.
 */
final class DepotFlow {

    static final int COLUMNS = 24;
    static final int ROWS = 12;

    /** Cell size and thickness, m. */
    static final double CELL = 10;

    static final double THICKNESS = 8;

    /** m/d. */
    static final double RECHARGE = 0.0006;

    /** What the leak adds, m³/d, and to which cell. */
    static final double LEAK = 0.4;

    static final int LEAK_COLUMN = 4;
    static final int LEAK_ROW = 6;

    /** Through each row of cells on the average, m³/d. */
    private static final double THROUGH_ROW = 2.4;

    /** By how many rows the bends reach to the side. */
    private static final double BEND = 1.1;

    private DepotFlow() {}

    /** Flow between a place in the south and the corner of cells, m³/d: its differences are flows that balance. */
    private static double stream(int column, int line) {
        double bend = StrictMath.sin(Math.PI * line / ROWS) * StrictMath.sin(2 * Math.PI * column / COLUMNS);
        return THROUGH_ROW * (line + BEND * bend);
    }

    /** Eastward flow through the west face of a cell, or the east face of the one before, m³/d. */
    static double east(int column, int row) {
        double gained = RECHARGE * CELL * CELL * column;
        double leaked = row == LEAK_ROW && column > LEAK_COLUMN ? LEAK : 0;
        return stream(column, row + 1) - stream(column, row) + gained + leaked;
    }

    /** Northward flow through the south face of a cell, or the north face of the one before, m³/d. */
    static double north(int column, int row) {
        return stream(column, row) - stream(column + 1, row);
    }
}
