package org.seepledger.job;

/**
 * What a trace of a solute's row is asked for.
 *
 * @param row which row, and how the budget is struck; the unit of rates is one of masses
 * @param solute the solute
 * @param dispersion whether dispersion is booked
 */
public record SoluteTraceRequest(TraceRequest row, String solute, boolean dispersion) {}
