package org.seepledger.aquifer;

/**
 * One line of a points file: a steady rate at a place between two times.
 *
 * @param name the well's name; names repeat when a well has a schedule
 * @param category what the rate counts as in the budget
 * @param x map x
 * @param y map y
 * @param screen where in depth
 * @param from when it begins, in time units; negative infinity for always
 * @param to when it ends; positive infinity for always
 * @param rate length³/time while it lasts, positive where it adds water
 * @param place where it stands, for messages: file and line
 */
public record PointRate(
        String name,
        String category,
        double x,
        double y,
        Screen screen,
        double from,
        double to,
        double rate,
        String place) {}
