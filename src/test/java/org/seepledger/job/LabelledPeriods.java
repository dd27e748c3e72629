package org.seepledger.job;

import java.time.LocalDate;
import java.time.format.TextStyle;
import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import java.util.Random;

/** Periods within a record as people write them: some months, or all its water years or years. */
final class LabelledPeriods {

    private static final int CALENDAR = -1;

    private final LocalDate first;
    private final int months;
    private final Random random;

    LabelledPeriods(LocalDate first, int months, Random random) {
        this.first = first;
        this.months = months;
        this.random = random;
    }

    List<String> labels() {
        int kind = months < 24 ? 2 * random.nextInt(2) : random.nextInt(3);
        int form = random.nextInt(3);
        return kind == 0 ? monthly(form) : kind == 1 ? yearly(10, form) : yearly(1, CALENDAR);
    }

    private List<String> monthly(int form) {
        List<String> labels = new ArrayList<>();
        int count = 1 + random.nextInt(6);
        int from = random.nextInt(Math.max(1, months - count));
        for (int m = from; m < from + count; m++) {
            labels.add(month(first.plusMonths(m), form));
        }
        return labels;
    }

    private static String month(LocalDate month, int form) {
        return switch (form) {
            case 0 -> String.format(Locale.ROOT, "%d-%02d", month.getYear(), month.getMonthValue());
            case 1 -> month.getMonth().getDisplayName(TextStyle.SHORT, Locale.ENGLISH) + " " + month.getYear();
            default -> String.format(Locale.ROOT, "%02d/%d", month.getMonthValue(), month.getYear());
        };
    }

    private List<String> yearly(int start, int form) {
        List<String> labels = new ArrayList<>();
        for (LocalDate day = first; !day.plusYears(1).isAfter(first.plusMonths(months)); day = day.plusMonths(1)) {
            if (day.getMonthValue() == start) {
                labels.add(year(day.getYear(), form));
            }
        }
        return labels;
    }

    private static String year(int year, int form) {
        return switch (form) {
            case CALENDAR -> String.valueOf(year);
            case 0 -> "WY" + (year + 1);
            case 1 -> year + "/" + (year + 1) % 100;
            default -> "water year " + (year + 1);
        };
    }
}
