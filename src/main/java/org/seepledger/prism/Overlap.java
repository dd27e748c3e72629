package org.seepledger.prism;

/**
 * Two prisms that claim the same ground.
 *
 * @param first the name of the one that comes first
 * @param second the name of the other
 * @param area the plan area that both cover, in length units squared
 */
public record Overlap(String first, String second, double area) {}
