package org.seepledger.picture;

import static org.assertj.core.api.Assertions.assertThat;

import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.EnumSource;

/** Ramps are even to the eye, and their order is seen by those who miss a kind of cone. */
class RampTest {

    private static final int STEPS = 16;

    /**
     * Red, green and blue as a dichromat sees them, in linear light: Viénot, Brettel and Mollon 1999, "Digital video
     * colourmaps for checking the legibility of displays by dichromats", written from memory.
     */
    private static final double[][] DEUTERANOPE = {{0.29275, 0.70725, 0}, {0.29275, 0.70725, 0}, {-0.02234, 0.02234, 1}
    };

    private static final double[][] PROTANOPE = {{0.11238, 0.88762, 0}, {0.11238, 0.88762, 0}, {0.00401, -0.00401, 1}};

    private static double lightness(Ramp ramp, double value) {
        return OkLab.lab(ramp.rgb(value))[0];
    }

    private static double distance(double[] one, double[] other) {
        return Math.hypot(Math.hypot(one[0] - other[0], one[1] - other[1]), one[2] - other[2]);
    }

    private static double[] seen(int rgb, double[][] cones) {
        double[] linear = {OkLab.linear(rgb >> 16 & 255), OkLab.linear(rgb >> 8 & 255), OkLab.linear(rgb & 255)};
        int seen = 0;
        for (double[] row : cones) {
            double light = row[0] * linear[0] + row[1] * linear[1] + row[2] * linear[2];
            double encoded = light <= 0.0031308 ? 12.92 * light : 1.055 * Math.pow(light, 1 / 2.4) - 0.055;
            seen = seen << 8 | (int) Math.round(255 * Math.max(0, Math.min(1, encoded)));
        }
        return OkLab.lab(seen);
    }

    @ParameterizedTest
    @EnumSource(Ramp.class)
    void neighbouringStepsLookAboutEquallyFarApart(Ramp ramp) {
        double least = Double.POSITIVE_INFINITY;
        double greatest = 0;
        for (int i = 0; i < STEPS; i++) {
            double[] here = OkLab.lab(ramp.rgb((double) i / STEPS));
            double[] next = OkLab.lab(ramp.rgb((i + 1.0) / STEPS));
            least = Math.min(least, distance(here, next));
            greatest = Math.max(greatest, distance(here, next));
        }
        assertThat(greatest / least).isLessThan(2);
    }

    @ParameterizedTest
    @EnumSource(names = {"DEPTH", "STAIN"})
    void aSequentialRampGetsDarkerByEvenSteps(Ramp ramp) {
        double mean = (lightness(ramp, 0) - lightness(ramp, 1)) / STEPS;
        for (int i = 0; i < STEPS; i++) {
            double step = lightness(ramp, (double) i / STEPS) - lightness(ramp, (i + 1.0) / STEPS);
            assertThat(step).isBetween(0.5 * mean, 1.5 * mean);
        }
    }

    @Test
    void aRampThatSwingsIsLightInTheMiddleAndAsDarkAtBothEnds() {
        assertThat(lightness(Ramp.SWING, 0.5)).isGreaterThan(0.95);
        for (int i = 0; i < STEPS / 2; i++) {
            double value = (double) i / STEPS;
            double next = (i + 1.0) / STEPS;
            assertThat(lightness(Ramp.SWING, next)).isGreaterThan(lightness(Ramp.SWING, value));
            assertThat(lightness(Ramp.SWING, 1 - value))
                    .isBetween(lightness(Ramp.SWING, value) - 0.03, lightness(Ramp.SWING, value) + 0.03);
        }
    }

    @Test
    void gainAndLossStayApartForThoseWhoMissAKindOfCone() {
        for (Palette palette : Palette.values()) {
            for (double[][] cones : new double[][][] {DEUTERANOPE, PROTANOPE}) {
                double[] gain = seen(palette.colour(Ink.Token.GAIN).value(), cones);
                double[] loss = seen(palette.colour(Ink.Token.LOSS).value(), cones);
                assertThat(distance(gain, loss)).isGreaterThan(0.15);
            }
        }
        for (double[][] cones : new double[][][] {DEUTERANOPE, PROTANOPE}) {
            assertThat(distance(seen(Ramp.SWING.rgb(0.1), cones), seen(Ramp.SWING.rgb(0.9), cones)))
                    .isGreaterThan(0.15);
        }
    }

    @ParameterizedTest
    @EnumSource(Palette.class)
    void inksStandOutFromThePaper(Palette palette) {
        for (Ink.Token token : Ink.Token.values()) {
            double least = switch (token) {
                case PAPER, GUIDE -> 1;
                case TEXT, MUTED -> 4.5;
                default -> 3;
            };
            assertThat(contrast(palette.colour(token), palette.colour(Ink.Token.PAPER)))
                    .as(token.name())
                    .isGreaterThanOrEqualTo(least);
        }
    }

    /** Contrast as WCAG 2.1 (W3C 2018) defines it. */
    private static double contrast(Ink.Rgb one, Ink.Rgb other) {
        double a = luminance(one.value());
        double b = luminance(other.value());
        return (Math.max(a, b) + 0.05) / (Math.min(a, b) + 0.05);
    }

    private static double luminance(int rgb) {
        return 0.2126 * OkLab.linear(rgb >> 16 & 255)
                + 0.7152 * OkLab.linear(rgb >> 8 & 255)
                + 0.0722 * OkLab.linear(rgb & 255);
    }
}
