package org.seepledger.job;

import java.util.List;
import org.seepledger.plume.Plume;
import org.seepledger.prism.Prism;

/**
 * What one prism holds of each solute in one interval, and which geometry it belongs to.
 *
 * @param prism the prism that was asked about, as it was drawn
 * @param area its plan area on the grid, length²
 * @param interval the interval, from 0
 * @param plumes by solute; they have no numbers for other intervals
 * @param notes what was done to the prism, as cutting it at the grid's edge
 */
public record IntervalPlume(Prism prism, double area, int interval, List<Plume> plumes, List<String> notes) {

    /** Copies the lists. */
    public IntervalPlume {
        plumes = List.copyOf(plumes);
        notes = List.copyOf(notes);
    }
}
