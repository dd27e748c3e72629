package org.seepledger.io.table;

import java.nio.file.Path;
import java.util.ArrayList;
import java.util.HashSet;
import java.util.List;
import java.util.Set;
import java.util.function.Consumer;
import org.seepledger.aquifer.Times;
import org.seepledger.io.table.SpanReader.Span;
import org.seepledger.ledger.NamedPeriod;

/** A table of periods: {@code name,from,to}. */
public final class PeriodsTable {

    private static final long MOST_LINES = 100_000;

    private PeriodsTable() {}

    /**
     * {@return the periods, in the order of the lines; an empty {@code from} or {@code to} is that of the record}
     *
     * @param file the file
     * @param shownName the file as the user named it
     * @param times the record
     * @param warnings receives a sentence for what is doubtful
     * @throws org.seepledger.fault.DataFault if the file cannot be read, a name is missing or given twice, or a period
     *     does not end after it begins or lies outside the record
     */
    public static List<NamedPeriod> read(Path file, String shownName, Times times, Consumer<String> warnings) {
        try (TableReader table = TableReader.open(file, shownName, MOST_LINES)) {
            int name = table.header().required("name");
            table.header().required("from");
            table.header().required("to");
            table.header().warnOfUnused(Set.of("name", "from", "to"), warnings);
            SpanReader spans = new SpanReader(table, times);
            Set<String> names = new HashSet<>();
            List<NamedPeriod> periods = new ArrayList<>();
            while (table.next()) {
                periods.add(period(table, uniqueName(table, name, names), spans.span(), times));
            }
            if (periods.isEmpty()) {
                throw table.fault("no period", "at least one line", "Add a line below the header.");
            }
            spans.warn(warnings);
            return List.copyOf(periods);
        }
    }

    private static String uniqueName(TableReader table, int column, Set<String> names) {
        String name = table.name(column);
        if (!names.add(name)) {
            throw table.fault(
                    column,
                    "the name " + Shown.text(name) + " again",
                    "names that differ",
                    "Rename one of the periods.");
        }
        return name;
    }

    private static NamedPeriod period(TableReader table, String name, Span span, Times times) {
        double first = times.instant(0);
        double last = times.instant(times.intervals());
        double from = span.from() == Double.NEGATIVE_INFINITY ? Math.min(first, span.to()) : span.from();
        double to = span.to() == Double.POSITIVE_INFINITY ? Math.max(last, span.from()) : span.to();
        if (to <= first || from >= last) {
            throw table.fault(
                    "a period outside the record, from " + CsvText.number(from) + " to " + CsvText.number(to),
                    "one that overlaps it, from " + CsvText.number(first) + " to " + CsvText.number(last) + " "
                            + times.unit(),
                    "Correct the period or take it out.");
        }
        return new NamedPeriod(name, from, to);
    }
}
