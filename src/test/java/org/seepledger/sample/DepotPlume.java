package org.seepledger.sample;

import java.util.ArrayList;
import java.util.List;

/**
 * A solvent that seeps down for a year, and what becomes of it: advection with the concentration upstream, dispersion with the
 * full tensor, linear sorption, decay into a product, in gravel whose water table rises and falls. A month's flows carry
 * the mean of its two ends, as budgets do.
 *
 * <p>Concentrations in g/m³ (mg/L), cell = row from the south × columns + column.
 */
final class DepotPlume {

    static final int INTERVALS = ValleySeasons.MONTHS;
    static final double POROSITY = 0.28;

    /** kg/m³. */
    static final double BULK_DENSITY = 1700;

    /** Mass of the product for each mass of the solvent that decays. */
    static final double YIELD = 0.74;

    /** Kd in L/kg and half-life in days, of solvent and product. */
    static final double[] KD = {0.06, 0.02};

    static final double[] HALF_LIFE = {500, 900};

    /** The first of the two by two cells whose recharge the solvent seeps down with. */
    static final int SPILL_COLUMN = 4;

    static final int SPILL_ROW = 6;
    static final int SPILL_WIDTH = 2;

    private static final double DAYS_A_YEAR = 365.25;

    private final DepotFlow flow;

    DepotPlume(DepotFlow flow) {
        this.flow = flow;
    }

    /** What recharge carries of the solvent through the spoiled ground in a month, g/m³. */
    static double seeping(int interval) {
        return interval < INTERVALS / 2 ? 850 : 0;
    }

    static boolean isSpoiled(int column, int row) {
        return column >= SPILL_COLUMN
                && column < SPILL_COLUMN + SPILL_WIDTH
                && row >= SPILL_ROW
                && row < SPILL_ROW + SPILL_WIDTH;
    }

    /** {@return concentrations at the instants: of the solvent, then of its product} */
    List<List<double[]>> solved() {
        List<double[]> solvent = new ArrayList<>(List.of(new double[DepotFlow.CELLS]));
        List<double[]> product = new ArrayList<>(List.of(new double[DepotFlow.CELLS]));
        for (int interval = 0; interval < INTERVALS; interval++) {
            DepotMonth month = new DepotMonth(flow, interval);
            double[] before = solvent.get(interval);
            double[] after = month.step(capacity(0), decay(0), before, seeped(interval));
            double[] produced = month.decayed(capacity(0), decay(0), before, after);
            for (int cell = 0; cell < produced.length; cell++) {
                produced[cell] *= YIELD;
            }
            solvent.add(after);
            product.add(month.step(capacity(1), decay(1), product.get(interval), produced));
        }
        return List.of(solvent, product);
    }

    /** Mass in a volume of full rock for each mass in a volume of water. */
    private static double capacity(int substance) {
        return POROSITY + BULK_DENSITY * KD[substance] * 1e-3;
    }

    /** 1/d. */
    private static double decay(int substance) {
        return StrictMath.log(2) / HALF_LIFE[substance];
    }

    /** g/d. */
    private double[] seeped(int interval) {
        double[] added = new double[DepotFlow.CELLS];
        for (int row = 0; row < DepotFlow.ROWS; row++) {
            for (int column = 0; column < DepotFlow.COLUMNS; column++) {
                double water =
                        flow.recharge(interval, column, row) / 1000.0 / DAYS_A_YEAR * DepotFlow.CELL * DepotFlow.CELL;
                added[row * DepotFlow.COLUMNS + column] = isSpoiled(column, row) ? water * seeping(interval) : 0;
            }
        }
        return added;
    }
}
