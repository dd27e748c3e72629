package org.seepledger.intake;

import java.nio.file.Path;
import java.util.List;
import org.seepledger.io.table.TableCopy;

/** How a file comes into the aquifer folder. */
public sealed interface Copy {

    /** {@return the file as it was brought} */
    Path from();

    /** {@return what it is called in the folder, with {@code /}} */
    String to();

    /**
     * Byte by byte.
     *
     * @param from the file
     * @param to its name in the folder
     */
    record Whole(Path from, String to) implements Copy {}

    /**
     * A table with other headings, or other texts in some columns.
     *
     * @param from the file
     * @param shownName the file as messages name it
     * @param to its name in the folder
     * @param columns what becomes of each column
     */
    record Mended(Path from, String shownName, String to, List<TableCopy.Column> columns) implements Copy {}

    /**
     * A raster without values where a mask has none or 0.
     *
     * @param from the file
     * @param shownName the file as messages name it
     * @param to its name in the folder
     * @param mask the mask
     * @param band the mask's band, from 0
     */
    record Masked(Path from, String shownName, String to, Path mask, int band) implements Copy {}
}
