package org.seepledger.review.mapping;

import java.util.Locale;

/** What a term of a table is. */
public enum Kind {
    /** Flow through faces, a source, or storage: what totals are made of. */
    ITEM,
    /** The sum of what comes in. */
    TOTAL_IN,
    /** The sum of what goes out. */
    TOTAL_OUT,
    /** The change in storage, where it stands for all of storage. */
    CHANGE,
    /** In − out. */
    NET_TOTAL,
    /** What is left unexplained. */
    RESIDUAL,
    /** The residual in percent. */
    PERCENT,
    /** What is in storage when a period begins. */
    OPENING,
    /** What is in storage when it ends. */
    CLOSING,
    /** The sum of the rows above it. */
    SUBTOTAL,
    /** A term of another compartment, such as precipitation: not recomputed. */
    OUTSIDE,
    /** Nobody knows. */
    UNTIED,
    /** Not looked at. */
    IGNORED;

    /** {@return the word for it in a mapping} */
    @Override
    public String toString() {
        return name().toLowerCase(Locale.ROOT).replace('_', ' ');
    }
}
