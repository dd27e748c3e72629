package org.seepledger.io.raster;

import java.util.Arrays;
import java.util.Optional;
import org.seepledger.fault.DataFault;

/** Reads from a directory how its raster lies on the map (OGC 19-008r4, section 7.4), rows as the file has them. */
final class ModelTransform {

    private static final String ASSIGN =
            "Give it its place anew, for instance with gdal_translate -a_ullr, or gdalwarp.";

    private final TiffDirectory directory;
    private final double[] scale;
    private final double[] tie;
    private final double[] matrix;

    private ModelTransform(TiffDirectory directory) {
        this.directory = directory;
        this.scale = directory.reals(Tag.MODEL_PIXEL_SCALE);
        this.tie = directory.reals(Tag.MODEL_TIEPOINT);
        this.matrix = directory.reals(Tag.MODEL_TRANSFORMATION);
    }

    /**
     * Reads the georeference, if there is one.
     *
     * @throws DataFault if there is one that is not a plain linear one, or is mirrored along x
     */
    static Optional<Georeference> of(TiffDirectory directory) {
        GeoKeys keys = GeoKeys.of(directory);
        ModelTransform transform = new ModelTransform(directory);
        Optional<Georeference> read = transform.read(keys.crs());
        Optional<Georeference> edges = keys.isPixelPoint() ? read.map(ModelTransform::fromCentres) : read;
        edges.ifPresent(transform::check);
        return edges;
    }

    private Optional<Georeference> read(Optional<String> crs) {
        if (matrix.length >= 8) {
            return Optional.of(new Georeference(matrix[3], matrix[7], matrix[0], matrix[4], matrix[1], matrix[5], crs));
        }
        if (tie.length > 6 && scale.length == 0) {
            throw fault("control points in place of a georeference", "a corner and a step");
        }
        if (tie.length < 6 || scale.length < 2) {
            return Optional.empty();
        }
        if (scale[1] < 0) {
            // The standard takes this for rows from south to north; common programs take it for north to south.
            throw fault("a negative y scale, which programs read in two ways", "a positive one (rows from the north)");
        }
        double x = tie[3] - tie[0] * scale[0];
        double y = tie[4] + tie[1] * scale[1];
        return Optional.of(new Georeference(x, y, scale[0], 0, 0, -scale[1], crs));
    }

    /** The coordinates given are those of the centres of cells: the corner is half a cell before them. */
    private static Georeference fromCentres(Georeference centres) {
        return new Georeference(
                centres.mapX(-0.5, -0.5),
                centres.mapY(-0.5, -0.5),
                centres.columnX(),
                centres.columnY(),
                centres.rowX(),
                centres.rowY(),
                centres.crs());
    }

    private void check(Georeference read) {
        double[] numbers = {read.x(), read.y(), read.columnX(), read.columnY(), read.rowX(), read.rowY()};
        double turn = turn(read);
        if (!Arrays.stream(numbers).allMatch(Double::isFinite) || !Double.isFinite(turn) || turn == 0) {
            throw fault("a georeference without extent (" + Arrays.toString(numbers) + ")", "cells with an area");
        }
        if (isSouthUp(read) && read.columnX() <= 0) {
            throw fault(
                    "columns that run against x (step " + read.columnX() + "), a mirrored raster",
                    "columns in the direction of x");
        }
    }

    /** {@return whether the file's first row is the southernmost} */
    static boolean isSouthUp(Georeference read) {
        return turn(read) > 0;
    }

    /** Positive where going from columns to rows is a turn to the left. */
    private static double turn(Georeference read) {
        return read.columnX() * read.rowY() - read.columnY() * read.rowX();
    }

    private DataFault fault(String found, String expected) {
        return directory.file().fault("georeference", found, expected, ASSIGN);
    }
}
