package org.seepledger.io.table;

/**
 * A column that counts something: rows, layers, intervals.
 *
 * @param column where it stands
 * @param first the number of the first
 * @param count how many there are
 * @param remedy how they are counted, for messages
 */
record Ordinal(int column, int first, int count, String remedy) {

    /** Stands for all of them. */
    static final int ALL = -1;

    /**
     * {@return the number in the current line, counted from 0}
     *
     * @param line the table
     * @throws org.seepledger.fault.DataFault if it is none of them
     */
    int index(TableReader line) {
        return index(line, line.required(column, remedy));
    }

    /**
     * {@return the number in the current line, counted from 0, or {@link #ALL} where the cell is empty}
     *
     * @param line the table
     * @throws org.seepledger.fault.DataFault if it is none of them
     */
    int indexOrAll(TableReader line) {
        double number = line.number(column);
        return Double.isNaN(number) ? ALL : index(line, number);
    }

    private int index(TableReader line, double number) {
        double index = number - first;
        if (!(index >= 0 && index < count) || index != Math.rint(index)) {
            throw line.fault(
                    column,
                    Shown.text(line.text(column)),
                    "a whole number from " + first + " to " + (first + count - 1),
                    remedy);
        }
        return (int) index;
    }
}
