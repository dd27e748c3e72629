package org.seepledger.io.aquifer;

import java.util.Arrays;
import java.util.List;
import org.seepledger.aquifer.GriddedValues;
import org.seepledger.aquifer.Stored;
import org.seepledger.aquifer.Window;

/**
 * A number that {@code aquifer.json} gives for all cells.
 *
 * @param number the number as it stands there
 * @param place the key that it stands under
 * @param key the key of the binding, which may have an offset
 * @param conversion from the number to the set's units
 */
record BoundNumber(double number, String place, String key, Conversion conversion) implements GriddedValues {

    @Override
    public void read(int layer, int step, Window window, double[] target, int offset) {
        Arrays.fill(target, offset, offset + window.size(), conversion.of(number));
    }

    @Override
    public List<Stored> stored(int layer, int step, Window window) {
        return conversion.parts(Stored.everywhere(AquiferReader.FILE, place, number, 1, window), 1, 0, key);
    }

    @Override
    public boolean changes() {
        return false;
    }

    @Override
    public boolean layered() {
        return false;
    }
}
