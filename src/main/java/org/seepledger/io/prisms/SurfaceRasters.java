package org.seepledger.io.prisms;

import java.io.IOException;
import java.io.UncheckedIOException;
import java.nio.file.Path;
import java.util.LinkedHashMap;
import java.util.Map;
import java.util.function.Consumer;
import org.seepledger.aquifer.Grid;
import org.seepledger.aquifer.GriddedValues;
import org.seepledger.aquifer.Window;
import org.seepledger.io.raster.GeoTiff;
import org.seepledger.io.raster.GridMatch;
import org.seepledger.io.raster.RasterFiles;

/** The rasters that prisms name as their tops and bottoms, open until closed. */
public final class SurfaceRasters implements SurfaceReader, AutoCloseable {

    private final Grid grid;
    private final Consumer<String> notes;
    private final RasterFiles rasters = new RasterFiles();
    private final Map<String, Path> inputs = new LinkedHashMap<>();

    /**
     * Reads surfaces of a grid.
     *
     * @param grid the grid
     * @param notes receives remarks for the user
     */
    public SurfaceRasters(Grid grid, Consumer<String> notes) {
        this.grid = grid;
        this.notes = notes;
    }

    /**
     * {@return the files read, by the name that the user gives them}
     */
    public Map<String, Path> inputs() {
        return inputs;
    }

    @Override
    public GriddedValues read(Path raster, String shownRaster) {
        try (GeoTiff opened = rasters.open(raster, shownRaster)) {
            GridMatch.check(opened, grid).ifPresent(notes);
        } catch (IOException e) {
            throw new UncheckedIOException(e);
        }
        inputs.put(shownRaster, raster);
        return new Surface(raster, shownRaster);
    }

    @Override
    public void close() {
        try {
            rasters.close();
        } catch (IOException e) {
            throw new UncheckedIOException(e);
        }
    }

    /** Elevations of the first band, the same for all layers and steps. */
    private final class Surface implements GriddedValues {

        private final Path raster;
        private final String shownRaster;

        Surface(Path raster, String shownRaster) {
            this.raster = raster;
            this.shownRaster = shownRaster;
        }

        @Override
        public void read(int layer, int step, Window window, double[] target, int offset) {
            try (GeoTiff opened = rasters.open(raster, shownRaster)) {
                opened.read(0, window, target, offset);
            } catch (IOException e) {
                throw new UncheckedIOException(e);
            }
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
}
