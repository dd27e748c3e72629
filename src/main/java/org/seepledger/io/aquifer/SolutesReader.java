package org.seepledger.io.aquifer;

import com.fasterxml.jackson.databind.JsonNode;
import java.util.ArrayList;
import java.util.HashMap;
import java.util.Iterator;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import org.seepledger.aquifer.Concentration;
import org.seepledger.aquifer.GriddedValues;
import org.seepledger.aquifer.Solute;
import org.seepledger.fault.DataFault;
import org.seepledger.io.NearestName;
import org.seepledger.io.aquifer.CheckedValues.Bounds;
import org.seepledger.io.table.StepKind;
import org.seepledger.unit.Measure;

/** Reads the {@code solutes} of a set, and what its sources carry of them. */
final class SolutesReader {

    private static final Measure MASS = Measure.of("kg");

    private final Bindings bindings;
    private final JsonNode sources;
    private final Measure length;
    private final Measure time;
    private final Measure massPerLength3;
    private final Map<String, Integer> names = new LinkedHashMap<>();

    SolutesReader(Bindings bindings, JsonNode sources, Measure length, Measure time) {
        this.bindings = bindings;
        this.sources = sources;
        this.length = length;
        this.time = time;
        this.massPerLength3 = MASS.per(Measure.power(length, 3));
    }

    List<Solute> read(JsonNode nodes) {
        for (int i = 0; i < nodes.size(); i++) {
            addName(nodes.get(i).get("name").textValue(), i);
        }
        requireKnownInSources();
        List<Solute> solutes = new ArrayList<>();
        for (int i = 0; i < nodes.size(); i++) {
            String name = nodes.get(i).get("name").textValue();
            solutes.add(solute(new SoluteNode(nodes.get(i), KeyPlace.entry("solutes", i), name, bindings)));
        }
        requireAncestors(solutes);
        return solutes;
    }

    private void addName(String name, int index) {
        Integer other = names.putIfAbsent(name, index);
        if (other != null) {
            throw new DataFault(
                    AquiferReader.FILE,
                    KeyPlace.key(KeyPlace.entry("solutes", index), "name"),
                    "\"" + name + "\", which entry " + (other + 1) + " has already",
                    "names that differ",
                    "Rename one.");
        }
    }

    private void requireKnownInSources() {
        for (int i = 0; i < sources.size(); i++) {
            Iterator<String> carried = sources.get(i).path("concentration").fieldNames();
            while (carried.hasNext()) {
                requireKnown(carried.next(), KeyPlace.key(KeyPlace.entry("sources", i), "concentration"));
            }
        }
    }

    private void requireKnown(String name, String place) {
        if (!names.containsKey(name)) {
            String nearest = NearestName.of(name, names.keySet())
                    .map(meant -> "Did you mean \"" + meant + "\"?")
                    .orElse("Describe it under \"solutes\", or take it out.");
            throw new DataFault(
                    AquiferReader.FILE,
                    place,
                    "the unknown solute \"" + name + "\"",
                    names.isEmpty() ? "a solute that the set describes" : "one of " + names.keySet(),
                    nearest);
        }
    }

    private Solute solute(SoluteNode node) {
        Measure unit = unit(node);
        return new Solute(
                node.solute(),
                node.has("concentration") ? Optional.of(concentration(node, unit)) : Optional.empty(),
                share("porosity", node),
                share("effective_porosity", node),
                SorptionReader.read(node, length),
                decay(node),
                ancestry(node),
                dispersion(node),
                node.values("boundary_concentration", unit, massPerLength3, StepKind.INTERVAL, Bounds.NOT_NEGATIVE),
                ofSources(node.solute(), unit));
    }

    private Measure unit(SoluteNode node) {
        boolean needed = node.has("concentration")
                || node.has("boundary_concentration")
                || sources.findValues("concentration").stream().anyMatch(carried -> carried.has(node.solute()));
        if (needed && !node.has("unit")) {
            throw new DataFault(
                    AquiferReader.FILE,
                    node.place(),
                    "no \"unit\"",
                    "the unit of concentrations, as \"mg/L\"",
                    "Add it; a set has no unit of mass of its own.");
        }
        return node.unit("unit", Measure.of("mg/L"), massPerLength3);
    }

    private Concentration concentration(SoluteNode node, Measure unit) {
        JsonNode bound = node.node().get("concentration");
        String place = KeyPlace.key(node.place(), "concentration");
        double factor = unit.in(massPerLength3);
        GriddedValues values = bindings.marked("concentration of " + node.solute(), bound, place, unit);
        GriddedValues marks = bindings.marks(bound, place, unit);
        boolean censored = !node.has("censored") || node.node().get("censored").booleanValue();
        Optional<GriddedValues> limit =
                node.values("detection_limit", unit, massPerLength3, StepKind.INSTANT, Bounds.POSITIVE);
        return new Concentration(
                CheckedValues.of(values, place, Bounds.NOT_NEGATIVE, factor),
                CheckedValues.of(marks, place, Bounds.POSITIVE, factor),
                censored ? limit : Optional.empty(),
                !censored,
                unit);
    }

    private Optional<GriddedValues> share(String key, SoluteNode node) {
        return node.has(key) ? Optional.of(node.raw(key, Measure.number(), StepKind.NONE)) : Optional.empty();
    }

    private Solute.Decay decay(SoluteNode node) {
        Optional<GriddedValues> dissolved = halfLives("half_life", node).or(() -> {
            Measure rate = Measure.number().per(time);
            return node.values("decay_rate", rate, rate, StepKind.NONE, Bounds.NOT_NEGATIVE);
        });
        return new Solute.Decay(
                dissolved, node.has("sorbed_half_life") ? halfLives("sorbed_half_life", node) : dissolved);
    }

    private Optional<GriddedValues> halfLives(String key, SoluteNode node) {
        return node.values(key, time, time, StepKind.NONE, Bounds.POSITIVE).map(HalfLives::new);
    }

    private Optional<Solute.Ancestry> ancestry(SoluteNode node) {
        if (!node.has("parent")) {
            if (node.has("yield")) {
                throw node.fault("yield", "a yield", "a \"parent\" too", "Name the solute that it comes from.");
            }
            return Optional.empty();
        }
        String parent = node.node().get("parent").textValue();
        requireKnown(parent, KeyPlace.key(node.place(), "parent"));
        GriddedValues yield = node.required(
                "yield", node.numbers("yield", Bounds.NOT_NEGATIVE), "it is a product of \"" + parent + "\"");
        return Optional.of(new Solute.Ancestry(parent, yield));
    }

    /** Nothing is its own ancestor. */
    private static void requireAncestors(List<Solute> solutes) {
        Map<String, String> parents = new HashMap<>();
        solutes.forEach(
                solute -> solute.ancestry().ifPresent(ancestry -> parents.put(solute.name(), ancestry.parent())));
        for (int i = 0; i < solutes.size(); i++) {
            String name = solutes.get(i).name();
            String ancestor = parents.get(name);
            for (int step = 0; ancestor != null && step <= solutes.size(); step++) {
                if (ancestor.equals(name)) {
                    throw new DataFault(
                            AquiferReader.FILE,
                            KeyPlace.key(KeyPlace.entry("solutes", i), "parent"),
                            "a line of parents that leads back to \"" + name + "\"",
                            "a parent that is no product of it",
                            "Correct one of the parents.");
                }
                ancestor = parents.get(ancestor);
            }
        }
    }

    private Optional<Solute.Dispersion> dispersion(SoluteNode node) {
        if (!node.has("dispersion")) {
            return Optional.empty();
        }
        SoluteNode part = node.inside("dispersion");
        Measure perTime = Measure.power(length, 2).per(time);
        return Optional.of(new Solute.Dispersion(
                length("longitudinal", part),
                length("transverse", part),
                length("vertical", part),
                part.values("diffusion", perTime, perTime, StepKind.NONE, Bounds.NOT_NEGATIVE)
                        .orElse(GriddedValues.constant(0)),
                part.numbers("tortuosity", Bounds.SHARE).orElse(GriddedValues.constant(1))));
    }

    private GriddedValues length(String key, SoluteNode part) {
        return part.values(key, length, length, StepKind.NONE, Bounds.NOT_NEGATIVE)
                .orElse(GriddedValues.constant(0));
    }

    private Map<Integer, GriddedValues> ofSources(String name, Measure unit) {
        Map<Integer, GriddedValues> carried = new HashMap<>();
        for (int i = 0; i < sources.size(); i++) {
            JsonNode concentrations = sources.get(i).path("concentration");
            String category = sources.get(i).get("category").textValue();
            SoluteNode node = new SoluteNode(
                    concentrations,
                    KeyPlace.key(KeyPlace.entry("sources", i), "concentration"),
                    "\"" + category + "\"",
                    bindings);
            int source = i;
            node.values(name, unit, massPerLength3, StepKind.INTERVAL, Bounds.NOT_NEGATIVE)
                    .ifPresent(values -> carried.put(source, values));
        }
        return carried;
    }
}
