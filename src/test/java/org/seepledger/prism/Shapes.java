package org.seepledger.prism;

/** Outlines for tests, counter-clockwise, as x and y by turns. */
public final class Shapes {

    private Shapes() {}

    /** Sides 1 to 4: south, east, north, west. */
    public static double[] box(double west, double south, double east, double north) {
        return new double[] {west, south, east, south, east, north, west, north};
    }

    /** A regular polygon about a centre. */
    public static double[] round(double x, double y, double radius, int corners) {
        double[] outline = new double[2 * corners];
        for (int i = 0; i < corners; i++) {
            double angle = 2 * Math.PI * i / corners;
            outline[2 * i] = x + radius * Math.cos(angle);
            outline[2 * i + 1] = y + radius * Math.sin(angle);
        }
        return outline;
    }

    /** An outline turned counter-clockwise about a place. */
    public static double[] turned(double[] outline, double degrees, double x, double y) {
        double cosine = Math.cos(Math.toRadians(degrees));
        double sine = Math.sin(Math.toRadians(degrees));
        double[] turned = new double[outline.length];
        for (int i = 0; i < outline.length; i += 2) {
            double dx = outline[i] - x;
            double dy = outline[i + 1] - y;
            turned[i] = x + dx * cosine - dy * sine;
            turned[i + 1] = y + dx * sine + dy * cosine;
        }
        return turned;
    }

    /** The same outline the other way round: of an outer ring an island. */
    public static double[] reversed(double[] outline) {
        double[] reversed = new double[outline.length];
        for (int i = 0; i < outline.length; i += 2) {
            reversed[i] = outline[outline.length - 2 - i];
            reversed[i + 1] = outline[outline.length - 1 - i];
        }
        return reversed;
    }
}
