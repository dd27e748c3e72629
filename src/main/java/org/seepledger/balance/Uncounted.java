package org.seepledger.balance;

/**
 * What of a source's or storage item's values was not counted in an interval.
 *
 * @param missing cells without a value
 * @param lost what found no active cell, length³/time, as a sum of magnitudes
 */
public record Uncounted(int missing, double lost) {

    Uncounted plus(Uncounted other) {
        return new Uncounted(missing + other.missing, lost + other.lost);
    }

    Uncounted larger(Uncounted other) {
        return new Uncounted(Math.max(missing, other.missing), Math.max(lost, other.lost));
    }
}
