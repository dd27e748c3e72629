package org.seepledger.io.raster;

import java.io.Closeable;
import java.io.IOException;
import java.nio.file.Path;
import java.util.Arrays;
import java.util.List;
import java.util.Objects;
import java.util.Optional;
import org.seepledger.aquifer.Grid;
import org.seepledger.aquifer.Window;
import org.seepledger.fault.DataFault;

/**
 * One GeoTIFF, open for reading from any thread. It keeps the file's structure in memory, and of its values the blocks last
 * used, as far as a cache has room for them.
 */
public final class GeoTiff implements Closeable {

    private static final long MASK = 4;

    private final TiffFile file;
    private final TiffImage image;
    private final Optional<TiffImage> mask;
    private final NoData noData;
    private final BandScales scales;
    private final boolean southUp;
    private final Optional<Georeference> georeference;
    private int holders = 1;

    private GeoTiff(TiffFile file, BlockCache cache) {
        this.file = file;
        List<TiffDirectory> directories = TiffDirectory.all(file);
        TiffDirectory first = directories.get(0);
        this.image = TiffImage.of(first, cache);
        if (image.sample() == SampleType.BIT) {
            throw file.fault("", "1-bit samples", "values", "Write it again with gdal_translate -ot Byte.");
        }
        this.mask = directories.stream()
                .skip(1)
                .filter(this::isMask)
                .findFirst()
                .map(directory -> TiffImage.of(directory, cache));
        this.noData = NoData.of(first, image.sample());
        this.scales = BandScales.of(first, bands());
        Optional<Georeference> read = ModelTransform.of(first);
        this.southUp = read.isPresent() && ModelTransform.isSouthUp(read.get());
        this.georeference = southUp ? read.map(place -> place.flipped(rows())) : read;
    }

    /**
     * Opens a file and checks its structure, but reads no values yet.
     *
     * @param path the file
     * @param shownName how the user named it, for messages
     * @throws DataFault if there is no such file, or it is no GeoTIFF that can be read here
     */
    public static GeoTiff open(Path path, String shownName) {
        return open(path, shownName, BlockCache.ofMemory());
    }

    /** Opens a file whose unpacked blocks share a cache with those of others. */
    static GeoTiff open(Path path, String shownName, BlockCache cache) {
        TiffFile file = TiffFile.open(path, shownName);
        try {
            return new GeoTiff(file, cache);
        } catch (RuntimeException e) {
            try {
                file.close();
            } catch (IOException closing) {
                e.addSuppressed(closing);
            }
            throw e;
        }
    }

    /** Masks of the image itself, not of an overview. */
    private boolean isMask(TiffDirectory directory) {
        return directory.integer(Tag.NEW_SUBFILE_TYPE, 0) == MASK
                && directory.integer(Tag.IMAGE_WIDTH, 0) == columns()
                && directory.integer(Tag.IMAGE_LENGTH, 0) == rows();
    }

    /**
     * {@return how the user named the file}
     */
    public String shownName() {
        return file.shownName();
    }

    /**
     * {@return the number of rows}
     */
    public int rows() {
        return image.layout().rows();
    }

    /**
     * {@return the number of columns}
     */
    public int columns() {
        return image.layout().columns();
    }

    /**
     * {@return the number of bands}
     */
    public int bands() {
        return image.layout().bands();
    }

    /**
     * {@return where the raster lies, if the file tells}
     */
    public Optional<Georeference> georeference() {
        return georeference;
    }

    /**
     * {@return the evenly spaced grid that the raster's cells make}
     *
     * @param planUnit how many length units a plan unit has
     * @throws DataFault if the raster has no georeference or its rows are not at right angles to its columns
     */
    public Grid grid(double planUnit) {
        Georeference place = georeference.orElseThrow(() -> notAGrid("no georeference"));
        try {
            return place.grid(rows(), columns(), planUnit);
        } catch (IllegalArgumentException e) {
            throw notAGrid(e.getMessage());
        }
    }

    private DataFault notAGrid(String found) {
        return file.fault(
                "georeference",
                found,
                "a corner and a step, to make a grid of them",
                "Give the raster its place, for instance with gdal_translate -a_ullr, or describe the grid by numbers.");
    }

    /**
     * {@return what stored values of a band are multiplied by}
     *
     * @param band from 0
     */
    public double scale(int band) {
        return scales.scale(band);
    }

    /**
     * {@return what is added to a band's stored values after they were multiplied}
     *
     * @param band from 0
     */
    public double offset(int band) {
        return scales.offset(band);
    }

    /**
     * {@return what the file calls a band; empty where it does not say}
     *
     * @param band from 0
     */
    public String description(int band) {
        return scales.description(band);
    }

    /**
     * Reads values: stored × scale + offset.
     *
     * @param band from 0
     * @param window the block of cells, within the raster
     * @param target receives {@code window.size()} values, row-major, row 0 northernmost; {@code NaN} where there is none
     * @param start where in {@code target} the first goes
     * @throws DataFault if the file is damaged
     * @throws IndexOutOfBoundsException if band or window are not in the raster
     */
    public void read(int band, Window window, double[] target, int start) {
        readStored(band, window, target, start);
        double scale = scale(band);
        double offset = offset(band);
        if (scale != 1 || offset != 0) {
            for (int i = start; i < start + window.size(); i++) {
                target[i] = target[i] * scale + offset;
            }
        }
    }

    /**
     * Reads values as they are stored, before scale and offset.
     *
     * @param band from 0
     * @param window the block of cells, within the raster
     * @param target receives {@code window.size()} values, row-major, row 0 northernmost; {@code NaN} where there is none
     * @param start where in {@code target} the first goes
     * @throws DataFault if the file is damaged
     * @throws IndexOutOfBoundsException if band or window are not in the raster
     */
    public void readStored(int band, Window window, double[] target, int start) {
        readAll(image, band, window, noData.leftOut(), target, start);
        for (int i = start; i < start + window.size(); i++) {
            if (noData.is(target[i])) {
                target[i] = Double.NaN;
            }
        }
        mask.ifPresent(shown -> hide(shown, band, window, target, start));
    }

    private void hide(TiffImage shown, int band, Window window, double[] target, int start) {
        double[] visible = new double[window.size()];
        readAll(shown, Math.min(band, shown.layout().bands() - 1), window, 0, visible, 0);
        for (int i = 0; i < visible.length; i++) {
            if (visible[i] == 0) {
                target[start + i] = Double.NaN;
            }
        }
    }

    private void readAll(TiffImage from, int band, Window window, double leftOut, double[] target, int start) {
        Objects.checkIndex(band, from.layout().bands());
        Objects.checkFromToIndex(window.row(), window.rowEnd(), rows());
        Objects.checkFromToIndex(window.column(), window.columnEnd(), columns());
        Objects.checkFromIndexSize(start, window.size(), target.length);
        if (southUp) {
            int first = rows() - window.rowEnd();
            Window stored = new Window(first, window.column(), window.rows(), window.columns());
            from.read(band, stored, leftOut, target, start);
            turnOver(target, start, window);
        } else {
            from.read(band, window, leftOut, target, start);
        }
    }

    private static void turnOver(double[] target, int start, Window window) {
        int columns = window.columns();
        for (int row = 0; row < window.rows() / 2; row++) {
            int upper = start + row * columns;
            int lower = start + (window.rows() - 1 - row) * columns;
            double[] kept = Arrays.copyOfRange(target, upper, upper + columns);
            System.arraycopy(target, lower, target, upper, columns);
            System.arraycopy(kept, 0, target, lower, columns);
        }
    }

    /** Adds a holder, who closes it too: the file is closed when the last one has. */
    synchronized GeoTiff held() {
        holders++;
        return this;
    }

    /**
     * Gives the raster back; the file is closed once all who hold it have done so.
     *
     * @throws IOException if the file cannot be closed
     */
    @Override
    public synchronized void close() throws IOException {
        holders--;
        if (holders == 0) {
            image.forget();
            mask.ifPresent(TiffImage::forget);
            file.close();
        }
    }
}
