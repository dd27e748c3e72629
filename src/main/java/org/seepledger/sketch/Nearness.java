package org.seepledger.sketch;

/**
 * How near the pointer must be to something to mean it, in plan units.
 *
 * @param vertex for a vertex to be hit
 * @param edge for a side to be hit
 * @param capture for a snap to take hold
 * @param release for a snap to hold on; not less than what it takes
 * @param drag how far a press must move to be a drag
 */
public record Nearness(double vertex, double edge, double capture, double release, double drag) {

    /** Refuses a hold that lets go before it takes. */
    public Nearness {
        if (!(vertex >= 0 && edge >= 0 && capture >= 0 && release >= capture && drag >= 0)) {
            throw new IllegalArgumentException("distances are not negative, and release is not below capture");
        }
    }

    /**
     * {@return the distances that the window goes by: 7 pixels for a vertex, 5 for a side, 8 to capture, 12 to release,
     * 3 to drag}
     *
     * @param pixel the size of a logical pixel on the map, in plan units
     */
    public static Nearness ofPixel(double pixel) {
        return new Nearness(7 * pixel, 5 * pixel, 8 * pixel, 12 * pixel, 3 * pixel);
    }

    /**
     * {@return whether a press that has moved is a drag}
     *
     * @param pressed where it began
     * @param now where it is
     */
    public boolean isDrag(Place pressed, Place now) {
        return pressed.distance(now) > drag;
    }
}
