package org.seepledger.unit;

import static org.assertj.core.api.Assertions.assertThat;

import org.junit.jupiter.api.Test;

class FiguresTest {

    @Test
    void haveFourSignificantDigits() {
        assertThat(Figures.shown(1234567.8)).isEqualTo("1 235 000");
        assertThat(Figures.shown(-0.00123456)).isEqualTo("-0.001235");
        assertThat(Figures.shown(999.96)).isEqualTo("1 000");
        assertThat(Figures.shown(1.23456e-7)).isEqualTo("1.235e-07");
        assertThat(Figures.shown(-0.0)).isEqualTo("0");
    }

    @Test
    void whatIsNotKnownIsADashNeverZero() {
        assertThat(Figures.shown(Double.NaN)).isEqualTo("-");
        assertThat(Figures.percent(Double.NaN)).isEqualTo("-");
        assertThat(Figures.typeset(Double.NaN)).isEqualTo("–");
    }

    /** A sum of terms of about 1000 is exact to 1e-9 at best. */
    @Test
    void roundingIsTakenAway() {
        assertThat(Figures.withoutRounding(1.7e-18, 1e3)).isZero();
        assertThat(Figures.withoutRounding(-9e-10, 1e3)).isZero();
        assertThat(Figures.withoutRounding(-2e-9, 1e3)).isEqualTo(-2e-9);
        assertThat(Figures.withoutRounding(1.7e-18, 1e-17)).isEqualTo(1.7e-18);
        assertThat(Figures.withoutRounding(1.7e-18, 0)).isEqualTo(1.7e-18);
        assertThat(Figures.withoutRounding(Double.NaN, 1)).isNaN();
    }

    @Test
    void onPageAndWindowHaveATrueMinusAndDoNotBreak() {
        assertThat(Figures.typeset(-12345.6)).isEqualTo("−12\u202f350");
    }

    @Test
    void onPageAndWindowRaisePowersOfTen() {
        assertThat(Figures.typeset(-1.23456e-7)).isEqualTo("−1.235·10⁻⁷");
        assertThat(Figures.typeset(1.5e15)).isEqualTo("1.500·10¹⁵");
        assertThat(Figures.typesetPercent(-3e-13)).isEqualTo("−3·10⁻¹³\u202f%");
        assertThat(Figures.typesetPercent(20.318)).isEqualTo("20.32\u202f%");
        assertThat(Figures.typesetPercent(Double.NaN)).isEqualTo("–");
    }
}
