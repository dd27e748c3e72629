package org.seepledger.balance;

/** How a well counts whose cell a prism cuts. */
public enum WellRule {
    /** A well inside counts in full, one outside not at all; the boundary in its cell carries the radial field about it. */
    POINT,
    /** A well counts by the share of its cell that the prism covers. */
    SPREAD
}
