package org.seepledger.review.mapping;

import java.util.Locale;

/** Which way a figure counts. */
public enum Sense {
    /** What comes in, or is released from storage. */
    IN,
    /** What goes out, or is taken up by storage. */
    OUT,
    /** In − out. */
    NET,
    /** Out − in: a net outflow, or a change in storage. */
    LOSS;

    /** {@return the word for it in a mapping} */
    @Override
    public String toString() {
        return name().toLowerCase(Locale.ROOT);
    }
}
