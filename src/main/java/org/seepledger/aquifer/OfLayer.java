package org.seepledger.aquifer;

import java.util.List;

/**
 * One layer's values, whichever layer is asked for.
 *
 * @param values values by layer
 * @param of the layer, from 0
 */
record OfLayer(GriddedValues values, int of) implements GriddedValues {

    @Override
    public void read(int layer, int step, Window window, double[] target, int offset) {
        values.read(of, step, window, target, offset);
    }

    @Override
    public boolean changes() {
        return values.changes();
    }

    @Override
    public boolean layered() {
        return false;
    }

    @Override
    public List<Stored> stored(int layer, int step, Window window) {
        return values.stored(of, step, window);
    }
}
