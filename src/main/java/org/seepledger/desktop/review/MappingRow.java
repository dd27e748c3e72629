package org.seepledger.desktop.review;

import java.util.List;
import java.util.Optional;
import java.util.function.Function;
import java.util.function.UnaryOperator;
import org.seepledger.review.mapping.Mapping;

/**
 * Something that was read in a submitted table, and what it was taken for.
 *
 * @param what what kind of thing it is, as the key of the words for it
 * @param label what it is called in the table
 * @param is what it is taken for
 * @param kinds what it may be taken for
 * @param typed what a text typed in place of these means; empty where none may be typed
 * @param counts which way its figures count
 * @param senses which way they may count; none where that cannot be said here
 * @param unit its unit; empty for none
 * @param united what a unit that is typed means; empty where none may be typed
 */
record MappingRow(
        String what,
        String label,
        String is,
        List<Choice> kinds,
        Optional<Function<String, UnaryOperator<Mapping>>> typed,
        String counts,
        List<Choice> senses,
        String unit,
        Optional<Function<String, UnaryOperator<Mapping>>> united) {

    MappingRow {
        kinds = List.copyOf(kinds);
        senses = List.copyOf(senses);
    }

    /**
     * A choice.
     *
     * @param words what it is called
     * @param change what of the corrections it changes
     */
    record Choice(String words, UnaryOperator<Mapping> change) {

        @Override
        public String toString() {
            return words;
        }
    }
}
