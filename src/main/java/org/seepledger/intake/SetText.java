package org.seepledger.intake;

import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.function.Consumer;
import org.seepledger.aquifer.Axis;
import org.seepledger.aquifer.Grid;
import org.seepledger.intake.Wishes.Topic;
import org.seepledger.io.raster.Georeference;

/** Puts together what {@code aquifer.json} holds. */
final class SetText {

    private final Plan plan;
    private final FoundGrid grid;
    private final Binder binder;
    private final Shelf shelf;
    private final Consumer<Finding> findings;
    private final FlowText flow;

    SetText(Plan plan, FoundGrid grid, Binder binder, Shelf shelf, Consumer<Finding> findings) {
        this.plan = plan;
        this.grid = grid;
        this.binder = binder;
        this.shelf = shelf;
        this.findings = findings;
        this.flow = new FlowText(plan, binder, shelf, findings);
    }

    String flowKind() {
        return flow.kind();
    }

    Map<String, Object> set() {
        Map<String, Object> set = new LinkedHashMap<>();
        String name = plan.wishes().of(Topic.NAME);
        set.put("name", name.isEmpty() ? String.valueOf(plan.root().getFileName()) : name);
        set.put("crs", crs());
        set.put("length_unit", binder.lengthUnit());
        set.put("time_unit", binder.timeUnit());
        if (!binder.times().start().isEmpty()) {
            set.put("start_date", binder.times().start());
        }
        grid.grid().ifPresent(found -> set.put("grid", grid(found)));
        set.put("layers", layers());
        set.put("times", binder.times().instants().stream().map(Numbers::json).toList());
        set.put("flow", flow.flow());
        head().ifPresent(head -> set.put("head", head));
        Map<String, Object> storage = storage();
        if (!storage.isEmpty()) {
            set.put("storage", storage);
        }
        List<Object> sources = new SourceText(plan, binder, shelf, findings).sources();
        if (!sources.isEmpty()) {
            set.put("sources", sources);
        }
        List<Object> solutes = new SoluteText(binder, findings).solutes();
        if (!solutes.isEmpty()) {
            set.put("solutes", solutes);
        }
        new SetDoubts(plan, binder, findings).on(set);
        prisms();
        return set;
    }

    private void prisms() {
        List<Part> parts = binder.parts(Role.PRISMS);
        for (Part part : parts) {
            shelf.other((Item.Other) part.item(), "prisms.geojson");
        }
        if (parts.size() > 1) {
            findings.accept(Finding.doubt(
                    parts.get(1).item(),
                    "Only one file of prisms can lie beside an aquifer, and "
                            + parts.get(0).shown() + " does. The window can add the others to it."));
        }
    }

    /** What was said; else what most rasters say. */
    private Object crs() {
        String said = plan.wishes().of(Topic.CRS);
        if (!said.isEmpty()) {
            return said.equals("local") ? null : said;
        }
        Map<String, Integer> count = new LinkedHashMap<>();
        for (Item item : plan.items()) {
            if (item instanceof Item.Rasters rasters && item.isUsed()) {
                rasters.files()
                        .forEach(file -> file.place()
                                .flatMap(Georeference::crs)
                                .ifPresent(crs -> count.merge(crs, 1, Integer::sum)));
            }
        }
        Optional<String> most =
                count.entrySet().stream().max(Map.Entry.comparingByValue()).map(Map.Entry::getKey);
        if (most.isEmpty()) {
            findings.accept(Finding.note(
                    Topic.CRS, "No file says in which coordinate system it is: coordinates are taken as local ones."));
        }
        return most.orElse(null);
    }

    private static Map<String, Object> grid(Grid grid) {
        Map<String, Object> json = new LinkedHashMap<>();
        json.put("x", axis(grid.x()));
        json.put("y", axis(grid.y()));
        if (grid.rotation() != 0) {
            json.put("rotation", Numbers.json(grid.rotation()));
        }
        return json;
    }

    private static Map<String, Object> axis(Axis axis) {
        Map<String, Object> json = new LinkedHashMap<>();
        if (axis.isEven()) {
            json.put("from", Numbers.json(axis.origin()));
            json.put("step", Numbers.json(axis.edge(1)));
            json.put("count", axis.count());
            return json;
        }
        List<Number> edges = new ArrayList<>();
        for (int i = 0; i <= axis.count(); i++) {
            edges.add(Numbers.json(Numbers.clean(axis.origin() + axis.edge(i))));
        }
        json.put("edges", edges);
        return json;
    }

    private List<Object> layers() {
        List<Optional<Bound>> tops = binder.perLayer(Role.TOP, Optional.empty());
        List<Optional<Bound>> bottoms = binder.perLayer(Role.BOTTOM, Optional.of(Topic.BOTTOM));
        List<Boolean> waterTables = LayerWishes.waterTables(plan, binder.layers());
        List<Object> layers = new ArrayList<>();
        for (int layer = 0; layer < binder.layers(); layer++) {
            Map<String, Object> json = new LinkedHashMap<>();
            String name = LayerWishes.name(plan, layer + 1);
            if (!name.isEmpty()) {
                json.put("name", name);
            }
            Optional<Bound> top = tops.get(layer);
            if (layer == 0 && top.isEmpty()) {
                top = typedTop();
            }
            top.ifPresent(bound -> json.put("top", bound.json()));
            bottoms.get(layer).ifPresent(bound -> json.put("bottom", bound.json()));
            if (layer == 0 && top.isEmpty()) {
                missing(Topic.TOP, "the top of layer 1");
            }
            if (bottoms.get(layer).isEmpty()) {
                missing(Topic.BOTTOM, "the bottom of layer " + (layer + 1));
            }
            json.put("water_table", waterTables.get(layer));
            layers.add(json);
        }
        return layers;
    }

    private Optional<Bound> typedTop() {
        return Numbers.of(plan.wishes().of(Topic.TOP)).stream().findFirst().map(number -> Bound.number(number, ""));
    }

    private void missing(Topic topic, String what) {
        findings.accept(Finding.fault(
                topic,
                "Nothing gives " + what + ". Bring a file, say which of the files it is, or type an elevation."));
    }

    private Optional<Object> head() {
        return binder.joined("head", Optional.of(Topic.HEAD), binder.perLayer(Role.HEAD, Optional.of(Topic.HEAD)));
    }

    private Map<String, Object> storage() {
        Map<String, Object> storage = new LinkedHashMap<>();
        coefficient(storage, "specific_yield", Role.SPECIFIC_YIELD, Optional.of(Topic.SPECIFIC_YIELD));
        coefficient(storage, "specific_storage", Role.SPECIFIC_STORAGE, Optional.of(Topic.SPECIFIC_STORAGE));
        if (!storage.containsKey("specific_storage")) {
            coefficient(storage, "storativity", Role.STORATIVITY, Optional.empty());
        } else if (!binder.parts(Role.STORATIVITY).isEmpty()) {
            Part part = binder.parts(Role.STORATIVITY).get(0);
            findings.accept(Finding.doubt(
                    part.item(),
                    "Specific storage is given too, so that the storativity of " + part.shown() + " is not used."));
        }
        List<Object> supplied = new ArrayList<>();
        for (Part part : binder.parts(Role.SUPPLIED)) {
            binder.joined("supplied storage", Optional.empty(), binder.perLayer(List.of(part), Optional.empty()))
                    .ifPresent(rate -> {
                        Map<String, Object> item = new LinkedHashMap<>();
                        item.put("item", part.use().name());
                        item.put("rate", rate);
                        supplied.add(item);
                    });
        }
        if (!supplied.isEmpty()) {
            storage.put("supplied", supplied);
        }
        return storage;
    }

    private void coefficient(Map<String, Object> storage, String key, Role role, Optional<Topic> topic) {
        List<Optional<Bound>> bounds = binder.perLayer(role, topic);
        boolean some = bounds.stream().anyMatch(Optional::isPresent);
        if (some && role == Role.SPECIFIC_YIELD) {
            List<Boolean> waterTables = LayerWishes.waterTables(plan, binder.layers());
            for (int layer = 0; layer < bounds.size(); layer++) {
                if (bounds.get(layer).isEmpty() && !waterTables.get(layer)) {
                    bounds.set(layer, Optional.of(Bound.number(0, "")));
                }
            }
        }
        binder.joined(Binder.word(role), topic, bounds).ifPresent(json -> storage.put(key, json));
    }
}
