package org.seepledger.job;

import java.nio.file.Path;
import java.time.LocalDate;
import java.util.Optional;

/**
 * What a review is asked for.
 *
 * @param aquifer the aquifer folder; empty to look at the table alone
 * @param prisms the GeoJSON file of prisms; empty to look at the table alone
 * @param submitted the submitted budget, CSV or XLSX
 * @param mapping how the submission is to be read where the guess is wrong
 * @param out the output folder
 * @param tolerance how far figures may differ, in percent of throughput
 * @param wholeCells whether cells along outlines are taken whole
 * @param waterYearStart the month in which a water year begins, 1 to 12
 * @param clip whether prisms are cut at the grid's edge
 * @param threads how many threads may work
 * @param overwrite whether an earlier run's files may be replaced
 * @param date the date that the report carries
 */
public record ReviewRequest(
        Optional<Path> aquifer,
        Optional<Path> prisms,
        Path submitted,
        Optional<Path> mapping,
        Path out,
        double tolerance,
        boolean wholeCells,
        int waterYearStart,
        boolean clip,
        int threads,
        boolean overwrite,
        LocalDate date) {}
