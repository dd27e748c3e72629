package org.seepledger.aquifer;

import java.util.Arrays;

/**
 * One of the parts that a quantity's values in a block are the sum of, as it stands in a file: value × factor.
 *
 * @param file the file as the set names it; empty where the quantity was not read from one
 * @param place where in the file, up to the cell: band, or column and what tells its lines apart, or key
 * @param everywhere whether one stored number holds for all cells
 * @param values the stored numbers by cell of the block, row-major; {@code NaN} where the part takes no part
 * @param factor by what they are multiplied
 */
public record Stored(String file, String place, boolean everywhere, double[] values, double factor) {

    /**
     * {@return one number for all cells of a block}
     *
     * @param file the file
     * @param place where in the file
     * @param value the number
     * @param factor by what it is multiplied
     * @param window the block
     */
    public static Stored everywhere(String file, String place, double value, double factor, Window window) {
        double[] values = new double[window.size()];
        Arrays.fill(values, value);
        return new Stored(file, place, true, values, factor);
    }

    /**
     * {@return a single number that belongs to no cell}
     *
     * @param file the file
     * @param place where in the file
     * @param value the number
     * @param factor by what it is multiplied
     */
    public static Stored number(String file, String place, double value, double factor) {
        return new Stored(file, place, true, new double[] {value}, factor);
    }

    /**
     * {@return the same numbers with another factor}
     *
     * @param share by what the factor is multiplied
     */
    public Stored times(double share) {
        return new Stored(file, place, everywhere, values, factor * share);
    }

    /**
     * {@return a number that is added wherever this part has a value}
     *
     * @param addedFile its file
     * @param addedPlace where in the file
     * @param number the number
     * @param itsFactor by what it is multiplied
     */
    public Stored beside(String addedFile, String addedPlace, double number, double itsFactor) {
        double[] added = Arrays.stream(values)
                .map(value -> Double.isNaN(value) ? value : number)
                .toArray();
        return new Stored(addedFile, addedPlace, true, added, itsFactor);
    }

    /** The part in some of the cells alone. */
    Stored where(boolean[] cells, boolean wanted) {
        double[] some = values.clone();
        for (int i = 0; i < some.length; i++) {
            some[i] = cells[i] == wanted ? some[i] : Double.NaN;
        }
        return new Stored(file, place, everywhere, some, factor);
    }
}
