package org.seepledger.job;

/** What of a layer can be laid over a map. */
public enum Shown {
    /** Head at the interval's end, in length units. */
    HEAD,
    /** Magnitude of specific discharge in the middle of the cell, in length/time. */
    FLUX,
    /** What areal sources add, in length/time. */
    RECHARGE,
    /** From a cell's bottom to its top, in length units. */
    THICKNESS,
    /** Of that, what holds water at the interval's end. */
    SATURATED_THICKNESS,
    /** What a cell gains that nothing accounts for, in length³/time. */
    IMBALANCE;

    /** {@return whether values may have either sign, so that 0 is a place of its own} */
    public boolean isAboutZero() {
        return this == IMBALANCE;
    }

    /** {@return whether it is the same in all intervals} */
    public boolean isFixed() {
        return this == THICKNESS;
    }
}
