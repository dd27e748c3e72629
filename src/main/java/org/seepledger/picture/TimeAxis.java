package org.seepledger.picture;

import java.util.List;
import java.util.OptionalInt;
import org.seepledger.aquifer.Times;
import org.seepledger.ledger.Period;

/**
 * Where periods lie along a chart: to scale in time; or, where they overlap each other in time, side by side with the same
 * width.
 */
final class TimeAxis {

    private static final double SIZE = 11;
    private static final double TICK = 4;

    private final List<Period> periods;
    private final Times times;
    private final double left;
    private final double right;
    private final boolean toScale;

    TimeAxis(List<Period> periods, Times times, double left, double right) {
        this.periods = periods;
        this.times = times;
        this.left = left;
        this.right = right;
        boolean follow = true;
        for (int i = 1; i < periods.size(); i++) {
            double rounding = 1e-9 * Math.abs(periods.get(i).to());
            follow &= periods.get(i).from() >= periods.get(i - 1).to() - rounding;
        }
        this.toScale = follow && last() > first();
    }

    private double first() {
        return periods.get(0).from();
    }

    private double last() {
        return periods.get(periods.size() - 1).to();
    }

    double x(double time) {
        return left + (time - first()) / (last() - first()) * (right - left);
    }

    /** {@return where a period begins} */
    double from(int period) {
        return toScale ? x(periods.get(period).from()) : left + period * slot();
    }

    /** {@return where a period ends} */
    double to(int period) {
        return toScale ? x(periods.get(period).to()) : left + (period + 1) * slot();
    }

    private double slot() {
        return (right - left) / periods.size();
    }

    /** {@return the period at a place, if there is one} */
    OptionalInt at(double x) {
        for (int i = 0; i < periods.size(); i++) {
            if (x >= from(i) && x < to(i)) {
                return OptionalInt.of(i);
            }
        }
        return OptionalInt.empty();
    }

    /** Draws the axis at a height, with its labels just below, none beyond the picture. */
    void draw(double y, double pictureWidth, List<Mark> marks) {
        marks.add(new Mark.Line(new double[] {left, y, right, y}, Mark.Stroke.of(Ink.Token.MUTED, 1)));
        Labels labels = new Labels(new Box(0, y, pictureWidth, 3 * SIZE));
        if (toScale) {
            TimeTicks.along(times, first(), last(), right - left, SIZE)
                    .forEach(tick -> tick(x(tick.time()), y, tick.label(), pictureWidth, labels, marks));
        } else {
            for (int i = 0; i < periods.size(); i++) {
                String name = Lettering.fitted(periods.get(i).name(), SIZE, Math.max(60, slot() - 6));
                tick((from(i) + to(i)) / 2, y, name, pictureWidth, labels, marks);
            }
        }
    }

    private static void tick(double x, double y, String words, double pictureWidth, Labels labels, List<Mark> marks) {
        double half = Lettering.width(words, SIZE) / 2 + 2;
        double place = Math.max(half, Math.min(pictureWidth - half, x));
        Mark.Text label = Mark.Text.of(place, y + TICK + SIZE + 1, words, SIZE, Mark.Anchor.MIDDLE);
        if (labels.place(List.of(label), marks)) {
            marks.add(new Mark.Line(new double[] {x, y, x, y + TICK}, Mark.Stroke.of(Ink.Token.MUTED, 1)));
        }
    }
}
