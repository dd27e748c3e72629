package org.seepledger.intake;

import java.time.DateTimeException;
import java.time.LocalDate;
import java.time.LocalDateTime;
import java.time.YearMonth;
import java.util.Optional;
import java.util.regex.Matcher;
import java.util.regex.Pattern;

/** Dates as tables have them: ISO 8601, months of it, and day, month and year with points between. */
final class DateText {

    private static final Pattern POINTS = Pattern.compile("(\\d{1,2})\\.(\\d{1,2})\\.(\\d{4})");

    private DateText() {}

    /** {@return the date and time that a text writes, if it does} */
    static Optional<LocalDateTime> read(String text) {
        try {
            Matcher points = POINTS.matcher(text);
            if (points.matches()) {
                return Optional.of(LocalDate.of(number(points, 3), number(points, 2), number(points, 1))
                        .atStartOfDay());
            }
            if (text.matches("\\d{4}-\\d{2}")) {
                return Optional.of(YearMonth.parse(text).atDay(1).atStartOfDay());
            }
            return Optional.of(
                    text.length() > 10
                            ? LocalDateTime.parse(text.replace(' ', 'T'))
                            : LocalDate.parse(text).atStartOfDay());
        } catch (DateTimeException e) {
            return Optional.empty();
        }
    }

    private static int number(Matcher points, int group) {
        return Integer.parseInt(points.group(group));
    }

    /** {@return a date in ISO 8601; any other text as it is} */
    static String iso(String text) {
        return POINTS.matcher(text).matches()
                ? read(text).map(date -> date.toLocalDate().toString()).orElse(text)
                : text;
    }
}
