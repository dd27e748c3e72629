package org.seepledger.aquifer;

import java.util.Optional;

/** What was given of flow, from which flows through cell faces follow. */
public sealed interface Flow permits DarcyFlux, GivenFaceFlow, HeadGradient {

    /**
     * Works out the face flows of one interval.
     *
     * @param interval the interval, from 0
     * @param geometry a block of cells with a ring of one cell around those whose faces are wanted
     * @param saturation the same cells' saturation in the interval
     * @return the face flows
     */
    FaceFlows faceFlows(int interval, CellGeometry geometry, Saturation saturation);

    /**
     * {@return whether nothing can flow through the grid's outer sides because the set says so}
     */
    boolean closedSides();

    /**
     * {@return what was given, in words}
     */
    String given();

    /**
     * {@return horizontal conductivity by interval, where the flow was given by it}
     */
    default Optional<GriddedValues> knownConductivity() {
        return Optional.empty();
    }
}
