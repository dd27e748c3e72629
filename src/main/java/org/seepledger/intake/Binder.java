package org.seepledger.intake;

import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import java.util.Optional;
import java.util.function.Consumer;
import org.seepledger.io.table.StepKind;
import org.seepledger.io.table.TableLook;
import org.seepledger.unit.Measure;

/** Makes bindings of what items give, or of what a person typed. */
final class Binder {

    private final Plan plan;
    private final int layers;
    private final FoundTimes times;
    private final Shelf shelf;
    private final Consumer<Finding> findings;

    Binder(Plan plan, int layers, FoundTimes times, Shelf shelf, Consumer<Finding> findings) {
        this.plan = plan;
        this.layers = layers;
        this.times = times;
        this.shelf = shelf;
        this.findings = findings;
    }

    /** {@return all uses of a role} */
    List<Part> parts(Role role) {
        List<Part> parts = new ArrayList<>();
        for (Item item : plan.items()) {
            for (Use use : item.uses()) {
                if (use.role() == role) {
                    parts.add(new Part(item, use));
                }
            }
        }
        return parts;
    }

    /** {@return the binding of a role for each layer; empty where nothing gives it} */
    List<Optional<Bound>> perLayer(Role role, Optional<Wishes.Topic> numbers) {
        return perLayer(parts(role), numbers);
    }

    List<Optional<Bound>> perLayer(List<Part> parts, Optional<Wishes.Topic> numbers) {
        List<Double> typed = numbers.map(topic -> typed(topic)).orElse(List.of());
        List<Optional<Bound>> bounds = new ArrayList<>();
        for (int layer = 1; layer <= layers; layer++) {
            Optional<Bound> bound = Optional.empty();
            Part from = null;
            for (Part part : parts) {
                Optional<Bound> found = bound(part, layer);
                if (found.isPresent() && from != null) {
                    findings.accept(Finding.fault(
                            part.item(),
                            from.shown() + " and " + part.shown() + " both give the "
                                    + word(part.use().role()) + " of layer " + layer
                                    + ". Say which layers they are for, or leave one"
                                    + " out."));
                } else if (found.isPresent()) {
                    bound = found;
                    from = part;
                }
            }
            if (bound.isEmpty() && !typed.isEmpty()) {
                bound = Optional.of(Bound.number(typed.get(Math.min(layer, typed.size()) - 1), ""));
            }
            bounds.add(bound);
        }
        return bounds;
    }

    private List<Double> typed(Wishes.Topic topic) {
        String text = plan.wishes().of(topic);
        List<Double> numbers = text.isEmpty() ? List.of() : Numbers.of(text);
        if (!text.isEmpty() && numbers.size() != 1 && numbers.size() != layers) {
            findings.accept(Finding.fault(
                    topic,
                    "\"" + text + "\" is neither one number for all layers nor one for each of the "
                            + Wording.count(layers, "layer", "layers") + "."));
        }
        return numbers;
    }

    /**
     * {@return the bindings of all layers as one}
     *
     * @param what what they give, for messages
     * @param topic what a person can say where a layer has none
     * @param bounds one for each layer
     */
    Optional<Object> joined(String what, Optional<Wishes.Topic> topic, List<Optional<Bound>> bounds) {
        List<Integer> missing = new ArrayList<>();
        for (int layer = 1; layer <= bounds.size(); layer++) {
            if (bounds.get(layer - 1).isEmpty()) {
                missing.add(layer);
            }
        }
        if (missing.size() == bounds.size()) {
            return Optional.empty();
        }
        if (!missing.isEmpty()) {
            String which = missing.toString().replaceAll("[\\[\\]]", "");
            findings.accept(new Finding(
                    Finding.Level.FAULT,
                    Optional.empty(),
                    topic,
                    "Nothing gives the " + what + " of layer " + which
                            + ". Bring a file, or say which of the files is for it"
                            + (topic.isPresent() ? ", or type a number." : ".")));
            return Optional.empty();
        }
        return Optional.of(json(bounds.stream().map(Optional::get).toList()));
    }

    private static Object json(List<Bound> bounds) {
        Bound first = bounds.get(0);
        if (bounds.stream().allMatch(first::equals)) {
            return first.json();
        }
        if (bounds.stream().allMatch(first::isLike)) {
            return first.withFile(first.layerFile(), first.band()).json();
        }
        if (isBandOfLayer(bounds)) {
            return first.withFile(first.file(), Optional.of("layer")).json();
        }
        return bounds.stream().map(Bound::json).toList();
    }

    private static boolean isBandOfLayer(List<Bound> bounds) {
        boolean is = true;
        for (int layer = 1; layer <= bounds.size(); layer++) {
            Bound bound = bounds.get(layer - 1);
            is &= !bound.file().isEmpty()
                    && bound.file().equals(bounds.get(0).file())
                    && bound.band().equals(Optional.of((Object) layer))
                    && bound.isLikeBut(bounds.get(0));
        }
        return is;
    }

    private Optional<Bound> bound(Part part, int layer) {
        if (part.item() instanceof Item.Rasters rasters) {
            return ofRasters(rasters, part.use(), layer);
        }
        return part.item() instanceof Item.Table table ? ofTable(table, part.use(), layer) : Optional.empty();
    }

    private Optional<Bound> ofRasters(Item.Rasters item, Use use, int layer) {
        boolean told = item.fields().contains(Means.LAYER) || item.bands() == Means.LAYER && use.column() < 0;
        if (!told && use.layer() > 0 && use.layer() != layer) {
            return Optional.empty();
        }
        Optional<Object> band = Optional.empty();
        if (use.column() >= 0) {
            band = use.column() == 0 ? Optional.empty() : Optional.of(use.column() + 1);
        } else if (item.bands() == Means.LAYER) {
            if (layer > item.bandCount()) {
                return Optional.empty();
            }
            band = Optional.of(layer);
        } else if (item.bands() == Means.TIME) {
            boolean instants = use.role().steps() == StepKind.INSTANT;
            if (!instants && times.skipFirst()) {
                findings.accept(Finding.fault(
                        item,
                        "The first interval cannot be left out of the bands of " + item.id()
                                + ". Write it again without band 1."));
            }
            band = Optional.of(instants ? "instant" : "interval");
        }
        Optional<Object> chosen = band;
        return shelf.rasters(item, use, layer)
                .map(found -> new Bound(
                        found.name(), found.layerName(), chosen, "", unit(use, ""), use.turned() ? -1 : 1, 0));
    }

    private Optional<Bound> ofTable(Item.Table item, Use use, int layer) {
        boolean told = item.places().contains(Place.LAYER);
        boolean holds = told
                ? LayerNumbers.of(item).contains(layer) || LayerNumbers.of(item).isEmpty()
                : use.layer() == 0 || use.layer() == layer;
        if (!holds) {
            return Optional.empty();
        }
        boolean counted =
                item.places().contains(Place.INTERVAL) || item.places().contains(Place.TIME);
        if (times.skipFirst() && counted && use.role().steps() == StepKind.INTERVAL) {
            findings.accept(Finding.fault(
                    item, "The first interval cannot be left out of " + item.id() + ". Take its lines out."));
        }
        TableLook.Column column = item.file().look().columns().get(use.column());
        return Optional.of(new Bound(
                shelf.table(item, times),
                "",
                Optional.empty(),
                column.name(),
                unit(use, column.unit()),
                use.turned() ? -1 : 1,
                0));
    }

    /** A unit that the set has anyway, or that a heading tells, is not said again. */
    private String unit(Use use, String inHeading) {
        if (use.unit().isEmpty() || use.role().amount() == Role.Amount.SHARE) {
            return "";
        }
        boolean told = !inHeading.isEmpty() && isSame(inHeading, use.unit());
        return told || use.unit().equals(own(use.role().amount())) ? "" : use.unit();
    }

    private static boolean isSame(String one, String other) {
        try {
            return Measure.of(one).isCompatible(Measure.of(other))
                    && Measure.of(one).in(Measure.of(other)) == 1;
        } catch (IllegalArgumentException e) {
            return false;
        }
    }

    /** {@return the set's own unit of an amount; empty if it has none} */
    String own(Role.Amount amount) {
        String length = lengthUnit();
        String time = timeUnit();
        return switch (amount) {
            case LENGTH -> length;
            case RATE -> length + "/" + time;
            case FLOW -> length + "3/" + time;
            case PER_LENGTH -> "1/" + length;
            case DENSITY -> "kg/m3";
            default -> "";
        };
    }

    String lengthUnit() {
        String said = plan.wishes().of(Wishes.Topic.LENGTH_UNIT);
        return said.isEmpty() ? "m" : said;
    }

    String timeUnit() {
        String said = plan.wishes().of(Wishes.Topic.TIME_UNIT);
        return said.isEmpty() ? "d" : said;
    }

    /** {@return a role as sentences have it} */
    static String word(Role role) {
        return role.name().toLowerCase(Locale.ROOT).replace('_', ' ');
    }

    int layers() {
        return layers;
    }

    FoundTimes times() {
        return times;
    }
}
