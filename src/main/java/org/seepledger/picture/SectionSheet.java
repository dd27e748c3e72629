package org.seepledger.picture;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.function.ToDoubleFunction;
import java.util.stream.DoubleStream;
import org.seepledger.picture.Body.Slab;
import org.seepledger.picture.Mark.Fill;
import org.seepledger.picture.Mark.Stroke;
import org.seepledger.picture.Profile.Stretch;

/** A section being drawn: bodies and lines between cells' edges, and the frame with its axes. */
final class SectionSheet {

    /** The size of small letters. */
    static final double SMALL = 10;

    private final SectionFrame frame;
    private final Labels labels;
    private final List<Mark> inside = new ArrayList<>();
    private final List<Mark> over = new ArrayList<>();

    SectionSheet(SectionFrame frame) {
        this.frame = frame;
        this.labels = new Labels(frame.box().inset(1));
    }

    SectionFrame frame() {
        return frame;
    }

    Box box() {
        return frame.box();
    }

    Labels labels() {
        return labels;
    }

    /** Adds a mark that is cut off at the frame. */
    void inside(Mark mark) {
        inside.add(mark);
    }

    /** What is drawn over all that lies inside. */
    List<Mark> over() {
        return over;
    }

    private boolean isSeen(double from, double to) {
        return to >= frame.from() && from <= frame.to();
    }

    /** Draws a body, each run of its slabs as one area; slabs without thickness as a bar. */
    void body(List<Slab> slabs, Fill fill, Optional<Stroke> outline) {
        List<Slab> run = new ArrayList<>();
        for (Slab slab : slabs) {
            boolean goesOn = !run.isEmpty() && run.get(run.size() - 1).to() == slab.from();
            if (!goesOn || isFlat(run.get(0)) != isFlat(slab)) {
                run(run, fill, outline);
                run.clear();
            }
            if (isSeen(slab.from(), slab.to())) {
                run.add(slab);
            }
        }
        run(run, fill, outline);
    }

    private static boolean isFlat(Slab slab) {
        return !(slab.top() > slab.bottom());
    }

    private void run(List<Slab> run, Fill fill, Optional<Stroke> outline) {
        if (run.isEmpty()) {
            return;
        }
        if (isFlat(run.get(0))) {
            double[] xy = run.stream()
                    .flatMapToDouble(slab -> DoubleStream.of(
                            frame.x(slab.from()), frame.y(slab.top()), frame.x(slab.to()), frame.y(slab.top())))
                    .toArray();
            outline.ifPresent(line -> inside(
                    new Mark.Line(xy, Stroke.of(line.ink(), 1.5 + line.width()).dashed(3.0, 2.0))));
            return;
        }
        double[] ring = new double[8 * run.size()];
        for (int i = 0; i < run.size(); i++) {
            double from = frame.x(run.get(i).from());
            double to = frame.x(run.get(i).to());
            double above = frame.y(run.get(i).top());
            double below = frame.y(run.get(i).bottom());
            System.arraycopy(new double[] {from, above, to, above}, 0, ring, 4 * i, 4);
            System.arraycopy(new double[] {to, below, from, below}, 0, ring, ring.length - 4 * i - 4, 4);
        }
        inside.add(new Mark.Area(List.of(ring), Optional.of(fill), outline));
    }

    /** Draws a level as a line through the middles of stretches, wherever it has a value. */
    void level(List<Stretch> stretches, ToDoubleFunction<Stretch> level, Stroke stroke) {
        DoubleStream.Builder run = DoubleStream.builder();
        double end = Double.NaN;
        for (Stretch stretch : stretches) {
            double elevation = level.applyAsDouble(stretch);
            if (Double.isNaN(elevation) || stretch.from() != end) {
                line(run, stroke);
                run = DoubleStream.builder();
            }
            if (!Double.isNaN(elevation)) {
                run.add((frame.x(stretch.from()) + frame.x(stretch.to())) / 2).add(frame.y(elevation));
            }
            end = stretch.to();
        }
        line(run, stroke);
    }

    private void line(DoubleStream.Builder run, Stroke stroke) {
        double[] xy = run.build().toArray();
        if (xy.length == 2) {
            inside.add(new Mark.Line(new double[] {xy[0] - 6, xy[1], xy[0] + 6, xy[1]}, stroke));
        } else if (xy.length > 2) {
            inside.add(new Mark.Line(xy, stroke));
        }
    }

    /** {@return the section with its frame, elevations and distances} */
    List<Mark> marks() {
        Box box = frame.box();
        List<Mark> marks = new ArrayList<>();
        marks.add(new Mark.Group(box, inside));
        marks.addAll(over);
        Stroke thin = Stroke.of(Ink.Token.MUTED, 1);
        marks.add(Mark.Area.of(box, thin));
        Ticks up = Ticks.within(frame.lowest(), frame.highest(), Math.max(2, (int) (box.height() / 28)));
        for (int i = 0; i < up.count(); i++) {
            double y = frame.y(up.values().get(i));
            marks.add(new Mark.Line(new double[] {box.x() - 4, y, box.x(), y}, thin));
            marks.add(Mark.Text.of(box.x() - 7, y + 0.35 * SMALL, up.label(i), SMALL, Mark.Anchor.END)
                    .in(Ink.Token.MUTED));
        }
        Ticks across = Ticks.within(frame.from(), frame.to(), Math.max(2, (int) (box.width() / 75)));
        for (int i = 0; i < across.count(); i++) {
            double x = frame.x(across.values().get(i));
            marks.add(new Mark.Line(new double[] {x, box.bottom(), x, box.bottom() + 4}, thin));
            marks.add(Mark.Text.of(x, box.bottom() + 15, across.label(i), SMALL, Mark.Anchor.MIDDLE)
                    .in(Ink.Token.MUTED));
        }
        return marks;
    }
}
