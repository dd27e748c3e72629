package org.seepledger.io.aquifer;

import org.seepledger.aquifer.GriddedValues;
import org.seepledger.aquifer.Window;

/**
 * One quantity times another, neither of which changes in time.
 *
 * @param one the one
 * @param other the other
 */
record Product(GriddedValues one, GriddedValues other) implements GriddedValues {

    @Override
    public void read(int layer, int step, Window window, double[] target, int offset) {
        double[] factors = new double[window.size()];
        other.read(layer, step, window, factors, 0);
        one.read(layer, step, window, target, offset);
        for (int i = 0; i < factors.length; i++) {
            target[offset + i] *= factors[i];
        }
    }

    @Override
    public boolean changes() {
        return false;
    }

    @Override
    public boolean layered() {
        return one.layered() || other.layered();
    }
}
