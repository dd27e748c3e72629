package org.seepledger.aquifer;

/** Where in depth a point source takes or gives water. */
public sealed interface Screen {

    /**
     * The whole of one layer.
     *
     * @param layer from 0
     */
    record InLayer(int layer) implements Screen {}

    /**
     * A length of the vertical.
     *
     * @param top its upper elevation, in length units
     * @param bottom its lower elevation, below the upper one
     */
    record Between(double top, double bottom) implements Screen {}
}
