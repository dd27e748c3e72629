package org.seepledger.aquifer;

/** Whether change in storage can be given. */
public enum StorageKnowledge {
    /** Nothing changes: one interval without heads, or one head for all instants. */
    STEADY,
    /** It follows from heads and coefficients, or was supplied. */
    KNOWN,
    /** Heads or coefficients are missing: storage and all that rests on it stay empty. */
    UNKNOWN
}
