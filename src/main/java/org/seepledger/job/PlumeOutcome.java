package org.seepledger.job;

import java.util.List;

/**
 * What a solute balance came to.
 *
 * @param summary the summary, lines of text
 * @param worstClosureError the largest closure error of any prism, solute and period, in percent, without sign; NaN where
 *     none can be given
 * @param files the names of the files written
 */
public record PlumeOutcome(String summary, double worstClosureError, List<String> files) {

    /** Copies the list. */
    public PlumeOutcome {
        files = List.copyOf(files);
    }
}
