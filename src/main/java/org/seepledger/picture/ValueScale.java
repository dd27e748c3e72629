package org.seepledger.picture;

import java.util.DoubleSummaryStatistics;
import java.util.stream.DoubleStream;

/**
 * Which colour a value has.
 *
 * @param ramp the colours
 * @param from the value at the ramp's beginning
 * @param to the value at its end, beyond {@code from}
 * @param logarithmic whether equal ratios take equal parts of the ramp, rather than equal differences
 */
public record ValueScale(Ramp ramp, double from, double to, boolean logarithmic) {

    private static final double SHOWN = 0.98;

    /** Values that differ by less than this share of their size are one value and its rounding. */
    private static final double ROUNDING = 1e-9;

    /** What is less than this part of the greatest value has no colours of its own on a logarithmic scale. */
    private static final double DEEPEST = 1e-4;

    /** Refuses an empty range, and a logarithmic one that does not begin above 0. */
    public ValueScale {
        if (!(to > from) || logarithmic && !(from > 0)) {
            throw new IllegalArgumentException("no range from " + from + " to " + to);
        }
    }

    /**
     * Makes a scale of equal differences.
     *
     * @param ramp the colours
     * @param from the value at the ramp's beginning
     * @param to the value at its end, beyond {@code from}
     */
    public ValueScale(Ramp ramp, double from, double to) {
        this(ramp, from, to, false);
    }

    /**
     * {@return a logarithmic scale in the same colours, to the greatest of some values and over four powers of ten at most; this
     * one where none is above 0}
     *
     * @param values the values; those that are not finite do not count
     */
    public ValueScale logarithmicOver(double[] values) {
        double greatest = finite(values).max().orElse(0);
        double least = finite(values).filter(value -> value > 0).min().orElse(0);
        double begin = Math.max(least, DEEPEST * greatest);
        return greatest > 0 ? new ValueScale(ramp, Math.min(begin, 0.1 * greatest), greatest, true) : this;
    }

    /**
     * {@return a scale from the least to the greatest of some values; a narrow one about a single value, rounding
     * aside, and 0 to 1 about none}
     *
     * @param values the values; those that are not finite do not count
     */
    public static ValueScale over(double[] values) {
        double least = finite(values).min().orElse(0);
        double greatest = finite(values).max().orElse(1);
        double room = isFlat(values) ? Math.max(1e-3, 1e-3 * Math.abs(least)) : 0;
        return new ValueScale(Ramp.DEPTH, least - room, greatest + room);
    }

    /**
     * {@return a scale of concentrations, from 0 to the greatest of some values}
     *
     * @param values the values; those that are not finite do not count
     */
    public static ValueScale ofConcentrations(double[] values) {
        double greatest = finite(values).max().orElse(0);
        return new ValueScale(Ramp.STAIN, 0, greatest > 0 ? greatest : 1);
    }

    /** {@return whether values are all the same but for rounding, so that lines between them would mean nothing} */
    static boolean isFlat(double[] values) {
        DoubleSummaryStatistics known = finite(values).summaryStatistics();
        double size = Math.max(Math.abs(known.getMin()), Math.abs(known.getMax()));
        return known.getCount() > 0 && known.getMax() - known.getMin() <= ROUNDING * size;
    }

    /**
     * {@return a scale that has 0 in its middle and ends at the size that only one in fifty values exceeds, so that a few
     * extremes do not bleach the rest}
     *
     * @param values the values; those that are not finite do not count
     */
    public static ValueScale aboutZero(double[] values) {
        double[] sizes = finite(values).map(Math::abs).sorted().toArray();
        double most = sizes.length == 0 ? 0 : sizes[(int) (SHOWN * (sizes.length - 1))];
        double end = most > 0 ? most : sizes.length > 0 && sizes[sizes.length - 1] > 0 ? sizes[sizes.length - 1] : 1;
        return new ValueScale(Ramp.SWING, -end, end);
    }

    private static DoubleStream finite(double[] values) {
        return DoubleStream.of(values).filter(Double::isFinite);
    }

    /**
     * {@return the colour of a value: alpha, red, green and blue, eight bits each; nothing for one that is not finite}
     *
     * @param value the value
     * @param opacity from 0 to 1
     */
    public int argb(double value, double opacity) {
        int alpha = (int) Math.round(255 * opacity);
        return Double.isFinite(value) ? alpha << 24 | ramp.rgb(share(value)) : 0;
    }

    /**
     * {@return where along the ramp a value lies, 0 at its beginning and 1 at its end}
     *
     * @param value the value
     */
    public double share(double value) {
        return logarithmic ? Math.log(Math.max(value, 0) / from) / Math.log(to / from) : (value - from) / (to - from);
    }

    /**
     * {@return the value at a place along the ramp}
     *
     * @param share 0 at its beginning and 1 at its end
     */
    public double at(double share) {
        return logarithmic ? from * Math.pow(to / from, share) : from + share * (to - from);
    }

    /**
     * {@return round values in the range}
     *
     * @param most how many there may be, at least 2
     */
    public RoundValues ticks(int most) {
        return logarithmic ? LogTicks.within(from, to, most) : Ticks.within(from, to, most);
    }
}
