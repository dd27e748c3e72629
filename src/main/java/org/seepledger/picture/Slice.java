package org.seepledger.picture;

/**
 * A part of a block: an item of a budget, or several small ones.
 *
 * @param name what it is called
 * @param amount in the unit shown, not negative
 */
record Slice(String name, double amount) {}
