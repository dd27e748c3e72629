package org.seepledger.aquifer;

import java.util.Optional;
import java.util.function.Function;
import org.seepledger.unit.Measure;

/**
 * Concentrations of a solute at instants, and which of them are non-detects: below a detection limit, so that only the
 * limit is known.
 *
 * @param values mass/length³ at instants; where a value is marked as below a limit, the limit
 * @param marks the limits that single values are marked with, mass/length³; NaN where a value is not marked
 * @param limit the detection limit, mass/length³; empty where none is given, or values below it are values all the same
 * @param simulated whether the set says that a model computed them
 * @param unit the unit that they were given in
 */
public record Concentration(
        GriddedValues values, GriddedValues marks, Optional<GriddedValues> limit, boolean simulated, Measure unit) {

    /**
     * What stands in a block at an instant.
     *
     * @param values mass/length³; NaN where there is none
     * @param limits for non-detects the limit, mass/length³; NaN elsewhere
     */
    public record AtInstant(double[] values, double[] limits) {}

    /**
     * Reads a block at an instant.
     *
     * @param instant the instant, from 0
     * @param block the cells
     */
    public AtInstant at(int instant, Block block) {
        return at(given -> block.read(given, step(given, instant)));
    }

    /**
     * Reads one layer of a window at an instant.
     *
     * @param instant the instant, from 0
     * @param layer the layer, from 0
     * @param window the cells
     */
    public AtInstant at(int instant, int layer, Window window) {
        return at(given -> {
            double[] target = new double[window.size()];
            given.read(layer, step(given, instant), window, target, 0);
            return target;
        });
    }

    private AtInstant at(Function<GriddedValues, double[]> read) {
        double[] found = read.apply(values);
        double[] limits = read.apply(marks);
        limit.ifPresent(given -> {
            double[] least = read.apply(given);
            for (int cell = 0; cell < found.length; cell++) {
                boolean below = Double.isNaN(limits[cell]) && found[cell] < least[cell];
                limits[cell] = below ? least[cell] : limits[cell];
            }
        });
        return new AtInstant(found, limits);
    }

    private static int step(GriddedValues given, int instant) {
        return given.changes() ? instant : 0;
    }
}
