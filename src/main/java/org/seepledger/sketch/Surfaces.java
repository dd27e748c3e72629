package org.seepledger.sketch;

import org.seepledger.aquifer.GriddedValues;

/** Gives the surfaces that drawings name by path. */
@FunctionalInterface
public interface Surfaces {

    /**
     * {@return the elevations of a surface, in length units, the same for all layers and steps}
     *
     * @param surface the surface
     * @param lid {@code top} or {@code bottom}: what it was named for, to be told in messages
     * @throws org.seepledger.fault.DataFault if there is no such raster on the grid
     */
    GriddedValues read(Limit.Surface surface, String lid);
}
