package org.seepledger.io.raster;

import java.net.URISyntaxException;
import java.nio.file.Path;
import java.util.Map;
import org.seepledger.aquifer.Axis;
import org.seepledger.aquifer.Grid;
import org.seepledger.aquifer.Window;

/** The rasters that src/test/gdal/make-samples.sh wrote with GDAL, and the formulas of their values that stand there. */
final class Samples {

    static final int ROWS = 23;
    static final int COLUMNS = 37;

    /** The grid that most samples lie on. */
    static final Grid GRID = new Grid(Axis.even(500_000, 50, COLUMNS), Axis.even(5_199_080, 40, ROWS), 0, 1);

    /** A value from row and column, from 0 in the north-west. */
    interface Formula {
        double at(int row, int column);
    }

    static final Formula REAL = (r, c) -> 100.0 * r + c + 0.25;

    private static final Map<String, Formula> FORMULAS = Map.of(
            "real", REAL,
            "whole", (r, c) -> 100.0 * r + c,
            "signed", (r, c) -> 100.0 * r + c - 1000,
            "uint16", (r, c) -> 60_000.0 + 100 * r + c,
            "uint32", (r, c) -> 4_294_960_000.0 + 100 * r + c,
            "uint8", (r, c) -> (7 * r + 3 * c) % 251,
            "int8", (r, c) -> (7 * r + 3 * c) % 251 - 125);

    private Samples() {}

    static Formula formula(String name) {
        return FORMULAS.get(name);
    }

    /** The formula where (r + c) is not divisible by 7, else no value. */
    static Formula withHoles(Formula formula) {
        return (r, c) -> (r + c) % 7 == 0 ? Double.NaN : formula.at(r, c);
    }

    static Path path(String name) {
        try {
            return Path.of(Samples.class.getResource(name + ".tif").toURI());
        } catch (URISyntaxException e) {
            throw new IllegalStateException(e);
        }
    }

    static GeoTiff open(String name) {
        return GeoTiff.open(path(name), name + ".tif");
    }

    static double[] read(GeoTiff raster, int band, Window window) {
        double[] values = new double[window.size()];
        raster.read(band, window, values, 0);
        return values;
    }

    static double[] readAll(GeoTiff raster, int band) {
        return read(raster, band, new Window(0, 0, raster.rows(), raster.columns()));
    }

    static double[] expected(Formula formula, Window window) {
        double[] values = new double[window.size()];
        for (int row = window.row(); row < window.rowEnd(); row++) {
            for (int column = window.column(); column < window.columnEnd(); column++) {
                values[window.index(row, column)] = formula.at(row, column);
            }
        }
        return values;
    }
}
