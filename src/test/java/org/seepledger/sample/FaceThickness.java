package org.seepledger.sample;

/** How thick the water is that flows through a face, as the half-block on one side of it takes it. */
interface FaceThickness {

    /**
     * {@return the thickness, m}
     *
     * @param cell the block
     * @param face one of its lateral faces
     */
    double of(int cell, int face);

    /** {@return each block's own thickness: the half-blocks' transmissivities stand in series} */
    static FaceThickness own(double[] saturated) {
        return (cell, face) -> saturated[cell];
    }

    /**
     * {@return in layers with a water table the thickness of the block that has the higher head, on both sides of the face:
     * what flows over a step is what the upper side brings; in others each block's own}
     *
     * @param grid the grid
     * @param waterTable for each layer, whether the water table can lie in it
     * @param heads of each cell, m
     * @param saturated the water-filled thickness of each cell, m
     */
    static FaceThickness upstream(BlockGrid grid, boolean[] waterTable, double[] heads, double[] saturated) {
        return (cell, face) -> {
            int behind = grid.behind(face);
            int ahead = grid.ahead(face);
            if (!waterTable[grid.layer(cell)] || behind == BlockGrid.OUTSIDE || ahead == BlockGrid.OUTSIDE) {
                return saturated[cell];
            }
            return saturated[heads[behind] > heads[ahead] ? behind : ahead];
        };
    }
}
