/**
 * What is wrong with a submitted budget: its arithmetic, and how it differs from a recomputed one.
 *
 * <p>A figure agrees with a number if it is within half its last printed digit, or within the tolerance, a share of the
 * period's throughput. What differs is held against slips that have a signature: a ratio that is one unit over another, a
 * turned sign, the rate of a well, another period's or area's numbers, the thickness of the layer in place of the
 * saturated one. What remains is called a difference, not explained. A finding says what may be behind a number; it
 * does not prove it.
 *
 * <p>All amounts of a recomputed budget are volumes in a period, in cubic metres; periods are in days.
 */
package org.seepledger.review.check;
