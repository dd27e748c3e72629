package org.seepledger.picture;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.OptionalInt;
import java.util.function.ToDoubleFunction;
import java.util.stream.DoubleStream;
import org.seepledger.aquifer.Times;
import org.seepledger.balance.Periods;
import org.seepledger.picture.Mark.Fill;
import org.seepledger.picture.Mark.Stroke;
import org.seepledger.picture.Mark.Texture;
import org.seepledger.plume.NonDetects;
import org.seepledger.plume.Plume;
import org.seepledger.plume.Stock;
import org.seepledger.unit.Figures;

/**
 * What a prism holds of a solute through time: in all, dissolved and sorbed, and the band between non-detects counted as 0 and
 * as their limit.
 */
public final class MassCurve {

    private static final double RIGHT = 10;
    private static final double TOP = 8;
    private static final Stroke ALL = Stroke.of(Ink.Token.TEXT, 2);
    private static final Stroke DISSOLVED = Stroke.of(Ink.Token.PLUME, 2).dashed(6.0, 3.0);
    private static final Stroke SORBED = Stroke.of(Ink.Token.MUTED, 2).dashed(2.0, 3.0);
    private static final double LOWEST = 60;
    private static final Fill BRACKET = new Fill(Ink.Token.PLUME, 1, Texture.RISING);

    private final Plume plume;
    private final Times times;
    private final String unit;
    private final double factor;
    private final double width;
    private final OptionalDouble height;
    private final OptionalInt interval;
    private final Picture picture;
    private TimeAxis time;

    private MassCurve(
            Plume plume,
            Times times,
            String unit,
            double factor,
            double width,
            OptionalDouble height,
            OptionalInt interval) {
        this.plume = plume;
        this.times = times;
        this.unit = unit;
        this.factor = factor;
        this.width = width;
        this.height = height;
        this.interval = interval;
        this.picture = draw();
    }

    /**
     * {@return the curves}
     *
     * @param plume what a prism holds
     * @param times the record's instants
     * @param unit the unit of masses as it is written
     * @param factor how many of it a kilogram is
     * @param width in logical pixels, at least 340
     */
    public static Picture of(Plume plume, Times times, String unit, double factor, double width) {
        return new MassCurve(plume, times, unit, factor, width, OptionalDouble.empty(), OptionalInt.empty()).picture;
    }

    /**
     * {@return the curves in a given room, with an interval marked}
     *
     * @param plume what a prism holds
     * @param times the record's instants
     * @param unit the unit of masses as it is written
     * @param factor how many of it a kilogram is
     * @param interval the interval to mark, from 0
     * @param width in logical pixels, at least 300
     * @param height in logical pixels; the picture is higher where it could not be read otherwise
     */
    public static MassCurve of(
            Plume plume, Times times, String unit, double factor, int interval, double width, double height) {
        return new MassCurve(plume, times, unit, factor, width, OptionalDouble.of(height), OptionalInt.of(interval));
    }

    /** {@return what it looks like} */
    public Picture picture() {
        return picture;
    }

    /**
     * {@return the interval at a place in the picture, if there is one}
     *
     * @param x in logical pixels from the picture's left edge
     */
    public OptionalInt intervalAt(double x) {
        for (int i = 0; i < times.intervals(); i++) {
            if (x >= time.x(times.instant(i)) && x < time.x(times.instant(i + 1))) {
                return OptionalInt.of(i);
            }
        }
        return OptionalInt.empty();
    }

    private double[] masses(ToDoubleFunction<Stock> what) {
        double[] masses = new double[plume.stocks().size()];
        for (int instant = 0; instant < masses.length; instant++) {
            masses[instant] = factor * what.applyAsDouble(plume.whole(instant));
        }
        return masses;
    }

    private Picture draw() {
        double[] all = masses(stock -> stock.total(NonDetects.HALF));
        double[] dissolved = masses(stock -> stock.dissolved(NonDetects.HALF));
        double[] least = masses(stock -> stock.total(NonDetects.ZERO));
        double[] most = masses(stock -> stock.total(NonDetects.LIMIT));
        boolean bracketed = !Arrays.equals(least, most);
        boolean sorbs = plume.solute().sorption().isPresent();
        double[] sorbed = masses(stock -> stock.sorbed(NonDetects.HALF));
        double usual = width >= 600 ? 190 : 160;
        double greatest = DoubleStream.of(most).max().orElse(0);
        double left = 12 + new ValueAxis(0, greatest, 0, usual).labelWidth(true);
        double right = width - RIGHT;
        List<Mark> marks = new ArrayList<>();
        double keyEnd = key(left, right, sorbs, bracketed, marks, all, dissolved, sorbed);
        double high = height.isPresent() ? Math.max(LOWEST, height.getAsDouble() - keyEnd - TOP - 30) : usual;
        ValueAxis axis = new ValueAxis(0, greatest, keyEnd + TOP, high);
        time = new TimeAxis(List.of(new Periods(times).record()), times, left, right);
        interval.ifPresent(looked -> mark(looked, keyEnd + TOP, high, marks));
        axis.draw(left, right, true, marks);
        if (bracketed) {
            marks.add(new Mark.Area(
                    List.of(band(curve(least, time, axis), curve(most, time, axis))),
                    Optional.of(BRACKET),
                    Optional.empty()));
        }
        if (sorbs) {
            marks.add(new Mark.Line(curve(dissolved, time, axis), DISSOLVED));
            marks.add(new Mark.Line(curve(sorbed, time, axis), SORBED));
        }
        double[] line = curve(all, time, axis);
        marks.add(new Mark.Line(line, ALL));
        for (int i = 0; i < line.length; i += 2) {
            Fill fill = Fill.of(Ink.Token.TEXT);
            marks.add(new Mark.Area(
                    List.of(MapSheet.round(line[i], line[i + 1], 2.4)), Optional.of(fill), Optional.empty()));
        }
        axis.zero(left, right, marks);
        double bottom = keyEnd + TOP + high;
        time.draw(bottom + 4, width, marks);
        String title = plume.solute().name() + " that " + plume.prism() + " holds, through time";
        return new Picture(width, bottom + 28, title, description(all, least, most), marks);
    }

    private double key(
            double left,
            double right,
            boolean sorbs,
            boolean bracketed,
            List<Mark> marks,
            double[] all,
            double[] dissolved,
            double[] sorbed) {
        Key key = new Key(left, right, 0, marks).line(ALL, "mass in place, " + last(all));
        if (sorbs) {
            key.line(DISSOLVED, "dissolved, " + last(dissolved)).line(SORBED, "sorbed, " + last(sorbed));
        }
        if (bracketed) {
            key.filled(BRACKET, "non-detects counted from 0 to their limit");
        }
        return key.end();
    }

    /** What there is at the end of what is looked at. */
    private String last(double[] masses) {
        int instant = interval.orElse(times.intervals() - 1) + 1;
        String when = interval.isPresent() ? "then " : "in the end ";
        return when + Figures.typeset(masses[instant]) + " " + unit;
    }

    private void mark(int looked, double top, double high, List<Mark> marks) {
        double from = time.x(times.instant(looked));
        double to = time.x(times.instant(looked + 1));
        marks.add(Mark.Area.of(new Box(from, top, to - from, high), new Fill(Ink.Token.ACCENT, 0.14, Texture.PLAIN)));
        for (double x : new double[] {from, to}) {
            marks.add(new Mark.Line(new double[] {x, top, x, top + high}, Stroke.of(Ink.Token.ACCENT, 1.4)));
        }
    }

    private double[] curve(double[] masses, TimeAxis time, ValueAxis axis) {
        double[] xy = new double[2 * masses.length];
        for (int instant = 0; instant < masses.length; instant++) {
            xy[2 * instant] = time.x(times.instant(instant));
            xy[2 * instant + 1] = axis.y(masses[instant]);
        }
        return xy;
    }

    /** The ring along one curve and back along another. */
    private static double[] band(double[] one, double[] other) {
        double[] ring = new double[one.length + other.length];
        System.arraycopy(one, 0, ring, 0, one.length);
        for (int i = 0; i < other.length; i += 2) {
            System.arraycopy(other, other.length - 2 - i, ring, one.length + i, 2);
        }
        return ring;
    }

    private String description(double[] all, double[] least, double[] most) {
        int end = all.length - 1;
        return "Mass in place, from " + Figures.typeset(all[0]) + " to " + Figures.typeset(all[end]) + " " + unit
                + "; with non-detects as 0 in the end " + Figures.typeset(least[end]) + ", as their limit "
                + Figures.typeset(most[end]) + ".";
    }
}
