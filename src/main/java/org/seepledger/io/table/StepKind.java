package org.seepledger.io.table;

/** What the steps of a quantity are. */
public enum StepKind {

    /** It does not change. */
    NONE,

    /** It holds for an interval each. */
    INTERVAL,

    /** It holds at an instant each. */
    INSTANT
}
