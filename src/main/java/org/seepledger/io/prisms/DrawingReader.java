package org.seepledger.io.prisms;

import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.function.Consumer;
import org.seepledger.fault.DataFault;
import org.seepledger.io.crs.PlanCrs;
import org.seepledger.sketch.Drawing;
import org.seepledger.sketch.Shape;

/**
 * Reads a drawing from a GeoJSON file of prisms, to go on with it.
 *
 * <p>It reads what {@link PrismsReader} reads, and what is not yet a prism too: rings that cross themselves are told in
 * a note, a file may have no features, and shapes may reach beyond the grid. Whether there are rasters at the paths of
 * surfaces is not looked at.
 *
 * @param crs the aquifer's plan coordinates, to which others are transformed
 * @param layers how many layers it has
 * @param notes told what a user should know, a line each
 */
public record DrawingReader(PlanCrs crs, int layers, Consumer<String> notes) {

    /**
     * {@return the drawing that a file holds}
     *
     * @param file a FeatureCollection of Polygons and MultiPolygons, or one Feature
     * @param shownFile the file as the user named it, for messages
     * @throws DataFault if the file is damaged, a property is wrong, or a ring has fewer than three vertices
     */
    public Drawing read(Path file, String shownFile) {
        List<Shape> shapes = new ArrayList<>();
        new ShapesReader(crs, layers, notes, notes, flaw -> notes.accept(flaw.getMessage()))
                .read(file, shownFile, (shape, spot) -> shapes.add(shape));
        return new Drawing(shapes);
    }
}
