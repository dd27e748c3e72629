package org.seepledger.job;

import java.util.HashMap;
import java.util.List;
import java.util.Map;
import org.seepledger.aquifer.GriddedValues;
import org.seepledger.io.DataFolder;
import org.seepledger.io.prisms.SurfaceRasters;
import org.seepledger.sketch.ControlLine;
import org.seepledger.sketch.Drawing;
import org.seepledger.sketch.Limit;
import org.seepledger.sketch.Shape;

/**
 * What a file of a drawing holds.
 *
 * @param drawing the drawing
 * @param surfaces the surfaces that its shapes name
 * @param notes what a user should know of it
 */
public record DrawingFile(Drawing drawing, Map<Limit.Surface, GriddedValues> surfaces, List<String> notes) {

    /** No file. */
    public static final DrawingFile NONE = new DrawingFile(Drawing.EMPTY, Map.of(), List.of());

    /** Copies what is given. */
    public DrawingFile {
        surfaces = Map.copyOf(surfaces);
        notes = List.copyOf(notes);
    }

    /**
     * {@return the same with transects}
     *
     * @param lines the transects
     */
    public DrawingFile with(List<ControlLine> lines) {
        return new DrawingFile(drawing.withLines(lines), surfaces, notes);
    }

    static DrawingFile of(Drawing drawing, DataFolder folder, SurfaceRasters rasters, List<String> notes) {
        Map<Limit.Surface, GriddedValues> surfaces = new HashMap<>();
        for (Shape shape : drawing.shapes()) {
            for (Limit.Surface surface : shape.reach().surfaces()) {
                surfaces.put(surface, rasters.read(folder.resolve(surface.path(), shape.name()), surface.path()));
            }
        }
        return new DrawingFile(drawing, surfaces, notes);
    }
}
