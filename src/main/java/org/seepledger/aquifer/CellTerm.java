package org.seepledger.aquifer;

/**
 * One term of the cells' balance in an interval, other than flow between cells and wells.
 *
 * @param storage whether it is a release from storage, rather than a source
 * @param item the category or storage item
 * @param entry where in a cell's height it enters
 * @param rates a rate per cell of the block, length³/time, positive where it adds water
 * @param missing in how many cells of the inner window there was no value
 * @param lost how much of what was given in the inner window found no active cell, as a sum of magnitudes
 */
public record CellTerm(boolean storage, String item, Entry entry, double[] rates, int missing, double lost) {

    /** The same term with other rates. */
    CellTerm with(double[] others) {
        return new CellTerm(storage, item, entry, others, 0, 0);
    }

    /** Where in a cell's height a term enters. */
    public enum Entry {
        /** Evenly over the saturated height. */
        THROUGHOUT,
        /** At the water table, or at the top of a saturated cell. */
        AT_WATER_TABLE,
        /** Where the water table passes. */
        WHERE_IT_PASSES
    }
}
