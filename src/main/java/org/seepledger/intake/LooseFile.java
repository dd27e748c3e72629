package org.seepledger.intake;

import java.nio.file.Path;
import java.util.List;
import java.util.Optional;
import org.seepledger.io.raster.Georeference;
import org.seepledger.io.table.TableLook;

/** A file as it was brought, after a first look. */
public sealed interface LooseFile {

    /** {@return where it lies} */
    Path path();

    /** {@return what it is called below the folder that all files have in common, with {@code /}} */
    String shownName();

    /** {@return its length} */
    long bytes();

    /**
     * A raster.
     *
     * @param path where it lies
     * @param shownName what it is called
     * @param bytes its length
     * @param rows its rows
     * @param columns its columns
     * @param place where it lies on the map, if it tells
     * @param bands its bands
     */
    record Raster(
            Path path,
            String shownName,
            long bytes,
            int rows,
            int columns,
            Optional<Georeference> place,
            List<BandLook> bands)
            implements LooseFile {

        /** Copies the list. */
        public Raster {
            bands = List.copyOf(bands);
        }
    }

    /**
     * What a band holds.
     *
     * @param description what the file calls it; empty if it does not
     * @param least the least value; NaN if there is none
     * @param greatest the greatest value; NaN if there is none
     * @param mean the mean of its values; NaN if there is none
     * @param missing the share of cells without a value
     */
    record BandLook(String description, double least, double greatest, double mean, double missing) {}

    /**
     * A table.
     *
     * @param path where it lies
     * @param shownName what it is called
     * @param bytes its length
     * @param look what it holds
     */
    record Table(Path path, String shownName, long bytes, TableLook look) implements LooseFile {}

    /**
     * Any other file.
     *
     * @param path where it lies
     * @param shownName what it is called
     * @param bytes its length
     * @param kind what it is
     * @param words what is to be said of it
     */
    record Other(Path path, String shownName, long bytes, Kind kind, String words) implements LooseFile {}

    /** Kinds of other files. */
    enum Kind {
        /** GeoJSON, which may hold prisms. */
        SHAPES,
        /** A raster or table that cannot be read. */
        BROKEN,
        /** Of no use here. */
        STRANGE
    }
}
