package org.seepledger.review.mapping;

import java.time.DateTimeException;
import java.time.LocalDate;
import java.time.YearMonth;
import java.util.List;
import java.util.Locale;
import java.util.Optional;
import java.util.regex.Matcher;
import java.util.regex.Pattern;

/** Reads the names of periods: months, years, water years, seasons' dates, in the usual ways of writing them. */
public final class PeriodWords {

    private static final List<String> MONTHS =
            List.of("jan", "feb", "mar", "apr", "may", "jun", "jul", "aug", "sep", "oct", "nov", "dec");
    private static final String MONTH_NAME = "(jan|feb|mar|apr|may|jun|jul|aug|sep|oct|nov|dec)[a-z]*\\.?";
    private static final Pattern ISO_DAY = Pattern.compile("(\\d{4})-(\\d{1,2})-(\\d{1,2})(?:[t ]\\d.*)?");
    private static final Pattern DOTTED_DAY = Pattern.compile("(\\d{1,2})[./](\\d{1,2})[./](\\d{4})");
    private static final Pattern SPOKEN_DAY = Pattern.compile("(\\d{1,2})[. -]+" + MONTH_NAME + "[ -]+(\\d{4})");
    private static final Pattern ISO_MONTH = Pattern.compile("(\\d{4})[-/](0?[1-9]|1[0-2])");
    private static final Pattern MONTH_FIRST = Pattern.compile("(0?[1-9]|1[0-2])[-/.](\\d{4})");
    private static final Pattern SPOKEN_MONTH = Pattern.compile(MONTH_NAME + "[ '-]+(\\d{4}|\\d{2})");
    private static final Pattern YEAR_THEN_MONTH = Pattern.compile("(\\d{4})[ -]+" + MONTH_NAME);
    private static final Pattern YEAR = Pattern.compile(
            "(?:calendar year |year |cy ?|annual |total |yr ?)?((?:19|20|21)\\d{2})(?: total| annual)?");
    private static final Pattern WATER_YEAR =
            Pattern.compile("(?:water[- ]year|hydrological year|wy|hy|fy) ?(\\d{4})(?:[-/]\\d{2,4})?(?: total)?");
    private static final Pattern SPLIT_YEAR =
            Pattern.compile("(?:(?:water[- ]|hydrological )?year |wy ?|fy ?)?(\\d{4})[-/](\\d{2}|\\d{4})");
    private static final Pattern RANGE =
            Pattern.compile("(.+?) ?(?: to |\\.\\.|-(?=\\D| )|(?<= )-|until|through|/) ?(.+)");
    private static final Pattern OURS = Pattern.compile("interval \\d+|record");
    private static final int CENTURY = 2000;

    private final int waterYearStart;

    /**
     * Prepares the reading.
     *
     * @param waterYearStart the month in which a water year begins, 1 to 12
     */
    public PeriodWords(int waterYearStart) {
        this.waterYearStart = waterYearStart;
    }

    static String plain(String label) {
        return label.toLowerCase(Locale.ROOT)
                .replace('\u2013', '-')
                .replace('\u2014', '-')
                .replaceAll("[,:]", " ")
                .replaceAll("\\s+", " ")
                .strip();
    }

    /** Whether a label is the name of a period, ours or one with dates. */
    boolean isPeriod(String label) {
        return OURS.matcher(plain(label)).matches() || of(label).isPresent();
    }

    /**
     * {@return the days that a label names; empty where it names none}
     *
     * @param label the label
     */
    public Optional<Days> of(String label) {
        String words = plain(label);
        try {
            return month(words)
                    .map(month -> new Days(month.atDay(1), month.plusMonths(1).atDay(1)))
                    .or(() -> year(words))
                    .or(() -> range(words));
        } catch (DateTimeException e) {
            return Optional.empty();
        }
    }

    private Optional<YearMonth> month(String words) {
        Matcher iso = ISO_MONTH.matcher(words);
        if (iso.matches()) {
            return Optional.of(YearMonth.of(number(iso, 1), number(iso, 2)));
        }
        Matcher first = MONTH_FIRST.matcher(words);
        if (first.matches()) {
            return Optional.of(YearMonth.of(number(first, 2), number(first, 1)));
        }
        Matcher spoken = SPOKEN_MONTH.matcher(words);
        if (spoken.matches()) {
            int year = number(spoken, 2);
            return Optional.of(YearMonth.of(year < 100 ? CENTURY + year : year, monthOf(spoken.group(1))));
        }
        Matcher last = YEAR_THEN_MONTH.matcher(words);
        return last.matches() ? Optional.of(YearMonth.of(number(last, 1), monthOf(last.group(2)))) : Optional.empty();
    }

    private Optional<Days> year(String words) {
        Matcher split = SPLIT_YEAR.matcher(words);
        if (split.matches() && follows(split.group(1), split.group(2))) {
            return Optional.of(waterYear(number(split, 1) + 1));
        }
        Matcher water = WATER_YEAR.matcher(words);
        if (water.matches()) {
            return Optional.of(waterYear(number(water, 1)));
        }
        Matcher calendar = YEAR.matcher(words);
        return calendar.matches()
                ? Optional.of(
                        new Days(LocalDate.of(number(calendar, 1), 1, 1), LocalDate.of(number(calendar, 1) + 1, 1, 1)))
                : Optional.empty();
    }

    private static boolean follows(String year, String next) {
        int expected = Integer.parseInt(year) + 1;
        return Integer.parseInt(next) == (next.length() == 2 ? expected % 100 : expected);
    }

    /** A water year is named by the year in which it ends. */
    private Days waterYear(int year) {
        int begins = waterYearStart == 1 ? year : year - 1;
        LocalDate from = LocalDate.of(begins, waterYearStart, 1);
        return new Days(from, from.plusYears(1));
    }

    private Optional<Days> range(String words) {
        Matcher range = RANGE.matcher(words);
        if (!range.matches()) {
            return Optional.empty();
        }
        Optional<LocalDate> from = day(range.group(1));
        Optional<LocalDate> to = day(range.group(2));
        if (from.isPresent() && to.isPresent()) {
            return Days.between(from.get(), to.get());
        }
        Optional<YearMonth> first = month(range.group(1).strip());
        Optional<YearMonth> last = month(range.group(2).strip());
        return first.isPresent() && last.isPresent() && !last.get().isBefore(first.get())
                ? Optional.of(
                        new Days(first.get().atDay(1), last.get().plusMonths(1).atDay(1)))
                : Optional.empty();
    }

    /**
     * {@return the day that a text names; empty where it names none}
     *
     * @param text as {@code 2021-10-01}, {@code 1.10.2021} (the day first) or {@code 1 Oct 2021}
     */
    public static Optional<LocalDate> day(String text) {
        String words = plain(text);
        try {
            Matcher iso = ISO_DAY.matcher(words);
            if (iso.matches()) {
                return Optional.of(LocalDate.of(number(iso, 1), number(iso, 2), number(iso, 3)));
            }
            Matcher dotted = DOTTED_DAY.matcher(words);
            if (dotted.matches()) {
                return Optional.of(LocalDate.of(number(dotted, 3), number(dotted, 2), number(dotted, 1)));
            }
            Matcher spoken = SPOKEN_DAY.matcher(words);
            return spoken.matches()
                    ? Optional.of(LocalDate.of(number(spoken, 3), monthOf(spoken.group(2)), number(spoken, 1)))
                    : Optional.empty();
        } catch (DateTimeException e) {
            return Optional.empty();
        }
    }

    private static int number(Matcher found, int group) {
        return Integer.parseInt(found.group(group));
    }

    private static int monthOf(String name) {
        return MONTHS.indexOf(name.substring(0, 3)) + 1;
    }
}
