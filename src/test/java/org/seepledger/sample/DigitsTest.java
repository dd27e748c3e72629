package org.seepledger.sample;

import static org.assertj.core.api.Assertions.assertThat;

import org.junit.jupiter.api.Test;

class DigitsTest {

    @Test
    void roundsTheExactValueHalfToEven() {
        assertThat(Digits.decimals(0.125, 2)).isEqualTo("0.12");
        assertThat(Digits.decimals(0.375, 2)).isEqualTo("0.38");
        // The double nearest 1.005 lies below it.
        assertThat(Digits.decimals(1.005, 2)).isEqualTo("1");
        assertThat(Digits.rounded(-2.346, 2)).isEqualTo(-2.35);
    }

    @Test
    void writesPlainNumbers() {
        assertThat(Digits.significant(-0.00001234567, 5)).isEqualTo("-0.000012346");
        assertThat(Digits.significant(123456, 3)).isEqualTo("123000");
        assertThat(Digits.significant(0, 5)).isEqualTo("0");
    }
}
