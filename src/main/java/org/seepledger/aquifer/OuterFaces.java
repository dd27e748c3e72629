package org.seepledger.aquifer;

/**
 * Which of the grid's outer faces let water through.
 *
 * @param sides the outer sides
 * @param top the uppermost surface
 * @param bottom the lowest surface
 */
public record OuterFaces(boolean sides, boolean top, boolean bottom) {}
