package org.seepledger.io.prisms;

import com.fasterxml.jackson.core.JsonGenerator;
import java.io.IOException;
import java.util.List;
import org.seepledger.prism.Ring;
import org.seepledger.prism.Side;

/** Writes rings as the members of a GeoJSON geometry, coordinates so that they read back to the same doubles. */
public final class PolygonsJson {

    private PolygonsJson() {}

    /**
     * Writes type and coordinates into the object that is open.
     *
     * @param json where to
     * @param parts part by part an outer ring and its islands
     * @param multi whether they are written as a MultiPolygon, as several must be
     * @throws IOException if it cannot be written
     */
    public static void write(JsonGenerator json, List<List<Ring>> parts, boolean multi) throws IOException {
        json.writeStringField("type", multi ? "MultiPolygon" : "Polygon");
        json.writeFieldName("coordinates");
        if (multi) {
            json.writeStartArray();
        }
        for (List<Ring> part : parts) {
            json.writeStartArray();
            for (Ring ring : part) {
                write(json, ring);
            }
            json.writeEndArray();
        }
        if (multi) {
            json.writeEndArray();
        }
    }

    private static void write(JsonGenerator json, Ring ring) throws IOException {
        json.writeStartArray();
        for (Side side : ring.sides()) {
            writeStart(json, side);
        }
        writeStart(json, ring.sides().get(0));
        json.writeEndArray();
    }

    /**
     * Writes the place where a side begins.
     *
     * @param json where to
     * @param side the side
     * @throws IOException if it cannot be written
     */
    public static void writeStart(JsonGenerator json, Side side) throws IOException {
        json.writeStartArray();
        json.writeNumber(side.x());
        json.writeNumber(side.y());
        json.writeEndArray();
    }
}
