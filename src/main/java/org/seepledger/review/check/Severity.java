package org.seepledger.review.check;

import java.util.Locale;

/** How much a finding weighs, the heaviest first. */
public enum Severity {
    /** The budget cannot stand as it is. */
    FAULT,
    /** Its author should explain it. */
    DOUBT,
    /** A reader should know of it; sound budgets have it, too. */
    NOTE;

    /** {@return the word for it in files} */
    @Override
    public String toString() {
        return name().toLowerCase(Locale.ROOT);
    }
}
