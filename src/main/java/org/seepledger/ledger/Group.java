package org.seepledger.ledger;

import java.util.Locale;

/** The kinds of rows in a budget, in their order. */
public enum Group {
    /** Flow through a vertical side. */
    SIDE,
    /** Flow through the top or the bottom. */
    LID,
    /** What sources add and take. */
    SOURCE,
    /** What spreads through sides and lids beside the mean flow; of solutes alone. */
    DISPERSION,
    /** What decays; of solutes alone. */
    DECAY,
    /** What the decay of another solute produces. */
    PRODUCTION,
    /** What storage gives and takes. */
    STORAGE,
    /** Totals of a prism and period. */
    TOTAL;

    /** {@return the word for it in files} */
    @Override
    public String toString() {
        return name().toLowerCase(Locale.ROOT);
    }
}
