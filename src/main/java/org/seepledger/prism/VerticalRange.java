package org.seepledger.prism;

import java.util.Optional;
import org.seepledger.aquifer.GriddedValues;

/** How far a prism reaches up and down. */
public sealed interface VerticalRange {

    /**
     * A stack of whole layers.
     *
     * @param first the uppermost, from 0
     * @param last the lowest, not above the first
     */
    record Layers(int first, int last) implements VerticalRange {}

    /**
     * Between two elevations or surfaces.
     *
     * @param top the upper one, in length units; empty for the grid's own
     * @param bottom the lower one; empty for the grid's own
     */
    record Elevations(Optional<GriddedValues> top, Optional<GriddedValues> bottom) implements VerticalRange {}
}
