package org.seepledger.job;

import java.util.List;

/**
 * What a review came to.
 *
 * @param summary the summary, lines of text
 * @param fault whether a fault was found
 * @param files the names of the files written
 */
public record ReviewOutcome(String summary, boolean fault, List<String> files) {

    /** Copies the list. */
    public ReviewOutcome {
        files = List.copyOf(files);
    }
}
