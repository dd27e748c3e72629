package org.seepledger.job;

import java.util.ArrayList;
import java.util.List;
import org.seepledger.report.Figures;
import org.seepledger.report.ValueRange;
import org.seepledger.unit.Measure;

/**
 * Doubts about values and units, from the range of each quantity. Common practice, not rules: a doubt never stops
 * anything.
 */
final class Plausibility {

    /** Specific discharge beyond this is rather a velocity, or in another unit (common practice). */
    private static final double FAST_METRES_A_DAY = 100;

    /** The wettest places on Earth receive about 12 m of rain a year (from memory). */
    private static final double WET_METRES_A_YEAR = 12;

    private static final double THICK_METRES = 10_000;

    /** The greatest of medium to coarse sand and gravel (Johnson 1967, USGS Water-Supply Paper 1662-D). */
    private static final double MOST_SPECIFIC_YIELD = 0.35;

    /** The greatest of plastic clay, per metre (Domenico 1972). */
    private static final double MOST_SPECIFIC_STORAGE = 2e-2;

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
        checkMark(range, unit, range.least(), range.leastAt());
        checkMark(range, unit, range.greatest(), range.greatestAt());
        if (unit.isCompatible(Measure.of("m/d"))) {
            checkFlux(range, unit);
        }
        if (range.name().startsWith("flow ") && range.least() == 0 && range.greatest() == 0) {
            doubts.add("\"" + range.name() + "\" is 0 everywhere.");
        }
        if (range.name().contains("of layer") && size(range) * unit.in(Measure.of("m")) > THICK_METRES) {
            doubts.add("\"" + range.name() + "\" reaches " + shown(range) + ": check its unit.");
        }
        switch (range.name()) {
            case "specific yield", "storativity" -> checkFraction(range);
            case "specific storage" -> checkSpecificStorage(range, unit);
            default -> {}
        }
    }

    private void checkMark(ValueRange range, Measure unit, double value, String at) {
        NoValueMarks.in(value, unit)
                .ifPresent(mark -> doubts.add("\"" + range.name() + "\" is " + mark + " at " + at
                        + ": that looks like a mark for \"no value\" that the file does not declare."));
    }

    private void checkFraction(ValueRange range) {
        if (range.least() < 0 || range.greatest() > 1) {
            doubts.add("\"" + range.name() + "\" goes from " + Figures.shown(range.least()) + " to "
                    + Figures.shown(range.greatest()) + ": it is a fraction between 0 and 1.");
        } else if (range.greatest() > MOST_SPECIFIC_YIELD) {
            doubts.add("\"" + range.name() + "\" reaches " + Figures.shown(range.greatest()) + " at "
                    + range.greatestAt() + ": more than " + MOST_SPECIFIC_YIELD + " is hardly ever found.");
        }
    }

    private void checkSpecificStorage(ValueRange range, Measure unit) {
        double greatest = range.greatest() * unit.in(Measure.of("1/m"));
        if (range.least() < 0 || greatest > MOST_SPECIFIC_STORAGE) {
            doubts.add("\"" + range.name() + "\" reaches " + shown(range)
                    + ": it is hardly ever negative or more than " + MOST_SPECIFIC_STORAGE
                    + " per metre; check its unit, and that it is not storativity.");
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
