package org.seepledger.io.table;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;

import java.math.BigDecimal;
import net.jqwik.api.ForAll;
import net.jqwik.api.Property;
import net.jqwik.api.constraints.IntRange;
import net.jqwik.api.constraints.LongRange;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.ValueSource;

class CsvTextTest {

    @ParameterizedTest
    @ValueSource(strings = {"=1+1", "+a", "-a", "@a", "\ta", "\ra"})
    void putsAnApostropheBeforeWhatASpreadsheetWouldRun(String text) {
        assertThat(CsvText.text(text)).isEqualTo("'" + text);
    }

    @ParameterizedTest
    @ValueSource(strings = {"", "Field 7", "a=b", "1", "é", " =a"})
    void leavesOtherTextAlone(String text) {
        assertThat(CsvText.text(text)).isEqualTo(text);
    }

    @Test
    void writesNothingForWhatIsMissing() {
        assertThat(CsvText.number(Double.NaN)).isEmpty();
        assertThat(CsvText.text(null)).isEmpty();
    }

    @ParameterizedTest
    @CsvSource({
        "0, 0.0",
        "-0.0, 0.0",
        "12, 12.0",
        "-1200, -1200.0",
        "0.1, 0.1",
        "500025.5, 500025.5",
        "1e-3, 0.001",
        "1.5e-9, 1.5E-9",
        "1e23, 1E+23",
        "2e-323, 2E-323",
        "4.9e-324, 5E-324",
        "9007199254740993, 9007199254740992.0",
        "1.7976931348623157e308, 1.7976931348623157E+308"
    })
    void writesTheShortestNumber(double value, String text) {
        assertThat(CsvText.number(value)).isEqualTo(text);
    }

    @Test
    void refusesTheInfinite() {
        assertThatThrownBy(() -> CsvText.number(Double.NEGATIVE_INFINITY)).isInstanceOf(IllegalArgumentException.class);
    }

    @Property(tries = 2000)
    void anyDoubleReadsBack(@ForAll long bits) {
        double value = Double.longBitsToDouble(bits);
        if (Double.isFinite(value)) {
            assertThat(Double.parseDouble(CsvText.number(value))).isEqualTo(value);
        }
    }

    /** A decimal number of up to 15 digits comes back as it was (IEEE 754: DBL_DIG is 15). */
    @Property(tries = 1000)
    void shortDecimalsStayShort(
            @ForAll @LongRange(min = -999_999_999_999_999L, max = 999_999_999_999_999L) long digits,
            @ForAll @IntRange(min = -20, max = 20) int exponent) {
        BigDecimal decimal = BigDecimal.valueOf(digits, exponent);
        String text = CsvText.number(decimal.doubleValue());
        assertThat(new BigDecimal(text)).isEqualByComparingTo(decimal);
        assertThat(new BigDecimal(text).stripTrailingZeros().precision())
                .isEqualTo(decimal.stripTrailingZeros().precision());
    }
}
