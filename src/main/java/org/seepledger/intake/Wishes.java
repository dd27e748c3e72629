package org.seepledger.intake;

import java.util.Collections;
import java.util.EnumMap;
import java.util.Map;

/**
 * What a person said of a set as a whole, each as text; an empty text leaves it to what the files tell.
 *
 * @param texts what was said
 */
public record Wishes(Map<Topic, String> texts) {

    /** Nothing was said. */
    public static final Wishes NONE = new Wishes(Map.of());

    /** What can be said. */
    public enum Topic {
        /** Name of the set. */
        NAME,
        /** Coordinate system. */
        CRS,
        /** Unit of lengths. */
        LENGTH_UNIT,
        /** Unit of times. */
        TIME_UNIT,
        /** Date of instant 0. */
        START,
        /** Instants, or {@code monthly}, {@code yearly}, {@code every 10}. */
        TIMES,
        /** Edges along x: {@code from step count}, or a list of edges. */
        X,
        /** Edges along y. */
        Y,
        /** Turn of the grid in degrees. */
        ROTATION,
        /** Names of the layers from the top, with commas. */
        LAYERS,
        /** Numbers of the layers that have a water table. */
        WATER_TABLE,
        /** Kind of flow. */
        FLOW,
        /** Numbers, by layer or one for all, where no file gives them. */
        TOP,
        /** Bottoms of the layers. */
        BOTTOM,
        /** Heads. */
        HEAD,
        /** Conductivity. */
        CONDUCTIVITY,
        /** Vertical conductivity. */
        VERTICAL_CONDUCTIVITY,
        /** Vertical conductivity as a share of the horizontal. */
        VERTICAL_SHARE,
        /** Specific yield. */
        SPECIFIC_YIELD,
        /** Specific storage. */
        SPECIFIC_STORAGE,
        /** Porosity. */
        POROSITY,
        /** Recharge, with its unit. */
        RECHARGE,
        /** Whether the first interval is left out: {@code yes}. */
        SKIP_FIRST,
        /** Outer faces of fluxes: {@code open} or {@code closed}. */
        SIDES
    }

    /** Copies the map without its empty texts. */
    public Wishes {
        Map<Topic, String> said = new EnumMap<>(Topic.class);
        texts.forEach((topic, text) -> {
            if (!text.isBlank()) {
                said.put(topic, text.strip());
            }
        });
        texts = Collections.unmodifiableMap(said);
    }

    /** {@return what was said; empty if nothing was} */
    public String of(Topic topic) {
        return texts.getOrDefault(topic, "");
    }

    /** {@return whether anything was said} */
    public boolean has(Topic topic) {
        return texts.containsKey(topic);
    }

    /** {@return the same with something else said} */
    public Wishes with(Topic topic, String text) {
        Map<Topic, String> changed = new EnumMap<>(Topic.class);
        changed.putAll(texts);
        changed.put(topic, text);
        return new Wishes(changed);
    }
}
