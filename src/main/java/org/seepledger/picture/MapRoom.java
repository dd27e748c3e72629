package org.seepledger.picture;

import java.util.DoubleSummaryStatistics;
import java.util.function.ToDoubleFunction;
import org.seepledger.prism.Prism;
import org.seepledger.prism.Side;

/** How much room a map gets in a picture, and which part of the plan it shows there. */
public final class MapRoom {

    /** What stays free on the right, in logical pixels. */
    static final double RIGHT = 8;

    private static final double TOP = 6;
    private static final double LOWEST = 260;
    private static final double HIGHEST = 460;
    private static final double AROUND = 0.2;

    private MapRoom() {}

    /**
     * {@return where map coordinates come to in the maps of a prism}
     *
     * @param subject the prism
     * @param width of the map, in logical pixels
     */
    public static MapFrame of(Prism subject, double width) {
        DoubleSummaryStatistics x = coordinates(subject, Side::x);
        DoubleSummaryStatistics y = coordinates(subject, Side::y);
        double across = x.getMax() - x.getMin();
        double up = y.getMax() - y.getMin();
        double margin = AROUND * Math.max(across, up);
        double room = width - MapSheet.MARGIN - RIGHT;
        double height = Math.max(LOWEST, Math.min(HIGHEST, room * (up + 2 * margin) / (across + 2 * margin)));
        return MapFrame.fitting(
                new Box(MapSheet.MARGIN, TOP, room, height),
                x.getMin() - margin,
                y.getMin() - margin,
                x.getMax() + margin,
                y.getMax() + margin);
    }

    /**
     * {@return where map coordinates come to in a map of what a view shows}
     *
     * @param west the least map x that is seen
     * @param south the least map y
     * @param east the greatest map x
     * @param north the greatest map y
     * @param width of the map, in logical pixels
     */
    public static MapFrame of(double west, double south, double east, double north, double width) {
        double room = width - MapSheet.MARGIN - RIGHT;
        double height = Math.max(LOWEST, Math.min(HIGHEST, room * (north - south) / (east - west)));
        return MapFrame.fitting(new Box(MapSheet.MARGIN, TOP, room, height), west, south, east, north);
    }

    private static DoubleSummaryStatistics coordinates(Prism prism, ToDoubleFunction<Side> coordinate) {
        return prism.rings().stream()
                .flatMap(ring -> ring.sides().stream())
                .mapToDouble(coordinate)
                .summaryStatistics();
    }
}
