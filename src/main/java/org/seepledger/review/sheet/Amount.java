package org.seepledger.review.sheet;

/** In what a budget may be given. */
public enum Amount {
    /** Length³/time. */
    RATE,
    /** Length³ in a period. */
    VOLUME,
    /** Length over the area, in a period. */
    DEPTH,
    /** Length/time over the area. */
    DEPTH_RATE,
    /** None of them. */
    OTHER
}
