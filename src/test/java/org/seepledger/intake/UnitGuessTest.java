package org.seepledger.intake;

import static org.assertj.core.api.Assertions.assertThat;

import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

class UnitGuessTest {

    @ParameterizedTest
    @CsvSource({
        "head_m, LENGTH, m",
        "head (ft), LENGTH, ft",
        "K [m/d], RATE, m/d",
        "K [m/day], RATE, m/d",
        "recharge (mm/yr), RATE, mm/yr",
        "recharge (mm/a), RATE, mm/yr",
        "recharge_mm_yr, RATE, mm/yr",
        "recharge [mm d-1], RATE, mm/d",
        "rate (m³/day), FLOW, m3/d",
        "rate [m^3/s], FLOW, m3/s",
        "q (l/s), FLOW, L/s",
        "Q [gal/min], FLOW, gal/min",
        "Q [cfs], FLOW, ft3/s",
        "chloride [mg/l], CONCENTRATION, mg/L",
        "ss [1/m], PER_LENGTH, 1/m",
        "head meters, LENGTH, m",
    })
    void findsAUnitHoweverItIsWritten(String text, Role.Amount amount, String unit) {
        assertThat(UnitGuess.of(text, amount))
                .hasValueSatisfying(found -> assertThat(
                                org.seepledger.unit.Measure.of(found).in(org.seepledger.unit.Measure.of(unit)))
                        .isEqualTo(1));
    }

    @ParameterizedTest
    @CsvSource({
        "head, LENGTH",
        "head [m/d], LENGTH",
        "porosity [-], SHARE",
        "recharge (estimated), RATE",
        "top_1, LENGTH"
    })
    void findsNoneWhereThereIsNone(String text, Role.Amount amount) {
        assertThat(UnitGuess.of(text, amount)).isEmpty();
    }

    @Test
    void theSizeOfRainTellsItsUnit() {
        assertThat(UnitGuess.ofRain(675, "m")).contains("mm/yr");
        assertThat(UnitGuess.ofRain(2, "m")).contains("mm/d");
        assertThat(UnitGuess.ofRain(0.002, "m")).isEmpty();
        assertThat(UnitGuess.ofRain(22, "ft")).contains("in/yr");
    }
}
