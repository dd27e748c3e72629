package org.seepledger.report;

import static org.assertj.core.api.Assertions.assertThat;

import org.junit.jupiter.api.Test;

class FiguresTest {

    @Test
    void fourDigitsAreShown() {
        assertThat(Figures.shown(1234.567)).isEqualTo("1 235");
        assertThat(Figures.shown(0.0123456)).isEqualTo("0.01235");
        assertThat(Figures.shown(-4.326e-12)).isEqualTo("-4.326e-12");
        assertThat(Figures.shown(Double.NaN)).isEqualTo("-");
    }

    /** A sum of terms of about 1000 is exact to 1e-9 at best. */
    @Test
    void roundingIsShownAsZero() {
        assertThat(Figures.shown(1.7e-18, 1e3)).isEqualTo("0");
        assertThat(Figures.shown(-9e-10, 1e3)).isEqualTo("0");
        assertThat(Figures.shown(-2e-9, 1e3)).isEqualTo("-2.000e-09");
        assertThat(Figures.shown(1.7e-18, 1e-17)).isEqualTo("1.700e-18");
        assertThat(Figures.shown(1.7e-18, 0)).isEqualTo("1.700e-18");
        assertThat(Figures.shown(Double.NaN, 1)).isEqualTo("-");
    }

    @Test
    void percentagesSmallerThanTheirDecimalsAreShownInPowersOfTen() {
        assertThat(Figures.percent(12.345)).isEqualTo("12.35 %");
        assertThat(Figures.percent(0.0012)).isEqualTo("1e-03 %");
        assertThat(Figures.percent(-3e-9)).isEqualTo("-3e-09 %");
        assertThat(Figures.percent(-3e-13)).isEqualTo("0.00 %");
        assertThat(Figures.percent(Double.NaN)).isEqualTo("-");
    }
}
