package org.seepledger.io.aquifer;

import com.fasterxml.jackson.databind.JsonNode;
import java.util.ArrayList;
import java.util.List;
import org.seepledger.aquifer.Source;
import org.seepledger.aquifer.Well;
import org.seepledger.io.table.PointsTable;
import org.seepledger.io.table.Repeats;
import org.seepledger.io.table.StepKind;
import org.seepledger.unit.Measure;

/** Reads the {@code sources} of a set. */
final class SourcesReader {

    private final Bindings bindings;
    private final Measure length;
    private final Measure time;
    private final List<String> warnings;

    SourcesReader(Bindings bindings, Measure length, Measure time, List<String> warnings) {
        this.bindings = bindings;
        this.length = length;
        this.time = time;
        this.warnings = warnings;
    }

    List<Source> read(JsonNode nodes) {
        List<Source> sources = new ArrayList<>();
        for (int i = 0; i < nodes.size(); i++) {
            sources.add(source(nodes.get(i), KeyPlace.entry("sources", i)));
        }
        return sources;
    }

    private Source source(JsonNode node, String place) {
        String category = node.get("category").textValue();
        Measure rate = Measure.power(length, 3).per(time);
        return switch (node.get("kind").textValue()) {
            case "areal" ->
                new Source.Areal(
                        category,
                        bindings.values(
                                category,
                                node.get("rate"),
                                KeyPlace.key(place, "rate"),
                                length.per(time),
                                StepKind.INTERVAL));
            case "cells" ->
                new Source.Cells(
                        category,
                        bindings.values(
                                category,
                                node.get("rate"),
                                KeyPlace.key(place, "rate"),
                                rate,
                                StepKind.INTERVAL,
                                Repeats.ADDED));
            default -> points(category, node.get("file").textValue(), place, rate);
        };
    }

    private Source points(String category, String file, String place, Measure rate) {
        List<Well> wells = Well.of(PointsTable.read(
                bindings.files().path(file, KeyPlace.key(place, "file")),
                file,
                category,
                bindings.frame(),
                length,
                rate,
                warnings::add));
        for (Well well : wells) {
            well.overlapping()
                    .ifPresent(
                            line -> warnings.add(
                                    line.place() + ": the well \"" + well.name()
                                            + "\" has another line for the same time; their rates add. Let one end where the next begins."));
        }
        return new Source.Points(category, wells);
    }
}
