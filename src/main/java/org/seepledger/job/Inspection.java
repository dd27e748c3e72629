package org.seepledger.job;

import java.util.List;

/**
 * What an inspection of a set finds.
 *
 * @param text all of it, lines of text
 * @param warnings what may be wrong, a sentence each; they stand in the text too
 */
public record Inspection(String text, List<String> warnings) {

    /** Copies the list. */
    public Inspection {
        warnings = List.copyOf(warnings);
    }
}
