package org.seepledger.aquifer;

import java.util.List;
import java.util.Optional;

/**
 * What is known of storage.
 *
 * @param specificYield dimensionless, for water-table layers
 * @param specificStorage 1/length
 * @param storativity dimensionless, a layer's specific storage times its thickness, in place of specific storage
 * @param supplied releases given from elsewhere
 */
public record Storage(
        Optional<GriddedValues> specificYield,
        Optional<GriddedValues> specificStorage,
        Optional<GriddedValues> storativity,
        List<Supplied> supplied) {

    /** A set without any. */
    public static final Storage NONE = new Storage(Optional.empty(), Optional.empty(), Optional.empty(), List.of());

    /** Copies the list. */
    public Storage {
        supplied = List.copyOf(supplied);
    }

    /** Specific storage, or storativity in its place; 0 where neither was given. */
    GriddedValues elastic() {
        return specificStorage.or(() -> storativity).orElseGet(() -> GriddedValues.constant(0));
    }

    /**
     * A release that was computed elsewhere.
     *
     * @param item its name in the budget
     * @param rate length³/time per cell by interval, release positive
     */
    public record Supplied(String item, GriddedValues rate) {}
}
