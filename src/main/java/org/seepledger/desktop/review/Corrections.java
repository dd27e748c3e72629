package org.seepledger.desktop.review;

import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import org.seepledger.review.mapping.Column;
import org.seepledger.review.mapping.Mapping;
import org.seepledger.review.mapping.Tie;

/** Says one thing more of how a table is read; what was said before stays. */
final class Corrections {

    private Corrections() {}

    private static <T> Map<String, T> with(Map<String, T> before, String label, T value) {
        Map<String, T> after = new LinkedHashMap<>(before);
        after.put(label, value);
        return after;
    }

    static Mapping term(Mapping said, String label, Tie tie) {
        Map<String, Tie> terms = with(said.terms(), label, tie);
        return new Mapping(
                said.header(), said.decimal(), said.unit(), said.columns(), terms, said.areas(), said.periods());
    }

    static Mapping area(Mapping said, String label, String prism) {
        Map<String, String> areas = with(said.areas(), label, prism);
        return new Mapping(
                said.header(), said.decimal(), said.unit(), said.columns(), said.terms(), areas, said.periods());
    }

    static Mapping period(Mapping said, String label, String ours) {
        Map<String, String> periods = with(said.periods(), label, ours);
        return new Mapping(
                said.header(), said.decimal(), said.unit(), said.columns(), said.terms(), said.areas(), periods);
    }

    static Mapping unit(Mapping said, String unit) {
        return new Mapping(
                said.header(), said.decimal(), unit, said.columns(), said.terms(), said.areas(), said.periods());
    }

    static Mapping decimal(Mapping said, Optional<Character> decimal) {
        return new Mapping(
                said.header(), decimal, said.unit(), said.columns(), said.terms(), said.areas(), said.periods());
    }

    /**
     * Columns are found by their headings, the first by the first: with one, all of the same heading are said.
     *
     * @param read the columns of the table, as they were read
     * @param index which of them is otherwise
     * @param otherwise what it is instead
     */
    static Mapping column(Mapping said, List<Column> read, int index, Column otherwise) {
        String heading = otherwise.header();
        List<Column> columns = new ArrayList<>(said.columns().stream()
                .filter(column -> !column.header().equals(heading))
                .toList());
        for (int i = 0; i < read.size(); i++) {
            if (read.get(i).header().equals(heading)) {
                columns.add(i == index ? otherwise : read.get(i));
            }
        }
        return new Mapping(
                said.header(), said.decimal(), said.unit(), columns, said.terms(), said.areas(), said.periods());
    }
}
