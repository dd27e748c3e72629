package org.seepledger.aquifer;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.assertj.core.api.Assertions.within;

import java.time.LocalDateTime;
import java.util.Optional;
import org.junit.jupiter.api.Test;
import org.seepledger.unit.Measure;

class TimesTest {

    private static final LocalDateTime START = LocalDateTime.of(2023, 12, 31, 12, 0);

    private static Times times(String unit, double... instants) {
        return new Times(instants, Measure.of(unit), Optional.of(START));
    }

    @Test
    void intervalsLieBetweenInstants() {
        Times times = times("d", 5, 7, 10);
        assertThat(times.intervals()).isEqualTo(2);
        assertThat(times.instant(1)).isEqualTo(7);
        assertThat(times.length(0)).isEqualTo(2);
        assertThat(times.length(1)).isEqualTo(3);
        assertThat(times.unit()).isEqualTo(Measure.of("d"));
    }

    @Test
    void theFirstInstantHasTheStartDateWhateverItsNumber() {
        Times times = times("d", 5, 7, 10);
        assertThat(times.hasDates()).isTrue();
        assertThat(times.date(5)).contains(START);
        assertThat(times.date(6.5)).contains(LocalDateTime.of(2024, 1, 2, 0, 0));
        assertThat(times.time(LocalDateTime.of(2024, 1, 2, 0, 0))).isEqualTo(6.5);
    }

    @Test
    void countsLeapDays() {
        Times times = times("d", 0, 100);
        assertThat(times.time(LocalDateTime.of(2024, 3, 1, 12, 0))).isEqualTo(61);
        assertThat(times.date(60)).contains(LocalDateTime.of(2024, 2, 29, 12, 0));
    }

    @Test
    void hoursSecondsAndYearsAreTurnedIntoDates() {
        assertThat(times("h", 0, 1).date(30)).contains(START.plusHours(30));
        assertThat(times("h", 0, 1).time(START.plusDays(2))).isEqualTo(48);
        assertThat(times("s", 0, 1).date(86_400.4)).contains(START.plusDays(1));
        // A year is 365.25 d (Julian year, IAU).
        assertThat(times("yr", 0, 1).date(4)).contains(START.plusDays(1461));
        assertThat(times("yr", 0, 1).time(START.plusDays(1461))).isEqualTo(4, within(1e-15));
    }

    @Test
    void withoutAStartDateThereAreNone() {
        Times times = new Times(new double[] {0, 1}, Measure.of("d"), Optional.empty());
        assertThat(times.hasDates()).isFalse();
        assertThat(times.date(0)).isEmpty();
        assertThatThrownBy(() -> times.time(START)).hasMessageContaining("start_date");
    }

    @Test
    void refusesInstantsThatDoNotIncrease() {
        assertThatThrownBy(() -> times("d", 0)).hasMessageContaining("at least two");
        assertThatThrownBy(() -> times("d", 0, 1, 1)).hasMessageContaining("instant 2 is 1.0 after 1.0");
        assertThatThrownBy(() -> times("d", 0, Double.NaN)).hasMessageContaining("instant 1");
        assertThatThrownBy(() -> times("d", 0, Double.POSITIVE_INFINITY)).hasMessageContaining("instant 1");
        assertThatThrownBy(() -> times("d", Double.NEGATIVE_INFINITY, 0)).hasMessageContaining("instant 1");
    }

    @Test
    void keepsItsOwnCopyOfTheInstants() {
        double[] instants = {0, 1};
        Times times = times("d", instants);
        instants[1] = 9;
        assertThat(times.instant(1)).isEqualTo(1);
    }
}
