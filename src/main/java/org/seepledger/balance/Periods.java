package org.seepledger.balance;

import java.time.LocalDateTime;
import java.time.YearMonth;
import java.time.temporal.ChronoUnit;
import java.util.ArrayList;
import java.util.List;
import java.util.function.Function;
import org.seepledger.aquifer.Times;
import org.seepledger.fault.DataFault;
import org.seepledger.ledger.NamedPeriod;
import org.seepledger.ledger.Period;

/** The periods of a record: which stretch of time each covers, and which parts of which intervals. */
public final class Periods {

    /** A part of an interval shorter than this share of it is rounding, and left out. */
    private static final double SLIVER = 1e-9;

    /** How often a budget is struck. */
    public enum Every {
        /** For each interval. */
        INTERVAL,
        /** For each calendar month. */
        MONTH,
        /** For each calendar year. */
        YEAR,
        /** For each water year, named by the year in which it ends. */
        WATER_YEAR,
        /** Once, for the whole record. */
        RECORD
    }

    private final Times times;

    /**
     * Prepares the periods of a record.
     *
     * @param times the record's instants
     */
    public Periods(Times times) {
        this.times = times;
    }

    /**
     * {@return the periods that the record covers, wholly or in part}
     *
     * @param every how often
     * @param waterYearStart the month in which a water year begins, 1 to 12
     * @throws DataFault if calendar periods are asked for and the set has no start date
     */
    public List<Period> every(Every every, int waterYearStart) {
        return switch (every) {
            case INTERVAL -> intervals();
            case RECORD -> List.of(record());
            case MONTH -> calendar(1, 1, month -> month.toString());
            case YEAR -> calendar(1, 12, month -> String.valueOf(month.getYear()));
            case WATER_YEAR ->
                calendar(
                        waterYearStart,
                        12,
                        month -> "water year " + month.plusMonths(11).getYear());
        };
    }

    /**
     * {@return the whole record as one period}
     */
    public Period record() {
        return cut("record", first(), last());
    }

    /**
     * {@return periods of the user's own, as far as the record covers them}
     *
     * @param named the periods
     */
    public List<Period> named(List<NamedPeriod> named) {
        return named.stream()
                .map(period -> cut(period.name(), Math.max(period.from(), first()), Math.min(period.to(), last())))
                .toList();
    }

    private List<Period> intervals() {
        List<Period> periods = new ArrayList<>();
        for (int i = 0; i < times.intervals(); i++) {
            periods.add(cut("interval " + (i + 1), times.instant(i), times.instant(i + 1)));
        }
        return periods;
    }

    private List<Period> calendar(int firstMonth, int months, Function<YearMonth, String> name) {
        LocalDateTime start = times.date(first())
                .orElseThrow(() -> new DataFault(
                        "aquifer.json",
                        "start_date",
                        "no start date",
                        "one, since months and years are asked for",
                        "Give start_date, the date of the first instant, or ask for intervals or the record."));
        LocalDateTime begin = start.truncatedTo(ChronoUnit.DAYS)
                .withDayOfMonth(1)
                .minusMonths(monthsSince(start, firstMonth, months));
        List<Period> periods = new ArrayList<>();
        while (times.time(begin) < last()) {
            LocalDateTime end = begin.plusMonths(months);
            Period period = cut(
                    name.apply(YearMonth.from(begin)),
                    Math.max(times.time(begin), first()),
                    Math.min(times.time(end), last()));
            if (!period.parts().isEmpty()) {
                periods.add(period);
            }
            begin = end;
        }
        return periods;
    }

    private static int monthsSince(LocalDateTime date, int firstMonth, int months) {
        return Math.floorMod(date.getMonthValue() - firstMonth, months);
    }

    private Period cut(String name, double from, double to) {
        List<Period.Part> parts = new ArrayList<>();
        for (int i = times.intervalAt(from); i < times.intervals() && times.instant(i) < to; i++) {
            double overlap = Math.min(to, times.instant(i + 1)) - Math.max(from, times.instant(i));
            if (overlap > SLIVER * times.length(i)) {
                parts.add(new Period.Part(i, overlap));
            }
        }
        return new Period(name, from, to, parts);
    }

    private double first() {
        return times.instant(0);
    }

    private double last() {
        return times.instant(times.intervals());
    }
}
