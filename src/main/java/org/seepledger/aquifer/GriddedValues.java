package org.seepledger.aquifer;

import java.util.Arrays;
import java.util.List;

/**
 * One quantity on the grid, a value per cell, layer and step; a step is an interval, an instant, or, for what does not
 * change, always 0.
 */
public interface GriddedValues {

    /**
     * Reads one block. Called from any thread.
     *
     * @param layer the layer, from 0
     * @param step the interval or instant, from 0
     * @param window the block
     * @param target receives {@code window.size()} values, row-major, row 0 northernmost, in the set's units;
     *     {@code NaN} where there is no value
     * @param offset where in {@code target} the first goes
     * @throws org.seepledger.fault.DataFault if the file cannot be read or does not hold what it should
     */
    void read(int layer, int step, Window window, double[] target, int offset);

    /**
     * {@return whether the values may differ from step to step; one raster for all steps does not}
     */
    boolean changes();

    /**
     * {@return whether values belong to layers; where not, a source's enter the uppermost active cell}
     */
    boolean layered();

    /**
     * {@return what the values of a block are made of: the parts' value × factor add up to what {@link #read} gives, to
     * rounding; none for a quantity that is 0 because nothing was given}
     *
     * @param layer the layer, from 0
     * @param step the interval or instant, from 0
     * @param window the block
     */
    default List<Stored> stored(int layer, int step, Window window) {
        double[] values = new double[window.size()];
        read(layer, step, window, values, 0);
        String place = (layered() ? "layer " + (layer + 1) : "all layers") + (changes() ? ", step " + (step + 1) : "");
        return List.of(new Stored("", place, false, values, 1));
    }

    /**
     * {@return the mean of the two instants that bound each interval: snapshots read as intervals}
     *
     * @param snapshots values at instants
     */
    static GriddedValues meanOfEnds(GriddedValues snapshots) {
        return snapshots.changes() ? new MeanOfEnds(snapshots) : snapshots;
    }

    /**
     * {@return a quantity with one value everywhere}
     *
     * @param value the value, in the set's units
     */
    static GriddedValues constant(double value) {
        return new GriddedValues() {
            @Override
            public void read(int layer, int step, Window window, double[] target, int offset) {
                Arrays.fill(target, offset, offset + window.size(), value);
            }

            @Override
            public boolean changes() {
                return false;
            }

            @Override
            public boolean layered() {
                return false;
            }

            @Override
            public List<Stored> stored(int layer, int step, Window window) {
                return value == 0 ? List.of() : List.of(Stored.everywhere("", "", value, 1, window));
            }
        };
    }
}
