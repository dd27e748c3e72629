package org.seepledger.prism;

/**
 * One straight side of a ring, from its vertex to the next side's.
 *
 * @param name its own name, as {@code island 1 side 2}
 * @param item what it counts under: its name, or the boundary that the user put it in
 * @param x map x of the vertex where it begins
 * @param y map y of the vertex where it begins
 */
public record Side(String name, String item, double x, double y) {}
