package org.seepledger.job;

import java.util.List;

/**
 * What a balance came to.
 *
 * @param summary the summary, lines of text
 * @param worstClosureError the largest closure error of any prism and period, in percent, without sign; NaN where none
 *     can be given
 * @param files the names of the files written
 */
public record BalanceOutcome(String summary, double worstClosureError, List<String> files) {

    /** Copies the list. */
    public BalanceOutcome {
        files = List.copyOf(files);
    }
}
