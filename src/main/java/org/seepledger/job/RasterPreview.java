package org.seepledger.job;

import java.io.IOException;
import java.io.UncheckedIOException;
import java.nio.file.Path;
import org.seepledger.aquifer.Window;
import org.seepledger.io.raster.GeoTiff;
import org.seepledger.progress.Progress;

/**
 * A band of a raster, thinned out to be looked at.
 *
 * @param rows its rows
 * @param columns its columns
 * @param values row-major, row 0 northernmost; NaN where there is none
 */
public record RasterPreview(int rows, int columns, double[] values) {

    private static final int MOST = 400;

    /**
     * Reads a band.
     *
     * @param file a GeoTIFF
     * @param shownName how the user named it, for messages
     * @param band from 0
     * @param progress told of each row
     * @return the band
     * @throws org.seepledger.fault.DataFault if it cannot be read
     */
    public static RasterPreview of(Path file, String shownName, int band, Progress progress) {
        try (GeoTiff raster = GeoTiff.open(file, shownName)) {
            int stride = (Math.max(raster.rows(), raster.columns()) + MOST - 1) / MOST;
            int rows = (raster.rows() + stride - 1) / stride;
            int columns = (raster.columns() + stride - 1) / stride;
            double[] values = new double[rows * columns];
            double[] line = new double[raster.columns()];
            progress.begin("reading " + shownName, rows);
            for (int row = 0; row < rows; row++) {
                raster.read(band, new Window(row * stride, 0, 1, raster.columns()), line, 0);
                for (int column = 0; column < columns; column++) {
                    values[row * columns + column] = line[column * stride];
                }
                progress.step();
            }
            return new RasterPreview(rows, columns, values);
        } catch (IOException e) {
            throw new UncheckedIOException(e);
        }
    }
}
