package org.seepledger.io.table;

import java.util.ArrayList;
import java.util.HashMap;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import java.util.Optional;
import java.util.OptionalInt;
import java.util.Set;
import java.util.function.Consumer;
import java.util.stream.Collectors;
import org.seepledger.fault.DataFault;
import org.seepledger.io.NearestName;
import org.seepledger.unit.Measure;

/** The header line of a table: the columns' names and units. */
final class Header {

    private static final int MOST_COLUMNS = 10_000;
    private static final int MOST_NAMES_SHOWN = 30;

    private final String shownName;
    private final long line;
    private final List<Heading> headings;
    private final Map<String, Integer> byFoldedName = new HashMap<>();

    /**
     * One cell of the header.
     *
     * @param name the name, empty where the column has none
     * @param unit the unit as written, if any
     */
    private record Heading(String name, Optional<String> unit) {

        static Heading of(String cell) {
            String text = cell.strip();
            int bracket = text.lastIndexOf('[');
            if (bracket < 0 || !text.endsWith("]")) {
                return new Heading(text, Optional.empty());
            }
            String unit = text.substring(bracket + 1, text.length() - 1);
            return new Heading(text.substring(0, bracket).strip(), Optional.of(unit));
        }
    }

    Header(String shownName, long line, List<String> cells) {
        this.shownName = shownName;
        this.line = line;
        if (cells.size() > MOST_COLUMNS) {
            throw fault(cells.size() + " columns", "at most 10,000", "Split the table.");
        }
        this.headings = cells.stream().map(Heading::of).toList();
        for (int column = 0; column < headings.size(); column++) {
            String name = headings.get(column).name();
            Integer other = name.isEmpty() ? null : byFoldedName.putIfAbsent(folded(name), column);
            if (other != null) {
                throw fault(
                        "two columns named " + Shown.text(name) + ", the " + Shown.ordinal(other + 1) + " and the "
                                + Shown.ordinal(column + 1),
                        "names that differ by more than case",
                        "Rename one of them.");
            }
        }
        if (byFoldedName.isEmpty()) {
            throw fault("no names", "a header line with the names of the columns", "Write one above the values.");
        }
    }

    private static String folded(String name) {
        return name.toLowerCase(Locale.ROOT);
    }

    int size() {
        return headings.size();
    }

    String name(int column) {
        return headings.get(column).name();
    }

    /**
     * {@return the column with a name of the format's own, in any case}
     *
     * @param name the name, in lower case
     */
    OptionalInt known(String name) {
        Integer column = byFoldedName.get(name);
        return column == null ? OptionalInt.empty() : OptionalInt.of(column);
    }

    /**
     * {@return the column with a name of the format's own}
     *
     * @param name the name, in lower case
     * @throws DataFault if there is none
     */
    int required(String name) {
        return known(name).orElseThrow(() -> missing(name, names()));
    }

    /**
     * {@return the named columns that are not of the format's own, in order}
     *
     * @param known the format's own names
     */
    List<Integer> others(Set<String> known) {
        List<Integer> others = new ArrayList<>();
        for (int column = 0; column < size(); column++) {
            if (!name(column).isEmpty() && !known.contains(folded(name(column)))) {
                others.add(column);
            }
        }
        return others;
    }

    /**
     * {@return the unit that a column's header carries}
     *
     * @param column the column
     * @throws DataFault if it is not a unit
     */
    Optional<Measure> unit(int column) {
        try {
            return headings.get(column).unit().map(Measure::of);
        } catch (IllegalArgumentException e) {
            String unit = headings.get(column).unit().orElseThrow();
            throw fault(
                    column,
                    "the unit " + Shown.text(unit),
                    "a known unit: " + Measure.choices(),
                    "Write one of these.");
        }
    }

    /**
     * {@return by what a column's numbers are multiplied to be in a unit; 1 where the header carries none}
     *
     * @param column the column
     * @param own the unit that numbers without one are in
     * @param target the unit that is wanted
     * @throws DataFault if the header's unit measures something else
     */
    double factor(int column, Measure own, Measure target) {
        Measure unit = unit(column).orElse(own);
        if (!unit.isCompatible(target)) {
            throw fault(
                    column,
                    "the unit " + Shown.text(unit.toString()),
                    "a unit that can be given in " + target,
                    "Write the unit that the numbers are in.");
        }
        return unit.in(target);
    }

    /**
     * {@return that a column is missing}
     *
     * @param name the name that was asked for
     * @param candidates the names among which the nearest one is looked for
     */
    DataFault missing(String name, List<String> candidates) {
        return fault(
                "no column " + Shown.text(name) + " among " + Shown.list(names(), MOST_NAMES_SHOWN),
                "a column of that name",
                NearestName.of(name, candidates)
                        .map(near -> "The nearest is " + Shown.text(near) + ".")
                        .orElse("Name one of those that are there."));
    }

    /**
     * Warns of named columns that are not read, since a misspelt one is among them.
     *
     * @param known the names that are read
     * @param warnings receives at most one sentence
     */
    void warnOfUnused(Set<String> known, Consumer<String> warnings) {
        List<String> unused = others(known).stream().map(this::name).toList();
        if (!unused.isEmpty()) {
            String columns = unused.size() == 1 ? "the column " : "the columns ";
            warnings.accept(shownName + ": " + columns + Shown.list(unused, MOST_NAMES_SHOWN)
                    + (unused.size() == 1 ? " is" : " are") + " not read.");
        }
    }

    /** {@return the names of all columns that have one} */
    List<String> names() {
        return headings.stream()
                .map(Heading::name)
                .filter(name -> !name.isEmpty())
                .collect(Collectors.toList());
    }

    DataFault fault(String found, String expected, String remedy) {
        return new DataFault(shownName, "line " + line, found, expected, remedy);
    }

    DataFault fault(int column, String found, String expected, String remedy) {
        String place = "line " + line + ", column " + Shown.text(name(column));
        return new DataFault(shownName, place, found, expected, remedy);
    }
}
