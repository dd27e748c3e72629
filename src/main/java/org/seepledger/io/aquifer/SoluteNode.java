package org.seepledger.io.aquifer;

import com.fasterxml.jackson.databind.JsonNode;
import java.util.List;
import java.util.Optional;
import org.seepledger.aquifer.GriddedValues;
import org.seepledger.fault.DataFault;
import org.seepledger.io.aquifer.CheckedValues.Bounds;
import org.seepledger.io.table.StepKind;
import org.seepledger.unit.Measure;

/**
 * One solute, or a part of one, as it stands in {@code aquifer.json}.
 *
 * @param node the node
 * @param place where it stands
 * @param solute the solute's name, for lists of quantities
 * @param bindings what turns bindings into values
 */
record SoluteNode(JsonNode node, String place, String solute, Bindings bindings) {

    SoluteNode inside(String key) {
        return new SoluteNode(node.path(key), KeyPlace.key(place, key), solute, bindings);
    }

    /** Whether a key stands there, be it with null. */
    boolean has(String key) {
        return node.has(key);
    }

    /**
     * The values of a key in another unit; empty where it is not there or null.
     *
     * @param key the key
     * @param written the unit of values that carry none
     * @param target the unit to give them in
     * @param steps what they hold for
     * @param bounds what they may be
     */
    Optional<GriddedValues> values(String key, Measure written, Measure target, StepKind steps, Bounds bounds) {
        if (!node.hasNonNull(key)) {
            return Optional.empty();
        }
        GriddedValues given = raw(key, written, steps);
        return Optional.of(CheckedValues.of(given, KeyPlace.key(place, key), bounds, written.in(target)));
    }

    Optional<GriddedValues> numbers(String key, Bounds bounds) {
        return values(key, Measure.number(), Measure.number(), StepKind.NONE, bounds);
    }

    /** The values of a key as they stand, listed among the set's quantities. */
    GriddedValues raw(String key, Measure written, StepKind steps) {
        String name = key.replace('_', ' ') + " of " + solute;
        return bindings.values(name, node.get(key), KeyPlace.key(place, key), written, steps);
    }

    /** The unit that a key names, which must measure the same as another. */
    Measure unit(String key, Measure like, Measure otherwise) {
        if (!node.has(key)) {
            return otherwise;
        }
        String text = node.get(key).textValue();
        try {
            Measure unit = Measure.of(text);
            if (unit.isCompatible(like)) {
                return unit;
            }
        } catch (IllegalArgumentException e) {
            throw fault(key, "the unknown unit \"" + text + "\"", "a unit as \"" + like + "\"", known());
        }
        throw fault(key, "\"" + text + "\", the unit of something else", "a unit as \"" + like + "\"", known());
    }

    private static String known() {
        return "Known are " + Measure.choices() + ".";
    }

    /** Makes sure that only keys that belong together stand there. */
    void requireNone(List<String> keys, String why) {
        for (String key : keys) {
            if (node.has(key)) {
                throw fault(
                        key, "\"" + key + "\" beside " + why, "what belongs to it alone", "Take one of the two out.");
            }
        }
    }

    GriddedValues required(String key, Optional<GriddedValues> values, String why) {
        return values.orElseThrow(() -> new DataFault(
                AquiferReader.FILE,
                place,
                "no \"" + key + "\"",
                "one, since " + why,
                "Add it; 0 where there is none."));
    }

    DataFault fault(String key, String found, String expected, String remedy) {
        return new DataFault(AquiferReader.FILE, KeyPlace.key(place, key), found, expected, remedy);
    }
}
