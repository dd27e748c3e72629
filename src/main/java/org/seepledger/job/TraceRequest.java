package org.seepledger.job;

import java.nio.file.Path;
import java.util.Optional;
import org.seepledger.balance.Periods;
import org.seepledger.balance.WellRule;
import org.seepledger.unit.Measure;

/**
 * What a trace is asked for.
 *
 * @param aquifer the aquifer folder
 * @param prisms the GeoJSON file of prisms
 * @param row the row, as {@code PRISM/PERIOD/ITEM/LAYER}
 * @param out the output file
 * @param every how often the budget is struck
 * @param periods a CSV of named periods, in place of {@code every}
 * @param waterYearStart the month in which a water year begins, 1 to 12
 * @param rateUnit unit of rates, in place of the set's own
 * @param wells how wells in cut cells count
 * @param clip whether prisms are cut at the grid's edge
 * @param threads how many threads may work on the budget
 * @param overwrite whether an earlier trace may be replaced
 */
public record TraceRequest(
        Path aquifer,
        Path prisms,
        String row,
        Path out,
        Periods.Every every,
        Optional<Path> periods,
        int waterYearStart,
        Optional<Measure> rateUnit,
        WellRule wells,
        boolean clip,
        int threads,
        boolean overwrite) {}
