package org.seepledger.review.mapping;

import java.util.Locale;

/** What a column of a table holds. */
public enum Role {
    /** Names of areas. */
    AREA,
    /** Names of periods. */
    PERIOD,
    /** When periods begin. */
    FROM,
    /** When periods end. */
    TO,
    /** Names of terms. */
    TERM,
    /** Kinds of terms. */
    GROUP,
    /** Layers. */
    LAYER,
    /** Which way figures count. */
    SENSE,
    /** The unit of all figures of the row. */
    UNIT,
    /** The unit of its rates. */
    RATE_UNIT,
    /** The unit of its volumes. */
    VOLUME_UNIT,
    /** Figures. */
    VALUE,
    /** Nothing that is looked at. */
    IGNORED;

    /** {@return the word for it in a mapping} */
    @Override
    public String toString() {
        return name().toLowerCase(Locale.ROOT).replace('_', ' ');
    }
}
