package org.seepledger.io.prisms;

import com.fasterxml.jackson.core.JsonFactory;
import com.fasterxml.jackson.core.JsonGenerator;
import java.io.IOException;
import java.io.Writer;
import java.nio.file.Path;
import java.util.List;
import java.util.Optional;
import org.seepledger.io.WholeFile;
import org.seepledger.io.crs.CrsMember;
import org.seepledger.prism.Transect;

/**
 * Writes transects as the GeoJSON file that {@link TransectsReader} reads, which makes the same transects of it, to the last
 * bit. The file appears whole or not at all.
 */
public final class TransectsWriter {

    private TransectsWriter() {}

    /**
     * Writes transects.
     *
     * @param file the file, which is replaced if it exists
     * @param crs the coordinate system as {@code EPSG:n} or well-known text; empty for local coordinates
     * @param transects the transects
     * @throws org.seepledger.fault.UsageFault if it cannot be written
     */
    public static void write(Path file, Optional<String> crs, List<Transect> transects) {
        WholeFile.write(file, text -> write(text, crs, transects));
    }

    private static void write(Writer text, Optional<String> crs, List<Transect> transects) throws IOException {
        try (JsonGenerator json = new JsonFactory().createGenerator(text)) {
            json.useDefaultPrettyPrinter();
            json.writeStartObject();
            json.writeStringField("type", "FeatureCollection");
            CrsMember.write(json, crs);
            json.writeArrayFieldStart("features");
            for (Transect transect : transects) {
                write(json, transect);
            }
            json.writeEndArray();
            json.writeEndObject();
        }
    }

    private static void write(JsonGenerator json, Transect transect) throws IOException {
        json.writeStartObject();
        json.writeStringField("type", "Feature");
        json.writeObjectFieldStart("properties");
        json.writeStringField("name", transect.name());
        json.writeEndObject();
        json.writeObjectFieldStart("geometry");
        json.writeStringField("type", "LineString");
        json.writeArrayFieldStart("coordinates");
        for (double[] vertex : transect.vertices()) {
            json.writeArray(vertex, 0, 2);
        }
        json.writeEndArray();
        json.writeEndObject();
        json.writeEndObject();
    }
}
