package org.seepledger.io.table;

/** What lines mean that give the same cell, layer and step. */
public enum Repeats {

    /** They contradict each other: an error. */
    REFUSED,

    /** They add, as rates of sources in one cell do. */
    ADDED
}
