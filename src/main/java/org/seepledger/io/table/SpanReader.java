package org.seepledger.io.table;

import java.time.LocalDate;
import java.time.LocalDateTime;
import java.time.LocalTime;
import java.time.format.DateTimeParseException;
import java.util.function.Consumer;
import java.util.regex.Pattern;
import org.seepledger.aquifer.Times;

/**
 * Reads the {@code from} and {@code to} of a table's lines: numbers in time units (or the unit in the header), or ISO
 * 8601 dates with or without a time of day. A date is the instant 00:00 of that day.
 */
final class SpanReader {

    private static final Pattern LOOKS_LIKE_A_DATE = Pattern.compile("\\d{4}-.*");
    private static final String REMEDY = "Write a time such as 30.5, or a date such as 2021-10-31 or 2021-10-31T12:00.";

    private final TableReader table;
    private final Times times;
    private final OptionalNumber from;
    private final OptionalNumber to;
    private long monthEnds;
    private String firstMonthEnd;

    SpanReader(TableReader table, Times times) {
        this.table = table;
        this.times = times;
        this.from = OptionalNumber.of(table.header(), "from", times.unit(), times.unit());
        this.to = OptionalNumber.of(table.header(), "to", times.unit(), times.unit());
    }

    /**
     * A stretch of time.
     *
     * @param from in time units; negative infinity where the cell is empty
     * @param to in time units, after {@code from}; infinity where the cell is empty
     */
    record Span(double from, double to) {}

    /**
     * {@return the span of the current line}
     *
     * @throws org.seepledger.fault.DataFault if it cannot be read or does not end after it begins
     */
    Span span() {
        double begin = time(from, Double.NEGATIVE_INFINITY);
        double end = time(to, Double.POSITIVE_INFINITY);
        if (!(end > begin)) {
            throw table.fault(
                    "from " + Shown.text(text(from)) + " to " + Shown.text(text(to)),
                    "an end after the beginning",
                    "Correct one of them; a date is 00:00 of its day.");
        }
        noteMonthEnd();
        return new Span(begin, end);
    }

    private String text(OptionalNumber end) {
        return end.column().isPresent() ? table.text(end.column().getAsInt()) : "";
    }

    private double time(OptionalNumber end, double whenEmpty) {
        String text = text(end);
        if (text.isEmpty()) {
            return whenEmpty;
        }
        int column = end.column().orElseThrow();
        if (LOOKS_LIKE_A_DATE.matcher(text).matches()) {
            return times.time(date(column, text));
        }
        double time = table.number(column, "a time or an ISO date", REMEDY);
        return Double.isNaN(time) ? whenEmpty : table.finite(column, time * end.factor());
    }

    private LocalDateTime date(int column, String text) {
        if (!times.hasDates()) {
            throw table.fault(
                    column,
                    "the date " + Shown.text(text),
                    "a time in " + times.unit() + ", since the aquifer has no dates",
                    "Give the aquifer a \"start_date\", or write times as numbers.");
        }
        try {
            return parsed(text);
        } catch (DateTimeParseException e) {
            throw table.fault(column, Shown.text(text), "an ISO date that the calendar has", REMEDY);
        }
    }

    private static LocalDateTime parsed(String text) {
        return text.indexOf('T') < 0 ? LocalDate.parse(text).atStartOfDay() : LocalDateTime.parse(text);
    }

    /** Somebody who writes {@code to} 2021-10-31 often means the end of that day, which is 2021-11-01. */
    private void noteMonthEnd() {
        if (!LOOKS_LIKE_A_DATE.matcher(text(to)).matches()) {
            return;
        }
        LocalDateTime date = parsed(text(to));
        LocalDate next = date.toLocalDate().plusDays(1);
        if (next.getDayOfMonth() == 1 && date.toLocalTime().equals(LocalTime.MIDNIGHT)) {
            monthEnds++;
            if (firstMonthEnd == null) {
                firstMonthEnd =
                        table.place() + ": \"to\" is " + date.toLocalDate() + ", the last day of a month, and ends at "
                                + "00:00 of that day; where the day itself counts, write " + next;
            }
        }
    }

    /**
     * Warns of what was read, if need be: once, however many lines there are.
     *
     * @param warnings receives at most one sentence
     */
    void warn(Consumer<String> warnings) {
        if (monthEnds == 1) {
            warnings.accept(firstMonthEnd + ".");
        } else if (monthEnds > 1) {
            warnings.accept(firstMonthEnd + " (and " + (monthEnds - 1) + " more such lines).");
        }
    }
}
