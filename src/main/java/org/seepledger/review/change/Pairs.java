package org.seepledger.review.change;

import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Map;
import java.util.Objects;
import java.util.Optional;
import java.util.Set;
import java.util.function.Function;

/**
 * Which row of one run is which of the other. Prisms and periods are paired by name; those that are left, by order, if
 * both runs have as many of them left.
 *
 * @param rows the pairs
 */
public record Pairs(List<Pair> rows) {

    /** Copies the list. */
    public Pairs {
        rows = List.copyOf(rows);
    }

    /**
     * Two rows about the same.
     *
     * @param first the first run's; empty where it has none
     * @param second the second run's; empty where it has none
     */
    public record Pair(Optional<RecordedRow> first, Optional<RecordedRow> second) {}

    /**
     * {@return the pairs of two runs}
     *
     * @param first the first run's rows
     * @param second the second run's rows
     */
    public static Pairs of(List<RecordedRow> first, List<RecordedRow> second) {
        Map<String, String> prisms = named(first, second, RecordedRow::prism);
        Map<String, String> periods = named(first, second, RecordedRow::period);
        Map<List<String>, RecordedRow> seconds = new LinkedHashMap<>();
        second.forEach(row -> seconds.put(List.of(row.prism(), row.period(), row.key()), row));
        List<Pair> pairs = new ArrayList<>();
        for (RecordedRow row : first) {
            String prism = Objects.requireNonNullElse(prisms.get(row.prism()), "");
            String period = Objects.requireNonNullElse(periods.get(row.period()), "");
            pairs.add(
                    new Pair(Optional.of(row), Optional.ofNullable(seconds.remove(List.of(prism, period, row.key())))));
        }
        seconds.values().forEach(row -> pairs.add(new Pair(Optional.empty(), Optional.of(row))));
        return new Pairs(pairs);
    }

    private static Map<String, String> named(
            List<RecordedRow> first, List<RecordedRow> second, Function<RecordedRow, String> name) {
        Set<String> ones = names(first, name);
        Set<String> others = names(second, name);
        Map<String, String> named = new LinkedHashMap<>();
        ones.stream().filter(others::contains).forEach(same -> named.put(same, same));
        List<String> left = ones.stream().filter(one -> !others.contains(one)).toList();
        List<String> right =
                others.stream().filter(other -> !ones.contains(other)).toList();
        for (int i = 0; i < left.size() && left.size() == right.size(); i++) {
            named.put(left.get(i), right.get(i));
        }
        return named;
    }

    private static Set<String> names(List<RecordedRow> rows, Function<RecordedRow, String> name) {
        Set<String> names = new LinkedHashSet<>();
        rows.forEach(row -> names.add(name.apply(row)));
        return names;
    }
}
