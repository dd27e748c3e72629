package org.seepledger.balance;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.assertj.core.api.Assertions.within;

import java.time.LocalDate;
import java.util.List;
import java.util.Optional;
import net.jqwik.api.ForAll;
import net.jqwik.api.Property;
import net.jqwik.api.constraints.IntRange;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.seepledger.aquifer.Times;
import org.seepledger.balance.Periods.Every;
import org.seepledger.fault.DataFault;
import org.seepledger.ledger.NamedPeriod;
import org.seepledger.ledger.Period;
import org.seepledger.ledger.Period.Part;
import org.seepledger.unit.Measure;

class PeriodsTest {

    private static Periods periods(String unit, String start, double... instants) {
        return new Periods(new Times(
                instants,
                Measure.of(unit),
                Optional.ofNullable(start).map(date -> LocalDate.parse(date).atStartOfDay())));
    }

    @Test
    void intervalsAndTheRecordNeedNoDates() {
        Periods periods = periods("d", null, 3, 10, 30);
        assertThat(periods.every(Every.INTERVAL, 10))
                .containsExactly(
                        new Period("interval 1", 3, 10, List.of(new Part(0, 7))),
                        new Period("interval 2", 10, 30, List.of(new Part(1, 20))));
        Period record = new Period("record", 3, 30, List.of(new Part(0, 7), new Part(1, 20)));
        assertThat(periods.every(Every.RECORD, 10)).containsExactly(record);
        assertThat(periods.record()).isEqualTo(record);
        assertThat(record.duration()).isEqualTo(27);
        for (Every every : List.of(Every.MONTH, Every.YEAR, Every.WATER_YEAR)) {
            assertThatThrownBy(() -> periods.every(every, 10))
                    .isInstanceOf(DataFault.class)
                    .hasMessageContaining("start_date");
        }
    }

    @Test
    void monthsTakeTheirPartOfEachInterval() {
        // From the 20th of January of a leap year: 12 days of January, 29 of February, 9 of March.
        List<Period> months = periods("d", "2024-01-20", 0, 25, 50).every(Every.MONTH, 10);
        assertThat(months)
                .containsExactly(
                        new Period("2024-01", 0, 12, List.of(new Part(0, 12))),
                        new Period("2024-02", 12, 41, List.of(new Part(0, 13), new Part(1, 16))),
                        new Period("2024-03", 41, 50, List.of(new Part(1, 9))));
    }

    @Test
    void aRecordThatEndsWithAMonthHasNoEmptyOneAfterIt() {
        assertThat(periods("d", "2023-02-01", 0, 28).every(Every.MONTH, 10))
                .containsExactly(new Period("2023-02", 0, 28, List.of(new Part(0, 28))));
        assertThat(periods("d", "2023-02-01", 0, 28 + 1e-9, 31).every(Every.MONTH, 10))
                .extracting(period -> period.parts().size())
                .containsExactly(1, 1);
    }

    @Test
    void yearsAreCalendarYears() {
        List<Period> years = periods("d", "2023-12-01", 0, 31 + 366 + 10).every(Every.YEAR, 10);
        assertThat(years).extracting(Period::name).containsExactly("2023", "2024", "2025");
        assertThat(years).extracting(Period::duration).containsExactly(31.0, 366.0, 10.0);
    }

    @ParameterizedTest
    @CsvSource({
        "10, 2023-09-30, water year 2023", "10, 2023-10-01, water year 2024", "10, 2023-12-31, water year 2024",
        "10, 2024-01-01, water year 2024", "1, 2023-12-31, water year 2023", "1, 2023-01-01, water year 2023",
        "4, 2023-03-31, water year 2023", "4, 2023-04-01, water year 2024", "12, 2023-11-30, water year 2023",
        "12, 2023-12-01, water year 2024",
    })
    void aWaterYearIsNamedByTheYearInWhichItEnds(int month, String start, String name) {
        Period first =
                periods("d", start, 0, 800).every(Every.WATER_YEAR, month).get(0);
        assertThat(first.name()).isEqualTo(name);
        assertThat(first.from()).isZero();
    }

    @Property(tries = 12)
    void waterYearsOfEveryMonthCoverTheRecordWithoutGaps(@ForAll @IntRange(min = 1, max = 12) int month) {
        List<Period> years = periods("d", "2021-07-14", 0, 400, 1500).every(Every.WATER_YEAR, month);
        double reached = 0;
        for (Period year : years) {
            assertThat(year.from()).isEqualTo(reached);
            assertThat(year.parts().stream().mapToDouble(Part::duration).sum()).isEqualTo(year.duration());
            LocalDate begin = LocalDate.of(2021, 7, 14).plusDays((long) year.from());
            if (reached > 0) {
                assertThat(begin.getMonthValue()).isEqualTo(month);
                assertThat(begin.getDayOfMonth()).isEqualTo(1);
            }
            reached = year.to();
        }
        assertThat(reached).isEqualTo(1500);
        assertThat(years.get(1).duration()).isBetween(365.0, 366.0);
    }

    @Test
    void hoursAndYearsAreCountedInTheirOwnUnit() {
        List<Period> hourly = periods("h", "2023-01-31", 0, 36, 72).every(Every.MONTH, 10);
        assertThat(hourly)
                .containsExactly(
                        new Period("2023-01", 0, 24, List.of(new Part(0, 24))),
                        new Period("2023-02", 24, 72, List.of(new Part(0, 12), new Part(1, 36))));
        List<Period> yearly = periods("yr", "2021-01-01", 0, 2).every(Every.YEAR, 10);
        assertThat(yearly).extracting(Period::name).containsExactly("2021", "2022", "2023");
        // A year of the unit is 365.25 d, so that half a day is left for 2023.
        assertThat(yearly.get(0).duration()).isEqualTo(365 / 365.25, within(1e-15));
        assertThat(yearly.get(2).duration()).isEqualTo(0.5 / 365.25, within(1e-12));
    }

    @Test
    void namedPeriodsAreCutToTheRecord() {
        List<Period> named = periods("d", null, 0, 10, 20)
                .named(List.of(
                        new NamedPeriod("early", -5, 4),
                        new NamedPeriod("across", 8, 13),
                        new NamedPeriod("late", 19, 40)));
        assertThat(named)
                .containsExactly(
                        new Period("early", 0, 4, List.of(new Part(0, 4))),
                        new Period("across", 8, 13, List.of(new Part(0, 2), new Part(1, 3))),
                        new Period("late", 19, 20, List.of(new Part(1, 1))));
    }

    @Test
    void aSliverLeftByRoundingIsNotAPart() {
        List<Period> named = periods("d", null, 0, 10, 20).named(List.of(new NamedPeriod("a", 0, 10 + 5e-9)));
        assertThat(named.get(0).parts()).containsExactly(new Part(0, 10));
        List<Period> longer = periods("d", null, 0, 10, 20).named(List.of(new NamedPeriod("a", 0, 10 + 5e-8)));
        assertThat(longer.get(0).parts()).hasSize(2);
    }
}
