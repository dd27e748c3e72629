package org.seepledger.job;

import java.nio.file.Path;
import java.util.Optional;
import org.seepledger.balance.Periods;
import org.seepledger.balance.WellRule;
import org.seepledger.io.result.MassUnits;
import org.seepledger.unit.Measure;

/**
 * What a solute balance is asked for.
 *
 * @param aquifer the aquifer folder
 * @param prisms the GeoJSON file of prisms
 * @param out the output folder
 * @param every how often a budget is struck
 * @param periods a CSV of named periods, in place of {@code every}
 * @param waterYearStart the month in which a water year begins, 1 to 12
 * @param rateUnit unit of mass rates, in place of the mass's over the set's time unit
 * @param massUnit unit of masses, in place of kilograms
 * @param volumeUnit unit of volumes, in place of the set's own
 * @param wells how wells in cut cells count
 * @param dispersion whether dispersion is booked
 * @param above the concentration above which volume and area are counted
 * @param transects a GeoJSON file of lines to count what crosses
 * @param panels a CSV of measured panels
 * @param clip whether prisms are cut at the grid's edge
 * @param threads how many threads may work
 * @param overwrite whether an earlier run's files may be replaced
 * @param report what the report is to look like
 */
public record PlumeRequest(
        Path aquifer,
        Path prisms,
        Path out,
        Periods.Every every,
        Optional<Path> periods,
        int waterYearStart,
        Optional<Measure> rateUnit,
        Optional<Measure> massUnit,
        Optional<Measure> volumeUnit,
        WellRule wells,
        boolean dispersion,
        Optional<Threshold> above,
        Optional<Path> transects,
        Optional<Path> panels,
        boolean clip,
        int threads,
        boolean overwrite,
        ReportRequest report) {

    /** The same request with its results in another folder. */
    PlumeRequest into(Path folder) {
        return new PlumeRequest(
                aquifer,
                prisms,
                folder,
                every,
                periods,
                waterYearStart,
                rateUnit,
                massUnit,
                volumeUnit,
                wells,
                dispersion,
                above,
                transects,
                panels,
                clip,
                threads,
                overwrite,
                report);
    }

    /**
     * A concentration with its unit.
     *
     * @param value the number
     * @param unit its unit
     */
    public record Threshold(double value, Measure unit) {

        /**
         * {@return the concentration in kg/length³}
         *
         * @param length the set's length unit
         */
        public double kilograms(Measure length) {
            return value / MassUnits.concentrationFactor(unit, length);
        }

        /** {@return number and unit, as it is typed} */
        @Override
        public String toString() {
            return value + " " + unit;
        }
    }
}
