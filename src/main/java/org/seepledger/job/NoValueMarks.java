package org.seepledger.job;

import java.util.List;
import java.util.Optional;
import java.util.stream.DoubleStream;
import org.seepledger.unit.Measure;

/**
 * Numbers that programs commonly write where there is no value, recognised in any unit that the file may have been in
 * (common practice).
 */
final class NoValueMarks {

    private static final double[] MARKS = {
        -888, -999, -999.99, -9999, -99999, -999999, -32768, 9999, 99999, 999999, 1e20, -1e20, 1e30, -1e30
    };

    private static final double BEYOND_ANY_VALUE = 1e19;

    /** What converting there and back may cost; single precision where a mark is stored so. */
    private static final double SAME = 1e-7;

    private static final List<Measure> UNITS = List.of(
                    "m",
                    "cm",
                    "mm",
                    "km",
                    "ft",
                    "m/d",
                    "mm/d",
                    "m/s",
                    "m/yr",
                    "mm/yr",
                    "cm/yr",
                    "in/yr",
                    "ft/d",
                    "m3/d",
                    "m3/s",
                    "m3/h",
                    "m3/yr",
                    "L/s",
                    "ft3/d",
                    "ft3/s",
                    "gal/min",
                    "acre-ft/yr")
            .stream()
            .map(Measure::of)
            .toList();

    private NoValueMarks() {}

    /**
     * {@return the mark that a value looks like, in words}
     *
     * @param value the value
     * @param unit the unit that it is in
     */
    static Optional<String> in(double value, Measure unit) {
        if (isMark(value) || Math.abs(value) > BEYOND_ANY_VALUE) {
            return Optional.of(String.valueOf(value));
        }
        return UNITS.stream()
                .filter(other -> other.isCompatible(unit) && isMark(value * unit.in(other)))
                .findFirst()
                .map(other -> Math.round(value * unit.in(other)) + " in " + other);
    }

    private static boolean isMark(double value) {
        return DoubleStream.of(MARKS).anyMatch(mark -> Math.abs(value - mark) <= SAME * Math.abs(mark));
    }
}
