package org.seepledger.desktop.map;

import java.util.Arrays;

/** What of the map can be seen at all, so that nothing else is painted. */
final class OnScreen {

    /** Letters begin this far outside, in logical pixels. */
    private static final double BESIDE = 300;

    /** Places nearer than this look like one, in logical pixels. */
    private static final double SAME = 1.6;

    private OnScreen() {}

    /** Whether a place on the screen is seen, or near enough for something that begins there to be. */
    static boolean isNear(double x, double y, Camera camera) {
        return x > -BESIDE && y > -BESIDE && x < camera.width() + BESIDE && y < camera.height() + BESIDE;
    }

    /** A line on the screen, without the places that look like the one before; nothing if it is not seen. */
    static double[] thinned(double[] line, Camera camera) {
        double[] xy = new double[line.length];
        int count = 0;
        boolean seen = false;
        for (int i = 0; i < line.length; i += 2) {
            double x = camera.x(line[i]);
            double y = camera.y(line[i + 1]);
            boolean last = i + 2 >= line.length;
            if (count == 0 || last || Math.abs(x - xy[count - 2]) + Math.abs(y - xy[count - 1]) > SAME) {
                xy[count++] = x;
                xy[count++] = y;
                seen |= isNear(x, y, camera);
            }
        }
        return seen ? Arrays.copyOf(xy, count) : new double[0];
    }
}
