package org.seepledger.intake;

import java.io.IOException;
import java.io.InputStream;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import org.seepledger.aquifer.Window;
import org.seepledger.fault.DataFault;
import org.seepledger.io.Unreadable;
import org.seepledger.io.raster.GeoTiff;
import org.seepledger.io.table.TableLook;
import org.seepledger.progress.Progress;

/** Looks at one file for the first time. */
final class FirstLook {

    /** Of larger bands some rows are read, evenly spread. */
    private static final long MOST_CELLS = 4_000_000;

    private final Path path;
    private final String shownName;
    private final Progress progress;

    private FirstLook(Path path, String shownName, Progress progress) {
        this.path = path;
        this.shownName = shownName;
        this.progress = progress;
    }

    static LooseFile at(Path path, String shownName, Progress progress) {
        long bytes = 0;
        try {
            bytes = Files.size(path);
            return new FirstLook(path, shownName, progress).look(bytes);
        } catch (DataFault e) {
            return new LooseFile.Other(path, shownName, bytes, LooseFile.Kind.BROKEN, e.getMessage());
        } catch (IOException e) {
            String words = Unreadable.file(shownName, e).getMessage();
            return new LooseFile.Other(path, shownName, bytes, LooseFile.Kind.BROKEN, words);
        }
    }

    private LooseFile look(long bytes) throws IOException {
        String name = shownName.toLowerCase(Locale.ROOT);
        if (bytes == 0) {
            return other(
                    bytes, LooseFile.Kind.BROKEN, shownName + " is empty: it has 0 bytes. Write or copy it again.");
        }
        if (name.matches(".*\\.tiff?") || beginsAsTiff()) {
            return raster(bytes);
        }
        if (name.matches(".*\\.(csv|txt|tsv|tab)")) {
            TableLook look = TableLook.of(path, shownName, lines -> progress.begin(shownName, 0));
            return new LooseFile.Table(path, shownName, bytes, look);
        }
        if (name.matches(".*\\.(geojson)")) {
            return other(bytes, LooseFile.Kind.SHAPES, "");
        }
        return other(bytes, LooseFile.Kind.STRANGE, strange(name));
    }

    private String strange(String name) {
        String left = shownName
                + " is neither a GeoTIFF (.tif), nor a CSV (.csv, .txt, .tsv), nor a GeoJSON. It is left out.";
        if (name.matches(".*\\.(asc|nc|img|grd|vrt|bil|flt|adf)")) {
            return left
                    + " A raster of another format can be written as GeoTIFF, for instance with gdal_translate -of GTiff.";
        }
        if (name.matches(".*\\.(xlsx?|ods)")) {
            return left + " Save the sheet as CSV in UTF-8.";
        }
        return name.matches(".*\\.(shp|gpkg|kml)")
                ? left + " Prisms can be written as GeoJSON, for instance with ogr2ogr -f GeoJSON."
                : left;
    }

    private LooseFile other(long bytes, LooseFile.Kind kind, String words) {
        return new LooseFile.Other(path, shownName, bytes, kind, words);
    }

    private boolean beginsAsTiff() throws IOException {
        try (InputStream start = Files.newInputStream(path)) {
            byte[] head = start.readNBytes(4);
            return head.length == 4
                    && (head[0] == 'I' && head[1] == 'I' && (head[2] == 42 || head[2] == 43)
                            || head[0] == 'M' && head[1] == 'M' && (head[3] == 42 || head[3] == 43));
        }
    }

    private LooseFile raster(long bytes) throws IOException {
        try (GeoTiff raster = GeoTiff.open(path, shownName)) {
            List<LooseFile.BandLook> bands = new ArrayList<>();
            for (int band = 0; band < raster.bands(); band++) {
                progress.begin(shownName, 0);
                bands.add(band(raster, band));
            }
            return new LooseFile.Raster(
                    path, shownName, bytes, raster.rows(), raster.columns(), raster.georeference(), bands);
        }
    }

    private static LooseFile.BandLook band(GeoTiff raster, int band) {
        long cells = (long) raster.rows() * raster.columns();
        int stride = (int) Math.max(1, cells / MOST_CELLS);
        double[] line = new double[raster.columns()];
        double least = Double.NaN;
        double greatest = Double.NaN;
        double sum = 0;
        long values = 0;
        long read = 0;
        for (int row = 0; row < raster.rows(); row += stride) {
            raster.read(band, new Window(row, 0, 1, raster.columns()), line, 0);
            read += line.length;
            for (double value : line) {
                if (Double.isFinite(value)) {
                    least = value >= least ? least : value;
                    greatest = value <= greatest ? greatest : value;
                    sum += value;
                    values++;
                }
            }
        }
        return new LooseFile.BandLook(
                raster.description(band), least, greatest, sum / values, 1 - (double) values / read);
    }
}
