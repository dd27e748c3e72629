package org.seepledger.aquifer;

import java.util.List;
import java.util.Optional;

/**
 * One layer.
 *
 * @param name its name
 * @param top its own upper surface, elevations in length units; always there for the uppermost, else empty where it is
 *     the bottom of the layer above
 * @param bottom its lower surface
 * @param waterTable whether the water table can lie in it
 */
public record Layer(String name, Optional<GriddedValues> top, GriddedValues bottom, boolean waterTable) {

    /**
     * {@return the top of a layer as a surface of its own: the same whichever layer is asked for}
     *
     * @param layers the layers from the top down
     * @param index which of them, from 0
     */
    public static GriddedValues topOf(List<Layer> layers, int index) {
        return layers.get(index).top().map(top -> ofLayer(top, index)).orElseGet(() -> bottomOf(layers, index - 1));
    }

    /**
     * {@return the bottom of a layer as a surface of its own}
     *
     * @param layers the layers from the top down
     * @param index which of them, from 0
     */
    public static GriddedValues bottomOf(List<Layer> layers, int index) {
        return ofLayer(layers.get(index).bottom(), index);
    }

    private static GriddedValues ofLayer(GriddedValues values, int index) {
        return new OfLayer(values, index);
    }
}
