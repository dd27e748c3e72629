package org.seepledger.job;

import java.util.ArrayList;
import java.util.List;
import org.seepledger.report.ValueRange;
import org.seepledger.unit.Figures;
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

    /** From clay to coarse sand, the least and the greatest found. */
    private static final Published SPECIFIC_YIELD =
            new Published(0, 0.35, "1", "Johnson 1967, USGS Water-Supply Paper 1662-D");

    /** From jointed rock to plastic clay. */
    private static final Published SPECIFIC_STORAGE = new Published(3.3e-6, 2e-2, "1/m", "Domenico 1972");

    /** From unfractured rock to gravel (the bounds from memory). */
    private static final Published CONDUCTIVITY = new Published(1e-13, 1, "m/s", "Freeze and Cherry 1979");

    /** From dense crystalline rock to clay (the bounds from memory). */
    private static final Published POROSITY = new Published(0, 0.7, "1", "Freeze and Cherry 1979");

    /**
     * The widest range that a handbook gives.
     *
     * @param least the least value
     * @param greatest the greatest value
     * @param unit their unit
     * @param source the handbook
     */
    private record Published(double least, double greatest, String unit, String source) {}

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
        if (unit.isCompatible(Measure.of("m/d")) && !range.name().contains("conductivity")) {
            checkFlux(range, unit);
        }
        if (range.name().startsWith("flow ") && range.least() == 0 && range.greatest() == 0) {
            doubts.add("\"" + range.name() + "\" is 0 everywhere.");
        }
        if (range.name().contains("of layer") && size(range) * unit.in(Measure.of("m")) > THICK_METRES) {
            doubts.add("\"" + range.name() + "\" reaches " + shown(range) + ": check its unit.");
        }
        switch (range.name()) {
            case "specific yield" -> checkAgainst(range, unit, SPECIFIC_YIELD);
            case "specific storage" -> checkAgainst(range, unit, SPECIFIC_STORAGE);
            case "flow conductivity", "flow conductivity_y", "flow vertical_conductivity" ->
                checkAgainst(range, unit, CONDUCTIVITY);
            case "storativity" -> checkFraction(range);
            default -> {
                if (range.name().matches("(?s)(effective )?porosity of .*")) {
                    checkPorosity(range, unit);
                }
            }
        }
    }

    private void checkAgainst(ValueRange range, Measure unit, Published published) {
        double factor = unit.in(Measure.of(published.unit()));
        boolean low = range.least() != 0 && range.least() * factor < published.least();
        boolean high = range.greatest() * factor > published.greatest();
        if (low || high) {
            double value = low ? range.least() : range.greatest();
            doubts.add("\"" + range.name() + "\" is " + Figures.shown(value) + unit(range.unit()) + " at "
                    + (low ? range.leastAt() : range.greatestAt()) + ": outside the widest published range, "
                    + published.least() + " to " + published.greatest() + unit(published.unit()) + " ("
                    + published.source() + ").");
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
        }
    }

    private void checkPorosity(ValueRange range, Measure unit) {
        boolean low = range.least() < 0;
        if (low || range.greatest() > 1) {
            doubts.add("\"" + range.name() + "\" is " + Figures.shown(low ? range.least() : range.greatest()) + " at "
                    + (low ? range.leastAt() : range.greatestAt())
                    + ": physically impossible, pores take between 0 and 1 of a rock's volume; 25 % is written 0.25.");
        } else {
            checkAgainst(range, unit, POROSITY);
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

    /** A unit after its number; nothing for what has none. */
    private static String unit(String unit) {
        return unit.equals("1") ? "" : " " + unit;
    }

    private static String shown(ValueRange range) {
        boolean least = Math.abs(range.least()) > Math.abs(range.greatest());
        return Figures.shown(least ? range.least() : range.greatest()) + unit(range.unit()) + " at "
                + (least ? range.leastAt() : range.greatestAt());
    }
}
