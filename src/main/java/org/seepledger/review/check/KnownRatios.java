package org.seepledger.review.check;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import java.util.Optional;

/**
 * Ratios of units that are mistaken for each other. Lengths, areas and volumes: NIST Handbook 44, Appendix C.
 */
final class KnownRatios {

    /** How near a ratio must be to a known one. */
    static final double NEAR = 0.01;

    private static final double FOOT = 0.3048;
    private static final double ACRE = 4046.8564224;
    private static final double GALLON = 0.003785411784;
    private static final List<Ratio> KNOWN = known();

    /**
     * A ratio.
     *
     * @param value submitted ÷ right
     * @param words whose ratio it is
     */
    record Ratio(double value, String words) {}

    private KnownRatios() {}

    static List<Ratio> all() {
        return KNOWN;
    }

    /** The known ratio that is nearest to one, if it is near; of either sign. */
    static Optional<Ratio> nearest(double ratio) {
        double size = Math.abs(ratio);
        return KNOWN.stream()
                .filter(known -> Math.abs(size / known.value() - 1) <= NEAR)
                .min(Comparator.comparingDouble(known -> Math.abs(Math.log(size / known.value()))));
    }

    private static List<Ratio> known() {
        List<Ratio> one = new ArrayList<>();
        one.add(new Ratio(1 / FOOT, "feet to metres"));
        one.add(new Ratio(1 / (FOOT * FOOT), "square feet to square metres"));
        one.add(new Ratio(1 / (FOOT * FOOT * FOOT), "cubic feet to cubic metres"));
        one.add(new Ratio(ACRE * FOOT, "acre-feet to cubic metres"));
        one.add(new Ratio(43_560, "acre-feet to cubic feet"));
        one.add(new Ratio(1 / GALLON, "gallons to cubic metres"));
        one.add(new Ratio(FOOT * FOOT * FOOT / GALLON, "gallons to cubic feet"));
        one.add(new Ratio(ACRE * FOOT / GALLON, "gallons to acre-feet"));
        one.add(new Ratio(ACRE, "acres to square metres"));
        one.add(new Ratio(10, "10: a decimal point out of place"));
        one.add(new Ratio(
                100, "100: a decimal point out of place, or centimetres to metres, hectares to square kilometres"));
        one.add(new Ratio(1_000, "1000: litres to cubic metres, cubic metres to megalitres, millimetres to metres"));
        one.add(new Ratio(10_000, "hectares to square metres"));
        one.add(new Ratio(1e6, "1,000,000: square metres to square kilometres, litres to megalitres"));
        one.add(new Ratio(25.4, "inches to millimetres"));
        one.add(new Ratio(12, "12: inches to feet, months to years"));
        one.add(new Ratio(365, "days to years (365 days)"));
        one.add(new Ratio(365.25, "days to years (365.25 days)"));
        one.add(new Ratio(366, "days to years (366 days)"));
        one.add(new Ratio(30, "days to months (30 days)"));
        one.add(new Ratio(30.4375, "days to months (30.44 days)"));
        one.add(new Ratio(31, "days to months (31 days)"));
        one.add(new Ratio(28, "days to months (28 days)"));
        one.add(new Ratio(7, "days to weeks"));
        one.add(new Ratio(24, "hours to days"));
        one.add(new Ratio(60, "seconds to minutes, or minutes to hours"));
        one.add(new Ratio(1_440, "minutes to days"));
        one.add(new Ratio(3_600, "seconds to hours"));
        one.add(new Ratio(86_400, "seconds to days"));
        one.add(new Ratio(86.4, "litres a second to cubic metres a day"));
        one.add(new Ratio(31_557_600, "seconds to years"));
        one.add(new Ratio(86_400 * FOOT * FOOT * FOOT, "cubic feet a second to cubic metres a day"));
        one.add(new Ratio(1_440 * GALLON, "gallons a minute to cubic metres a day"));
        one.add(new Ratio(ACRE * FOOT / 365.25, "acre-feet a year to cubic metres a day"));
        List<Ratio> both = new ArrayList<>(one);
        one.forEach(ratio -> both.add(new Ratio(1 / ratio.value(), ratio.words())));
        return List.copyOf(both);
    }
}
