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
 * @param given the number that the rate follows from as it stands in the file
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
        String place,
        Stored given) {

    /**
     * A line that was not read from a file.
     *
     * @param name the well's name
     * @param category what the rate counts as
     * @param x map x
     * @param y map y
     * @param screen where in depth
     * @param from when it begins
     * @param to when it ends
     * @param rate length³/time
     * @param place where it stands, for messages
     */
    public PointRate(
            String name,
            String category,
            double x,
            double y,
            Screen screen,
            double from,
            double to,
            double rate,
            String place) {
        this(name, category, x, y, screen, from, to, rate, place, Stored.number("", place, rate, 1));
    }
}
