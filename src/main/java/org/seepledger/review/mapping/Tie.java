package org.seepledger.review.mapping;

import java.util.List;
import java.util.Optional;

/**
 * What a term of a table is tied to.
 *
 * @param kind what it is
 * @param items for an item, which of ours it stands for: a group as {@code side}, or a group and item as {@code
 *     source/recharge}
 * @param sense which way its figures count, where columns and headings do not say so
 */
public record Tie(Kind kind, List<String> items, Optional<Sense> sense) {

    /** Copies the list. */
    public Tie {
        items = List.copyOf(items);
    }

    /**
     * {@return a tie without items}
     *
     * @param kind what the term is
     */
    public static Tie of(Kind kind) {
        return new Tie(kind, List.of(), Optional.empty());
    }

    static Tie item(List<String> items, Sense sense) {
        return new Tie(Kind.ITEM, items, Optional.ofNullable(sense));
    }

    /** {@return whether it stands for storage} */
    public boolean storage() {
        return kind == Kind.CHANGE || kind == Kind.ITEM && items.stream().allMatch(item -> item.startsWith("storage"));
    }
}
