package org.seepledger.review.mapping;

import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;

/**
 * How a table is read.
 *
 * @param header the header line, from 0; below 0 to find it out
 * @param decimal the decimal sign; empty to find it out
 * @param unit the unit of figures that no column, cell or heading gives one; empty for none
 * @param columns its columns, from the left
 * @param terms what its terms are tied to, by label
 * @param areas which prisms its areas are, by label
 * @param periods which of our periods its periods are, by label, where they are not told by dates or words
 */
public record Mapping(
        int header,
        Optional<Character> decimal,
        String unit,
        List<Column> columns,
        Map<String, Tie> terms,
        Map<String, String> areas,
        Map<String, String> periods) {

    /** Nothing said: all is guessed. */
    public static final Mapping NONE = new Mapping(-1, Optional.empty(), "", List.of(), Map.of(), Map.of(), Map.of());

    /** Copies the collections. */
    public Mapping {
        columns = List.copyOf(columns);
        terms = new LinkedHashMap<>(terms);
        areas = new LinkedHashMap<>(areas);
        periods = new LinkedHashMap<>(periods);
    }

    /**
     * {@return this mapping with a person's corrections over it}
     *
     * @param given a mapping, whole or in part; its columns are found by their headings
     */
    public Mapping under(Mapping given) {
        Map<String, Tie> joinedTerms = new LinkedHashMap<>(terms);
        joinedTerms.putAll(given.terms);
        Map<String, String> joinedAreas = new LinkedHashMap<>(areas);
        joinedAreas.putAll(given.areas);
        Map<String, String> joinedPeriods = new LinkedHashMap<>(periods);
        joinedPeriods.putAll(given.periods);
        return new Mapping(
                given.header >= 0 ? given.header : header,
                given.decimal.or(() -> decimal),
                given.unit.isEmpty() ? unit : given.unit,
                corrected(columns, given.columns),
                joinedTerms,
                joinedAreas,
                joinedPeriods);
    }

    /** The columns with those of the same heading in their place; the first takes the first, and so on. */
    static List<Column> corrected(List<Column> columns, List<Column> given) {
        List<Column> left = new ArrayList<>(given);
        return columns.stream()
                .map(column -> {
                    for (Column corrected : left) {
                        if (corrected.header().equals(column.header())) {
                            left.remove(corrected);
                            return corrected;
                        }
                    }
                    return column;
                })
                .toList();
    }
}
