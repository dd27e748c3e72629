package org.seepledger.desktop.map;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.stream.DoubleStream;
import org.seepledger.desktop.session.Session;
import org.seepledger.picture.Ink;
import org.seepledger.picture.Mark;
import org.seepledger.picture.SectionLine;
import org.seepledger.sketch.Place;

/** The line of the section on the map: from A to A′, a head where it leads, and the place on it that is pointed at. */
final class SectionTrace {

    /** How near the line the cursor points to a place on it. */
    private static final double REACH = 12;

    private static final double HEAD = 12;
    private static final double DOT = 5;

    private SectionTrace() {}

    static List<Mark> of(Session session, Camera camera) {
        List<Mark> marks = new ArrayList<>();
        session.sectionLine().get().ifPresent(line -> {
            draw(line, camera, marks);
            session.along().get().ifPresent(along -> marks.add(dot(line.at(along), camera)));
        });
        return marks;
    }

    /** How far along the line the cursor points to, in plan units; nothing while it is far from it. */
    static OptionalDouble along(Optional<SectionLine> line, Camera camera, double x, double y) {
        if (line.isEmpty()) {
            return OptionalDouble.empty();
        }
        Place pointer = new Place(camera.mapX(x), camera.mapY(y));
        double along = line.get().nearest(pointer);
        boolean near = line.get().at(along).distance(pointer) * camera.scale() <= REACH;
        return near ? OptionalDouble.of(along) : OptionalDouble.empty();
    }

    private static void draw(SectionLine line, Camera camera, List<Mark> marks) {
        double[] xy = line.places().stream()
                .flatMapToDouble(place -> DoubleStream.of(camera.x(place.x()), camera.y(place.y())))
                .toArray();
        marks.add(new Mark.Line(xy, Mark.Stroke.of(Ink.Token.PAPER, 5)));
        marks.add(new Mark.Line(xy, Mark.Stroke.of(Ink.Token.ACCENT, 2).dashed(12.0, 4.0, 3.0, 4.0)));
        int last = xy.length - 2;
        double alongX = xy[last] - xy[last - 2];
        double alongY = xy[last + 1] - xy[last - 1];
        double length = Math.max(1e-9, Math.hypot(alongX, alongY));
        marks.add(head(xy[last], xy[last + 1], alongX / length, alongY / length));
        name(xy[0], xy[1], xy[0] - xy[2], xy[1] - xy[3], "A", marks);
        name(xy[last], xy[last + 1], alongX, alongY, "A′", marks);
    }

    private static Mark head(double x, double y, double alongX, double alongY) {
        double[] ring = {
            x,
            y,
            x - HEAD * alongX - HEAD / 2 * alongY,
            y - HEAD * alongY + HEAD / 2 * alongX,
            x - HEAD * alongX + HEAD / 2 * alongY,
            y - HEAD * alongY - HEAD / 2 * alongX
        };
        return new Mark.Area(
                List.of(ring),
                Optional.of(Mark.Fill.of(Ink.Token.ACCENT)),
                Optional.of(Mark.Stroke.of(Ink.Token.PAPER, 1.4)));
    }

    /** An end is named beyond it. */
    private static void name(double x, double y, double outX, double outY, String words, List<Mark> marks) {
        double length = Math.max(1e-9, Math.hypot(outX, outY));
        double nameX = x + 15 * outX / length;
        double nameY = y + 15 * outY / length + 5;
        marks.add(new Mark.Text(nameX, nameY, words, 14, Mark.Anchor.MIDDLE, Ink.Token.ACCENT, true, true, 0));
    }

    private static Mark dot(Place place, Camera camera) {
        double[] ring = new double[32];
        for (int i = 0; i < 16; i++) {
            ring[2 * i] = camera.x(place.x()) + DOT * Math.cos(Math.PI * i / 8);
            ring[2 * i + 1] = camera.y(place.y()) + DOT * Math.sin(Math.PI * i / 8);
        }
        return new Mark.Area(
                List.of(ring),
                Optional.of(Mark.Fill.of(Ink.Token.ACCENT)),
                Optional.of(Mark.Stroke.of(Ink.Token.PAPER, 2)));
    }
}
