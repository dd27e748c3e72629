package org.seepledger.aquifer;

import java.util.Optional;
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
        double[] found = at(instant, values, block);
        double[] limits = at(instant, marks, block);
        limit.ifPresent(given -> {
            double[] least = at(instant, given, block);
            for (int cell = 0; cell < found.length; cell++) {
                boolean below = Double.isNaN(limits[cell]) && found[cell] < least[cell];
                limits[cell] = below ? least[cell] : limits[cell];
            }
        });
        return new AtInstant(found, limits);
    }

    private static double[] at(int instant, GriddedValues given, Block block) {
        return block.read(given, given.changes() ? instant : 0);
    }
}
