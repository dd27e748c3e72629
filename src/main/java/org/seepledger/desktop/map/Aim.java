package org.seepledger.desktop.map;

/** What a press would do, told by the cursor. */
public enum Aim {
    /** Drag the map. */
    PAN,
    /** Place a vertex. */
    DRAW,
    /** Take hold of a vertex or a prism. */
    MOVE,
    /** Choose a side or a prism. */
    CHOOSE
}
