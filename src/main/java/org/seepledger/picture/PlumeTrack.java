package org.seepledger.picture;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import org.seepledger.picture.Mark.Fill;
import org.seepledger.picture.Mark.Stroke;

/**
 * The way of a plume's centre of mass: a line with a dot for each instant, hollow at the first and large at the last, and
 * about the last an ellipse as wide as one standard deviation along each principal axis.
 *
 * @param stops the centre at each instant; instants without mass are left out
 */
public record PlumeTrack(List<Stop> stops) {

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

    /** Leaves out the stops that have no place. */
    public PlumeTrack {
        stops = stops.stream()
                .filter(stop -> Double.isFinite(stop.mapX() + stop.mapY()))
                .toList();
    }

    /**
     * {@return the track as marks, the lowermost first}
     *
     * @param frame where map coordinates come to
     * @param labels where the names of the last, the first and then the other instants find room
     */
    public List<Mark> marks(MapFrame frame, Labels labels) {
        List<Mark> marks = new ArrayList<>();
        if (stops.isEmpty()) {
            return marks;
        }
        spread(frame, marks);
        double[] way = way(frame);
        if (stops.size() > 1) {
            marks.add(new Mark.Line(way, Stroke.of(Ink.Token.PAPER, RIM)));
            marks.add(new Mark.Line(way, stroke()));
        }
        int last = stops.size() - 1;
        for (int stop = 0; stop <= last; stop++) {
            marks.add(dot(way, stop, last));
        }
        labels.keepFree(new Box(way[2 * last] - END, way[2 * last + 1] - END, 2 * END, 2 * END));
        name(last, way, labels, marks);
        for (int stop = 0; stop < last; stop++) {
            name(stop, way, labels, marks);
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
        Stop last = stops.get(stops.size() - 1);
        if (last.along() > 0) {
            List<double[]> ring = List.of(frame.drawn(last.ellipse()));
            marks.add(new Mark.Area(ring, Optional.empty(), Optional.of(Stroke.of(Ink.Token.PAPER, 3))));
            marks.add(new Mark.Area(
                    ring,
                    Optional.empty(),
                    Optional.of(Stroke.of(Ink.Token.TEXT, 1.2).dashed(4.0, 3.0))));
        }
    }

    private static Mark dot(double[] way, int stop, int last) {
        double radius = stop == last ? END : stop == 0 ? END - 1 : DOT;
        boolean hollow = stop == 0 && last > 0;
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
