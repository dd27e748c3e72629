package org.seepledger.picture;

import static org.assertj.core.api.Assertions.assertThat;

import java.time.LocalDateTime;
import java.util.List;
import java.util.Optional;
import org.junit.jupiter.api.Test;
import org.seepledger.aquifer.Times;
import org.seepledger.unit.Measure;

class TimeTicksTest {

    private static List<String> labels(LocalDateTime start, double days, double length) {
        Times times = new Times(new double[] {0, days}, Measure.of("d"), Optional.ofNullable(start));
        return TimeTicks.along(times, 0, days, length, 11).stream()
                .map(TimeTicks.Tick::label)
                .toList();
    }

    @Test
    void datesAreRoundAndIso() {
        LocalDateTime start = LocalDateTime.of(2021, 10, 1, 0, 0);
        assertThat(labels(start, 730, 700))
                .containsExactly(
                        "2021-10", "2022-01", "2022-04", "2022-07", "2022-10", "2023-01", "2023-04", "2023-07",
                        "2023-10");
        assertThat(labels(start, 730, 300)).containsExactly("2022-01", "2022-07", "2023-01", "2023-07");
        assertThat(labels(start, 36_525, 300)).containsExactly("2040", "2060", "2080", "2100", "2120");
        assertThat(labels(start.plusDays(2), 3, 400))
                .containsExactly("2021-10-03", "2021-10-04", "2021-10-05", "2021-10-06");
        assertThat(labels(start.plusHours(5), 0.4, 700))
                .containsExactly("2021-10-01 06:00", "2021-10-01 09:00", "2021-10-01 12:00");
    }

    @Test
    void aTickStandsAtItsDate() {
        Times times =
                new Times(new double[] {5, 100}, Measure.of("d"), Optional.of(LocalDateTime.of(2021, 10, 1, 0, 0)));
        assertThat(TimeTicks.along(times, 5, 100, 400, 11))
                .containsExactly(
                        new TimeTicks.Tick(5, "2021-10"),
                        new TimeTicks.Tick(36, "2021-11"),
                        new TimeTicks.Tick(66, "2021-12"),
                        new TimeTicks.Tick(97, "2022-01"));
    }

    @Test
    void withoutDatesTimeUnitsAreGiven() {
        assertThat(labels(null, 730, 300)).containsExactly("0\u202fd", "200\u202fd", "400\u202fd", "600\u202fd");
    }
}
