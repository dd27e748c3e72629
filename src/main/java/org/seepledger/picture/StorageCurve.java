package org.seepledger.picture;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.stream.DoubleStream;
import org.seepledger.aquifer.Times;
import org.seepledger.ledger.Period;
import org.seepledger.ledger.PeriodBudget;
import org.seepledger.ledger.Totals;
import org.seepledger.picture.Mark.Fill;
import org.seepledger.picture.Mark.Stroke;
import org.seepledger.picture.Mark.Texture;
import org.seepledger.unit.Figures;

/**
 * How much water storage has taken since the record began, and how much has come to be unexplained.
 *
 * <p>Where a period's numbers cannot be given, the curves end.
 */
public final class StorageCurve {

    private static final double RIGHT = 10;
    private static final double TOP = 8;

    private final List<Period> periods;
    private final boolean storageKnown;
    private final List<Double> storage = new ArrayList<>();
    private final List<Double> residual = new ArrayList<>();
    private final UnitShown unit;
    private final double width;

    private StorageCurve(List<PeriodBudget> budgets, UnitShown unit, double width) {
        this.periods = budgets.stream().map(PeriodBudget::period).toList();
        this.unit = unit;
        this.width = width;
        this.storageKnown = budgets.stream()
                .anyMatch(budget -> !Double.isNaN(budget.totals().storageChange()));
        storage.add(0.0);
        residual.add(0.0);
        for (PeriodBudget budget : budgets) {
            Totals totals = budget.totals();
            double change = storageKnown ? unit.of(totals.storageChange(), budget.period()) : 0;
            double open =
                    unit.of(storageKnown ? totals.residual() : totals.inflow() - totals.outflow(), budget.period());
            if (!Double.isFinite(change + open)) {
                break;
            }
            storage.add(storage.get(storage.size() - 1) + change);
            residual.add(residual.get(residual.size() - 1) + open);
        }
    }

    /**
     * {@return the curves of a series of budgets}
     *
     * @param prism the prism's name
     * @param budgets its budgets, at least one, whose periods follow one another
     * @param times the record's instants, for dates
     * @param unit the unit to show, of volumes
     * @param width in logical pixels, at least 340
     * @throws IllegalArgumentException if the unit is one of rates
     */
    public static Picture of(String prism, List<PeriodBudget> budgets, Times times, UnitShown unit, double width) {
        if (unit.rate()) {
            throw new IllegalArgumentException("rates do not add up through time");
        }
        return new StorageCurve(budgets, unit, width).picture(prism, times);
    }

    private Picture picture(String prism, Times times) {
        List<Mark> marks = new ArrayList<>();
        double[] range = DoubleStream.concat(values(storage), values(residual)).toArray();
        double least = DoubleStream.of(range).min().orElse(0);
        double greatest = DoubleStream.of(range).max().orElse(0);
        double high = width >= 600 ? 190 : 160;
        double left = 12 + new ValueAxis(least, greatest, 0, high).labelWidth(true);
        double right = width - RIGHT;
        double keyEnd = key(left, right, marks);
        ValueAxis axis = new ValueAxis(least, greatest, keyEnd + TOP, high);
        TimeAxis time = new TimeAxis(periods, times, left, right);
        axis.draw(left, right, true, marks);
        if (storage.size() > 1) {
            draw(time, axis, marks);
        }
        axis.zero(left, right, marks);
        double bottom = keyEnd + TOP + high;
        time.draw(bottom + 4, width, marks);
        return new Picture(
                width, bottom + 28, "Water stored in " + prism + " since the record began", description(), marks);
    }

    private void draw(TimeAxis time, ValueAxis axis, List<Mark> marks) {
        if (storageKnown) {
            double[] curve = curve(storage, time, axis);
            Fill fill = new Fill(Ink.Token.STORAGE, 1, Texture.DOTS);
            marks.add(new Mark.Area(List.of(closed(curve, axis.y(0))), Optional.of(fill), Optional.empty()));
            marks.add(new Mark.Line(curve, Stroke.of(Ink.Token.STORAGE, 2)));
        }
        marks.add(new Mark.Line(curve(residual, time, axis), residualStroke()));
    }

    private static Stroke residualStroke() {
        return Stroke.of(Ink.Token.RESIDUAL, 2).dashed(6.0, 3.0);
    }

    private double key(double left, double right, List<Mark> marks) {
        Key key = new Key(left, right, 0, marks);
        if (storageKnown) {
            key.filled(new Fill(Ink.Token.STORAGE, 1, Texture.DOTS), "taken by storage, " + last(storage));
            key.line(residualStroke(), "residual, " + last(residual));
        } else {
            key.line(residualStroke(), "gains − losses, " + last(residual));
        }
        return key.end();
    }

    /** What a curve has come to. */
    private String last(List<Double> curve) {
        return "in the end " + Figures.typeset(curve.get(curve.size() - 1)) + " " + unit.words();
    }

    private static DoubleStream values(List<Double> curve) {
        return curve.stream().mapToDouble(value -> value);
    }

    /** {@return the curve through the period ends; level where no period is} */
    private double[] curve(List<Double> values, TimeAxis time, ValueAxis axis) {
        double[] xy = new double[4 * (values.size() - 1)];
        for (int i = 0; i + 1 < values.size(); i++) {
            xy[4 * i] = time.from(i);
            xy[4 * i + 1] = axis.y(values.get(i));
            xy[4 * i + 2] = time.to(i);
            xy[4 * i + 3] = axis.y(values.get(i + 1));
        }
        return xy;
    }

    private static double[] closed(double[] curve, double zero) {
        double[] ring = new double[curve.length + 4];
        System.arraycopy(curve, 0, ring, 2, curve.length);
        ring[0] = curve[0];
        ring[1] = zero;
        ring[ring.length - 2] = curve[curve.length - 2];
        ring[ring.length - 1] = zero;
        return ring;
    }

    private String description() {
        String covered = storage.size() <= periods.size()
                ? " The curve ends after " + (storage.size() - 1) + " of " + periods.size()
                        + " periods, since no number can be given for the next."
                : "";
        if (!storageKnown) {
            return "Storage is not known; gains − losses, " + last(residual) + "." + covered;
        }
        return "Storage has taken, " + last(storage) + "; in between, from "
                + Figures.typeset(values(storage).min().orElse(0)) + " to "
                + Figures.typeset(values(storage).max().orElse(0)) + ". The residual has come to "
                + last(residual).replace("in the end ", "") + "." + covered;
    }
}
