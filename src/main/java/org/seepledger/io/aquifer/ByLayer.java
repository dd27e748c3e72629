package org.seepledger.io.aquifer;

import java.util.List;
import org.seepledger.aquifer.GriddedValues;
import org.seepledger.aquifer.Stored;
import org.seepledger.aquifer.Window;

/**
 * A quantity with a binding of its own for each layer.
 *
 * @param layers one for each layer, from the top down
 */
record ByLayer(List<GriddedValues> layers) implements GriddedValues {

    @Override
    public void read(int layer, int step, Window window, double[] target, int offset) {
        layers.get(layer).read(layer, step, window, target, offset);
    }

    @Override
    public List<Stored> stored(int layer, int step, Window window) {
        return layers.get(layer).stored(layer, step, window);
    }

    @Override
    public boolean changes() {
        return layers.stream().anyMatch(GriddedValues::changes);
    }

    @Override
    public boolean layered() {
        return true;
    }
}
