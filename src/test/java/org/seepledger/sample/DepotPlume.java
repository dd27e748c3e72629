package org.seepledger.sample;

import java.util.ArrayList;
import java.util.List;
import org.apache.commons.math3.linear.Array2DRowRealMatrix;
import org.apache.commons.math3.linear.ArrayRealVector;
import org.apache.commons.math3.linear.DecompositionSolver;
import org.apache.commons.math3.linear.LUDecomposition;

/**
 * A solvent that leaks for a year, and what becomes of it: advection with the concentration upstream, dispersion with the full
 * tensor, linear sorption, decay into a product. An interval's flows carry the mean of its two ends, as budgets do.
 *
 * <p>Concentrations in g/m³ (mg/L), cell = row from the south × columns + column.
 */
final class DepotPlume {

    static final int INTERVALS = 12;
    static final double INTERVAL = 60.875;
    static final double POROSITY = 0.25;

    /** kg/m³. */
    static final double BULK_DENSITY = 1700;

    /** m. */
    static final double LONGITUDINAL = 6;

    static final double TRANSVERSE = 0.6;

    /** Mass of the product for each mass of the solvent that decays. */
    static final double YIELD = 0.74;

    /** Kd in L/kg and half-life in days, of solvent and product. */
    static final double[] KD = {0.06, 0.02};

    static final double[] HALF_LIFE = {500, 900};

    private static final int CELLS = DepotFlow.COLUMNS * DepotFlow.ROWS;
    private static final double VOLUME = DepotFlow.CELL * DepotFlow.CELL * DepotFlow.THICKNESS;

    private DepotPlume() {}

    /** What the leak carries of the solvent in an interval, g/m³. */
    static double leaked(int interval) {
        return interval < INTERVALS / 2 ? 900 : 0;
    }

    /** {@return concentrations at the instants: of the solvent, then of its product} */
    static List<List<double[]>> solved() {
        double[] none = new double[CELLS];
        List<double[]> solvent = new ArrayList<>(List.of(none));
        List<double[]> product = new ArrayList<>(List.of(none));
        Step ofSolvent = new Step(0);
        Step ofProduct = new Step(1);
        for (int interval = 0; interval < INTERVALS; interval++) {
            double[] added = new double[CELLS];
            added[DepotFlow.LEAK_ROW * DepotFlow.COLUMNS + DepotFlow.LEAK_COLUMN] = DepotFlow.LEAK * leaked(interval);
            double[] before = solvent.get(interval);
            double[] after = ofSolvent.from(before, added);
            double[] produced = new double[CELLS];
            for (int cell = 0; cell < CELLS; cell++) {
                produced[cell] = YIELD * ofSolvent.decay * ofSolvent.capacity * 0.5 * (before[cell] + after[cell]);
            }
            solvent.add(after);
            product.add(ofProduct.from(product.get(interval), produced));
        }
        return List.of(solvent, product);
    }

    /** One interval of one substance: capacity × growth = added − flow out − decay, both for the mean of the two ends. */
    private static final class Step {

        private final double capacity;
        private final double decay;
        private final Array2DRowRealMatrix leaving = new Array2DRowRealMatrix(CELLS, CELLS);
        private final DecompositionSolver solver;

        Step(int substance) {
            capacity = VOLUME * (POROSITY + BULK_DENSITY * KD[substance] * 1e-3);
            decay = StrictMath.log(2) / HALF_LIFE[substance];
            for (int cell = 0; cell < CELLS; cell++) {
                double[] one = new double[CELLS];
                one[cell] = 1;
                double[] out = out(one);
                out[cell] += decay * capacity;
                leaving.setColumn(cell, out);
            }
            Array2DRowRealMatrix matrix = (Array2DRowRealMatrix) leaving.scalarMultiply(0.5);
            for (int cell = 0; cell < CELLS; cell++) {
                matrix.addToEntry(cell, cell, capacity / INTERVAL);
            }
            solver = new LUDecomposition(matrix).getSolver();
        }

        double[] from(double[] before, double[] added) {
            double[] known = leaving.operate(before);
            for (int cell = 0; cell < CELLS; cell++) {
                known[cell] = capacity / INTERVAL * before[cell] - 0.5 * known[cell] + added[cell];
            }
            return solver.solve(new ArrayRealVector(known)).toArray();
        }
    }

    /** What leaves each cell through its faces; clean water comes from beyond the grid. */
    private static double[] out(double[] c) {
        double[] out = new double[CELLS];
        for (int row = 0; row < DepotFlow.ROWS; row++) {
            for (int column = 0; column <= DepotFlow.COLUMNS; column++) {
                double flow = DepotFlow.east(column, row);
                move(out, c, column - 1, row, column, row, flow, dispersed(c, column, row, true));
            }
        }
        for (int row = 0; row <= DepotFlow.ROWS; row++) {
            for (int column = 0; column < DepotFlow.COLUMNS; column++) {
                double flow = DepotFlow.north(column, row);
                move(out, c, column, row - 1, column, row, flow, dispersed(c, column, row, false));
            }
        }
        return out;
    }

    private static void move(
            double[] out, double[] c, int column, int row, int toColumn, int toRow, double flow, double dispersed) {
        double upstream = flow >= 0 ? at(c, column, row) : at(c, toColumn, toRow);
        double moved = flow * upstream + dispersed;
        if (isInside(column, row)) {
            out[row * DepotFlow.COLUMNS + column] += moved;
        }
        if (isInside(toColumn, toRow)) {
            out[toRow * DepotFlow.COLUMNS + toColumn] -= moved;
        }
    }

    /** What disperses eastward through a cell's west face, or northward through its south face. */
    private static double dispersed(double[] c, int column, int row, boolean eastward) {
        int firstColumn = eastward ? column - 1 : column;
        int firstRow = eastward ? row : row - 1;
        if (!isInside(firstColumn, firstRow) || !isInside(column, row)) {
            return 0;
        }
        double face = DepotFlow.CELL * DepotFlow.THICKNESS;
        double qx = eastward ? DepotFlow.east(column, row) / face : across(firstColumn, firstRow, column, row, true);
        double qy = eastward ? across(firstColumn, firstRow, column, row, false) : DepotFlow.north(column, row) / face;
        double size = Math.sqrt(qx * qx + qy * qy);
        double step = (at(c, column, row) - at(c, firstColumn, firstRow)) / DepotFlow.CELL;
        double aside = 0.5 * (slope(c, firstColumn, firstRow, !eastward) + slope(c, column, row, !eastward));
        double along = eastward ? qx : qy;
        double lateral = eastward ? qy : qx;
        double straight = (LONGITUDINAL * along * along + TRANSVERSE * lateral * lateral) / size;
        double crossed = (LONGITUDINAL - TRANSVERSE) * qx * qy / size;
        return -face * (straight * step + crossed * aside);
    }

    /** The mean discharge of two cells along one axis. */
    private static double across(int column, int row, int otherColumn, int otherRow, boolean eastward) {
        double face = DepotFlow.CELL * DepotFlow.THICKNESS;
        double sum = eastward
                ? DepotFlow.east(column, row)
                        + DepotFlow.east(column + 1, row)
                        + DepotFlow.east(otherColumn, otherRow)
                        + DepotFlow.east(otherColumn + 1, otherRow)
                : DepotFlow.north(column, row)
                        + DepotFlow.north(column, row + 1)
                        + DepotFlow.north(otherColumn, otherRow)
                        + DepotFlow.north(otherColumn, otherRow + 1);
        return 0.25 * sum / face;
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
        return isInside(column, row) ? c[row * DepotFlow.COLUMNS + column] : 0;
    }

    private static boolean isInside(int column, int row) {
        return column >= 0 && row >= 0 && column < DepotFlow.COLUMNS && row < DepotFlow.ROWS;
    }
}
