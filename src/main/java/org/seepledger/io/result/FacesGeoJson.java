package org.seepledger.io.result;

import com.fasterxml.jackson.core.JsonFactory;
import com.fasterxml.jackson.core.JsonGenerator;
import java.io.IOException;
import java.io.Writer;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.Optional;
import org.seepledger.io.crs.CrsMember;
import org.seepledger.io.prisms.PolygonsJson;
import org.seepledger.ledger.Account;
import org.seepledger.ledger.Disclaimer;
import org.seepledger.ledger.Entry;
import org.seepledger.ledger.Group;
import org.seepledger.ledger.PeriodBudget;
import org.seepledger.prism.Prism;
import org.seepledger.prism.Ring;

/**
 * Writes {@code faces.geojson}: the faces of prisms with the flow through them, mean over the record; a side, or a
 * boundary of several, as lines for each layer, a lid as the prism's polygon.
 */
public final class FacesGeoJson {

    private final JsonGenerator json;
    private final ResultUnits units;

    private FacesGeoJson(JsonGenerator json, ResultUnits units) {
        this.json = json;
        this.units = units;
    }

    /**
     * Writes the faces.
     *
     * @param file the file
     * @param crs the coordinate system as {@code EPSG:n} or WKT; empty for local coordinates
     * @param prisms the prisms
     * @param records the budget of the record for each of them
     * @param units the units to give
     * @throws IOException if it cannot be written
     */
    public static void write(
            Path file, Optional<String> crs, List<Prism> prisms, List<PeriodBudget> records, ResultUnits units)
            throws IOException {
        try (Writer text = Files.newBufferedWriter(file);
                JsonGenerator json = new JsonFactory().createGenerator(text)) {
            json.useDefaultPrettyPrinter();
            json.writeStartObject();
            json.writeStringField("type", "FeatureCollection");
            CrsMember.write(json, crs);
            json.writeStringField("disclaimer", Disclaimer.text());
            json.writeArrayFieldStart("features");
            FacesGeoJson faces = new FacesGeoJson(json, units);
            for (int i = 0; i < prisms.size(); i++) {
                faces.write(prisms.get(i), records.get(i));
            }
            json.writeEndArray();
            json.writeEndObject();
        }
    }

    private void write(Prism prism, PeriodBudget record) throws IOException {
        for (Entry entry : record.entries()) {
            Group group = entry.account().group();
            if (group == Group.SIDE || group == Group.LID) {
                json.writeStartObject();
                json.writeStringField("type", "Feature");
                writeProperties(prism, record, entry);
                json.writeObjectFieldStart("geometry");
                if (group == Group.SIDE) {
                    writeLines(prism, entry.account().item());
                } else {
                    PolygonsJson.write(json, prism.parts(), true);
                }
                json.writeEndObject();
                json.writeEndObject();
            }
        }
    }

    private void writeProperties(Prism prism, PeriodBudget record, Entry entry) throws IOException {
        Account account = entry.account();
        double time = record.period().duration();
        json.writeObjectFieldStart("properties");
        json.writeStringField("prism", prism.name());
        json.writeStringField("period", record.period().name());
        json.writeStringField("group", account.group().toString());
        json.writeStringField("item", account.item());
        json.writeNumberField("layer", account.layer() + 1);
        writeRate("inflow_rate", entry.inflow() / time);
        writeRate("outflow_rate", entry.outflow() / time);
        writeRate("net_rate", entry.net() / time);
        json.writeStringField("rate_unit", units.rate().toString());
        json.writeEndObject();
    }

    private void writeRate(String name, double rate) throws IOException {
        if (Double.isNaN(rate)) {
            json.writeNullField(name);
        } else {
            json.writeNumberField(name, rate * units.rateFactor());
        }
    }

    private void writeLines(Prism prism, String item) throws IOException {
        json.writeStringField("type", "MultiLineString");
        json.writeArrayFieldStart("coordinates");
        for (Ring ring : prism.rings()) {
            for (int i = 0; i < ring.sides().size(); i++) {
                if (ring.sides().get(i).item().equals(item)) {
                    json.writeStartArray();
                    PolygonsJson.writeStart(json, ring.sides().get(i));
                    PolygonsJson.writeStart(json, ring.after(i));
                    json.writeEndArray();
                }
            }
        }
        json.writeEndArray();
    }
}
