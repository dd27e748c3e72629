package org.seepledger.io.raster;

import java.io.ByteArrayOutputStream;
import java.io.IOException;
import java.io.RandomAccessFile;
import java.nio.ByteBuffer;
import java.nio.ByteOrder;
import java.nio.file.Path;
import java.util.Arrays;
import java.util.Optional;
import java.util.function.IntFunction;
import java.util.zip.DeflaterOutputStream;
import org.seepledger.aquifer.Grid;
import org.seepledger.aquifer.Window;

/**
 * Writes quantities on a part of a grid as a GeoTIFF: 64-bit reals, nodata {@code nan}, tiles packed with DEFLATE, band
 * after band.
 *
 * <p>It has a georeference where the grid is evenly spaced, turned grids included. An unevenly spaced one has none, as
 * GeoTIFF has no way to say it: such a raster is matched by its shape.
 */
public final class GeoTiffWriter {

    private static final int TILE = 256;
    private static final int TILE_STEP = 16;

    /** What the tiles may at most take in a classic TIFF, whose places have 32 bits; DEFLATE may add a little. */
    private static final long CLASSIC_BYTES = 4_000_000_000L;

    private final RandomAccessFile file;
    private final Window window;
    private final int tileRows;
    private final int tileColumns;
    private final int bands;
    private final int tilesOfBand;
    private final long[] offsets;
    private final long[] counts;

    private GeoTiffWriter(RandomAccessFile file, Window window, int bands) {
        this.file = file;
        this.window = window;
        this.tileRows = tile(window.rows());
        this.tileColumns = tile(window.columns());
        this.bands = bands;
        this.tilesOfBand = tiles(window.rows(), tileRows) * tiles(window.columns(), tileColumns);
        this.offsets = new long[Math.multiplyExact(bands, tilesOfBand)];
        this.counts = new long[offsets.length];
    }

    /**
     * Writes a file, replacing one of that name. No more than 256 rows are in memory at a time.
     *
     * @param path the file
     * @param grid the grid
     * @param window the part of it to write
     * @param crs the grid's coordinate system as {@code EPSG:n} or WKT of a projected one; empty for local coordinates
     * @param rows gives the window's values of a row of the grid, from the first column of the window; asked once for each
     *     row of the window, from the north
     * @throws IOException if the file cannot be written
     */
    public static void write(Path path, Grid grid, Window window, Optional<String> crs, IntFunction<double[]> rows)
            throws IOException {
        write(path, grid, window, crs, rows, (long) window.size() * Double.BYTES > CLASSIC_BYTES);
    }

    static void write(
            Path path, Grid grid, Window window, Optional<String> crs, IntFunction<double[]> rows, boolean big)
            throws IOException {
        write(path, grid, window, crs, new Bands(1, Optional.empty(), (band, row) -> rows.apply(row)), big);
    }

    /**
     * The bands of a raster.
     *
     * @param count how many there are
     * @param metadata the XML of their scales and offsets; empty where none has any
     * @param rows gives the window's values of a band and a row of the grid; asked band by band, from the north
     */
    record Bands(int count, Optional<String> metadata, Rows rows) {

        interface Rows {
            double[] row(int band, int row);
        }
    }

    static void write(Path path, Grid grid, Window window, Optional<String> crs, Bands bands) throws IOException {
        write(path, grid, window, crs, bands, (long) bands.count * window.size() * Double.BYTES > CLASSIC_BYTES);
    }

    private static void write(Path path, Grid grid, Window window, Optional<String> crs, Bands bands, boolean big)
            throws IOException {
        try (RandomAccessFile file = new RandomAccessFile(path.toFile(), "rw")) {
            file.setLength(0);
            GeoTiffWriter writer = new GeoTiffWriter(file, window, bands.count);
            file.write(new byte[big ? 16 : 8]);
            for (int band = 0; band < bands.count; band++) {
                int index = band;
                writer.tiles(band, row -> bands.rows.row(index, row));
            }
            long directory = writer.wordBoundary();
            TiffFields fields = writer.structure(big);
            bands.metadata.ifPresent(xml -> fields.text(Tag.GDAL_METADATA, xml));
            georeference(fields, grid, window, crs);
            file.write(fields.at(directory));
            file.seek(0);
            file.write(header(directory, big));
        }
    }

    private static int tile(int count) {
        return Math.min(TILE, (count + TILE_STEP - 1) / TILE_STEP * TILE_STEP);
    }

    private static int tiles(int count, int tile) {
        return (count + tile - 1) / tile;
    }

    private static byte[] header(long directory, boolean big) {
        ByteBuffer header = ByteBuffer.allocate(big ? 16 : 8).order(ByteOrder.LITTLE_ENDIAN);
        header.put((byte) 'I').put((byte) 'I');
        if (big) {
            header.putShort((short) 43)
                    .putShort((short) Long.BYTES)
                    .putShort((short) 0)
                    .putLong(directory);
        } else {
            header.putShort((short) 42).putInt((int) directory);
        }
        return header.array();
    }

    private void tiles(int number, IntFunction<double[]> rows) throws IOException {
        int across = tiles(window.columns(), tileColumns);
        ByteBuffer[] band = new ByteBuffer[across];
        Arrays.setAll(
                band,
                i -> ByteBuffer.allocate(tileRows * tileColumns * Double.BYTES).order(ByteOrder.LITTLE_ENDIAN));
        for (int top = 0; top < window.rows(); top += tileRows) {
            for (int row = 0; row < tileRows; row++) {
                double[] values = top + row < window.rows() ? rows.apply(window.row() + top + row) : new double[0];
                deal(values, band);
            }
            for (int i = 0; i < across; i++) {
                append(number * tilesOfBand + top / tileRows * across + i, band[i]);
            }
        }
    }

    /** Deals a row out to the tiles side by side; beyond the window there is nothing. */
    private void deal(double[] values, ByteBuffer[] band) {
        int used = Math.min(values.length, window.columns());
        for (int column = 0; column < band.length * tileColumns; column++) {
            band[column / tileColumns].putDouble(column < used ? values[column] : Double.NaN);
        }
    }

    private void append(int tile, ByteBuffer values) throws IOException {
        ByteArrayOutputStream packed = new ByteArrayOutputStream();
        try (DeflaterOutputStream deflater = new DeflaterOutputStream(packed)) {
            deflater.write(values.array());
        }
        values.clear();
        offsets[tile] = file.getFilePointer();
        counts[tile] = packed.size();
        file.write(packed.toByteArray());
    }

    private long wordBoundary() throws IOException {
        if (file.getFilePointer() % 2 != 0) {
            file.write(0);
        }
        return file.getFilePointer();
    }

    private TiffFields structure(boolean big) {
        TiffFields fields = new TiffFields(big)
                .integer(Tag.IMAGE_WIDTH, window.columns())
                .integer(Tag.IMAGE_LENGTH, window.rows())
                .shorts(Tag.BITS_PER_SAMPLE, ofEachBand(SampleType.FLOAT64.bits()))
                .shorts(Tag.COMPRESSION, Compression.DEFLATE.code())
                .shorts(Tag.PHOTOMETRIC_INTERPRETATION, 1)
                .shorts(Tag.SAMPLES_PER_PIXEL, bands)
                .shorts(Tag.PLANAR_CONFIGURATION, bands == 1 ? 1 : 2)
                .shorts(Tag.SAMPLE_FORMAT, ofEachBand(3))
                .shorts(Tag.TILE_WIDTH, tileColumns)
                .shorts(Tag.TILE_LENGTH, tileRows)
                .places(Tag.TILE_OFFSETS, offsets)
                .places(Tag.TILE_BYTE_COUNTS, counts)
                .text(Tag.GDAL_NODATA, "nan");
        return bands == 1 ? fields : fields.shorts(Tag.EXTRA_SAMPLES, new int[bands - 1]);
    }

    private int[] ofEachBand(int value) {
        int[] values = new int[bands];
        Arrays.fill(values, value);
        return values;
    }

    private static void georeference(TiffFields fields, Grid grid, Window window, Optional<String> crs) {
        if (grid.x().isEven() && grid.y().isEven()) {
            Georeference whole = Georeference.of(grid, crs);
            double x = whole.mapX(window.column(), window.row());
            double y = whole.mapY(window.column(), window.row());
            if (whole.columnY() == 0 && whole.columnX() > 0) {
                fields.reals(Tag.MODEL_PIXEL_SCALE, whole.columnX(), -whole.rowY(), 0)
                        .reals(Tag.MODEL_TIEPOINT, 0, 0, 0, x, y, 0);
            } else {
                double[] first = {whole.columnX(), whole.rowX(), 0, x, whole.columnY(), whole.rowY(), 0, y};
                double[] matrix = Arrays.copyOf(first, 16);
                matrix[15] = 1;
                fields.reals(Tag.MODEL_TRANSFORMATION, matrix);
            }
        }
        GeoKeys.write(fields, crs);
    }
}
