package org.seepledger.io.raster;

import java.io.IOException;
import java.nio.file.Path;
import java.util.Arrays;
import java.util.Locale;
import java.util.Optional;
import org.seepledger.aquifer.Grid;
import org.seepledger.aquifer.Window;
import org.seepledger.prism.Surroundings;

/**
 * Copies a raster of a grid, with no value outside some of its cells. Shape, bands and stored values stay, and so do the
 * bands' scales and offsets.
 */
public final class RasterCut {

    /** Rows are read many at a time, as tiles hold them, but no more values than this. */
    private static final int VALUES_AT_ONCE = 1 << 22;

    private final GeoTiff from;
    private final Surroundings cells;
    private final int rowsAtOnce;
    private int keptBand = -1;
    private Window kept = new Window(0, 0, 1, 1);
    private double[] values = new double[1];

    private RasterCut(GeoTiff from, Surroundings cells) {
        this.from = from;
        this.cells = cells;
        this.rowsAtOnce = Math.max(1, Math.min(256, VALUES_AT_ONCE / from.columns()));
    }

    /**
     * Copies a raster.
     *
     * @param from the raster, whose cells are the grid's
     * @param grid the grid
     * @param crs the grid's coordinate system; empty for local coordinates
     * @param cells the cells whose values stay
     * @param to the copy
     * @throws IOException if it cannot be written
     */
    public static void write(GeoTiff from, Grid grid, Optional<String> crs, Surroundings cells, Path to)
            throws IOException {
        RasterCut cut = new RasterCut(from, cells);
        GeoTiffWriter.Bands bands = new GeoTiffWriter.Bands(from.bands(), metadata(from), cut::row);
        GeoTiffWriter.write(to, grid, grid.window(), crs, bands);
    }

    private double[] row(int band, int row) {
        double[] target = new double[from.columns()];
        Arrays.fill(target, Double.NaN);
        if (!cells.touchRow(row)) {
            return target;
        }
        if (band != keptBand || !kept.contains(row, 0)) {
            int first = row / rowsAtOnce * rowsAtOnce;
            kept = new Window(first, 0, Math.min(rowsAtOnce, from.rows() - first), from.columns());
            keptBand = band;
            values = new double[kept.size()];
            from.readStored(band, kept, values, 0);
        }
        for (int column = 0; column < target.length; column++) {
            target[column] = cells.holds(row, column) ? values[kept.index(row, column)] : Double.NaN;
        }
        return target;
    }

    /** Scales and offsets in the form of tag 42112; Java writes doubles so that they read back to the same. */
    private static Optional<String> metadata(GeoTiff from) {
        StringBuilder items = new StringBuilder();
        for (int band = 0; band < from.bands(); band++) {
            if (from.scale(band) != 1 || from.offset(band) != 0) {
                items.append(item("OFFSET", band, from.offset(band))).append(item("SCALE", band, from.scale(band)));
            }
        }
        return items.isEmpty() ? Optional.empty() : Optional.of("<GDALMetadata>\n" + items + "</GDALMetadata>\n");
    }

    private static String item(String name, int band, double value) {
        return "  <Item name=\"" + name + "\" sample=\"" + band + "\" role=\"" + name.toLowerCase(Locale.ROOT) + "\">"
                + value + "</Item>\n";
    }
}
