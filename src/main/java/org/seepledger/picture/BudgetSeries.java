package org.seepledger.picture;

import java.util.ArrayList;
import java.util.List;
import java.util.OptionalDouble;
import java.util.OptionalInt;
import java.util.stream.DoubleStream;
import java.util.stream.IntStream;
import org.seepledger.aquifer.Times;
import org.seepledger.ledger.PeriodBudget;
import org.seepledger.picture.Mark.Anchor;
import org.seepledger.picture.Mark.Fill;
import org.seepledger.picture.Mark.Stroke;
import org.seepledger.picture.Mark.Texture;
import org.seepledger.unit.Figures;

/**
 * Gains, losses, change in storage and residual through time: gains upward and losses downward from a line of zero, storage
 * on the side where it makes up the difference, the residual in a strip of its own scale.
 */
public final class BudgetSeries {

    private static final Fill GAINS = new Fill(Ink.Token.GAIN, 1, Texture.RISING);
    private static final Fill LOSSES = new Fill(Ink.Token.LOSS, 1, Texture.FALLING);
    private static final Fill STORAGE = new Fill(Ink.Token.STORAGE, 1, Texture.DOTS);
    private static final Fill RESIDUAL = new Fill(Ink.Token.RESIDUAL, 1, Texture.CROSSED);
    private static final double RIGHT = 10;
    private static final double STRIP = 46;
    private static final double LOWEST = 56;
    private static final double ROOMY = 640;

    private final List<PeriodBudget> budgets;
    private final SeriesValues values;
    private final UnitShown unit;
    private final double width;
    private final ValueAxis axis;
    private final ValueAxis strip;
    private final double left;
    private final double top;
    private final double bottom;
    private final double stripTop;
    private final double end;
    private final TimeAxis time;
    private final Picture picture;

    private BudgetSeries(
            String prism,
            List<PeriodBudget> budgets,
            Times times,
            UnitShown unit,
            OptionalInt marked,
            double width,
            OptionalDouble height) {
        this.budgets = List.copyOf(budgets);
        this.values = SeriesValues.of(budgets, unit);
        this.unit = unit;
        this.width = width;
        this.top = 26;
        this.bottom = top + plotHeight(height);
        this.stripTop = bottom + (isOneLine() ? 26 : 50);
        this.end = values.closes() ? stripTop - 4 : stripTop + STRIP;
        double greatest = IntStream.range(0, values.count())
                .mapToDouble(values::up)
                .filter(Double::isFinite)
                .max()
                .orElse(0);
        double least = IntStream.range(0, values.count())
                .mapToDouble(values::down)
                .filter(Double::isFinite)
                .max()
                .orElse(0);
        this.axis = new ValueAxis(-least, greatest, top, bottom - top);
        double[] residuals = values.closes() ? new double[0] : finite(values.residual());
        this.strip = new ValueAxis(
                DoubleStream.of(residuals).min().orElse(0),
                DoubleStream.of(residuals).max().orElse(0),
                stripTop,
                STRIP);
        this.left = 12 + Math.max(axis.labelWidth(false), values.closes() ? 0 : strip.labelWidth(true));
        this.time = new TimeAxis(budgets.stream().map(PeriodBudget::period).toList(), times, left, width - RIGHT);
        this.picture = new Picture(
                width,
                end + 26,
                "Gains, losses and storage of " + prism + " through time",
                description(),
                marks(marked));
    }

    /** A residual that has no strip is told beside the key of losses, where there is room. */
    private boolean isOneLine() {
        return values.closes() && width >= ROOMY;
    }

    /** How high gains and losses are drawn, as far as what else there is leaves room. */
    private double plotHeight(OptionalDouble height) {
        double rest = top + (isOneLine() ? 48 : values.closes() ? 72 : 76 + STRIP);
        return height.isPresent() ? Math.max(LOWEST, height.getAsDouble() - rest) : width >= 600 ? 230 : 190;
    }

    /**
     * {@return the chart of a series of budgets}
     *
     * @param prism the prism's name
     * @param budgets its budgets, at least one; where their periods overlap, they stand side by side and not to scale
     * @param times the record's instants, for dates
     * @param unit the unit to show
     * @param marked the period to mark, if any
     * @param width in logical pixels, at least 340
     */
    public static BudgetSeries of(
            String prism, List<PeriodBudget> budgets, Times times, UnitShown unit, OptionalInt marked, double width) {
        return new BudgetSeries(prism, budgets, times, unit, marked, width, OptionalDouble.empty());
    }

    /**
     * {@return the chart of a series of budgets in a given room}
     *
     * @param prism the prism's name
     * @param budgets its budgets, at least one
     * @param times the record's instants, for dates
     * @param unit the unit to show
     * @param marked the period to mark, if any
     * @param width in logical pixels, at least 300
     * @param height in logical pixels; the chart is higher where it could not be read otherwise
     */
    public static BudgetSeries of(
            String prism,
            List<PeriodBudget> budgets,
            Times times,
            UnitShown unit,
            OptionalInt marked,
            double width,
            double height) {
        return new BudgetSeries(prism, budgets, times, unit, marked, width, OptionalDouble.of(height));
    }

    /** {@return what it looks like} */
    public Picture picture() {
        return picture;
    }

    /**
     * {@return the period at a place in the picture, if there is one}
     *
     * @param x in logical pixels from the picture's left edge
     */
    public OptionalInt periodAt(double x) {
        return time.at(x);
    }

    /**
     * {@return the part of the picture that a period takes}
     *
     * @param period from 0
     */
    public Box place(int period) {
        double from = time.from(period);
        return new Box(from, top, time.to(period) - from, end - top);
    }

    private List<Mark> marks(OptionalInt marked) {
        List<Mark> marks = new ArrayList<>();
        double right = width - RIGHT;
        Key above = new Key(left, right, 0, marks).filled(GAINS, "gains, " + unit.words());
        Key below = new Key(left, right, bottom + 4, marks).filled(LOSSES, "losses");
        if (values.storageKnown()) {
            above.filled(STORAGE, "storage gives");
            below.filled(STORAGE, "storage takes");
        }
        Key residual = isOneLine() ? below : new Key(left, right, stripTop - 22, marks);
        residual.filled(RESIDUAL, aboutResidual());
        axis.draw(left, right, false, marks);
        if (!values.closes()) {
            strip.draw(left, right, true, marks);
            strip.zero(left, right, marks);
        }
        for (int i = 0; i < values.count(); i++) {
            draw(i, marks);
        }
        axis.zero(left, right, marks);
        time.draw(end + 4, width, marks);
        marked.ifPresent(period -> mark(period, marks));
        return marks;
    }

    private String aboutResidual() {
        String name = values.storageKnown() ? "residual" : "gains − losses";
        return values.closes()
                ? name + ": rounding alone, at most " + Figures.typeset(values.largestResidual())
                : name + ", on a scale of its own";
    }

    private void draw(int period, List<Mark> marks) {
        double storage = SeriesValues.orNothing(values.storage()[period]);
        double gains = values.gains()[period];
        double losses = values.losses()[period];
        if (!Double.isFinite(gains + losses)) {
            double middle = (time.from(period) + time.to(period)) / 2;
            marks.add(Mark.Text.of(middle, axis.y(0) - 4, "–", 12, Anchor.MIDDLE));
            return;
        }
        bar(axis, period, 0, gains, GAINS, marks);
        bar(axis, period, 0, -losses, LOSSES, marks);
        bar(axis, period, gains, gains + Math.max(0, -storage), STORAGE, marks);
        bar(axis, period, -losses, -losses - Math.max(0, storage), STORAGE, marks);
        if (!values.closes() && Double.isFinite(values.residual()[period])) {
            bar(strip, period, 0, values.residual()[period], RESIDUAL, marks);
        }
    }

    private void bar(ValueAxis along, int period, double from, double to, Fill fill, List<Mark> marks) {
        if (from == to) {
            return;
        }
        double gap = time.to(period) - time.from(period) > 5 ? 0.6 : 0;
        double upper = Math.min(along.y(from), along.y(to));
        double wide = time.to(period) - time.from(period) - 2 * gap;
        marks.add(Mark.Area.of(
                new Box(time.from(period) + gap, upper, wide, Math.abs(along.y(from) - along.y(to))), fill));
    }

    private void mark(int period, List<Mark> marks) {
        Box whole = place(period);
        mark(new Box(whole.x(), top, whole.width(), bottom - top), marks);
        if (!values.closes()) {
            mark(new Box(whole.x(), stripTop, whole.width(), STRIP), marks);
        }
    }

    private static void mark(Box box, List<Mark> marks) {
        marks.add(Mark.Area.of(box, new Fill(Ink.Token.ACCENT, 0.14, Texture.PLAIN)));
        for (double x : new double[] {box.x(), box.right()}) {
            marks.add(new Mark.Line(new double[] {x, box.y(), x, box.bottom()}, Stroke.of(Ink.Token.ACCENT, 1.4)));
        }
    }

    private static double[] finite(double[] values) {
        return DoubleStream.of(values).filter(Double::isFinite).toArray();
    }

    private String description() {
        String span = budgets.size() == 1
                ? "In " + budgets.get(0).period().name() + ", in " + unit.words()
                : "In " + budgets.size() + " periods from "
                        + budgets.get(0).period().name() + " to "
                        + budgets.get(budgets.size() - 1).period().name() + ", in " + unit.words();
        return span + ": gains " + range(values.gains()) + ", losses " + range(values.losses()) + ", change in storage "
                + range(values.storage()) + ", "
                + (values.storageKnown() ? "residual " : "gains − losses ")
                + range(values.residual()) + ".";
    }

    private static String range(double[] values) {
        double[] known = finite(values);
        double least = DoubleStream.of(known).min().orElse(Double.NaN);
        double greatest = DoubleStream.of(known).max().orElse(Double.NaN);
        return least == greatest || known.length == 0
                ? Figures.typeset(least)
                : Figures.typeset(least) + " to " + Figures.typeset(greatest);
    }
}
