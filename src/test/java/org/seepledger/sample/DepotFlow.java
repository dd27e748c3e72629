package org.seepledger.sample;

/**
 * The flow under the depot: a window of the valley's gravel, month by month, on cells a fifth as wide.
 *
 * <p>Within a cell of the valley flow is taken as the program takes it, each component linear along its own axis: every small
 * cell then balances as the large one does, and the flow through small faces adds up to that through the large one's. Rows
 * are counted from the south here; a small cell is row × columns + column.
 */
final class DepotFlow {

    static final int FINER = 5;
    static final int COLUMNS = 5 * FINER;
    static final int ROWS = 3 * FINER;
    static final int CELLS = COLUMNS * ROWS;

    /** Cell size, m. */
    static final double CELL = ValleyGround.CELL / FINER;

    /** The first column of the valley's cells, and the first row from the south. */
    static final int FIRST_COLUMN = 20;

    static final int FIRST_ROW = 15;

    private final Valley valley;
    private final BlockGrid grid;

    DepotFlow(Valley valley) {
        this.valley = valley;
        this.grid = valley.grid();
    }

    /** The valley's cell that a small one lies in. */
    int large(int column, int row) {
        return grid.cell(
                ValleyGround.GRAVEL, ValleyGround.ROWS - 1 - FIRST_ROW - row / FINER, FIRST_COLUMN + column / FINER);
    }

    /** Eastward flow through the west face of a cell, or the east face of the one before, m³/d. */
    double east(int interval, int column, int row) {
        int within = Math.min(column, COLUMNS - 1);
        int large = large(within, row);
        double[] flows = valley.solution(interval).faceFlows();
        return between(flows[grid.west(large)], flows[grid.east(large)], column - within / FINER * FINER);
    }

    /** Northward flow through the south face of a cell, or the north face of the one before, m³/d. */
    double north(int interval, int column, int row) {
        int within = Math.min(row, ROWS - 1);
        int large = large(column, within);
        double[] flows = valley.solution(interval).faceFlows();
        return between(flows[grid.south(large)], flows[grid.north(large)], row - within / FINER * FINER);
    }

    private static double between(double first, double last, int line) {
        double through = line == FINER ? last : first + (last - first) * line / FINER;
        return through / FINER;
    }

    /** Upward flow through the base of the gravel, m³/d. */
    double up(int interval, int column, int row) {
        double[] flows = valley.solution(interval).faceFlows();
        return flows[grid.bottom(large(column, row))] / (FINER * FINER);
    }

    /** mm/yr. */
    int recharge(int interval, int column, int row) {
        int large = large(column, row);
        return ValleySeasons.recharge(interval, grid.centreX(large), grid.centreY(large));
    }

    double head(int instant, int column, int row) {
        return valley.heads(instant)[large(column, row)];
    }

    double top(int column, int row) {
        return grid.topElevation(large(column, row));
    }

    double bottom(int column, int row) {
        return grid.bottomElevation(large(column, row));
    }

    double specificYield(int column, int row) {
        return valley.stored().specificYield()[large(column, row)];
    }

    /** Water-filled thickness at an instant, m. */
    double filled(int instant, int column, int row) {
        double head = Math.min(top(column, row), head(instant, column, row));
        return Math.max(bottom(column, row), head) - bottom(column, row);
    }

    /** What storage gives in a month, from specific yield and elastic, m³/d. */
    double released(int interval, int column, int row) {
        int large = large(column, row);
        double before = valley.stored().volume(large, valley.heads(interval)[large]);
        double after = valley.stored().volume(large, valley.heads(interval + 1)[large]);
        return (before - after) / ValleySeasons.days(interval) / (FINER * FINER);
    }
}
