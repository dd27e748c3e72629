package org.seepledger.desktop.ledger;

/** How a budget is laid out in lines. */
public enum Arrangement {
    /** A line for each face, source and storage item, layers added up. */
    ITEMS,
    /** A line for each of them in each layer. */
    ITEMS_BY_LAYER,
    /** For each layer a line for all its sides, lids, sources and storage. */
    LAYERS
}
