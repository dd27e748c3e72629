package org.seepledger.io.table;

/** What a cell means that begins with {@code <}: a value below a limit. */
public enum Below {

    /** It is no number: an error. */
    REFUSED,

    /** The limit stands for the value. */
    AS_LIMIT,

    /** The limit is what is read; values that are not below one are passed over. */
    LIMIT_ALONE
}
