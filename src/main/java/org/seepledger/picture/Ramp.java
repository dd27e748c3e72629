package org.seepledger.picture;

/**
 * Colours for values from 0 to 1.
 *
 * <p>Stops are given in OKLab (Ottosson 2020, "A perceptual color space for image processing") and joined by straight
 * lines in it, so that equal steps look equal; lightness falls all along a sequential ramp, and from the middle to both ends
 * of a diverging one, so that order is seen without hue, in print and by colour-blind eyes.
 */
public enum Ramp {

    /** From pale sand over moss to deep slate blue: heads, thicknesses, rates. */
    DEPTH(new double[][] {
        {0.955, 0.000, 0.045},
        {0.83, -0.035, 0.075},
        {0.68, -0.070, 0.040},
        {0.53, -0.055, -0.030},
        {0.38, -0.015, -0.085},
        {0.24, 0.015, -0.075}
    }),
    /** From near white over rose to deep plum: concentrations. */
    STAIN(new double[][] {
        {0.975, 0.005, 0.012},
        {0.84, 0.065, 0.045},
        {0.69, 0.125, 0.035},
        {0.53, 0.140, -0.015},
        {0.38, 0.105, -0.050},
        {0.25, 0.065, -0.055}
    }),
    /** From deep violet over near white to deep ochre: what may have either sign. */
    SWING(new double[][] {
        {0.36, 0.060, -0.120},
        {0.58, 0.045, -0.095},
        {0.79, 0.020, -0.045},
        {0.965, 0.000, 0.002},
        {0.79, 0.022, 0.075},
        {0.58, 0.050, 0.100},
        {0.36, 0.050, 0.070}
    });

    private static final int SIZE = 256;

    private final double[][] stops;
    private final int[] table = new int[SIZE];

    Ramp(double[][] stops) {
        this.stops = stops;
        for (int i = 0; i < SIZE; i++) {
            table[i] = OkLab.rgb(at(i / (SIZE - 1.0)));
        }
    }

    /**
     * {@return the colour of a value}
     *
     * @param value from 0 to 1; beyond it, the nearer end
     */
    public Ink.Rgb ink(double value) {
        return new Ink.Rgb(rgb(value));
    }

    /**
     * {@return the colour of a value, as red, green and blue, eight bits each}
     *
     * @param value from 0 to 1; beyond it, the nearer end
     */
    public int rgb(double value) {
        return table[(int) Math.round(Math.max(0, Math.min(1, value)) * (SIZE - 1))];
    }

    private double[] at(double value) {
        double place = value * (stops.length - 1);
        int below = Math.min((int) place, stops.length - 2);
        double part = place - below;
        double[] colour = new double[3];
        for (int i = 0; i < colour.length; i++) {
            colour[i] = stops[below][i] + part * (stops[below + 1][i] - stops[below][i]);
        }
        return colour;
    }
}
