package org.seepledger.io.aquifer;

import java.io.IOException;
import java.util.List;
import org.seepledger.aquifer.GriddedValues;
import org.seepledger.aquifer.Stored;
import org.seepledger.aquifer.Window;
import org.seepledger.io.Unreadable;
import org.seepledger.io.raster.GeoTiff;

/**
 * Values from rasters: one file, or one for each layer or step where the name holds a placeholder.
 *
 * @param files where the files are
 * @param name the file's name, with placeholders
 * @param band which band holds what
 * @param key where {@code aquifer.json} binds them
 * @param conversion from stored values to the set's units
 */
record RasterValues(DataFiles files, String name, BandRule band, String key, Conversion conversion)
        implements GriddedValues {

    @Override
    public void read(int layer, int step, Window window, double[] target, int offset) {
        String file = FileName.of(name, layer, step);
        try (GeoTiff raster = files.raster(file)) {
            int index = band.index(layer, step);
            raster.readStored(index, window, target, offset);
            conversion.apply(raster.scale(index), raster.offset(index), target, offset, window.size());
        } catch (IOException e) {
            throw Unreadable.file(file, e);
        }
    }

    @Override
    public List<Stored> stored(int layer, int step, Window window) {
        String file = FileName.of(name, layer, step);
        try (GeoTiff raster = files.raster(file)) {
            int index = band.index(layer, step);
            double[] values = new double[window.size()];
            raster.readStored(index, window, values, 0);
            Stored stored = new Stored(file, "band " + (index + 1), false, values, 1);
            return conversion.parts(stored, raster.scale(index), raster.offset(index), key);
        } catch (IOException e) {
            throw Unreadable.file(file, e);
        }
    }

    @Override
    public boolean changes() {
        return band.changes() || FileName.changes(name);
    }

    @Override
    public boolean layered() {
        return band.layered() || FileName.layered(name);
    }
}
