package org.seepledger.io.aquifer;

import com.fasterxml.jackson.databind.JsonNode;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import org.seepledger.aquifer.DarcyFlux;
import org.seepledger.aquifer.Flow;
import org.seepledger.aquifer.GivenFaceFlow;
import org.seepledger.aquifer.GriddedValues;
import org.seepledger.aquifer.HeadGradient;
import org.seepledger.aquifer.OuterFaces;
import org.seepledger.fault.DataFault;
import org.seepledger.io.table.StepKind;
import org.seepledger.unit.Measure;

/** Reads the {@code flow} of a set. */
final class FlowReader {

    private static final String DARCY_FLUX = "darcy_flux";
    private static final String FACE_FLOW = "face_flow";
    private static final List<String> SHARED = List.of("kind", "at", "origin", "reference", "uncertainty");
    private static final List<String> DARCY = List.of("x", "y", "z", "components", "outer_faces");
    private static final List<String> HEADS =
            List.of("conductivity", "conductivity_y", "vertical_conductivity", "heads");
    private static final List<String> FACES = List.of("east", "north", "up", "west", "south", "down");

    private final JsonNode node;
    private final Bindings bindings;
    private final Measure velocity;
    private final Measure rate;
    private final List<String> warnings;
    private final boolean snapshots;
    private final boolean hasHeads;

    FlowReader(
            JsonNode node, boolean hasHeads, Bindings bindings, Measure length, Measure time, List<String> warnings) {
        this.hasHeads = hasHeads;
        this.node = node;
        this.bindings = bindings;
        this.velocity = length.per(time);
        this.rate = Measure.power(length, 3).per(time);
        this.warnings = warnings;
        this.snapshots = node.path("at").asText().equals("instant");
    }

    Flow read() {
        if (snapshots) {
            warnings.add(
                    "Flow is given as snapshots at instants; each interval takes the mean of its two ends, which is not"
                            + " the interval's own mean.");
        }
        return switch (node.get("kind").textValue()) {
            case DARCY_FLUX -> darcyFlux();
            case FACE_FLOW -> faceFlow();
            default -> headGradient();
        };
    }

    private Flow darcyFlux() {
        onlyKeys(DARCY);
        JsonNode outer = node.path("outer_faces");
        return new DarcyFlux(
                values("x", velocity),
                values("y", velocity),
                vertical("z", velocity),
                node.path("components").asText().equals("map"),
                new OuterFaces(open(outer, "sides", true), open(outer, "top", false), open(outer, "bottom", false)));
    }

    private Flow faceFlow() {
        onlyKeys(FACES);
        return new GivenFaceFlow(
                values("east", rate),
                values("north", rate),
                vertical("up", rate),
                optional("west", rate),
                optional("south", rate),
                optional("down", rate));
    }

    private Flow headGradient() {
        onlyKeys(HEADS);
        if (!hasHeads) {
            throw new DataFault(
                    AquiferReader.FILE, "flow.kind", "\"head_gradient\" without heads", "\"head\"", "Add the heads.");
        }
        if (!node.has("vertical_conductivity") && bindings.frame().layers() > 1) {
            throw new DataFault(
                    AquiferReader.FILE,
                    "flow",
                    "no \"vertical_conductivity\" with " + bindings.frame().layers() + " layers",
                    "one, since water flows between layers",
                    "Add it.");
        }
        return new HeadGradient(
                values("conductivity", velocity),
                optional("conductivity_y", velocity),
                optional("vertical_conductivity", velocity),
                node.path("heads").asText().equals("mean"));
    }

    private void onlyKeys(List<String> own) {
        List<String> known = new ArrayList<>(SHARED);
        known.addAll(own);
        node.fieldNames().forEachRemaining(key -> {
            if (!known.contains(key)) {
                throw new DataFault(
                        AquiferReader.FILE,
                        "flow",
                        "\"" + key + "\" with a flow of kind \""
                                + node.get("kind").textValue() + "\"",
                        "one of " + String.join(", ", known),
                        "It belongs to the kind \"" + kindOf(key) + "\": take it out, or correct the kind.");
            }
        });
    }

    private static String kindOf(String key) {
        return DARCY.contains(key) ? DARCY_FLUX : FACES.contains(key) ? FACE_FLOW : "head_gradient";
    }

    private Optional<GriddedValues> vertical(String key, Measure unit) {
        if (!node.has(key) && bindings.frame().layers() > 1) {
            warnings.add("No vertical flow is given (flow." + key + "); it is taken as 0 between layers.");
        }
        return optional(key, unit);
    }

    private Optional<GriddedValues> optional(String key, Measure unit) {
        return node.has(key) ? Optional.of(values(key, unit)) : Optional.empty();
    }

    private GriddedValues values(String key, Measure unit) {
        StepKind steps = snapshots ? StepKind.INSTANT : StepKind.INTERVAL;
        GriddedValues values = bindings.values("flow " + key, node.get(key), "flow." + key, unit, steps);
        return snapshots ? GriddedValues.meanOfEnds(values) : values;
    }

    private static boolean open(JsonNode outer, String key, boolean preset) {
        return outer.has(key) ? outer.get(key).textValue().equals("open") : preset;
    }
}
