package org.seepledger.aquifer;

/**
 * Face flows of one interval as a linear function of what drives them; all else (thicknesses, conductances, which cells
 * are active, which of two is upstream) is as it stands.
 */
interface LinearFlow {

    /**
     * {@return the face flows}
     *
     * @param drivers a value per cell of the block for each of {@link Flow#drivers}, never {@code NaN}; may be changed
     */
    FaceFlows of(double[][] drivers);
}
