package org.seepledger.io.aquifer;

import org.seepledger.aquifer.GriddedValues;
import org.seepledger.aquifer.Window;

/**
 * Stored values of a table, in the set's units.
 *
 * @param stored the values as they stand in the file
 * @param conversion from stored values to the set's units
 */
record ConvertedValues(GriddedValues stored, Conversion conversion) implements GriddedValues {

    @Override
    public void read(int layer, int step, Window window, double[] target, int offset) {
        stored.read(layer, step, window, target, offset);
        conversion.apply(1, 0, target, offset, window.size());
    }

    @Override
    public boolean changes() {
        return stored.changes();
    }

    @Override
    public boolean layered() {
        return stored.layered();
    }
}
