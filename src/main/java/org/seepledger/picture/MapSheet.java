package org.seepledger.picture;

import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import org.seepledger.aquifer.PlacedWell;
import org.seepledger.picture.Mark.Fill;
import org.seepledger.picture.Mark.Stroke;
import org.seepledger.prism.Prism;
import org.seepledger.prism.Ring;
import org.seepledger.prism.Side;

/**
 * A map being drawn: what lies in the frame is clipped to it, labels keep clear of each other, and coordinates stand along
 * the lower and left edge.
 */
final class MapSheet {

    /** How much room coordinates need left of and below the frame. */
    static final double MARGIN = 20;

    /** How far coordinates may reach beyond the frame's upper and right edge. */
    private static final double BESIDE = 6;

    private static final double SMALL = 10;
    private static final double WELL = 3.2;
    private static final int MOST_TICKS = 5;

    private final MapFrame frame;
    private final Labels labels;
    private final List<Mark> ground = new ArrayList<>();
    private final List<Mark> above = new ArrayList<>();
    private final Map<String, double[]> contourLabels = new LinkedHashMap<>();

    MapSheet(MapFrame frame) {
        this.frame = frame;
        this.labels = new Labels(frame.box().inset(2));
    }

    MapFrame frame() {
        return frame;
    }

    Labels labels() {
        return labels;
    }

    /** Adds a mark over all that lies on the ground. */
    void above(Mark mark) {
        above.add(mark);
    }

    /** Adds a mark that lies on the ground, above what already does. */
    void onGround(Mark mark) {
        ground.add(mark);
    }

    void drape(Drape drape, ValueScale scale, double opacity) {
        ground.add(drape.image(frame, scale, opacity));
    }

    /** Draws lines at round values; each value is written on its longest line once all else has its label. */
    void contours(Drape drape, Ticks levels) {
        for (int i = 0; i < levels.count(); i++) {
            double[] longest = new double[0];
            for (double[] line : Contours.at(drape, levels.values().get(i))) {
                double[] drawn = frame.drawn(line);
                ground.add(new Mark.Line(drawn, Stroke.of(Ink.Token.TEXT, 0.7)));
                longest = drawn.length > longest.length ? drawn : longest;
            }
            contourLabels.put(levels.label(i), longest);
        }
    }

    /** Writes a label on a line: in its middle, else nearer to its ends. */
    private void labelAlong(double[] line, String words) {
        List<Mark.Text> choices = new ArrayList<>();
        int places = line.length / 2;
        for (double share : new double[] {0.5, 0.35, 0.65, 0.2, 0.8}) {
            int at = (int) (share * places);
            if (at > 0 && at + 1 < places) {
                double x = line[2 * at];
                double y = line[2 * at + 1] + 0.35 * SMALL;
                choices.add(Mark.Text.of(x, y, words, SMALL, Mark.Anchor.MIDDLE)
                        .haloed()
                        .in(Ink.Token.TEXT));
            }
        }
        labels.place(choices, above);
    }

    /** Draws the outline of a prism, the one that the map is about in full. */
    void prism(Prism prism, boolean subject) {
        List<double[]> rings = prism.rings().stream().map(this::onPage).toList();
        Stroke outline = subject
                ? Stroke.of(Ink.Token.PRISM, 2.2)
                : Stroke.of(Ink.Token.PRISM, 1).dashed(5.0, 3.0);
        if (subject) {
            ground.add(new Mark.Area(rings, Optional.empty(), Optional.of(Stroke.of(Ink.Token.PAPER, 5))));
        }
        ground.add(new Mark.Area(rings, Optional.empty(), Optional.of(outline)));
    }

    /** Writes the name of another prism in it, if there is room. */
    void name(Prism prism) {
        double[] ring = onPage(prism.rings().get(0));
        double x = 0;
        double y = 0;
        for (int i = 0; i < ring.length; i += 2) {
            x += ring[i] / (ring.length / 2);
            y += ring[i + 1] / (ring.length / 2);
        }
        Mark.Text name = Mark.Text.of(x, y, prism.name(), SMALL + 1, Mark.Anchor.MIDDLE)
                .haloed()
                .in(Ink.Token.MUTED);
        labels.place(List.of(name), above);
    }

    void well(PlacedWell well) {
        double x = frame.x(well.well().x());
        double y = frame.y(well.well().y());
        if (!frame.box().inset(WELL).holds(new Box(x, y, 0, 0))) {
            return;
        }
        Stroke rim = Stroke.of(Ink.Token.TEXT, 1.6);
        above.add(new Mark.Area(List.of(round(x, y, WELL)), Optional.of(Fill.of(Ink.Token.PAPER)), Optional.of(rim)));
        labels.keepFree(new Box(x - WELL, y - WELL, 2 * WELL, 2 * WELL));
        List<Mark.Text> choices = Labels.around(x, y, WELL + 2, well.well().name(), SMALL).stream()
                .map(Mark.Text::haloed)
                .toList();
        labels.place(choices, above);
    }

    /** A ring of 24 corners. */
    static double[] round(double x, double y, double radius) {
        double[] ring = new double[48];
        for (int i = 0; i < 24; i++) {
            ring[2 * i] = x + radius * Math.cos(Math.PI * i / 12);
            ring[2 * i + 1] = y + radius * Math.sin(Math.PI * i / 12);
        }
        return ring;
    }

    double[] onPage(Ring ring) {
        double[] drawn = new double[2 * ring.sides().size()];
        for (int i = 0; i < ring.sides().size(); i++) {
            Side side = ring.sides().get(i);
            drawn[2 * i] = frame.x(side.x());
            drawn[2 * i + 1] = frame.y(side.y());
        }
        return drawn;
    }

    /** {@return the map with its frame and coordinates} */
    List<Mark> marks() {
        Box box = frame.box();
        contourLabels.forEach((words, line) -> labelAlong(line, words));
        List<Mark> marks = new ArrayList<>();
        marks.add(new Mark.Group(box, ground));
        marks.addAll(above);
        marks.add(Mark.Area.of(box, Stroke.of(Ink.Token.MUTED, 1)));
        Ticks east = Ticks.within(frame.west(), frame.east(), MOST_TICKS);
        for (int i = 0; i < east.count(); i++) {
            double x = frame.x(east.values().get(i));
            tick(marks, x, box.bottom(), x, box.bottom() + 4);
            double half = Lettering.width(east.label(i), SMALL) / 2;
            double middle = Math.min(x, box.right() + BESIDE - half);
            marks.add(Mark.Text.of(middle, box.bottom() + 15, east.label(i), SMALL, Mark.Anchor.MIDDLE)
                    .in(Ink.Token.MUTED));
        }
        Ticks north = Ticks.within(frame.south(), frame.north(), MOST_TICKS);
        for (int i = 0; i < north.count(); i++) {
            double y = frame.y(north.values().get(i));
            tick(marks, box.x() - 4, y, box.x(), y);
            double half = Lettering.width(north.label(i), SMALL) / 2;
            double middle = Math.max(y, box.y() - BESIDE + half);
            marks.add(Mark.Text.of(box.x() - 7, middle, north.label(i), SMALL, Mark.Anchor.MIDDLE)
                    .in(Ink.Token.MUTED)
                    .turned(-90));
        }
        return marks;
    }

    private static void tick(List<Mark> marks, double fromX, double fromY, double toX, double toY) {
        marks.add(new Mark.Line(new double[] {fromX, fromY, toX, toY}, Stroke.of(Ink.Token.MUTED, 1)));
    }
}
