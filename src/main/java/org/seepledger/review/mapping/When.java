package org.seepledger.review.mapping;

import java.util.Optional;

/**
 * A period of a table.
 *
 * @param label its name there
 * @param name the name of ours that it is tied to; else the same
 * @param days the days that its name or its dates say; empty if neither does
 * @param from when it begins, in time units of the aquifer; NaN if not said so
 * @param to when it ends; NaN if not said so
 * @param whole whether it is all of the table's other periods together
 */
public record When(String label, String name, Optional<Days> days, double from, double to, boolean whole) {}
