package org.seepledger.desktop.words;

import java.util.function.Function;
import javafx.util.StringConverter;

/**
 * The words by which things stand in a box that they are chosen from, and not typed into; where nothing is chosen, none.
 *
 * @param <T> what is chosen
 */
public final class ChoiceWords<T> extends StringConverter<T> {

    private final Function<T, String> words;

    /**
     * Makes them.
     *
     * @param words the words of each thing
     */
    public ChoiceWords(Function<T, String> words) {
        this.words = words;
    }

    @Override
    public String toString(T choice) {
        return choice == null ? "" : words.apply(choice);
    }

    /**
     * Refuses.
     *
     * @throws UnsupportedOperationException always: words do not tell the thing
     */
    @Override
    public T fromString(String text) {
        throw new UnsupportedOperationException();
    }
}
