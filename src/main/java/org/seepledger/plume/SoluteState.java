package org.seepledger.plume;

import java.util.List;
import java.util.Optional;

/**
 * What is known of a solute in a block of cells in one interval.
 *
 * @param matrix what does not change in time
 * @param start concentrations at the interval's begin
 * @param end concentrations at its end
 * @param mean the mean of both, which flows carry
 * @param boundary what enters through the grid's outer faces, by the cell that it enters; empty for the cell's own
 * @param carried what each of the interval's terms, and then wells, adds, by cell; empty for nothing
 * @param parent the solute that it is a product of, if any
 */
record SoluteState(
        Matrix matrix,
        Reading start,
        Reading end,
        Reading mean,
        Optional<double[]> boundary,
        List<Optional<double[]>> carried,
        Optional<SoluteState> parent) {}
