package org.seepledger.io.prisms;

import java.util.List;
import java.util.Optional;
import org.seepledger.aquifer.GriddedValues;
import org.seepledger.aquifer.Layer;

/** Level layers from 40 down to 0, each 10 thick. */
final class FourLayers {

    static final List<Layer> ALL = List.of(
            new Layer("1", Optional.of(GriddedValues.constant(40)), GriddedValues.constant(30), true),
            new Layer("2", Optional.empty(), GriddedValues.constant(20), false),
            new Layer("3", Optional.empty(), GriddedValues.constant(10), false),
            new Layer("4", Optional.empty(), GriddedValues.constant(0), false));

    private FourLayers() {}
}
