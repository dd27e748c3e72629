package org.seepledger.ledger;

/**
 * A stretch of time that a budget is asked for.
 *
 * @param name what it is called in the result
 * @param from when it begins, in time units
 * @param to when it ends, in time units, after the beginning
 */
public record NamedPeriod(String name, double from, double to) {}
