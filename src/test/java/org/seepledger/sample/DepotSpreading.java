package org.seepledger.sample;

/** What leaves each cell under the depot in a month, with the flow and by dispersion; clean water comes from beyond the grid. */
final class DepotSpreading {

    private final DepotFlow flow;
    private final int interval;
    private final double[] thickness;

    /**
     * Takes what it rests on.
     *
     * @param flow the flow
     * @param interval the month
     * @param thickness water-filled at its end, by cell
     */
    DepotSpreading(DepotFlow flow, int interval, double[] thickness) {
        this.flow = flow;
        this.interval = interval;
        this.thickness = thickness;
    }

    static boolean isInside(int column, int row) {
        return column >= 0 && row >= 0 && column < DepotFlow.COLUMNS && row < DepotFlow.ROWS;
    }

    private static int cell(int column, int row) {
        return row * DepotFlow.COLUMNS + column;
    }

    /** Through sides and base, less what water from storage brings with the cell's own concentration. */
    double[] out(double[] c) {
        double[] out = new double[c.length];
        for (int row = 0; row < DepotFlow.ROWS; row++) {
            for (int column = 0; column <= DepotFlow.COLUMNS; column++) {
                double water = flow.east(interval, column, row);
                move(out, c, column - 1, row, column, row, water, dispersed(c, column, row, true));
            }
        }
        for (int row = 0; row <= DepotFlow.ROWS; row++) {
            for (int column = 0; column < DepotFlow.COLUMNS; column++) {
                double water = flow.north(interval, column, row);
                move(out, c, column, row - 1, column, row, water, dispersed(c, column, row, false));
            }
        }
        for (int row = 0; row < DepotFlow.ROWS; row++) {
            for (int column = 0; column < DepotFlow.COLUMNS; column++) {
                int cell = cell(column, row);
                out[cell] += Math.max(0, -flow.up(interval, column, row)) * c[cell];
                out[cell] -= flow.released(interval, column, row) * c[cell];
            }
        }
        return out;
    }

    private static void move(
            double[] out, double[] c, int column, int row, int toColumn, int toRow, double water, double dispersed) {
        double upstream = water >= 0 ? at(c, column, row) : at(c, toColumn, toRow);
        double moved = water * upstream + dispersed;
        if (isInside(column, row)) {
            out[cell(column, row)] += moved;
        }
        if (isInside(toColumn, toRow)) {
            out[cell(toColumn, toRow)] -= moved;
        }
    }

    /** What disperses eastward through a cell's west face, or northward through its south face. */
    private double dispersed(double[] c, int column, int row, boolean eastward) {
        int firstColumn = eastward ? column - 1 : column;
        int firstRow = eastward ? row : row - 1;
        if (!isInside(firstColumn, firstRow) || !isInside(column, row)) {
            return 0;
        }
        double height = 0.5 * (thickness[cell(firstColumn, firstRow)] + thickness[cell(column, row)]);
        double face = DepotFlow.CELL * height;
        double qx = eastward
                ? flow.east(interval, column, row) / face
                : 0.5 * (meanEast(firstColumn, firstRow) + meanEast(column, row));
        double qy = eastward
                ? 0.5 * (meanNorth(firstColumn, firstRow) + meanNorth(column, row))
                : flow.north(interval, column, row) / face;
        double qz = 0.5 * (meanUp(firstColumn, firstRow) + meanUp(column, row));
        double size = Math.sqrt(qx * qx + qy * qy + qz * qz);
        double step = (at(c, column, row) - at(c, firstColumn, firstRow)) / DepotFlow.CELL;
        double aside = 0.5 * (slope(c, firstColumn, firstRow, !eastward) + slope(c, column, row, !eastward));
        double along = eastward ? qx : qy;
        double lateral = eastward ? qy : qx;
        double straight = (DepotMonth.LONGITUDINAL * along * along
                        + DepotMonth.TRANSVERSE * lateral * lateral
                        + DepotMonth.VERTICAL * qz * qz)
                / size;
        double crossed = (DepotMonth.LONGITUDINAL - DepotMonth.TRANSVERSE) * qx * qy / size;
        return -face * (straight * step + crossed * aside);
    }

    /** A cell's mean discharge, m/d. */
    private double meanEast(int column, int row) {
        double sum = flow.east(interval, column, row) + flow.east(interval, column + 1, row);
        return 0.5 * sum / (DepotFlow.CELL * thickness[cell(column, row)]);
    }

    private double meanNorth(int column, int row) {
        double sum = flow.north(interval, column, row) + flow.north(interval, column, row + 1);
        return 0.5 * sum / (DepotFlow.CELL * thickness[cell(column, row)]);
    }

    /** The top is closed. */
    private double meanUp(int column, int row) {
        return 0.5 * flow.up(interval, column, row) / (DepotFlow.CELL * DepotFlow.CELL);
    }

    /** The slope in a cell along one axis: between its neighbours, or to the one that there is. */
    private static double slope(double[] c, int column, int row, boolean eastward) {
        int beforeColumn = Math.max(0, eastward ? column - 1 : column);
        int beforeRow = Math.max(0, eastward ? row : row - 1);
        int afterColumn = Math.min(DepotFlow.COLUMNS - 1, eastward ? column + 1 : column);
        int afterRow = Math.min(DepotFlow.ROWS - 1, eastward ? row : row + 1);
        double distance = DepotFlow.CELL * (afterColumn - beforeColumn + afterRow - beforeRow);
        return (at(c, afterColumn, afterRow) - at(c, beforeColumn, beforeRow)) / distance;
    }

    private static double at(double[] c, int column, int row) {
        return isInside(column, row) ? c[cell(column, row)] : 0;
    }
}
