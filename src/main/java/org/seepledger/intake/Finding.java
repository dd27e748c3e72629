package org.seepledger.intake;

import java.util.Optional;

/**
 * Something that is wrong, missing or doubtful.
 *
 * @param level how bad it is
 * @param item the id of the item that it is about, if it is about one
 * @param topic what a person can say about it, if that helps
 * @param words what it is and what to do, as sentences
 */
public record Finding(Level level, Optional<String> item, Optional<Wishes.Topic> topic, String words) {

    /** How bad something is. */
    public enum Level {
        /** No aquifer folder can be made as long as it is so. */
        FAULT,
        /** It may be wrong. */
        DOUBT,
        /** Good to know. */
        NOTE
    }

    static Finding fault(Item item, String words) {
        return new Finding(Level.FAULT, Optional.of(item.id()), Optional.empty(), words);
    }

    static Finding doubt(Item item, String words) {
        return new Finding(Level.DOUBT, Optional.of(item.id()), Optional.empty(), words);
    }

    static Finding fault(Wishes.Topic topic, String words) {
        return new Finding(Level.FAULT, Optional.empty(), Optional.of(topic), words);
    }

    static Finding doubt(Wishes.Topic topic, String words) {
        return new Finding(Level.DOUBT, Optional.empty(), Optional.of(topic), words);
    }

    static Finding note(Wishes.Topic topic, String words) {
        return new Finding(Level.NOTE, Optional.empty(), Optional.of(topic), words);
    }
}
