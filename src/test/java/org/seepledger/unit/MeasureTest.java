package org.seepledger.unit;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;

import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

/** Factors against NIST Handbook 44 (2023), Appendix C, "General Tables of Units of Measurement". */
class MeasureTest {

    @ParameterizedTest
    @CsvSource({
        "ft, m, 0.3048",
        "acre, m2, 4046.8564224",
        "acre-ft, m3, 1233.48183754752",
        "AF, m3, 1233.48183754752",
        "gal, L, 3.785411784",
        "Mgal, m3, 3785.411784",
        "cfs, m3/d, 2446.5755455488",
        "gpm, m3/d, 5.45099296896",
        "in, mm, 25.4",
        "mi, m, 1609.344",
        "lb, g, 453.59237",
        "hm3, ML, 1000",
        "km3, GL, 1000",
        "yr, d, 365.25",
        "mg/L, g/m3, 1",
        "L/kg, m3/t, 1",
        "ha, m2, 10000",
        "min, s, 60",
        "ug, ng, 1000",
        "t, kg, 1000",
    })
    void agreesWithHandbook44ToTheLastDigit(String from, String to, double factor) {
        assertThat(Measure.of(from).in(Measure.of(to))).isEqualTo(factor);
    }

    @Test
    void surveyFootIsNotTheInternationalFoot() {
        assertThat(Measure.of("ftUS").in(Measure.of("m"))).isEqualTo(1200.0 / 3937.0);
        assertThat(Measure.of("ftUS").in(Measure.of("ft"))).isGreaterThan(1.0);
    }

    @Test
    void composesPowersAndQuotients() {
        Measure rate = Measure.power(Measure.of("ft"), 3).per(Measure.of("d"));
        assertThat(rate).hasToString("ft3/d");
        assertThat(rate.in(Measure.of("ft3/d"))).isEqualTo(1.0);
        assertThat(rate).isEqualTo(Measure.of(" ft3/d "));
        assertThat(rate.isCompatible(Measure.of("m3"))).isFalse();
        assertThat(Measure.number().isCompatible(Measure.of("m"))).isFalse();
    }

    @ParameterizedTest
    @CsvSource({"m/d/d", "furlong", "m4", "s2", "''", "m3/"})
    void refusesWhatIsNotAUnitAndListsWhatIs(String text) {
        assertThatThrownBy(() -> Measure.of(text))
                .isInstanceOf(IllegalArgumentException.class)
                .hasMessageContaining("acre-ft");
    }

    @Test
    void refusesToTurnLengthIntoTime() {
        assertThatThrownBy(() -> Measure.of("m").in(Measure.of("d"))).hasMessageContaining("cannot be given in");
    }
}
