package org.seepledger.io.prisms;

import java.util.HashSet;
import java.util.List;
import java.util.Locale;
import java.util.Set;
import java.util.function.Consumer;
import org.seepledger.io.NearestName;

/** Tells, once for each, of properties that look like the program's own but are not read. */
final class OwnKeys {

    private static final List<String> KEYS = List.of("name", "layers", "top", "bottom", "boundaries");
    private static final int WORD = 5;

    private final Consumer<String> notes;
    private final Set<String> told = new HashSet<>();

    OwnKeys(Consumer<String> notes) {
        this.notes = notes;
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
