package org.seepledger.review.sheet;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.List;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.ValueSource;

/** Numbers as people print them. */
class NumeralsTest {

    @ParameterizedTest
    @CsvSource(
            delimiter = '|',
            quoteCharacter = '"',
            value = {
                "1234.5|1234.5|0.05",
                "1,234|1234|0.5",
                "1,234,567.80|1234567.8|0.005",
                "1 234.5|1234.5|0.05",
                "1'234|1234|0.5",
                "(12.30)|-12.3|0.005",
                "-(12)|-12|0.5",
                "−7|-7|0.5",
                "12-|-12|0.5",
                "+3|3|0.5",
                "~1200|1200|0.5",
                "ca. 5|5|0.5",
                "1.5E+03|1500|50",
                "0.0050|0.005|0.00005",
                "17*|17|0.5",
                "'-4|-4|0.5"
            })
    void readsWithItsRounding(String text, double value, double half) {
        Numeral numeral = Numerals.with('.').read(text).orElseThrow();
        assertThat(numeral.value()).isEqualTo(value);
        assertThat(numeral.half()).isCloseTo(half, org.assertj.core.api.Assertions.within(1e-12));
    }

    @Test
    void readsTheUnitBeside() {
        assertThat(Numerals.with('.').read("1,200 m³/day").orElseThrow()).isEqualTo(new Numeral(1200, 0.5, "m³/day"));
        assertThat(Numerals.with('.').read("0.3 %").orElseThrow().unit()).isEqualTo("%");
    }

    @ParameterizedTest
    @ValueSource(strings = {"-", "–", "n/a", "not quantified", "—"})
    void knowsWhatWasNotGiven(String text) {
        assertThat(Numerals.with('.').read(text).orElseThrow().given()).isFalse();
    }

    @ParameterizedTest
    @ValueSource(strings = {"", "side 3", "2021-10", "12 apples", "1.2.3", "1 Oct 2021", "3 4", "=1+1"})
    void leavesTextsAlone(String text) {
        assertThat(Numerals.with('.').read(text)).isEmpty();
    }

    @ParameterizedTest
    @CsvSource(
            delimiter = '|',
            value = {"1.234,5|,", "1,234.5|.", "0,5|,", "1,23|,", "1.234.567|,", "1,234,567|.", "123|.", "12345,678|,"})
    void findsTheDecimalSign(String text, char decimal) {
        Sheet sheet = new Sheet("", false, List.of(List.of("a", text)));
        assertThat(Numerals.of(sheet).decimal()).isEqualTo(decimal);
    }

    @Test
    void takesACommaForTheDecimalSignWhereAllNumbersHaveThreeDigitsBehindItAndCellsAreNotPartedByCommas() {
        List<List<String>> rows = List.of(List.of("12,345", "7,891"));
        assertThat(Numerals.of(new Sheet("", true, rows)).decimal()).isEqualTo(',');
        assertThat(Numerals.of(new Sheet("", true, rows)).guessed()).isTrue();
        assertThat(Numerals.of(new Sheet("", false, rows)).decimal()).isEqualTo('.');
    }

    @ParameterizedTest
    @CsvSource(
            delimiter = '|',
            value = {
                "Inflow (ML)|ML",
                "net_rate [m3/d]|m3/d",
                "All figures in acre-feet per year|acre-feet per year",
                "Volume, 1000 m3|1000 m3",
                "Error %|%",
                "Recharge (from rain)|"
            })
    void findsUnitsInHeadings(String heading, String unit) {
        assertThat(UnitWords.in(heading).orElse(null)).isEqualTo(unit);
    }

    @Test
    void understandsUnitsOfTheTrade() {
        assertThat(UnitWords.of("AFY").orElseThrow().inMetresAndDays())
                .isCloseTo(1233.48183754752 / 365.25, org.assertj.core.api.Assertions.within(1e-9));
        assertThat(UnitWords.of("1000 m3").orElseThrow().inMetresAndDays()).isEqualTo(1000);
        assertThat(UnitWords.of("m3/month").orElseThrow().perPeriod()).isTrue();
        assertThat(UnitWords.of("m³/d").orElseThrow().amount()).isEqualTo(Amount.RATE);
        assertThat(UnitWords.of("mm/yr").orElseThrow().amount()).isEqualTo(Amount.DEPTH_RATE);
        assertThat(UnitWords.of("apples")).isEmpty();
    }
}
