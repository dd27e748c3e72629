package org.seepledger.aquifer;

/**
 * What a well adds to one cell in one interval.
 *
 * @param well the well
 * @param layer the cell's layer, from 0
 * @param rate length³/time, positive where it adds water
 */
public record WellRate(PlacedWell well, int layer, double rate) {}
