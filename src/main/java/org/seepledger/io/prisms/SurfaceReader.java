package org.seepledger.io.prisms;

import java.nio.file.Path;
import org.seepledger.aquifer.GriddedValues;

/** Reads a surface raster on the aquifer's grid, for the top or bottom of a prism. */
@FunctionalInterface
public interface SurfaceReader {

    /**
     * {@return the elevations, in length units, the same for all layers and steps}
     *
     * @param raster the file, which exists
     * @param shownRaster the file as the user named it, for messages
     * @throws org.seepledger.fault.DataFault if it is no raster of the grid's shape
     */
    GriddedValues read(Path raster, String shownRaster);
}
