package org.seepledger.io.raster;

import java.io.Closeable;
import java.io.IOException;
import java.io.UncheckedIOException;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.Iterator;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;

/**
 * Rasters kept open between uses, the most recently used ones, so that neither memory nor open files grow with the number of
 * rasters; their unpacked blocks share one cache. For any number of threads.
 *
 * <pre>{@code
 * try (GeoTiff raster = files.open(path, "qx_l1.tif")) {
 *     raster.read(0, window, target, 0);
 * }
 * }</pre>
 */
public final class RasterFiles implements Closeable {

    /** How many rasters are kept open by default. */
    public static final int DEFAULT_CAPACITY = 64;

    private final int capacity;
    private final BlockCache blocks = BlockCache.ofMemory();
    private final Map<Key, GeoTiff> kept = new LinkedHashMap<>(16, 0.75f, true);

    private record Key(Path path, String shownName) {}

    /** Keeps up to {@link #DEFAULT_CAPACITY} rasters open. */
    public RasterFiles() {
        this(DEFAULT_CAPACITY);
    }

    /**
     * Keeps some rasters open.
     *
     * @param capacity how many, at least 1
     */
    public RasterFiles(int capacity) {
        this.capacity = capacity;
    }

    /**
     * {@return a raster, opened if it is not; the caller closes it, which leaves it open here}
     *
     * @param path the file
     * @param shownName how the user named it, for messages
     * @throws org.seepledger.fault.DataFault if there is no such file, or it is no GeoTIFF that can be read here
     */
    public synchronized GeoTiff open(Path path, String shownName) {
        Key key = new Key(path.toAbsolutePath().normalize(), shownName);
        GeoTiff raster = kept.get(key);
        if (raster == null) {
            raster = GeoTiff.open(path, shownName, blocks);
            kept.put(key, raster);
            closeEldest();
        }
        return raster.held();
    }

    private void closeEldest() {
        if (kept.size() > capacity) {
            Iterator<GeoTiff> eldest = kept.values().iterator();
            GeoTiff raster = eldest.next();
            eldest.remove();
            try {
                raster.close();
            } catch (IOException e) {
                throw new UncheckedIOException(e);
            }
        }
    }

    /**
     * Closes the rasters that nobody holds, and each of the others when its last holder does.
     *
     * @throws IOException if a file cannot be closed
     */
    @Override
    public synchronized void close() throws IOException {
        List<GeoTiff> all = new ArrayList<>(kept.values());
        kept.clear();
        IOException failed = null;
        for (GeoTiff raster : all) {
            try {
                raster.close();
            } catch (IOException e) {
                failed = e;
            }
        }
        if (failed != null) {
            throw failed;
        }
    }
}
