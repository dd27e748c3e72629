package org.seepledger.io.prisms;

import com.fasterxml.jackson.core.JsonFactory;
import com.fasterxml.jackson.core.JsonGenerator;
import java.io.IOException;
import java.io.Writer;
import java.nio.file.Path;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import org.seepledger.io.WholeFile;
import org.seepledger.io.crs.CrsMember;
import org.seepledger.prism.Ring;
import org.seepledger.sketch.Drawing;
import org.seepledger.sketch.Limit;
import org.seepledger.sketch.Reach;
import org.seepledger.sketch.Shape;

/**
 * Writes a drawing as the GeoJSON file that {@link PrismsReader} and {@link DrawingReader} read, which make the same
 * prisms of it, to the last bit. The file appears whole or not at all.
 */
public final class DrawingWriter {

    private final JsonGenerator json;

    private DrawingWriter(JsonGenerator json) {
        this.json = json;
    }

    /**
     * Writes a drawing; one that crosses itself too.
     *
     * @param file the file, which is replaced if it exists; paths of surfaces are relative to its folder
     * @param crs the coordinate system as {@code EPSG:n} or well-known text; empty for local coordinates
     * @param drawing the drawing, in map coordinates
     * @throws org.seepledger.fault.UsageFault if it cannot be written
     */
    public static void write(Path file, Optional<String> crs, Drawing drawing) {
        WholeFile.write(file, text -> write(text, crs, drawing));
    }

    private static void write(Writer text, Optional<String> crs, Drawing drawing) throws IOException {
        try (JsonGenerator json = new JsonFactory().createGenerator(text)) {
            json.useDefaultPrettyPrinter();
            json.writeStartObject();
            json.writeStringField("type", "FeatureCollection");
            CrsMember.write(json, crs);
            json.writeArrayFieldStart("features");
            DrawingWriter writer = new DrawingWriter(json);
            for (Shape shape : drawing.shapes()) {
                writer.write(shape);
            }
            json.writeEndArray();
            json.writeEndObject();
        }
    }

    private void write(Shape shape) throws IOException {
        List<Ring> rings = shape.rings();
        json.writeStartObject();
        json.writeStringField("type", "Feature");
        json.writeObjectFieldStart("properties");
        json.writeStringField("name", shape.name());
        write(shape.reach());
        writeBoundaries(BoundariesWriter.of(rings, shape.byPart()));
        if (!shape.note().isEmpty()) {
            json.writeStringField("note", shape.note());
        }
        for (Map.Entry<String, String> other : shape.others().entrySet()) {
            json.writeFieldName(other.getKey());
            json.writeRawValue(other.getValue());
        }
        json.writeEndObject();
        json.writeObjectFieldStart("geometry");
        PolygonsJson.write(json, Ring.byPart(rings), shape.byPart());
        json.writeEndObject();
        json.writeEndObject();
    }

    private void write(Reach reach) throws IOException {
        if (reach instanceof Reach.Layers layers) {
            json.writeArrayFieldStart("layers");
            json.writeNumber(layers.first() + 1);
            json.writeNumber(layers.last() + 1);
            json.writeEndArray();
        }
        if (reach instanceof Reach.Between between) {
            write("top", between.top());
            write("bottom", between.bottom());
        }
    }

    private void write(String lid, Optional<Limit> limit) throws IOException {
        if (limit.isPresent()) {
            json.writeFieldName(lid);
            if (limit.get() instanceof Limit.Elevation elevation) {
                json.writeNumber(elevation.height());
            } else if (limit.get() instanceof Limit.Layer layer) {
                json.writeStartObject();
                json.writeNumberField("layer", layer.index() + 1);
                json.writeEndObject();
            } else {
                json.writeString(((Limit.Surface) limit.get()).path());
            }
        }
    }

    private void writeBoundaries(Map<String, List<String>> boundaries) throws IOException {
        if (boundaries.isEmpty()) {
            return;
        }
        json.writeObjectFieldStart("boundaries");
        for (Map.Entry<String, List<String>> boundary : boundaries.entrySet()) {
            json.writeArrayFieldStart(boundary.getKey());
            for (String sides : boundary.getValue()) {
                json.writeString(sides);
            }
            json.writeEndArray();
        }
        json.writeEndObject();
    }
}
