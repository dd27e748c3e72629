package org.seepledger.io.prisms;

import com.fasterxml.jackson.databind.JsonNode;
import java.util.Comparator;
import java.util.HashSet;
import java.util.Iterator;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import java.util.Optional;
import java.util.Set;
import java.util.function.Consumer;
import org.seepledger.io.NearestName;

/**
 * Tells the program's own properties from others', and, once for each, of properties that look like the program's own but are not read: a warning where the prism goes
 * without the one that it resembles, so that its range or boundaries may not be what was meant, else a note.
 */
final class OwnKeys {

    private static final List<String> KEYS = List.of("name", "layers", "top", "bottom", "boundaries");
    /** What a person wrote about a prism; for people alone, so any kind of value will do. */
    private static final String NOTE = "note";

    private static final int WORD = 5;

    private final Consumer<String> warnings;
    private final Consumer<String> notes;
    private final Set<String> told = new HashSet<>();

    OwnKeys(Consumer<String> warnings, Consumer<String> notes) {
        this.warnings = warnings;
        this.notes = notes;
    }

    /** {@return what the property {@code note} says, or nothing} */
    static String note(JsonNode properties) {
        JsonNode note = properties.path(NOTE);
        return note.isContainerNode() ? note.toString() : note.isNull() ? "" : note.asText();
    }

    /** {@return the properties of other programs, as JSON texts by name, in the file's order} */
    static Map<String, String> others(JsonNode properties) {
        Map<String, String> others = new LinkedHashMap<>();
        properties.properties().stream()
                .filter(property ->
                        !KEYS.contains(property.getKey()) && !property.getKey().equals(NOTE))
                .forEach(property ->
                        others.put(property.getKey(), property.getValue().toString()));
        return others;
    }

    /** Looks through the properties of a feature. */
    void look(JsonNode properties, Spot spot) {
        for (Iterator<String> names = properties.fieldNames(); names.hasNext(); ) {
            String property = names.next();
            boolean known = KEYS.contains(property) || property.equals(NOTE);
            Optional<String> meant = known ? Optional.empty() : meant(property);
            meant.ifPresent(key -> tell(property, key, properties.has(key), spot));
        }
    }

    private void tell(String property, String key, boolean hasKey, Spot spot) {
        String name = spot + ": the property " + Spot.quoted(property) + " is not one of " + String.join(", ", KEYS)
                + " and was not read";
        boolean grave = !hasKey && !key.equals("name");
        if (told.add(property + grave)) {
            if (grave) {
                warnings.accept(name + ", so that the prism has no \"" + key + "\": did you mean that?");
            } else {
                notes.accept(name);
            }
        }
    }

    private static Optional<String> meant(String property) {
        return KEYS.stream()
                .filter(key -> resembles(property, key))
                .min(Comparator.comparingInt(key -> NearestName.distance(property, key)));
    }

    /** One letter off in any case, or the same first five letters, as in {@code boundary}. */
    private static boolean resembles(String property, String key) {
        String start = key.substring(0, Math.min(WORD, key.length()));
        return NearestName.distance(property, key) <= 1
                || start.length() == WORD && property.toLowerCase(Locale.ROOT).startsWith(start);
    }
}
