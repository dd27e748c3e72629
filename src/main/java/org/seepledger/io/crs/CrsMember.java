package org.seepledger.io.crs;

import com.fasterxml.jackson.core.JsonGenerator;
import java.io.IOException;
import java.util.Optional;

/** Writes the {@code crs} member of a GeoJSON file (GeoJSON 2008, as GDAL writes it). */
public final class CrsMember {

    private CrsMember() {}

    /**
     * Writes the member into the object that is open, or nothing for local coordinates.
     *
     * @param json where to
     * @param crs the coordinate system as {@code EPSG:n} or well-known text; empty for local coordinates
     * @throws IOException if it cannot be written
     */
    public static void write(JsonGenerator json, Optional<String> crs) throws IOException {
        if (crs.isEmpty()) {
            return;
        }
        json.writeObjectFieldStart("crs");
        json.writeStringField("type", "name");
        json.writeObjectFieldStart("properties");
        json.writeStringField("name", crs.get().replaceFirst("^EPSG:", "urn:ogc:def:crs:EPSG::"));
        json.writeEndObject();
        json.writeEndObject();
    }
}
