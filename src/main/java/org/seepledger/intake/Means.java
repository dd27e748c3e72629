package org.seepledger.intake;

/** What a field of names, or the bands of a raster, count. */
public enum Means {
    /** Layers. */
    LAYER,
    /** Instants or intervals. */
    TIME,
    /** Nothing that matters. */
    NOTHING
}
