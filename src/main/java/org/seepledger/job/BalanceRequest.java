package org.seepledger.job;

import java.nio.file.Path;
import java.util.Optional;
import org.seepledger.balance.Periods;
import org.seepledger.balance.WellRule;
import org.seepledger.unit.Measure;

/**
 * What a balance is asked for.
 *
 * @param aquifer the aquifer folder
 * @param prisms the GeoJSON file of prisms
 * @param out the output folder
 * @param every how often a budget is struck
 * @param periods a CSV of named periods, in place of {@code every}
 * @param waterYearStart the month in which a water year begins, 1 to 12
 * @param rateUnit unit of rates, in place of the set's own
 * @param volumeUnit unit of volumes, in place of the set's own
 * @param wells how wells in cut cells count
 * @param clip whether prisms are cut at the grid's edge
 * @param threads how many threads may work
 * @param overwrite whether an earlier run's files may be replaced
 * @param report what the report is to look like
 */
public record BalanceRequest(
        Path aquifer,
        Path prisms,
        Path out,
        Periods.Every every,
        Optional<Path> periods,
        int waterYearStart,
        Optional<Measure> rateUnit,
        Optional<Measure> volumeUnit,
        WellRule wells,
        boolean clip,
        int threads,
        boolean overwrite,
        ReportRequest report) {

    /** The same request with its results in another folder. */
    BalanceRequest into(Path folder) {
        return new BalanceRequest(
                aquifer,
                prisms,
                folder,
                every,
                periods,
                waterYearStart,
                rateUnit,
                volumeUnit,
                wells,
                clip,
                threads,
                overwrite,
                report);
    }
}
