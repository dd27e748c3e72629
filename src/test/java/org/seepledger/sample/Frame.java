package org.seepledger.sample;

/**
 * Where a turned grid lies on the map: its corner, and how far it is turned counter-clockwise about it.
 *
 * @param x map x of the corner, m
 * @param y map y of the corner, m
 * @param degrees the rotation
 */
record Frame(double x, double y, double degrees) {

    /** Map x of a place that is given along the grid, from the corner. */
    double mapX(double alongX, double alongY) {
        return x + alongX * StrictMath.cos(radians()) - alongY * StrictMath.sin(radians());
    }

    /** Map y of a place that is given along the grid, from the corner. */
    double mapY(double alongX, double alongY) {
        return y + alongX * StrictMath.sin(radians()) + alongY * StrictMath.cos(radians());
    }

    private double radians() {
        return degrees * (Math.PI / 180);
    }
}
