package org.seepledger.io.aquifer;

import org.seepledger.aquifer.GriddedValues;
import org.seepledger.aquifer.Window;

/**
 * First-order rates from half-lives: ln 2 over each.
 *
 * @param halfLives times, positive
 */
record HalfLives(GriddedValues halfLives) implements GriddedValues {

    @Override
    public void read(int layer, int step, Window window, double[] target, int offset) {
        halfLives.read(layer, step, window, target, offset);
        for (int i = offset; i < offset + window.size(); i++) {
            target[i] = Math.log(2) / target[i];
        }
    }

    @Override
    public boolean changes() {
        return halfLives.changes();
    }

    @Override
    public boolean layered() {
        return halfLives.layered();
    }
}
