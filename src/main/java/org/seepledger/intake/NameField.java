package org.seepledger.intake;

import java.time.LocalDate;
import java.time.YearMonth;
import java.util.Optional;

/**
 * A number or date in a file's name.
 *
 * @param before the word before it, in lower case; empty if there is none
 * @param kind what it looks like
 * @param text as it is written
 */
public record NameField(String before, Kind kind, String text) {

    /** What a field looks like. */
    public enum Kind {
        /** A number. */
        NUMBER,
        /** A month of a year. */
        MONTH,
        /** A day. */
        DAY
    }

    /** {@return the number; of dates, one that grows with them} */
    public long order() {
        return Long.parseLong(text.replaceAll("\\D", ""));
    }

    /** {@return the day, or the first day of the month; empty for a number} */
    public Optional<LocalDate> day() {
        String digits = text.replaceAll("\\D", "");
        if (kind == Kind.NUMBER) {
            return Optional.empty();
        }
        int year = Integer.parseInt(digits.substring(0, 4));
        int month = Integer.parseInt(digits.substring(4, 6));
        return Optional.of(
                kind == Kind.MONTH
                        ? YearMonth.of(year, month).atDay(1)
                        : LocalDate.of(year, month, Integer.parseInt(digits.substring(6, 8))));
    }
}
