package org.seepledger.review.mapping;

import java.util.List;
import org.seepledger.ledger.Group;

/**
 * What there is to tie to: our own names.
 *
 * @param prisms the prisms
 * @param items the items of their budgets
 */
public record Catalogue(List<String> prisms, List<Known> items) {

    /** Nothing: a table is then looked at by itself. */
    public static final Catalogue EMPTY = new Catalogue(List.of(), List.of());

    /** Copies the lists. */
    public Catalogue {
        prisms = List.copyOf(prisms);
        items = List.copyOf(items);
    }

    /** How a term was given. */
    public enum Nature {
        /** As flow through faces. */
        FACE,
        /** As a rate over the area. */
        AREAL,
        /** As rates of cells. */
        CELLS,
        /** As wells. */
        WELLS,
        /** As storage. */
        STORAGE
    }

    /**
     * An item.
     *
     * @param group its group
     * @param name its name
     * @param nature how it was given
     */
    public record Known(Group group, String name, Nature nature) {

        /** {@return its name in ties, as {@code source/recharge}} */
        public String key() {
            return group + "/" + name;
        }
    }
}
