package org.seepledger.picture;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import java.util.Optional;
import java.util.stream.DoubleStream;
import org.seepledger.aquifer.Grid;
import org.seepledger.ledger.Period;
import org.seepledger.picture.Mark.Fill;
import org.seepledger.picture.Mark.Stroke;
import org.seepledger.plume.Crossing;
import org.seepledger.plume.NonDetects;
import org.seepledger.plume.Panels;
import org.seepledger.unit.Figures;

/**
 * What crosses a drawn transect along its way: mass discharge per length of the line, all layers together and each by
 * itself. The area under the curve is the mass discharge.
 */
public final class CrossingProfile {

    private static final double RIGHT = 10;
    private static final double TOP = 8;
    private static final double HIGH = 190;
    private static final double SIZE = 11;
    private static final Fill ALL = new Fill(Ink.Token.PLUME, 0.3, Mark.Texture.PLAIN);
    private static final List<Stroke> LAYERS = List.of(
            Stroke.of(Ink.Token.TEXT, 1.6),
            Stroke.of(Ink.Token.LOSS, 1.6).dashed(6.0, 3.0),
            Stroke.of(Ink.Token.GAIN, 1.6).dashed(2.0, 2.0),
            Stroke.of(Ink.Token.RESIDUAL, 1.6).dashed(8.0, 3.0, 2.0, 3.0));

    private final Crossing crossing;
    private final Period period;
    private final double factor;
    private final List<Crossing.Stretch> way;

    private CrossingProfile(Crossing crossing, Period period, Grid grid, double factor) {
        this.crossing = crossing;
        this.period = period;
        this.factor = factor;
        this.way = crossing.along(grid);
    }

    /**
     * {@return the profile}
     *
     * @param crossing what crosses
     * @param period in which period, the mean over it
     * @param grid the grid
     * @param layers the layers' names
     * @param length the unit of lengths as it is written
     * @param rate the unit of rates as it is written
     * @param factor how many of it one kilogram over the set's time unit is
     * @param width in logical pixels, at least 340
     */
    public static Picture of(
            Crossing crossing,
            Period period,
            Grid grid,
            List<String> layers,
            String length,
            String rate,
            double factor,
            double width) {
        return new CrossingProfile(crossing, period, grid, factor).picture(layers, length, rate, width);
    }

    /** Along the line, in the rate's unit per length; -1 for all layers. */
    private double[] density(int layer) {
        return way.stream()
                .mapToDouble(
                        piece -> crossing.rate(period, piece.piece(), layer) * factor / (piece.to() - piece.from()))
                .toArray();
    }

    private double length() {
        return way.get(way.size() - 1).to();
    }

    private Picture picture(List<String> layers, String length, String rate, double width) {
        double[] all = density(-1);
        List<double[]> single = new ArrayList<>();
        for (int layer = 0; layer < layers.size(); layer++) {
            single.add(density(layer));
        }
        double[] range = single.stream()
                .reduce(
                        all,
                        (one, other) -> DoubleStream.concat(Arrays.stream(one), Arrays.stream(other))
                                .toArray());
        double least = Arrays.stream(range).min().orElse(0);
        double greatest = Arrays.stream(range).max().orElse(0);
        double left = 12 + new ValueAxis(least, greatest, 0, HIGH).labelWidth(true);
        double right = width - RIGHT;
        List<Mark> marks = new ArrayList<>();
        Key key = new Key(left, right, 0, marks)
                .filled(ALL, "mass discharge, " + rate + " per " + length + ", all layers");
        List<Integer> shown = carrying(single);
        for (int i = 0; i < shown.size() && shown.size() > 1; i++) {
            key.line(LAYERS.get(i % LAYERS.size()), layers.get(shown.get(i)));
        }
        ValueAxis axis = new ValueAxis(least, greatest, key.end() + TOP, HIGH);
        axis.draw(left, right, true, marks);
        marks.add(new Mark.Area(
                List.of(closed(steps(all, left, right, axis), axis.y(0))),
                Optional.of(ALL),
                Optional.of(Stroke.of(Ink.Token.PLUME, 1.2))));
        for (int i = 0; i < shown.size() && shown.size() > 1; i++) {
            marks.add(new Mark.Line(steps(single.get(shown.get(i)), left, right, axis), LAYERS.get(i % LAYERS.size())));
        }
        axis.zero(left, right, marks);
        double bottom = key.end() + TOP + HIGH;
        along(left, right, bottom, length, marks);
        String title =
                crossing.solute().name() + " across " + crossing.transect().name() + ", " + period.name();
        return new Picture(width, bottom + 40, title, description(rate), marks);
    }

    /** The layers in which anything crosses. */
    private static List<Integer> carrying(List<double[]> single) {
        List<Integer> carrying = new ArrayList<>();
        for (int layer = 0; layer < single.size(); layer++) {
            if (Arrays.stream(single.get(layer)).anyMatch(density -> density != 0)) {
                carrying.add(layer);
            }
        }
        return carrying;
    }

    private double[] steps(double[] densities, double left, double right, ValueAxis axis) {
        double[] xy = new double[4 * densities.length];
        double scale = (right - left) / length();
        for (int piece = 0; piece < densities.length; piece++) {
            xy[4 * piece] = left + way.get(piece).from() * scale;
            xy[4 * piece + 1] = axis.y(densities[piece]);
            xy[4 * piece + 2] = left + way.get(piece).to() * scale;
            xy[4 * piece + 3] = axis.y(densities[piece]);
        }
        return xy;
    }

    private static double[] closed(double[] steps, double zero) {
        double[] ring = Arrays.copyOf(steps, steps.length + 4);
        ring[steps.length] = steps[steps.length - 2];
        ring[steps.length + 1] = zero;
        ring[steps.length + 2] = steps[0];
        ring[steps.length + 3] = zero;
        return ring;
    }

    private void along(double left, double right, double bottom, String unit, List<Mark> marks) {
        double length = length();
        Stroke thin = Stroke.of(Ink.Token.MUTED, 1);
        marks.add(new Mark.Line(new double[] {left, bottom + 4, right, bottom + 4}, thin));
        Ticks ticks = Ticks.within(0, length, 8);
        for (int i = 0; i < ticks.count(); i++) {
            double x = left + ticks.values().get(i) / length * (right - left);
            marks.add(new Mark.Line(new double[] {x, bottom + 4, x, bottom + 8}, thin));
            double half = Lettering.width(ticks.label(i), SIZE) / 2;
            double middle = Math.min(x, right + RIGHT - half);
            marks.add(Mark.Text.of(middle, bottom + 20, ticks.label(i), SIZE, Mark.Anchor.MIDDLE)
                    .in(Ink.Token.MUTED));
        }
        String words = "distance along the line, " + unit + "; positive values cross to the right of the line as drawn";
        marks.add(Mark.Text.of(left, bottom + 35, Lettering.fitted(words, SIZE, right - left), SIZE, Mark.Anchor.START)
                .in(Ink.Token.MUTED));
    }

    private String description(String rate) {
        Panels panels = crossing.panels(period, NonDetects.HALF, -1, -1);
        return "Mass discharge per length along the line; over all of it "
                + Figures.typeset(panels.discharge() * factor) + " " + rate + ".";
    }
}
