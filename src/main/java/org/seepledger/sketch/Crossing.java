package org.seepledger.sketch;

/**
 * Where two sides of a shape meet that should not.
 *
 * @param one the ring of the one side
 * @param oneSide the side, from 0
 * @param other the ring of the other
 * @param otherSide the side, from 0
 * @param place where; for sides that run along each other, one end of what they have in common
 */
public record Crossing(RingAt one, int oneSide, RingAt other, int otherSide, Place place) {}
