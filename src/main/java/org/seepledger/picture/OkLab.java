package org.seepledger.picture;

/**
 * The colour space OKLab (Ottosson 2020), in which equal distances look about equal.
 *
 * <p>Its two matrices, and the transfer function of sRGB (IEC 61966-2-1:1999), are as published.
 */
final class OkLab {

    private OkLab() {}

    /**
     * {@return the nearest sRGB colour, eight bits each}
     *
     * @param lab lightness from 0 to 1, green–red, blue–yellow
     */
    static int rgb(double[] lab) {
        double l = cube(lab[0] + 0.3963377774 * lab[1] + 0.2158037573 * lab[2]);
        double m = cube(lab[0] - 0.1055613458 * lab[1] - 0.0638541728 * lab[2]);
        double s = cube(lab[0] - 0.0894841775 * lab[1] - 1.2914855480 * lab[2]);
        return channel(4.0767416621 * l - 3.3077115913 * m + 0.2309699292 * s) << 16
                | channel(-1.2684380046 * l + 2.6097574011 * m - 0.3413193965 * s) << 8
                | channel(-0.0041960863 * l - 0.7034186147 * m + 1.7076147010 * s);
    }

    /**
     * {@return lightness, green–red and blue–yellow of an sRGB colour}
     *
     * @param rgb red, green and blue, eight bits each
     */
    static double[] lab(int rgb) {
        double r = linear(rgb >> 16 & 255);
        double g = linear(rgb >> 8 & 255);
        double b = linear(rgb & 255);
        double l = Math.cbrt(0.4122214708 * r + 0.5363325363 * g + 0.0514459929 * b);
        double m = Math.cbrt(0.2119034982 * r + 0.6806995451 * g + 0.1073969566 * b);
        double s = Math.cbrt(0.0883024619 * r + 0.2817188376 * g + 0.6299787005 * b);
        return new double[] {
            0.2104542553 * l + 0.7936177850 * m - 0.0040720468 * s,
            1.9779984951 * l - 2.4285922050 * m + 0.4505937099 * s,
            0.0259040371 * l + 0.7827717662 * m - 0.8086757660 * s
        };
    }

    private static double cube(double value) {
        return value * value * value;
    }

    private static int channel(double linear) {
        double encoded = linear <= 0.0031308 ? 12.92 * linear : 1.055 * Math.pow(linear, 1 / 2.4) - 0.055;
        return (int) Math.round(255 * Math.max(0, Math.min(1, encoded)));
    }

    /** A channel without the transfer function, from 0 to 1. */
    static double linear(int channel) {
        double encoded = channel / 255.0;
        return encoded <= 0.04045 ? encoded / 12.92 : Math.pow((encoded + 0.055) / 1.055, 2.4);
    }
}
