/**
 * How two runs differ, and which part of each difference is due to the area, the period, the inputs and the unit.
 *
 * <p>A budget is struck from inputs, for an area, over a period. Each of the three may be the first run's or the second's,
 * which makes eight budgets. What a change of one of them does is the mean of what it does in each of the six orders in
 * which the three can be changed (Shapley 1953), so that the three parts add to the whole difference exactly, and none
 * depends on which was changed first. The unit changes numbers alone, and last.
 */
package org.seepledger.review.change;
