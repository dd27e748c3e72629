package org.seepledger.ledger;

/**
 * A period of the user's own choosing.
 *
 * @param name its name
 * @param from when it begins, in time units
 * @param to when it ends
 */
public record NamedPeriod(String name, double from, double to) {}
