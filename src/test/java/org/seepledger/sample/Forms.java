package org.seepledger.sample;

import static java.lang.StrictMath.cos;
import static java.lang.StrictMath.exp;
import static java.lang.StrictMath.sin;

/** Forms in plan that invented ground is put together from; all lengths in metres. */
final class Forms {

    private Forms() {}

    /** {@return a smooth unevenness between −1.5 and 1.5, some tens to hundreds of metres from crest to crest} */
    static double waves(double x, double y, double shift) {
        return 0.6 * sin((x + 0.4 * y) / 145 + shift)
                + 0.5 * cos((y - 0.3 * x) / 102 + 1 + shift)
                + 0.4 * sin(x / 53 + shift) * sin(y / 46);
    }

    /** {@return a bell that is 1 at its centre and 1/e at its half-axes} */
    static double bump(double x, double y, double centreX, double centreY, double alongX, double alongY) {
        double dx = (x - centreX) / alongX;
        double dy = (y - centreY) / alongY;
        return exp(-dx * dx - dy * dy);
    }

    /** {@return whether a place lies within an ellipse} */
    static boolean isInside(double x, double y, double centreX, double centreY, double alongX, double alongY) {
        double dx = (x - centreX) / alongX;
        double dy = (y - centreY) / alongY;
        return dx * dx + dy * dy < 1;
    }
}
