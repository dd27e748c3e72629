package org.seepledger.job;

import java.util.Arrays;
import org.seepledger.aquifer.Concentration;
import org.seepledger.aquifer.Solute;
import org.seepledger.aquifer.Window;
import org.seepledger.io.result.MassUnits;
import org.seepledger.unit.Measure;

/**
 * Concentrations of the cells of a window in one layer and interval, row-major, row 0 northernmost.
 *
 * @param solute the solute
 * @param length the set's length unit
 * @param interval the interval, from 0
 * @param layer the layer, from 0
 * @param window the window
 */
record ConcentrationReading(Solute solute, Measure length, int interval, int layer, Window window) {

    /**
     * Values in the unit that they were given in, and the limits of non-detects. A non-detect has no value; a mean of two ends
     * of which one is a non-detect has one, with half the limit, and has the limit beside it.
     */
    double[][] of(MapQuantity.Kind kind) {
        double[][] end = at(interval + 1);
        return kind == MapQuantity.Kind.MEAN_CONCENTRATION ? mean(at(interval), end) : end;
    }

    private double[][] at(int instant) {
        Concentration given = solute.concentration().orElseThrow();
        double factor = MassUnits.concentrationFactor(given.unit(), length);
        Concentration.AtInstant found = given.at(instant, layer, window);
        double[] values = found.values();
        double[] limits = found.limits();
        for (int cell = 0; cell < values.length; cell++) {
            values[cell] = Double.isNaN(limits[cell]) ? values[cell] * factor : Double.NaN;
            limits[cell] *= factor;
        }
        return new double[][] {values, limits};
    }

    private static double[][] mean(double[][] start, double[][] end) {
        double[] values = new double[end[0].length];
        double[] limits = new double[values.length];
        for (int cell = 0; cell < values.length; cell++) {
            boolean detected = !Double.isNaN(start[0][cell]) || !Double.isNaN(end[0][cell]);
            values[cell] = detected ? 0.5 * (value(start, cell) + value(end, cell)) : Double.NaN;
            limits[cell] = limit(start[1][cell], end[1][cell]);
        }
        return new double[][] {values, limits};
    }

    private static double value(double[][] at, int cell) {
        return Double.isNaN(at[0][cell]) ? 0.5 * at[1][cell] : at[0][cell];
    }

    private static double limit(double one, double other) {
        return Double.isNaN(one) ? other : Double.isNaN(other) ? one : 0.5 * (one + other);
    }

    /** No non-detect anywhere. */
    static double[] none(Window window) {
        double[] limits = new double[window.size()];
        Arrays.fill(limits, Double.NaN);
        return limits;
    }
}
