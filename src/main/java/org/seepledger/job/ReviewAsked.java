package org.seepledger.job;

import java.nio.file.Path;
import org.seepledger.review.mapping.Mapping;

/**
 * What is to be reviewed, and how.
 *
 * @param submitted the submitted budget, CSV or XLSX
 * @param corrections how it is to be read where the guess is wrong
 * @param tolerance how far figures may differ, in percent of throughput
 * @param wholeCells whether cells along outlines are taken whole
 * @param waterYearStart the month in which a water year begins, 1 to 12
 */
public record ReviewAsked(
        Path submitted, Mapping corrections, double tolerance, boolean wholeCells, int waterYearStart) {}
