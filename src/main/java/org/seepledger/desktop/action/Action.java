package org.seepledger.desktop.action;

import java.util.function.BooleanSupplier;
import org.seepledger.desktop.words.Words;

/**
 * Something that can be done.
 *
 * @param group the key of the words of what it belongs to
 * @param name the key of its words
 * @param keys its shortcut, as {@code Shortcut+Z}
 * @param possible whether it can be done now
 * @param run does it
 */
public record Action(String group, String name, String keys, BooleanSupplier possible, Runnable run) {

    /**
     * Makes an action that can always be done.
     *
     * @param group the key of the words of what it belongs to
     * @param name the key of its words
     * @param keys its shortcut
     * @param run does it
     */
    public Action(String group, String name, String keys, Runnable run) {
        this(group, name, keys, () -> true, run);
    }

    /** {@return what it belongs to, in words} */
    public String groupWords() {
        return Words.of(group);
    }

    /** {@return what it does, in words} */
    public String words() {
        return Words.of(name);
    }

    /** Does it, if it can be done. */
    public void perform() {
        if (possible.getAsBoolean()) {
            run.run();
        }
    }
}
