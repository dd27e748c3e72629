package org.seepledger.aquifer;

/**
 * One term of the cells' balance in an interval, other than flow between cells and wells.
 *
 * @param storage whether it is a release from storage, rather than a source
 * @param item the category or storage item
 * @param rates a rate per cell of the block, length³/time, positive where it adds water
 * @param missing in how many cells of the inner window there was no value
 * @param lost how much of what was given in the inner window found no active cell, as a sum of magnitudes
 */
public record CellTerm(boolean storage, String item, double[] rates, int missing, double lost) {}
