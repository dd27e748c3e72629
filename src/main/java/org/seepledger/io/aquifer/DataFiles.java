package org.seepledger.io.aquifer;

import java.io.IOException;
import java.io.InputStream;
import java.io.UncheckedIOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.LinkedHashMap;
import java.util.Locale;
import java.util.Map;
import java.util.Optional;
import java.util.concurrent.ConcurrentHashMap;
import org.seepledger.aquifer.Grid;
import org.seepledger.io.DataFolder;
import org.seepledger.io.Unreadable;
import org.seepledger.io.raster.GeoTiff;
import org.seepledger.io.raster.Georeference;
import org.seepledger.io.raster.GridMatch;
import org.seepledger.io.raster.RasterFiles;
import org.seepledger.io.table.Below;
import org.seepledger.io.table.Frame;
import org.seepledger.io.table.GriddedTable;
import org.seepledger.io.table.Repeats;

/** The data files of one aquifer folder: each found once, matched to the grid once, open until closed. */
public final class DataFiles implements AutoCloseable {

    private final DataFolder folder;
    private final RasterFiles rasters = new RasterFiles();
    private final Map<String, Path> found = new ConcurrentHashMap<>();
    private final Map<String, Path> inOrder = new LinkedHashMap<>();
    private final Map<String, GriddedTable> tables = new LinkedHashMap<>();
    private final Map<String, RastersIn> systems = new LinkedHashMap<>();
    private Optional<String> shapeNote = Optional.empty();
    private int matchedByShape;

    /** Which rasters say that they are in a coordinate system: the first one's name, and how many there are. */
    record RastersIn(String first, int count) {

        RastersIn plus(RastersIn more) {
            return new RastersIn(first, count + more.count);
        }
    }

    DataFiles(DataFolder folder) {
        this.folder = folder;
    }

    /** The file that a name means; remembered as read. */
    Path path(String name, String place) {
        Path path = found.computeIfAbsent(name, key -> folder.resolve(key, place));
        inOrder.putIfAbsent(name, path);
        return path;
    }

    boolean isRaster(String name, String place) {
        try (InputStream start = Files.newInputStream(path(name, place))) {
            byte[] mark = start.readNBytes(2);
            return mark.length == 2 && mark[0] == mark[1] && (mark[0] == 'I' || mark[0] == 'M')
                    || name.toLowerCase(Locale.ROOT).matches(".*\\.tiff?");
        } catch (IOException e) {
            throw Unreadable.file(name, e);
        }
    }

    /** A raster, found before; the caller closes it. */
    GeoTiff raster(String name) {
        return rasters.open(found.get(name), name);
    }

    /** The grid that a raster's cells make. */
    Grid grid(String name, String place, double planUnit) {
        path(name, place);
        try (GeoTiff raster = raster(name)) {
            rememberSystem(raster);
            return raster.grid(planUnit);
        } catch (IOException e) {
            throw Unreadable.file(name, e);
        }
    }

    /** Opens a raster for the first time, and makes sure that its cells are the grid's. */
    int matchedBands(String name, String place, Grid grid) {
        path(name, place);
        try (GeoTiff raster = raster(name)) {
            rememberSystem(raster);
            Optional<String> note = GridMatch.check(raster, grid);
            matchedByShape += note.isPresent() ? 1 : 0;
            shapeNote = shapeNote.or(() -> note);
            return raster.bands();
        } catch (IOException e) {
            throw Unreadable.file(name, e);
        }
    }

    private void rememberSystem(GeoTiff raster) {
        raster.georeference()
                .flatMap(Georeference::crs)
                .ifPresent(crs -> systems.merge(crs, new RastersIn(raster.shownName(), 1), RastersIn::plus));
    }

    /** The coordinate systems that rasters name, as {@code EPSG:n} or WKT. */
    Map<String, RastersIn> systems() {
        return systems;
    }

    GriddedTable table(String name, String place, Frame frame, Repeats repeats, Below below) {
        Path path = path(name, place);
        return tables.computeIfAbsent(
                name + "/" + repeats + "/" + below, key -> GriddedTable.open(path, name, frame, repeats, below));
    }

    /** A note where rasters were matched by their shape alone. */
    Optional<String> shapeNote() {
        return shapeNote.map(note -> matchedByShape == 1 ? note : note + " (so are " + (matchedByShape - 1) + " more)");
    }

    /** The files read so far, in order of first mention. */
    Map<String, Path> inputs() {
        return inOrder;
    }

    @Override
    public void close() {
        tables.values().forEach(GriddedTable::close);
        try {
            rasters.close();
        } catch (IOException e) {
            throw new UncheckedIOException(e);
        }
    }
}
