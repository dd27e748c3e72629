package org.seepledger.picture;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import org.seepledger.picture.Mark.Fill;
import org.seepledger.picture.Mark.Stroke;
import org.seepledger.plume.Course;

/**
 * The way of a plume's centre of mass: a line with a dot for each instant, hollow at the first and large at the one looked at,
 * and about that an ellipse as wide as one standard deviation along each principal axis.
 *
 * @param stops the centre at each instant that has a place
 * @param current which of them is looked at; -1 for none
 */
public record PlumeTrack(List<Stop> stops, int current) {

    private static final double SMALL = 10;
    private static final double DOT = 2.2;
    private static final double END = 4;
    private static final double RIM = 4;
    private static final int CORNERS = 48;

    /**
     * The centre of mass at an instant.
     *
     * @param mapX its map x
     * @param mapY its map y
     * @param along standard deviation along the longer principal axis, in plan units
     * @param across standard deviation along the shorter one
     * @param direction of the longer axis, degrees counter-clockwise from map x
     * @param name the instant; empty for none
     */
    public record Stop(double mapX, double mapY, double along, double across, double direction, String name) {

        /**
         * {@return a plume's centre as a stop}
         *
         * @param at the plume at an instant
         * @param planUnit how many length units a plan unit has
         * @param name the instant; empty for none
         */
        public static Stop of(Course.Place at, double planUnit, String name) {
            return new Stop(at.x(), at.y(), at.along() / planUnit, at.across() / planUnit, at.direction(), name);
        }

        /** {@return map x and y in turn of an ellipse as wide as one standard deviation, without its first place again} */
        public double[] ellipse() {
            double[] ring = new double[2 * CORNERS];
            double turned = Math.toRadians(direction);
            for (int i = 0; i < CORNERS; i++) {
                double u = along * Math.cos(2 * Math.PI * i / CORNERS);
                double v = across * Math.sin(2 * Math.PI * i / CORNERS);
                ring[2 * i] = mapX + u * Math.cos(turned) - v * Math.sin(turned);
                ring[2 * i + 1] = mapY + u * Math.sin(turned) + v * Math.cos(turned);
            }
            return ring;
        }
    }

    /** Copies the list. */
    public PlumeTrack {
        stops = List.copyOf(stops);
    }

    /**
     * Looks at the last instant.
     *
     * @param stops the centre at each instant; instants without mass are left out
     */
    public PlumeTrack(List<Stop> stops) {
        this(placed(stops), placed(stops).size() - 1);
    }

    /**
     * {@return the track, looked at at an instant}
     *
     * @param stops the centre at each instant; instants without mass are left out
     * @param instant the instant, from 0
     */
    public static PlumeTrack at(List<Stop> stops, int instant) {
        List<Stop> placed = placed(stops);
        return new PlumeTrack(placed, placed.indexOf(stops.get(instant)));
    }

    private static List<Stop> placed(List<Stop> stops) {
        return stops.stream()
                .filter(stop -> Double.isFinite(stop.mapX() + stop.mapY()))
                .toList();
    }

    /**
     * {@return the track as marks, the lowermost first}
     *
     * @param frame where map coordinates come to
     * @param labels where the names of the instant looked at, the first and then the others find room
     */
    public List<Mark> marks(MapFrame frame, Labels labels) {
        List<Mark> marks = new ArrayList<>();
        if (stops.isEmpty()) {
            return marks;
        }
        if (current >= 0) {
            spread(frame, marks);
        }
        double[] way = way(frame);
        if (stops.size() > 1) {
            marks.add(new Mark.Line(way, Stroke.of(Ink.Token.PAPER, RIM)));
            marks.add(new Mark.Line(way, stroke()));
        }
        for (int stop = 0; stop < stops.size(); stop++) {
            marks.add(dot(way, stop));
        }
        if (current >= 0) {
            labels.keepFree(new Box(way[2 * current] - END, way[2 * current + 1] - END, 2 * END, 2 * END));
            name(current, way, labels, marks);
        }
        for (int stop = 0; stop < stops.size(); stop++) {
            if (stop != current) {
                name(stop, way, labels, marks);
            }
        }
        return marks;
    }

    /** {@return how the track is drawn, for a key} */
    public static Stroke stroke() {
        return Stroke.of(Ink.Token.TEXT, 1.6);
    }

    private double[] way(MapFrame frame) {
        double[] map = new double[2 * stops.size()];
        for (int i = 0; i < stops.size(); i++) {
            map[2 * i] = stops.get(i).mapX();
            map[2 * i + 1] = stops.get(i).mapY();
        }
        return frame.drawn(map);
    }

    private void spread(MapFrame frame, List<Mark> marks) {
        Stop seen = stops.get(current);
        if (seen.along() > 0) {
            List<double[]> ring = List.of(frame.drawn(seen.ellipse()));
            marks.add(new Mark.Area(ring, Optional.empty(), Optional.of(Stroke.of(Ink.Token.PAPER, 3))));
            marks.add(new Mark.Area(
                    ring,
                    Optional.empty(),
                    Optional.of(Stroke.of(Ink.Token.TEXT, 1.2).dashed(4.0, 3.0))));
        }
    }

    private Mark dot(double[] way, int stop) {
        double radius = stop == current ? END : stop == 0 ? END - 1 : DOT;
        boolean hollow = stop == 0 && stops.size() > 1;
        return new Mark.Area(
                List.of(MapSheet.round(way[2 * stop], way[2 * stop + 1], radius)),
                Optional.of(Fill.of(hollow ? Ink.Token.PAPER : Ink.Token.TEXT)),
                Optional.of(Stroke.of(hollow ? Ink.Token.TEXT : Ink.Token.PAPER, hollow ? 1.4 : 0.8)));
    }

    private void name(int stop, double[] way, Labels labels, List<Mark> marks) {
        String words = stops.get(stop).name();
        if (!words.isEmpty()) {
            List<Mark.Text> choices = Labels.around(way[2 * stop], way[2 * stop + 1], END + 2, words, SMALL).stream()
                    .map(Mark.Text::haloed)
                    .toList();
            labels.place(choices, marks);
        }
    }
}
