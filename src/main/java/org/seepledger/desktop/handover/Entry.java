package org.seepledger.desktop.handover;

import java.util.Optional;
import java.util.function.Function;
import javafx.beans.property.ReadOnlyStringProperty;
import javafx.beans.property.ReadOnlyStringWrapper;
import javafx.beans.property.SimpleStringProperty;
import javafx.beans.property.StringProperty;

/**
 * A text that is typed, what it means, and what is wrong with it. Nothing typed means nothing given.
 *
 * @param <T> what it means
 */
public final class Entry<T> {

    private final StringProperty text = new SimpleStringProperty("");
    private final ReadOnlyStringWrapper problem = new ReadOnlyStringWrapper("");
    private final Function<String, T> meaning;
    private Optional<T> value = Optional.empty();

    /**
     * Makes an entry with nothing typed.
     *
     * @param meaning what a text means; throws an {@link IllegalArgumentException} that says what is wrong with it
     */
    Entry(Function<String, T> meaning) {
        this.meaning = meaning;
        text.addListener((typed, before, after) -> read());
    }

    private void read() {
        value = Optional.empty();
        String typed = text.get().strip();
        try {
            value = typed.isEmpty() ? Optional.empty() : Optional.of(meaning.apply(typed));
            problem.set("");
        } catch (IllegalArgumentException e) {
            problem.set(e.getMessage());
        }
    }

    /** {@return what is typed} */
    public StringProperty text() {
        return text;
    }

    /** {@return what is wrong with it; empty for nothing} */
    public ReadOnlyStringProperty problem() {
        return problem.getReadOnlyProperty();
    }

    boolean isSound() {
        return problem.get().isEmpty();
    }

    /** What it means; empty where nothing is typed, or something is wrong with it. */
    Optional<T> value() {
        return value;
    }
}
