package org.seepledger.aquifer;

import java.util.List;

/**
 * All that is known of a block of cells in one interval.
 *
 * @param geometry the cells
 * @param saturation their heads and saturated thickness
 * @param flows the flows through their faces
 * @param terms sources by area and by cell, and releases from storage
 * @param wells what wells add to cells, for the wells in the window that was asked for
 */
public record IntervalState(
        CellGeometry geometry, Saturation saturation, FaceFlows flows, List<CellTerm> terms, List<WellRate> wells) {}
