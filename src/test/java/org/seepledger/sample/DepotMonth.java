package org.seepledger.sample;

/**
 * What moves a substance under the depot in a month: capacity × growth = added − flow out − decay + what the water from
 * storage carries, for the mean of the month's two ends.
 */
final class DepotMonth {

    /** Dispersivities along the flow, across it, and across it upright, m. */
    static final double LONGITUDINAL = 6;

    static final double TRANSVERSE = 0.6;
    static final double VERTICAL = 0.06;

    /** A value acts on its cell and its neighbours: every third may be tried at once. */
    private static final int APART = 3;

    private static final int REACH = DepotFlow.COLUMNS + 1;
    private static final double AREA = DepotFlow.CELL * DepotFlow.CELL;

    private final DepotFlow flow;
    private final int interval;
    private final double days;
    private final double[] thickness = new double[DepotFlow.CELLS];
    private final double[] before = new double[DepotFlow.CELLS];

    DepotMonth(DepotFlow flow, int interval) {
        this.flow = flow;
        this.interval = interval;
        this.days = ValleySeasons.days(interval);
        for (int cell = 0; cell < DepotFlow.CELLS; cell++) {
            before[cell] = flow.filled(interval, column(cell), row(cell));
            thickness[cell] = flow.filled(interval + 1, column(cell), row(cell));
        }
    }

    private static int column(int cell) {
        return cell % DepotFlow.COLUMNS;
    }

    private static int row(int cell) {
        return cell / DepotFlow.COLUMNS;
    }

    /**
     * {@return concentrations at the month's end, g/m³}
     *
     * @param capacity mass in a volume of full rock for each mass in a volume of water
     * @param decay of both phases, 1/d
     * @param start concentrations at its begin
     * @param added g/d by cell
     */
    double[] step(double capacity, double decay, double[] start, double[] added) {
        double[][] band = leaving();
        double[] right = added.clone();
        for (int cell = 0; cell < DepotFlow.CELLS; cell++) {
            double held = capacity * AREA * 0.5 * (before[cell] + thickness[cell]) / days;
            for (int k = 0; k < band[cell].length; k++) {
                int other = cell + k - REACH;
                band[cell][k] *= 0.5;
                right[cell] -= other >= 0 && other < DepotFlow.CELLS ? band[cell][k] * start[other] : 0;
            }
            right[cell] += (held - 0.5 * decay * capacity * AREA * before[cell]) * start[cell];
            band[cell][REACH] += held + 0.5 * decay * capacity * AREA * thickness[cell];
        }
        return new BandSolver(band).solve(right);
    }

    /** {@return what decays, g/d by cell: the mean of both ends} */
    double[] decayed(double capacity, double decay, double[] start, double[] end) {
        double[] decayed = new double[DepotFlow.CELLS];
        for (int cell = 0; cell < decayed.length; cell++) {
            decayed[cell] = 0.5 * decay * capacity * AREA * (before[cell] * start[cell] + thickness[cell] * end[cell]);
        }
        return decayed;
    }

    /** What leaves each cell, by the concentrations of the cells from {@code REACH} before it to {@code REACH} after. */
    private double[][] leaving() {
        double[][] band = new double[DepotFlow.CELLS][2 * REACH + 1];
        for (int first = 0; first < APART * APART; first++) {
            double[] ones = new double[DepotFlow.CELLS];
            for (int cell = 0; cell < ones.length; cell++) {
                ones[cell] = column(cell) % APART == first % APART && row(cell) % APART == first / APART ? 1 : 0;
            }
            double[] out = new DepotSpreading(flow, interval, thickness).out(ones);
            for (int cell = 0; cell < ones.length; cell++) {
                int column = nearest(column(cell), first % APART);
                int row = nearest(row(cell), first / APART);
                if (DepotSpreading.isInside(column, row)) {
                    band[cell][row * DepotFlow.COLUMNS + column - cell + REACH] += out[cell];
                }
            }
        }
        return band;
    }

    private static int nearest(int index, int first) {
        return index + Math.floorMod(first - index + 1, APART) - 1;
    }
}
