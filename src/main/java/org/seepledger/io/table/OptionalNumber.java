package org.seepledger.io.table;

import java.util.OptionalInt;
import org.seepledger.unit.Measure;

/**
 * A column of numbers in a unit, which a table may have or not.
 *
 * @param column where it stands
 * @param factor what its numbers are multiplied by
 */
record OptionalNumber(OptionalInt column, double factor) {

    /**
     * {@return the column of a name}
     *
     * @param header the header
     * @param name the name, in lower case
     * @param own the unit of numbers where the header carries none
     * @param target the unit that they are given in
     * @throws org.seepledger.fault.DataFault if the header carries a unit that cannot be given in it
     */
    static OptionalNumber of(Header header, String name, Measure own, Measure target) {
        OptionalInt column = header.known(name);
        double factor = column.isPresent() ? header.factor(column.getAsInt(), own, target) : 1;
        return new OptionalNumber(column, factor);
    }

    /** {@return the number in the current line; NaN where there is none} */
    double read(TableReader table) {
        if (column.isEmpty()) {
            return Double.NaN;
        }
        return table.finite(column.getAsInt(), table.number(column.getAsInt()) * factor);
    }
}
