package org.seepledger.aquifer;

import java.util.List;
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
     * {@return the quantities that face flows are linear in when all else is as it stands: one step for each interval}
     *
     * @param aquifer the aquifer whose flow this is
     */
    List<GriddedValues> drivers(Aquifer aquifer);

    /**
     * {@return the face flows of one interval as a function of the drivers}
     *
     * @param interval the interval, from 0
     * @param geometry a block of cells
     * @param saturation their saturation in the interval
     * @param active which of them are active, as {@link #faceFlows} found
     */
    LinearFlow linear(int interval, CellGeometry geometry, Saturation saturation, boolean[] active);

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
