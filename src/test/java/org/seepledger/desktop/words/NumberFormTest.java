package org.seepledger.desktop.words;

import static org.assertj.core.api.Assertions.assertThat;

import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.ValueSource;
import org.seepledger.unit.Figures;

class NumberFormTest {

    @ParameterizedTest
    @CsvSource(
            delimiter = '|',
            value = {
                "SPACE_POINT | −12\u202f345\u202f678.5",
                "SPACE_COMMA | −12\u202f345\u202f678,5",
                "COMMA_POINT | −12,345,678.5",
                "POINT_COMMA | −12.345.678,5",
                "NONE_POINT | −12345678.5",
                "NONE_COMMA | −12345678,5"
            })
    void groupsAndDecimalsHaveTheirSigns(NumberForm form, String written) {
        assertThat(form.of("−12\u202f345\u202f678.5")).isEqualTo(written);
    }

    @Test
    void powersOfTenAndPercentagesAreNumbersToo() {
        assertThat(NumberForm.POINT_COMMA.of(Figures.typeset(1.234e-9))).isEqualTo("1,234·10⁻⁹");
        assertThat(NumberForm.POINT_COMMA.of(Figures.typesetPercent(12.345))).isEqualTo("12,35\u202f%");
        assertThat(NumberForm.POINT_COMMA.of("–")).isEqualTo("–");
    }

    @ParameterizedTest
    @ValueSource(strings = {"+1.5", "in 1.234", "out 2\u202f500.5", "32.5", "1.5\u202fkm", "0.12 m³/d", "1.5·10⁻⁹"})
    void labelsThatSayANumberAreChanged(String label) {
        assertThat(NumberForm.SPACE_COMMA.label(label)).isEqualTo(label.replace('.', ','));
    }

    @ParameterizedTest
    @ValueSource(strings = {"zone 2.1", "well field", "outside", "W-1.5", "2.1 north field", "rev. 1.2.3", "p.5"})
    void namesAreNot(String name) {
        assertThat(NumberForm.SPACE_COMMA.label(name)).isEqualTo(name);
    }

    @Test
    void whatIsTypedMayHaveACommaOrATrueMinus() {
        assertThat(NumberForm.plain(" −1,5 ")).isEqualTo("-1.5");
    }
}
