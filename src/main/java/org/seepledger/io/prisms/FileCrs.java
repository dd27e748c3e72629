package org.seepledger.io.prisms;

import com.fasterxml.jackson.databind.JsonNode;
import java.util.function.Consumer;
import org.seepledger.io.crs.PlanCrs;
import org.seepledger.io.crs.PlanTransform;

/**
 * The coordinate reference system of a GeoJSON file: what its {@code crs} member names (GeoJSON 2008, as GDAL writes
 * it), else WGS 84 longitude and latitude (RFC 7946) — or local coordinates where the aquifer's are.
 */
final class FileCrs {

    private final PlanCrs aquifer;
    private final Consumer<String> notes;

    FileCrs(PlanCrs aquifer, Consumer<String> notes) {
        this.aquifer = aquifer;
        this.notes = notes;
    }

    /** {@return the way from the coordinates of a file to the map's} */
    PlanTransform transform(JsonNode root, Spot file) {
        JsonNode crs = root.path("crs");
        boolean named = !crs.isMissingNode() && !crs.isNull();
        if (aquifer.isLocal()) {
            if (named) {
                throw file.in("crs")
                        .fault(
                                Spot.shown(crs) + " though the aquifer's crs is null",
                                "local coordinates without a crs member",
                                "Name the aquifer's CRS in aquifer.json; take the member out only if the coordinates"
                                        + " are the aquifer's local ones.");
            }
            return PlanTransform.identity();
        }
        if (named) {
            return aquifer.from(name(crs, file.in("crs")), file.file(), "crs", notes);
        }
        notes.accept(
                file + ": without a crs member coordinates are WGS 84 longitude and latitude; they were transformed"
                        + " to the aquifer's CRS"
                        + aquifer.code().map(code -> " " + code).orElse(""));
        return aquifer.fromLongitudeLatitude(file.file(), notes);
    }

    private static String name(JsonNode crs, Spot spot) {
        JsonNode name = crs.path("properties").path("name");
        if (!"name".equals(crs.path("type").textValue()) || !name.isTextual()) {
            throw spot.fault(Spot.shown(crs), member("urn:ogc:def:crs:EPSG::32633"), "Write the member in this form.");
        }
        return name.textValue();
    }

    /** {@return what to do about a file whose coordinates can be no longitudes and latitudes} */
    String remedyForDegrees() {
        String code = aquifer.code().map(text -> text.replace("EPSG:", "")).orElse("…");
        return "If they are in another CRS, add the member that names it, as \"crs\": "
                + member("urn:ogc:def:crs:EPSG::" + code) + ".";
    }

    private static String member(String name) {
        return "{\"type\": \"name\", \"properties\": {\"name\": \"" + name + "\"}}";
    }
}
