package org.seepledger.job;

import java.util.ArrayList;
import java.util.List;
import java.util.Set;
import org.seepledger.report.Figures;
import org.seepledger.report.ValueRange;
import org.seepledger.unit.Measure;

/**
 * Doubts about values and units, from the range of each quantity. Common practice, not rules: a doubt never stops
 * anything.
 */
final class Plausibility {

    /** Values that programs commonly write for "no value". */
    private static final Set<Double> MARKS =
            Set.of(-999.0, -9999.0, -99999.0, -999.99, -32768.0, 9999.0, 99999.0, 1e20, -1e20, 1e30, -1e30, -888.0);

    private static final double BEYOND_ANY_VALUE = 1e19;

    /** Specific discharge beyond this is rather a velocity, or in another unit (common practice). */
    private static final double FAST_METRES_A_DAY = 100;

    /** The wettest places on Earth receive about 12 m of rain a year (from memory). */
    private static final double WET_METRES_A_YEAR = 12;

    private static final double THICK_METRES = 10_000;

    private final List<String> doubts = new ArrayList<>();

    private Plausibility() {}

    static List<String> doubts(List<ValueRange> ranges) {
        Plausibility check = new Plausibility();
        ranges.forEach(check::check);
        return check.doubts;
    }

    private void check(ValueRange range) {
        Measure unit = Measure.of(range.unit());
        if (range.values() == 0) {
            doubts.add("\"" + range.name() + "\" has no value anywhere.");
            return;
        }
        checkMark(range, range.least(), range.leastAt());
        checkMark(range, range.greatest(), range.greatestAt());
        if (unit.isCompatible(Measure.of("m/d"))) {
            checkFlux(range, unit);
        }
        if (range.name().startsWith("flow ") && range.least() == 0 && range.greatest() == 0) {
            doubts.add("\"" + range.name() + "\" is 0 everywhere.");
        }
        if (range.name().contains("of layer") && size(range) * unit.in(Measure.of("m")) > THICK_METRES) {
            doubts.add("\"" + range.name() + "\" reaches " + shown(range) + ": check its unit.");
        }
        boolean fraction = range.name().equals("specific yield");
        if (fraction && (range.least() < 0 || range.greatest() > 1)) {
            doubts.add("\"" + range.name() + "\" goes from " + Figures.shown(range.least()) + " to "
                    + Figures.shown(range.greatest()) + ": it is a fraction between 0 and 1.");
        }
    }

    private void checkMark(ValueRange range, double value, String at) {
        if (MARKS.contains(value) || Math.abs(value) > BEYOND_ANY_VALUE) {
            doubts.add("\"" + range.name() + "\" is " + value + " at " + at
                    + ": that looks like a mark for \"no value\" that the file does not declare.");
        }
    }

    private void checkFlux(ValueRange range, Measure unit) {
        boolean flow = range.name().startsWith("flow ");
        double limit = flow
                ? FAST_METRES_A_DAY
                : WET_METRES_A_YEAR * Measure.of("m/yr").in(Measure.of("m/d"));
        if (size(range) * unit.in(Measure.of("m/d")) > limit) {
            String advice = flow
                    ? "specific discharge is seldom so large; check that it is not seepage velocity, and its unit"
                    : "no climate brings so much; check its unit";
            doubts.add("\"" + range.name() + "\" reaches " + shown(range) + ": " + advice + ".");
        }
    }

    private static double size(ValueRange range) {
        return Math.max(Math.abs(range.least()), Math.abs(range.greatest()));
    }

    private static String shown(ValueRange range) {
        boolean least = Math.abs(range.least()) > Math.abs(range.greatest());
        return Figures.shown(least ? range.least() : range.greatest()) + " " + range.unit() + " at "
                + (least ? range.leastAt() : range.greatestAt());
    }
}
