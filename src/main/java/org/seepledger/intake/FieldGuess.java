package org.seepledger.intake;

import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import java.util.Set;
import org.seepledger.io.table.StepKind;

/** Guesses which numbers in names count layers, and which count time; and what bands count. */
final class FieldGuess {

    private static final Set<String> LAYER_WORDS = Set.of("l", "lay", "layer", "lyr", "layers");
    private static final Set<String> TIME_WORDS = Set.of(
            "t",
            "time",
            "step",
            "i",
            "interval",
            "instant",
            "period",
            "day",
            "d",
            "month",
            "year",
            "date",
            "timestep",
            "week");

    private static final int MANY = 12;

    private final int layers;

    private FieldGuess(int layers) {
        this.layers = layers;
    }

    /** What the words before numbers say comes first; then the number of layers that came out of it helps with the rest. */
    static List<Item> settled(List<Item> items) {
        List<Item> spoken = each(items, new FieldGuess(0));
        return each(items, new FieldGuess(LayerCount.of(spoken)));
    }

    private static List<Item> each(List<Item> items, FieldGuess guess) {
        List<Item> settled = new ArrayList<>();
        for (Item item : items) {
            settled.add(item instanceof Item.Rasters rasters ? guess.settled(rasters) : item);
        }
        return settled;
    }

    private Item.Rasters settled(Item.Rasters rasters) {
        Item.Rasters named = rasters;
        List<Integer> open = new ArrayList<>();
        for (int field = 0; field < rasters.fields().size(); field++) {
            Means means = word(rasters, field);
            boolean differs = RastersGuess.distinct(rasters.names(), field).size() > 1;
            if (means != Means.NOTHING && !named.fields().contains(means)) {
                named = named.withField(field, means);
            } else if (differs) {
                open.add(field);
            }
        }
        for (int field : open) {
            named = named.withField(field, rest(named, field, open.size()));
        }
        return named.bandCount() > 1 && named.uses().get(0).column() < 0 ? named.withBands(bands(named)) : named;
    }

    private static Means word(Item.Rasters rasters, int field) {
        NameField first = rasters.names().get(0).fields().get(field);
        boolean differs = RastersGuess.distinct(rasters.names(), field).size() > 1;
        if (first.kind() != NameField.Kind.NUMBER) {
            return differs ? Means.TIME : Means.NOTHING;
        }
        if (LAYER_WORDS.contains(first.before())) {
            return Means.LAYER;
        }
        boolean surface = rasters.uses().get(0).role().isSurface() && !Vocabulary.saysSurfaces(rasters.id());
        boolean last = field == rasters.fields().size() - 1;
        if (surface && last && (differs || first.text().length() <= 2)) {
            return Means.LAYER;
        }
        return differs && TIME_WORDS.contains(first.before()) ? Means.TIME : Means.NOTHING;
    }

    private Means rest(Item.Rasters rasters, int field, int open) {
        Role role = rasters.uses().get(0).role();
        boolean layersKnown = rasters.fields().contains(Means.LAYER);
        boolean timesKnown = rasters.fields().contains(Means.TIME);
        int count = RastersGuess.distinct(rasters.names(), field).size();
        if (!layersKnown && (changesNever(role) || timesKnown)) {
            return Means.LAYER;
        }
        if (!layersKnown && role != Role.AREAL && open == 1 && count == layers) {
            return Means.LAYER;
        }
        boolean fewer = open > 1 && count <= MANY && count <= mostOfOthers(rasters, field);
        if (!layersKnown && fewer && role != Role.AREAL) {
            return Means.LAYER;
        }
        return timesKnown ? Means.NOTHING : Means.TIME;
    }

    private static int mostOfOthers(Item.Rasters rasters, int field) {
        int most = 0;
        for (int other = 0; other < rasters.fields().size(); other++) {
            if (other != field) {
                most = Math.max(
                        most, RastersGuess.distinct(rasters.names(), other).size());
            }
        }
        return most;
    }

    /** Conductivity could change, but hardly ever does. */
    private static boolean changesNever(Role role) {
        return role.steps() == StepKind.NONE
                || role == Role.CONDUCTIVITY
                || role == Role.CONDUCTIVITY_Y
                || role == Role.VERTICAL_CONDUCTIVITY;
    }

    private Means bands(Item.Rasters rasters) {
        Role role = rasters.uses().get(0).role();
        String text = rasters.files().get(0).bands().get(0).description().toLowerCase(Locale.ROOT);
        List<String> words = Vocabulary.words(text);
        boolean layersKnown = rasters.fields().contains(Means.LAYER);
        boolean timesKnown = rasters.fields().contains(Means.TIME);
        if (words.stream().anyMatch(LAYER_WORDS::contains)) {
            return Means.LAYER;
        }
        if (words.stream().anyMatch(TIME_WORDS::contains) || DateText.read(text).isPresent()) {
            return Means.TIME;
        }
        if (layersKnown || role == Role.AREAL) {
            return timesKnown ? Means.NOTHING : Means.TIME;
        }
        boolean likeLayers = rasters.bandCount() == layers || layers == 0 && rasters.bandCount() <= MANY;
        return timesKnown || changesNever(role) || likeLayers ? Means.LAYER : Means.TIME;
    }
}
