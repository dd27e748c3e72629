package org.seepledger.io.prisms;

import com.fasterxml.jackson.databind.JsonNode;
import java.util.HashSet;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import java.util.Set;
import java.util.function.Consumer;
import org.seepledger.io.NearestName;

/** Tells the program's own properties from others', and, once for each, of properties that look like the program's own but are not read. */
final class OwnKeys {

    private static final List<String> KEYS = List.of("name", "layers", "top", "bottom", "boundaries");
    /** What a person wrote about a prism; for people alone, so any kind of value will do. */
    private static final String NOTE = "note";

    private static final int WORD = 5;

    private final Consumer<String> notes;
    private final Set<String> told = new HashSet<>();

    OwnKeys(Consumer<String> notes) {
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

    void look(Iterable<String> properties, Spot spot) {
        for (String property : properties) {
            if (!KEYS.contains(property)
                    && KEYS.stream().anyMatch(key -> resembles(property, key))
                    && told.add(property)) {
                notes.accept(spot + ": the property " + Spot.quoted(property) + " is not one of "
                        + String.join(", ", KEYS) + " and was not read");
            }
        }
    }

    /** One letter off in any case, or the same first five letters, as in {@code boundary}. */
    private static boolean resembles(String property, String key) {
        String start = key.substring(0, Math.min(WORD, key.length()));
        return NearestName.distance(property, key) <= 1
                || start.length() == WORD && property.toLowerCase(Locale.ROOT).startsWith(start);
    }
}
