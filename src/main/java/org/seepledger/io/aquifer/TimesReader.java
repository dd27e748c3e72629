package org.seepledger.io.aquifer;

import com.fasterxml.jackson.databind.JsonNode;
import java.time.LocalDate;
import java.time.LocalDateTime;
import java.time.format.DateTimeParseException;
import java.util.Optional;
import org.seepledger.aquifer.Times;
import org.seepledger.fault.DataFault;
import org.seepledger.unit.Measure;

/** Reads the {@code times} and the {@code start_date} of a set. */
final class TimesReader {

    /** Some five thousand years. */
    private static final int MOST_DAYS = 2_000_000;

    private TimesReader() {}

    /**
     * {@return the instants}
     *
     * @param root the set
     * @param unit its time unit
     * @throws DataFault if they do not increase, or last longer than dates reach
     */
    static Times read(JsonNode root, Measure unit) {
        try {
            Times times = new Times(GridReader.numbers(root.get("times")), unit, startDate(root));
            checkCalendar(times);
            return times;
        } catch (IllegalArgumentException e) {
            throw new DataFault(
                    AquiferReader.FILE,
                    "times",
                    "times that cannot be (" + e.getMessage() + ")",
                    "increasing instants",
                    "Sort them and leave repeats out.");
        }
    }

    /** Beyond four-digit years a date is a mistake, and calendar periods would be too many to count. */
    private static void checkCalendar(Times times) {
        double days = (times.instant(times.intervals()) - times.instant(0))
                * times.unit().in(Measure.of("d"));
        if (times.hasDates() && !(days < MOST_DAYS)) {
            throw new DataFault(
                    AquiferReader.FILE,
                    "times",
                    "times that last " + days + " days, with a start_date",
                    "fewer than " + MOST_DAYS + " days",
                    "Correct the times or the time_unit, or leave the start_date out.");
        }
    }

    private static Optional<LocalDateTime> startDate(JsonNode root) {
        if (!root.has("start_date")) {
            return Optional.empty();
        }
        String text = root.get("start_date").textValue();
        try {
            return Optional.of(
                    text.contains("T")
                            ? LocalDateTime.parse(text)
                            : LocalDate.parse(text).atStartOfDay());
        } catch (DateTimeParseException e) {
            throw new DataFault(
                    AquiferReader.FILE,
                    "start_date",
                    "\"" + text + "\"",
                    "an ISO 8601 date as 2021-10-01",
                    "Correct the date.");
        }
    }
}
