package org.seepledger.intake;

import java.util.ArrayList;
import java.util.HashMap;
import java.util.HashSet;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import java.util.Optional;
import java.util.Set;
import java.util.function.Consumer;
import org.seepledger.io.table.StepKind;

/**
 * What files are called in the aquifer folder: in a new one after what they are, layer and step; where they lie, as they
 * are, which must then fit the way in which {@code aquifer.json} counts.
 */
final class Shelf {

    private final boolean inPlace;
    private final boolean skipFirst;
    private final Consumer<Finding> findings;
    private final Map<String, String> bases = new HashMap<>();
    private final Set<String> taken = new HashSet<>();
    private final Map<String, Copy> copies = new LinkedHashMap<>();
    private final Map<String, String> obstacles = new LinkedHashMap<>();

    Shelf(boolean inPlace, boolean skipFirst, Consumer<Finding> findings) {
        this.inPlace = inPlace;
        this.skipFirst = skipFirst;
        this.findings = findings;
    }

    /** Some files of a raster item: those of a layer. */
    record Found(String name, String layerName) {}

    /**
     * Puts the rasters of an item that hold one layer on the shelf.
     *
     * @param item the item
     * @param use what is made of it
     * @param layer the layer, from 1
     * @return the name, with a placeholder for steps; empty if no file holds the layer
     */
    Optional<Found> rasters(Item.Rasters item, Use use, int layer) {
        List<Integer> layers = LayerNumbers.of(item);
        int timeField = item.fields().indexOf(Means.TIME);
        Map<Integer, Integer> byStep = new LinkedHashMap<>();
        for (int file = 0; file < item.files().size(); file++) {
            if (layers.get(file) == layer || layers.get(file) == 0) {
                put(item, byStep, timeField < 0 ? 0 : step(item, timeField, file, use), file);
            }
        }
        if (byStep.isEmpty()) {
            return Optional.empty();
        }
        if (timeField >= 0) {
            checkSteps(item, use, layer, byStep);
        }
        String placeholder = use.role().steps() == StepKind.INSTANT ? "{instant}" : "{interval}";
        return Optional.of(
                inPlace
                        ? inPlace(item, use, layer, byStep, placeholder)
                        : renamed(item, use, layer, byStep, placeholder));
    }

    private void put(Item.Rasters item, Map<Integer, Integer> byStep, int step, int file) {
        Integer other = step < 0 ? null : byStep.putIfAbsent(step, file);
        if (other != null) {
            findings.accept(
                    Finding.fault(
                            item,
                            item.files().get(other).shownName() + " and "
                                    + item.files().get(file).shownName()
                                    + " are both for the same layer and time. Say what the numbers in their names mean, or leave one out."));
        }
    }

    private int step(Item.Rasters item, int field, int file, Use use) {
        long order = item.names().get(file).fields().get(field).order();
        long before = item.names().stream()
                .map(name -> name.fields().get(field).order())
                .filter(other -> other < order)
                .distinct()
                .count();
        boolean shifted = skipFirst && use.role().steps() == StepKind.INTERVAL;
        return (int) before - (shifted ? 1 : 0);
    }

    private void checkSteps(Item.Rasters item, Use use, int layer, Map<Integer, Integer> byStep) {
        int count = Steps.of(item).map(Steps::count).orElse(1);
        boolean shifted = skipFirst && use.role().steps() == StepKind.INTERVAL;
        int wanted = count - (shifted ? 1 : 0);
        if (byStep.size() < wanted) {
            findings.accept(Finding.fault(
                    item,
                    "Of layer " + layer + ", " + item.id() + " has " + Wording.count(byStep.size(), "file", "files")
                            + " where others have " + wanted + "."));
        }
    }

    private Found renamed(Item.Rasters item, Use use, int layer, Map<Integer, Integer> byStep, String placeholder) {
        String base = base(item);
        boolean layered = item.fields().contains(Means.LAYER);
        boolean timed = item.fields().contains(Means.TIME);
        String of = base + (layered ? "_l" + layer : "");
        int first = use.role().steps() == StepKind.INSTANT ? 0 : 1;
        byStep.forEach((step, file) -> {
            String to = of + (timed ? "_" + (step + first) : "") + ".tif";
            copies.put(to, new Copy.Whole(item.files().get(file).path(), to));
        });
        String steps = (timed ? "_" + placeholder : "") + ".tif";
        return new Found(of + steps, base + (layered ? "_l{layer}" : "") + steps);
    }

    private Found inPlace(Item.Rasters item, Use use, int layer, Map<Integer, Integer> byStep, String placeholder) {
        int timeField = item.fields().indexOf(Means.TIME);
        int layerField = item.fields().indexOf(Means.LAYER);
        int first = use.role().steps() == StepKind.INSTANT ? 0 : 1;
        String pattern = "";
        for (Map.Entry<Integer, Integer> entry : byStep.entrySet()) {
            NamePattern name = item.names().get(entry.getValue());
            List<String> texts =
                    new ArrayList<>(name.fields().stream().map(NameField::text).toList());
            String shown = item.files().get(entry.getValue()).shownName();
            if (timeField >= 0) {
                String counted = String.valueOf(entry.getKey() + first);
                boolean fits = texts.get(timeField).equals(counted);
                obstacle(
                        item,
                        !fits,
                        shown + " would have to be counted as " + counted + ", not " + texts.get(timeField));
                texts.set(timeField, placeholder);
            }
            String named = name.with(texts);
            obstacle(item, !pattern.isEmpty() && !pattern.equals(named), shown + " is named otherwise than " + pattern);
            pattern = named;
            obstacle(item, shown.contains("{"), shown + " has a brace in its name");
            copies.put(shown, new Copy.Whole(item.files().get(entry.getValue()).path(), shown));
        }
        return new Found(pattern, layerName(item, byStep, layerField, timeField, layer, placeholder));
    }

    /** The layer can be a placeholder where the name writes it as it is counted. */
    private static String layerName(
            Item.Rasters item,
            Map<Integer, Integer> byStep,
            int layerField,
            int timeField,
            int layer,
            String placeholder) {
        NamePattern name = item.names().get(byStep.values().iterator().next());
        List<String> texts =
                new ArrayList<>(name.fields().stream().map(NameField::text).toList());
        if (layerField < 0 || !texts.get(layerField).equals(String.valueOf(layer))) {
            return "";
        }
        texts.set(layerField, "{layer}");
        if (timeField >= 0) {
            texts.set(timeField, placeholder);
        }
        return name.with(texts);
    }

    /** One sentence for each item is enough. */
    private void obstacle(Item item, boolean there, String words) {
        if (there) {
            obstacles.putIfAbsent(item.id(), words + ".");
        }
    }

    /**
     * Puts a table on the shelf.
     *
     * @param item the item
     * @param times the instants of the set
     * @return its name
     */
    String table(Item.Table item, FoundTimes times) {
        MendedTable mended = MendedTable.of(item, times);
        if (inPlace) {
            mended.reasons().forEach(reason -> obstacle(item, true, item.id() + " " + reason));
            copies.put(item.id(), new Copy.Whole(item.file().path(), item.id()));
            return item.id();
        }
        String to = base(item) + ".csv";
        copies.put(
                to,
                mended.reasons().isEmpty()
                        ? new Copy.Whole(item.file().path(), to)
                        : new Copy.Mended(item.file().path(), item.id(), to, mended.columns()));
        return to;
    }

    /** Puts any file on the shelf under a name of its own. */
    void other(Item.Other item, String to) {
        if (!inPlace && taken.add(to)) {
            copies.put(to, new Copy.Whole(item.file().path(), to));
        }
    }

    /** Lets a raster come in without values where a mask has none. */
    void mask(Item.Rasters item, String name, LooseFile.Raster mask, int band) {
        Copy copy = copies.get(name);
        obstacle(item, inPlace, mask.shownName() + " can only be worked into a copy");
        if (copy instanceof Copy.Whole whole && !inPlace) {
            copies.put(name, new Copy.Masked(whole.from(), name, name, mask.path(), band));
        }
    }

    /** A short name that says what is in the file; a number after it where several would be called the same. */
    private String base(Item item) {
        return bases.computeIfAbsent(item.id() + " " + item.files().get(0).path(), key -> {
            Use use = item.uses().stream()
                    .filter(each -> each.role() != Role.NONE)
                    .findFirst()
                    .orElse(item.uses().get(0));
            String wanted = item instanceof Item.Table
                    ? stem(item)
                    : use.column() >= 0
                            ? "values"
                            : use.role().isNamed() ? use.name() : use.role().name();
            if (use.role().isSurface() && use.layer() > 0 && item instanceof Item.Rasters) {
                wanted += "_l" + use.layer();
            }
            String plain = wanted.toLowerCase(Locale.ROOT)
                    .replaceAll("[^a-z0-9]+", "_")
                    .replaceAll("^_+|_+$", "");
            String base = plain.isEmpty() ? "values" : plain;
            String free = base;
            for (int number = 2; !taken.add(free); number++) {
                free = base + "_" + number;
            }
            return free;
        });
    }

    private static String stem(Item item) {
        String name = item.id().substring(item.id().lastIndexOf('/') + 1);
        int dot = name.lastIndexOf('.');
        return dot > 0 ? name.substring(0, dot) : name;
    }

    List<Copy> copies() {
        return List.copyOf(copies.values());
    }

    List<String> obstacles() {
        return List.copyOf(obstacles.values());
    }
}
