package org.seepledger.io.aquifer;

import com.fasterxml.jackson.databind.JsonNode;
import java.util.ArrayList;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.Set;
import org.seepledger.aquifer.GriddedValues;
import org.seepledger.fault.DataFault;
import org.seepledger.io.table.Below;
import org.seepledger.io.table.Frame;
import org.seepledger.io.table.GriddedTable;
import org.seepledger.io.table.Repeats;
import org.seepledger.io.table.StepKind;
import org.seepledger.unit.Measure;

/** Turns bindings into values, and keeps a list of the quantities that were given. */
final class Bindings {

    private static final GriddedValues UNMARKED = GriddedValues.constant(Double.NaN);

    private final DataFiles files;
    private final Frame frame;
    private final List<Quantity> quantities = new ArrayList<>();

    Bindings(DataFiles files, Frame frame) {
        this.files = files;
        this.frame = frame;
    }

    List<Quantity> quantities() {
        return quantities;
    }

    Frame frame() {
        return frame;
    }

    DataFiles files() {
        return files;
    }

    /** The values of a quantity, listed under a name. */
    GriddedValues values(String name, JsonNode node, String place, Measure unit, StepKind steps) {
        return values(name, node, place, unit, steps, Repeats.REFUSED);
    }

    GriddedValues values(String name, JsonNode node, String place, Measure unit, StepKind steps, Repeats repeats) {
        return listed(name, node, new Binding(place, unit, steps, repeats, Below.REFUSED));
    }

    /** The values of a quantity at instants, the limit where one is marked to be below it; listed under a name. */
    GriddedValues marked(String name, JsonNode node, String place, Measure unit) {
        return listed(name, node, new Binding(place, unit, StepKind.INSTANT, Repeats.REFUSED, Below.AS_LIMIT));
    }

    private GriddedValues listed(String name, JsonNode node, Binding binding) {
        GriddedValues values = binding.read(node);
        quantities.add(new Quantity(name, binding.target, binding.steps, values));
        return values;
    }

    /** The limits that single values of a quantity are marked to be below; no value elsewhere. */
    GriddedValues marks(JsonNode node, String place, Measure unit) {
        return new Binding(place, unit, StepKind.INSTANT, Repeats.REFUSED, Below.LIMIT_ALONE).read(node);
    }

    private int steps(StepKind kind) {
        int intervals = frame.times().intervals();
        return switch (kind) {
            case NONE -> 1;
            case INTERVAL -> intervals;
            case INSTANT -> intervals + 1;
        };
    }

    /** What all parts of one binding have in common. */
    private final class Binding {

        private final String place;
        private final Measure target;
        private final StepKind steps;
        private final Repeats repeats;
        private final Below below;

        Binding(String place, Measure target, StepKind steps, Repeats repeats, Below below) {
            this.place = place;
            this.target = target;
            this.steps = steps;
            this.repeats = repeats;
            this.below = below;
        }

        GriddedValues read(JsonNode node) {
            if (below == Below.LIMIT_ALONE && (node.isNumber() || node.has("value"))) {
                return UNMARKED;
            }
            if (node.isNumber()) {
                return new BoundNumber(finite(node.doubleValue()), place, place, Conversion.NONE);
            }
            if (node.isArray()) {
                return perLayer(node);
            }
            if (node.isTextual()) {
                return file(node.textValue(), node);
            }
            if (node.has("value") == node.has("file")) {
                throw fault("neither or both of \"value\" and \"file\"", "one of them", "Give the one that is meant.");
            }
            if (node.has("value")) {
                if (node.has("band") || node.has("column")) {
                    throw fault("\"value\" with a band or a column", "one of them", "Give the one that is meant.");
                }
                double value = node.get("value").doubleValue();
                return new BoundNumber(value, KeyPlace.key(place, "value"), place, conversion(node, unit(node)));
            }
            return file(node.get("file").textValue(), node);
        }

        private double finite(double value) {
            if (!Double.isFinite(value)) {
                throw fault("a number too large", "one within the range of double precision", "Correct it.");
            }
            return value;
        }

        private GriddedValues perLayer(JsonNode node) {
            if (node.size() != frame.layers()) {
                throw fault(
                        "an array of " + node.size(),
                        "one binding for each of the " + frame.layers() + " layers",
                        "Add or remove entries.");
            }
            List<GriddedValues> layers = new ArrayList<>();
            for (int layer = 0; layer < node.size(); layer++) {
                String inner = KeyPlace.entry(place, layer);
                layers.add(new Binding(inner, target, steps, repeats, below).read(node.get(layer)));
            }
            return new ByLayer(List.copyOf(layers));
        }

        private GriddedValues file(String name, JsonNode node) {
            String misplaced = FileName.misplaced(name, steps);
            if (!misplaced.isEmpty()) {
                throw fault(
                        "\"" + name + "\" with " + misplaced,
                        placeholders(),
                        "Take the placeholder out or use the right one.");
            }
            String first = FileName.of(name, 0, 0);
            if (!files.isRaster(first, place)) {
                return table(name, node);
            }
            return below == Below.LIMIT_ALONE ? UNMARKED : raster(name, node);
        }

        private String placeholders() {
            return switch (steps) {
                case NONE -> "no placeholder but {layer}, since the quantity does not change";
                case INTERVAL -> "{layer} or {interval}, since the quantity holds for intervals";
                case INSTANT -> "{layer} or {instant}, since the quantity holds at instants";
            };
        }

        private GriddedValues raster(String name, JsonNode node) {
            if (node.has("column")) {
                throw fault("\"column\" for the raster \"" + name + "\"", "\"band\"", "Name the band that is meant.");
            }
            BandRule band = band(node);
            int needed = band.needed(frame.layers(), steps(steps));
            for (String file : expanded(name)) {
                int bands = files.matchedBands(file, place, frame.grid());
                if (bands < needed) {
                    throw fault(
                            "\"" + file + "\" with " + bands + (bands == 1 ? " band" : " bands"),
                            "at least " + needed + (needed == 1 ? " band" : " bands"),
                            "Name a band that exists, or give the raster all its bands.");
                }
            }
            return new RasterValues(files, name, band, place, conversion(node, unit(node)));
        }

        private Set<String> expanded(String name) {
            Set<String> names = new LinkedHashSet<>();
            int last = FileName.changes(name) ? steps(steps) : 1;
            int lowest = FileName.layered(name) ? frame.layers() : 1;
            for (int step = 0; step < last; step++) {
                for (int layer = 0; layer < lowest; layer++) {
                    names.add(FileName.of(name, layer, step));
                }
            }
            return names;
        }

        private BandRule band(JsonNode node) {
            JsonNode band = node.get("band");
            if (band == null) {
                return BandRule.FIRST;
            }
            if (band.isNumber()) {
                return new BandRule(BandRule.Kind.FIXED, band.intValue() - 1);
            }
            if (band.textValue().equals("layer")) {
                return new BandRule(BandRule.Kind.LAYER, 0);
            }
            StepKind wanted = band.textValue().equals("interval") ? StepKind.INTERVAL : StepKind.INSTANT;
            if (wanted != steps) {
                throw fault(
                        "the band \"" + band.textValue() + "\"",
                        placeholders().replaceAll("\\{(\\w+)}", "\"$1\"").replace("placeholder", "band"),
                        "Use the right word.");
            }
            return new BandRule(BandRule.Kind.STEP, 0);
        }

        private GriddedValues table(String name, JsonNode node) {
            if (node.has("band") || name.contains("{")) {
                throw fault(
                        "the table \"" + name + "\" with a band or a placeholder",
                        "one table, with columns for layer and time where it needs them",
                        "Name the table and its \"column\".");
            }
            GriddedTable table = files.table(name, place, frame, repeats, below);
            String column = table.column(Optional.ofNullable(node.get("column")).map(JsonNode::textValue));
            Optional<Measure> unit = table.unit(column, unit(node));
            return new ConvertedValues(
                    table.values(column, steps),
                    new ConvertedValues.Column(name, column, steps, table.isWholeGrid()),
                    place,
                    conversion(node, unit));
        }

        private Optional<Measure> unit(JsonNode node) {
            return Optional.ofNullable(node.get("unit")).map(text -> {
                try {
                    return Measure.of(text.textValue());
                } catch (IllegalArgumentException e) {
                    throw fault(
                            "the unknown unit \"" + text.textValue() + "\"",
                            "a unit as \"" + target + "\"",
                            "Known are " + Measure.choices() + ".");
                }
            });
        }

        private Conversion conversion(JsonNode node, Optional<Measure> unit) {
            Measure given = unit.orElse(target);
            if (!given.isCompatible(target)) {
                throw fault(
                        "the unit \"" + given + "\"",
                        "a unit that can be given in \"" + target + "\"",
                        "Correct the unit, or bind the right file or column.");
            }
            JsonNode dry = node.get("dry");
            return new Conversion(
                    node.has("scale") ? node.get("scale").doubleValue() : 1,
                    node.has("offset") ? node.get("offset").doubleValue() : 0,
                    given.in(target),
                    dry == null ? OptionalDouble.empty() : OptionalDouble.of(dry.doubleValue()));
        }

        private DataFault fault(String found, String expected, String remedy) {
            return new DataFault(AquiferReader.FILE, place, found, expected, remedy);
        }
    }
}
