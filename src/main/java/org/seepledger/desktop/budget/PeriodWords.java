package org.seepledger.desktop.budget;

import java.time.LocalDateTime;
import java.time.format.DateTimeFormatter;
import java.util.Locale;
import org.seepledger.aquifer.Times;
import org.seepledger.desktop.words.NumberForm;
import org.seepledger.desktop.words.Words;
import org.seepledger.ledger.Period;
import org.seepledger.unit.Figures;

/** Periods in words. */
public final class PeriodWords {

    private static final DateTimeFormatter MINUTE = DateTimeFormatter.ofPattern("yyyy-MM-dd HH:mm", Locale.ROOT);

    private PeriodWords() {}

    /**
     * {@return a period with its begin and end: as dates where there are dates, else as times}
     *
     * @param period the period
     * @param times the record's instants
     * @param form how numbers are written
     */
    public static String of(Period period, Times times, NumberForm form) {
        return times.hasDates()
                ? Words.of("period.dates", period.name(), date(times, period.from()), date(times, period.to()))
                : Words.of(
                        "period.times",
                        period.name(),
                        form.of(Figures.typeset(period.from())),
                        form.of(Figures.typeset(period.to())),
                        times.unit());
    }

    /** A day; where it is not midnight, with the time of day. */
    private static String date(Times times, double time) {
        LocalDateTime date = times.date(time).orElseThrow();
        return date.toLocalTime().toSecondOfDay() == 0 ? date.toLocalDate().toString() : MINUTE.format(date);
    }
}
