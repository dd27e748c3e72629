package org.seepledger.review.mapping;

import static org.assertj.core.api.Assertions.assertThat;

import java.time.LocalDate;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.ValueSource;

/** Periods as people name them. */
class PeriodWordsTest {

    @ParameterizedTest
    @CsvSource(
            delimiter = '|',
            value = {
                "2021-10|2021-10-01|2021-11-01",
                "10/2021|2021-10-01|2021-11-01",
                "Oct 2021|2021-10-01|2021-11-01",
                "October 21|2021-10-01|2021-11-01",
                "2021|2021-01-01|2022-01-01",
                "calendar year 2021|2021-01-01|2022-01-01",
                "WY2022|2021-10-01|2022-10-01",
                "water year 2022|2021-10-01|2022-10-01",
                "2021/22|2021-10-01|2022-10-01",
                "2021–2022|2021-10-01|2022-10-01",
                "1.10.2021 to 31.12.2021|2021-10-01|2022-01-01",
                "2021-10-05 to 2021-10-20|2021-10-05|2021-10-20",
                "Oct 2021 - Mar 2022|2021-10-01|2022-04-01"
            })
    void readsThem(String label, LocalDate from, LocalDate to) {
        assertThat(new PeriodWords(10).of(label)).contains(new Days(from, to));
    }

    @ParameterizedTest
    @ValueSource(strings = {"", "recharge", "13/2021", "99", "2021-13", "31.2.2021 to 1.3.2021", "side 3"})
    void leavesOtherWordsAlone(String label) {
        assertThat(new PeriodWords(10).of(label)).isEmpty();
    }
}
