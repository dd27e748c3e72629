package org.seepledger.job;

/**
 * Horizontal specific discharge at the centres of squares of cells, length/time, along the map's axes.
 *
 * @param east toward map east; {@code NaN} where there is none
 * @param north toward map north; {@code NaN} where there is none
 */
public record FluxField(GridLayer east, GridLayer north) {}
