package org.seepledger.desktop.intake;

/**
 * A line of the list of items.
 *
 * @param index which item, from 0; −1 for the set as a whole
 * @param title what it is called
 * @param lead what it is taken for
 * @param mark how it stands
 */
record ItemRow(int index, String title, String lead, Mark mark) {

    /** How something stands. */
    enum Mark {
        /** Nothing is wrong with it. */
        FINE,
        /** Something is doubtful. */
        DOUBT,
        /** Something is wrong. */
        FAULT,
        /** It is not used. */
        UNUSED
    }
}
