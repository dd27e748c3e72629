package org.seepledger.intake;

import java.util.Arrays;
import java.util.List;
import java.util.Locale;
import java.util.Set;
import java.util.stream.Collectors;
import java.util.stream.IntStream;
import org.seepledger.intake.Wishes.Topic;

/** What a person said of layers. */
final class LayerWishes {

    private static final Set<String> SAYING_BOTTOM = Set.of(
            "base",
            "bottom",
            "bottoms",
            "bot",
            "botm",
            "floor",
            "bedrock",
            "basement",
            "rock",
            "of",
            "the",
            "layer",
            "lay",
            "surface",
            "surfaces",
            "interface",
            "interfaces",
            "horizons",
            "elevation",
            "elevations",
            "elev",
            "top",
            "metres",
            "meters");

    private LayerWishes() {}

    /** {@return how many layers there are: as files tell, or more where more are named or typed} */
    static int of(Plan plan) {
        int typed = Numbers.of(plan.wishes().of(Topic.BOTTOM)).size();
        return Math.max(LayerCount.of(plan.items()), Math.max(names(plan).size(), typed));
    }

    /** {@return names of layers from the top, as far as they were said} */
    static List<String> names(Plan plan) {
        String said = plan.wishes().of(Topic.LAYERS);
        return said.isEmpty()
                ? List.of()
                : Arrays.stream(said.split(",")).map(String::strip).toList();
    }

    /** {@return the name of a layer: as it was said, else what its bottom is the bottom of; empty if nothing tells} */
    static String name(Plan plan, int layer) {
        List<String> said = names(plan);
        if (!said.isEmpty()) {
            return layer <= said.size() ? said.get(layer - 1) : "";
        }
        return plan.items().stream()
                .flatMap(item -> item.uses().stream().map(use -> new Part(item, use)))
                .filter(part -> part.use().role() == Role.BOTTOM && part.use().layer() == layer)
                .map(LayerWishes::named)
                .findFirst()
                .orElse("");
    }

    /** Of {@code gravel_base} the gravel. */
    private static String named(Part bottom) {
        String text = bottom.use().part().isEmpty()
                ? stem(bottom.item().id())
                : bottom.use().part();
        String words = Vocabulary.words(Vocabulary.withoutUnit(text)).stream()
                .filter(word -> !SAYING_BOTTOM.contains(word))
                .collect(Collectors.joining(" "));
        return words.length() < 3 ? "" : words.substring(0, 1).toUpperCase(Locale.ROOT) + words.substring(1);
    }

    private static String stem(String id) {
        String name = id.substring(id.lastIndexOf('/') + 1);
        int dot = name.lastIndexOf('.');
        return dot > 0 ? name.substring(0, dot) : name;
    }

    /** {@return whether the water table can lie in each layer; in the first alone if nothing else was said} */
    static List<Boolean> waterTables(Plan plan, int layers) {
        String said = plan.wishes().of(Topic.WATER_TABLE);
        List<Double> numbers = said.isEmpty() ? List.of(1.0) : Numbers.of(said);
        return IntStream.rangeClosed(1, layers)
                .mapToObj(layer -> numbers.contains((double) layer))
                .toList();
    }
}
