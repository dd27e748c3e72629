package org.seepledger.job;

import java.nio.file.Path;
import java.time.LocalDate;

/**
 * What a comparison is asked for.
 *
 * @param first the first run's folder
 * @param second the second run's folder
 * @param out the output folder
 * @param threads how many threads may work
 * @param overwrite whether an earlier run's files may be replaced
 * @param date the date that the report carries
 */
public record CompareRequest(Path first, Path second, Path out, int threads, boolean overwrite, LocalDate date) {}
