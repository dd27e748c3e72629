package org.seepledger.desktop.draw;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import org.seepledger.desktop.map.Camera;
import org.seepledger.picture.Ink;
import org.seepledger.picture.Mark;
import org.seepledger.sketch.ControlLine;
import org.seepledger.sketch.Crossings;
import org.seepledger.sketch.Hit;
import org.seepledger.sketch.LineHit;
import org.seepledger.sketch.Outline;
import org.seepledger.sketch.Place;
import org.seepledger.sketch.Shape;
import org.seepledger.sketch.Snap;

/** What is drawn over the map while one draws: vertices, the line in hand, what holds the pointer, crossings. */
final class DraftMarks {

    private static final Ink PAPER = Ink.Token.PAPER;
    private static final Ink ACCENT = Ink.Token.ACCENT;
    private static final double VERTEX = 4.2;

    /** Vertices nearer to each other than this would hide what they stand on. */
    private static final double ROOMY = 22;

    private static final double GLYPH = 7;
    private static final double NEAR = 14;
    private static final double LETTERS = 12;
    private static final int WIDEST = 42;

    private static final double ARROW = 14;

    private final Camera camera;
    private final List<Mark> marks = new ArrayList<>();

    DraftMarks(Camera camera) {
        this.camera = camera;
    }

    List<Mark> list() {
        return marks;
    }

    /** Why something was refused, where it was tried. */
    void refusal(String why, Place place) {
        double y = y(place) - NEAR;
        for (String line : lines(why)) {
            marks.add(Mark.Text.of(x(place) + NEAR, y, line, LETTERS, Mark.Anchor.START)
                    .in(Ink.Token.LOSS)
                    .haloed()
                    .strong());
            y += 1.3 * LETTERS;
        }
    }

    private static List<String> lines(String why) {
        List<String> lines = new ArrayList<>();
        StringBuilder line = new StringBuilder();
        for (String word : why.split(" ")) {
            if (line.length() + word.length() > WIDEST && !line.isEmpty()) {
                lines.add(line.toString().strip());
                line.setLength(0);
            }
            line.append(word).append(' ');
        }
        lines.add(line.toString().strip());
        return lines;
    }

    void shape(Shape shape, Pick pick) {
        for (Pick.SideAt side : pick.sides()) {
            if (side.ring().shape().equals(shape.name()) && shape.outlines().containsKey(side.ring())) {
                Place from = shape.outlines().get(side.ring()).place(side.side());
                Place to = shape.outlines().get(side.ring()).place(side.side() + 1);
                haloed(new double[] {x(from), y(from), x(to), y(to)}, ACCENT, 4);
            }
        }
        shape.outlines().forEach((ring, outline) -> {
            boolean roomy = sideLength(outline) >= ROOMY;
            for (int vertex = 0; vertex < outline.size(); vertex++) {
                boolean chosen = pick.vertex().equals(Optional.of(new Hit.Vertex(ring, vertex)));
                if (roomy || chosen) {
                    vertex(outline.place(vertex), chosen);
                }
            }
        });
        Crossings.of(shape).forEach(crossing -> cross(crossing.place()));
    }

    /** The mean length of a side on the screen. */
    private double sideLength(Outline outline) {
        double length = 0;
        for (int side = 0; side < outline.size(); side++) {
            length += outline.place(side).distance(outline.place(side + 1));
        }
        return length * camera.scale() / outline.size();
    }

    private void vertex(Place place, boolean chosen) {
        double radius = chosen ? VERTEX + 1.8 : VERTEX;
        marks.add(new Mark.Area(
                List.of(regular(x(place), y(place), radius, 16, 0)),
                Optional.of(Mark.Fill.of(chosen ? ACCENT : PAPER)),
                Optional.of(Mark.Stroke.of(chosen ? PAPER : Ink.Token.PRISM, 1.6))));
    }

    /** A crossing stands out by shape as well as colour. */
    private void cross(Place place) {
        double x = x(place);
        double y = y(place);
        haloed(regular(x, y, 9, 24, 0), ACCENT, 2, true);
        haloed(new double[] {x - 5, y - 5, x + 5, y + 5}, ACCENT, 2);
        haloed(new double[] {x - 5, y + 5, x + 5, y - 5}, ACCENT, 2);
    }

    void stroke(List<Place> places, Optional<Place> pointer, boolean closes) {
        List<Place> all = new ArrayList<>(places);
        if (!places.isEmpty()) {
            pointer.ifPresent(all::add);
        }
        double[] xy = new double[2 * all.size()];
        for (int i = 0; i < all.size(); i++) {
            xy[2 * i] = x(all.get(i));
            xy[2 * i + 1] = y(all.get(i));
        }
        if (closes && all.size() > 2) {
            Mark.Fill fill = new Mark.Fill(ACCENT, 0.14, Mark.Texture.PLAIN);
            marks.add(new Mark.Area(List.of(xy), Optional.of(fill), Optional.empty()));
            double[] closing = {xy[xy.length - 2], xy[xy.length - 1], xy[0], xy[1]};
            marks.add(new Mark.Line(closing, Mark.Stroke.of(ACCENT, 1.2).dashed(4.0, 4.0)));
        }
        if (all.size() > 1) {
            haloed(xy, ACCENT, 2);
        }
        if (places.size() < 40) {
            places.forEach(place -> vertex(place, false));
        }
    }

    /** Transects, the chosen one with its vertices, each with an arrow to where forward is. */
    void lines(List<ControlLine> lines, String selected, Optional<LineHit> vertex) {
        for (ControlLine line : lines) {
            boolean isSelected = line.name().equals(selected);
            List<Place> places = line.places();
            double[] xy = new double[2 * places.size()];
            for (int i = 0; i < places.size(); i++) {
                xy[2 * i] = x(places.get(i));
                xy[2 * i + 1] = y(places.get(i));
            }
            haloed(xy, Ink.Token.TEXT, isSelected ? 2.6 : 1.6);
            for (int i = 0; i + 3 < xy.length; i += 2) {
                forward(xy[i], xy[i + 1], xy[i + 2], xy[i + 3]);
            }
            marks.add(Mark.Text.of(xy[0] + 7, xy[1] - 7, line.name(), 12, Mark.Anchor.START)
                    .haloed());
            for (int i = 0; i < places.size() && isSelected; i++) {
                int place = i;
                vertex(
                        places.get(i),
                        vertex.filter(hit -> hit.index() == place && hit.line().equals(selected))
                                .isPresent());
            }
        }
    }

    /** To the right of a segment, from its middle. */
    private void forward(double fromX, double fromY, double toX, double toY) {
        double length = Math.hypot(toX - fromX, toY - fromY);
        if (length < 3 * ARROW) {
            return;
        }
        double rightX = -(toY - fromY) / length;
        double rightY = (toX - fromX) / length;
        double x = (fromX + toX) / 2;
        double y = (fromY + toY) / 2;
        double tipX = x + ARROW * rightX;
        double tipY = y + ARROW * rightY;
        haloed(new double[] {x, y, tipX, tipY}, Ink.Token.TEXT, 1.6);
        double[] head = {
            tipX - 5 * rightX - 4 * rightY,
            tipY - 5 * rightY + 4 * rightX,
            tipX,
            tipY,
            tipX - 5 * rightX + 4 * rightY,
            tipY - 5 * rightY - 4 * rightX
        };
        haloed(head, Ink.Token.TEXT, 1.6);
    }

    /** A glyph for each kind of target: ring, square, slanted cross, upright cross. */
    void snap(Snap snap) {
        double x = x(snap.place());
        double y = y(snap.place());
        switch (snap.kind()) {
            case VERTEX -> haloed(regular(x, y, GLYPH + 2, 24, 0), ACCENT, 2, true);
            case GRID_CORNER -> haloed(regular(x, y, GLYPH + 2, 4, Math.PI / 4), ACCENT, 2, true);
            case EDGE -> {
                haloed(new double[] {x - GLYPH, y - GLYPH, x + GLYPH, y + GLYPH}, ACCENT, 2);
                haloed(new double[] {x - GLYPH, y + GLYPH, x + GLYPH, y - GLYPH}, ACCENT, 2);
            }
            case GRID_LINE -> {
                haloed(new double[] {x - GLYPH, y, x + GLYPH, y}, ACCENT, 2);
                haloed(new double[] {x, y - GLYPH, x, y + GLYPH}, ACCENT, 2);
            }
        }
    }

    private void haloed(double[] xy, Ink ink, double width) {
        haloed(xy, ink, width, false);
    }

    private void haloed(double[] xy, Ink ink, double width, boolean closed) {
        for (Mark.Stroke stroke : List.of(Mark.Stroke.of(PAPER, width + 3), Mark.Stroke.of(ink, width))) {
            marks.add(
                    closed
                            ? new Mark.Area(List.of(xy), Optional.empty(), Optional.of(stroke))
                            : new Mark.Line(xy, stroke));
        }
    }

    private static double[] regular(double x, double y, double radius, int corners, double turn) {
        double[] ring = new double[2 * corners];
        for (int i = 0; i < corners; i++) {
            ring[2 * i] = x + radius * Math.cos(turn + 2 * Math.PI * i / corners);
            ring[2 * i + 1] = y + radius * Math.sin(turn + 2 * Math.PI * i / corners);
        }
        return ring;
    }

    private double x(Place place) {
        return camera.x(place.x());
    }

    private double y(Place place) {
        return camera.y(place.y());
    }
}
