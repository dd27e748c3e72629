package org.seepledger.report;

/**
 * What values a quantity takes.
 *
 * @param name the quantity
 * @param unit the unit of its values
 * @param least the smallest value; NaN if there is none
 * @param leastAt where it stands
 * @param greatest the greatest value; NaN if there is none
 * @param greatestAt where it stands
 * @param values how many values there are
 * @param missing in how many places there is none
 */
public record ValueRange(
        String name,
        String unit,
        double least,
        String leastAt,
        double greatest,
        String greatestAt,
        long values,
        long missing) {}
