package org.seepledger.job;

import java.io.IOException;
import java.io.UncheckedIOException;
import java.nio.file.Path;
import java.util.Optional;
import org.seepledger.aquifer.Window;
import org.seepledger.fault.DataFault;
import org.seepledger.io.crs.PlanCrs;
import org.seepledger.io.raster.GeoTiff;
import org.seepledger.io.raster.Georeference;
import org.seepledger.progress.Progress;

/**
 * A picture that lies under a map, such as an air photo: three bands of bytes as colours, else the first band in grey
 * from its least to its greatest value. A large one is thinned out.
 *
 * @param columns pixels in a row
 * @param rows rows of pixels
 * @param argb alpha, red, green, blue, eight bits each; row-major, the uppermost row first
 * @param placement six numbers a, b, c, d, e, f: the pixel edge (column, row) lies at map (a·column + c·row + e,
 *     b·column + d·row + f)
 */
public record GroundPicture(int columns, int rows, int[] argb, double[] placement) {

    private static final int MOST = 4096;

    /**
     * Reads a picture.
     *
     * @param file a GeoTIFF in the aquifer's coordinate system
     * @param crs that system
     * @param progress told of each row
     * @return the picture
     * @throws DataFault if it cannot be read, does not tell where it lies, or lies in another system
     */
    static GroundPicture read(Path file, PlanCrs crs, Progress progress) {
        String shown = file.toString();
        try (GeoTiff raster = GeoTiff.open(file, shown)) {
            Georeference place = raster.georeference()
                    .orElseThrow(() -> fault(
                            shown,
                            "no georeference",
                            "a GeoTIFF that tells where it lies",
                            "Give it its place, for instance with gdal_translate -a_ullr."));
            check(shown, place.crs(), crs.code());
            int stride = (Math.max(raster.rows(), raster.columns()) + MOST - 1) / MOST;
            double[][] bands = bands(raster, stride, progress);
            int columns = (raster.columns() + stride - 1) / stride;
            int rows = (raster.rows() + stride - 1) / stride;
            double[] placement = {
                stride * place.columnX(),
                stride * place.columnY(),
                stride * place.rowX(),
                stride * place.rowY(),
                place.x(),
                place.y()
            };
            return new GroundPicture(columns, rows, coloured(bands), placement);
        } catch (IOException e) {
            throw new UncheckedIOException(e);
        }
    }

    private static void check(String shown, Optional<String> found, Optional<String> expected) {
        if (found.isPresent() && expected.isPresent() && !found.equals(expected)) {
            throw fault(
                    shown,
                    "the coordinate system " + found.get(),
                    "the aquifer's, " + expected.get(),
                    "Bring it there first, for instance with gdalwarp -t_srs " + expected.get() + ".");
        }
    }

    private static DataFault fault(String shown, String found, String expected, String remedy) {
        return new DataFault(shown, "georeference", found, expected, remedy);
    }

    private static double[][] bands(GeoTiff raster, int stride, Progress progress) {
        int count = raster.bands() >= 3 ? 3 : 1;
        int columns = (raster.columns() + stride - 1) / stride;
        int rows = (raster.rows() + stride - 1) / stride;
        double[][] bands = new double[count][rows * columns];
        double[] line = new double[raster.columns()];
        progress.begin("reading the picture", rows);
        for (int row = 0; row < rows; row++) {
            for (int band = 0; band < count; band++) {
                raster.read(band, new Window(row * stride, 0, 1, raster.columns()), line, 0);
                for (int column = 0; column < columns; column++) {
                    bands[band][row * columns + column] = line[column * stride];
                }
            }
            progress.step();
        }
        return bands;
    }

    private static int[] coloured(double[][] bands) {
        double least = 0;
        double greatest = 255;
        if (bands.length == 1) {
            least = finite(bands[0]).min().orElse(0);
            greatest = Math.max(finite(bands[0]).max().orElse(1), Math.nextUp(least));
        }
        int[] argb = new int[bands[0].length];
        for (int i = 0; i < argb.length; i++) {
            int colour = 0;
            boolean known = true;
            for (int band = 0; band < 3; band++) {
                double value = bands[Math.min(band, bands.length - 1)][i];
                known &= Double.isFinite(value);
                colour = colour << 8 | (int) Math.round(255 * clamped((value - least) / (greatest - least)));
            }
            argb[i] = known ? 0xff000000 | colour : 0;
        }
        return argb;
    }

    private static java.util.stream.DoubleStream finite(double[] values) {
        return java.util.stream.DoubleStream.of(values).filter(Double::isFinite);
    }

    private static double clamped(double share) {
        return Math.max(0, Math.min(1, share));
    }
}
