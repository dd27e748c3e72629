package org.seepledger.prism;

/**
 * How a prism meets one well: whether it holds the well, and what each piece of boundary in the well's cell carries of
 * its rate beside the cell's own field.
 *
 * @param inside whether the well is inside
 * @param share the share of the well's cell that the prism covers
 * @param pieces the pieces in the well's cell; none where the cell is whole or outside
 * @param carried for each of them, the outflow that it carries as a share of the well's rate
 */
public record WellCut(boolean inside, double share, int[] pieces, double[] carried) {}
