package org.seepledger.sketch;

import org.seepledger.aquifer.GriddedValues;

/** Gives the surfaces that drawings name, by path or by layer. */
@FunctionalInterface
public interface Surfaces {

    /**
     * {@return the elevations of a surface, in length units, the same for all layers and steps}
     *
     * @param limit the surface
     * @param lid {@code top} or {@code bottom}: what it was named for, and what of a layer is meant
     * @throws org.seepledger.fault.DataFault if there is no such raster on the grid
     */
    GriddedValues read(Limit limit, String lid);
}
