package org.seepledger.io.prisms;

import com.fasterxml.jackson.databind.JsonNode;
import java.util.Comparator;
import java.util.HashSet;
import java.util.Iterator;
import java.util.List;
import java.util.Locale;
import java.util.Optional;
import java.util.Set;
import java.util.function.Consumer;
import org.seepledger.io.NearestName;

/**
 * Tells, once for each, of properties that look like the program's own but are not read: a warning where the prism goes
 * without the one that it resembles, so that its range or boundaries may not be what was meant, else a note.
 */
final class OwnKeys {

    private static final List<String> KEYS = List.of("name", "layers", "top", "bottom", "boundaries");
    private static final int WORD = 5;

    private final Consumer<String> warnings;
    private final Consumer<String> notes;
    private final Set<String> told = new HashSet<>();

    OwnKeys(Consumer<String> warnings, Consumer<String> notes) {
        this.warnings = warnings;
        this.notes = notes;
    }

    /** Looks through the properties of a feature. */
    void look(JsonNode properties, Spot spot) {
        for (Iterator<String> names = properties.fieldNames(); names.hasNext(); ) {
            String property = names.next();
            Optional<String> meant = KEYS.contains(property) ? Optional.empty() : meant(property);
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
