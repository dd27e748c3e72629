package org.seepledger.balance;

/**
 * A cell that does not balance.
 *
 * @param layer its layer, from 0
 * @param row its row in the grid
 * @param column its column in the grid
 * @param imbalance what it gains that nothing accounts for, as far as it lies in the prism, length³/time
 */
public record HotSpot(int layer, int row, int column, double imbalance) {}
