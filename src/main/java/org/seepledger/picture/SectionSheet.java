package org.seepledger.picture;

import java.math.BigDecimal;
import java.math.MathContext;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.function.ToDoubleFunction;
import java.util.stream.DoubleStream;
import org.seepledger.picture.Mark.Fill;
import org.seepledger.picture.Mark.Stroke;
import org.seepledger.picture.Profile.Stretch;

/** A section being drawn: where shares of the line and elevations come to, and bodies and lines between cells' edges. */
final class SectionSheet {

    /** The size of small letters. */
    static final double SMALL = 10;

    private final Profile profile;
    private final Box box;
    private final double lowest;
    private final double highest;
    private final Labels labels;
    private final List<Mark> inside = new ArrayList<>();
    private final List<Mark> over = new ArrayList<>();

    SectionSheet(Profile profile, Box box) {
        this.profile = profile;
        this.box = box;
        double least = elevations(profile).min().orElseThrow();
        double greatest = elevations(profile).max().orElseThrow();
        double margin = Math.max(1e-6, 0.08 * (greatest - least));
        this.lowest = least - margin;
        this.highest = greatest + 2.5 * margin;
        this.labels = new Labels(box.inset(1));
    }

    /** All elevations that a section must reach. */
    static DoubleStream elevations(Profile profile) {
        return profile.stretches().stream()
                .flatMapToDouble(stretch -> DoubleStream.concat(
                        DoubleStream.of(stretch.column().surfaces()),
                        DoubleStream.of(
                                stretch.column().levelAtStart(),
                                stretch.column().levelAtEnd())))
                .filter(Double::isFinite);
    }

    Box box() {
        return box;
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

    double x(double share) {
        return box.x() + share * box.width();
    }

    double y(double elevation) {
        return box.bottom() - (elevation - lowest) / (highest - lowest) * box.height();
    }

    /**
     * {@return how many times heights are exaggerated, to two digits}
     *
     * @param length how long the line is, in the unit of elevations
     */
    String exaggeration(double length) {
        double times = length / box.width() / ((highest - lowest) / box.height());
        return new BigDecimal(times).round(new MathContext(2)).toPlainString();
    }

    /** Draws the bodies between two surfaces, wherever both have values and the upper one is higher. */
    void bodies(ToDoubleFunction<Stretch> upper, ToDoubleFunction<Stretch> lower, Fill fill, Stroke outline) {
        List<Stretch> run = new ArrayList<>();
        for (Stretch stretch : profile.stretches()) {
            if (upper.applyAsDouble(stretch) > lower.applyAsDouble(stretch)) {
                run.add(stretch);
            } else {
                body(run, upper, lower, fill, outline);
                run.clear();
            }
        }
        body(run, upper, lower, fill, outline);
    }

    private void body(
            List<Stretch> run,
            ToDoubleFunction<Stretch> upper,
            ToDoubleFunction<Stretch> lower,
            Fill fill,
            Stroke outline) {
        if (run.isEmpty()) {
            return;
        }
        double[] ring = new double[8 * run.size()];
        for (int i = 0; i < run.size(); i++) {
            double from = x(run.get(i).from());
            double to = x(run.get(i).to());
            double above = y(upper.applyAsDouble(run.get(i)));
            double below = y(lower.applyAsDouble(run.get(i)));
            System.arraycopy(new double[] {from, above, to, above}, 0, ring, 4 * i, 4);
            System.arraycopy(new double[] {to, below, from, below}, 0, ring, ring.length - 4 * i - 4, 4);
        }
        inside.add(new Mark.Area(List.of(ring), Optional.of(fill), Optional.of(outline)));
    }

    /** Draws a level as a line through the middles of stretches, wherever it has a value. */
    void level(ToDoubleFunction<Stretch> level, Stroke stroke) {
        DoubleStream.Builder run = DoubleStream.builder();
        for (Stretch stretch : profile.stretches()) {
            double elevation = level.applyAsDouble(stretch);
            if (Double.isNaN(elevation)) {
                line(run, stroke);
                run = DoubleStream.builder();
            } else {
                run.add((x(stretch.from()) + x(stretch.to())) / 2).add(y(elevation));
            }
        }
        line(run, stroke);
    }

    private void line(DoubleStream.Builder run, Stroke stroke) {
        double[] xy = run.build().toArray();
        if (xy.length > 2) {
            inside.add(new Mark.Line(xy, stroke));
        }
    }

    /**
     * {@return the section with its frame, elevations and distances}
     *
     * @param length how long the line is, in the unit of distances
     */
    List<Mark> marks(double length) {
        List<Mark> marks = new ArrayList<>();
        marks.add(new Mark.Group(box, inside));
        marks.addAll(over);
        Stroke thin = Stroke.of(Ink.Token.MUTED, 1);
        marks.add(Mark.Area.of(box, thin));
        Ticks up = Ticks.within(lowest, highest, 6);
        for (int i = 0; i < up.count(); i++) {
            double y = y(up.values().get(i));
            marks.add(new Mark.Line(new double[] {box.x() - 4, y, box.x(), y}, thin));
            marks.add(Mark.Text.of(box.x() - 7, y + 0.35 * SMALL, up.label(i), SMALL, Mark.Anchor.END)
                    .in(Ink.Token.MUTED));
        }
        Ticks across = Ticks.within(0, length, 8);
        for (int i = 0; i < across.count(); i++) {
            double x = x(across.values().get(i) / length);
            marks.add(new Mark.Line(new double[] {x, box.bottom(), x, box.bottom() + 4}, thin));
            marks.add(Mark.Text.of(x, box.bottom() + 15, across.label(i), SMALL, Mark.Anchor.MIDDLE)
                    .in(Ink.Token.MUTED));
        }
        return marks;
    }
}
