package org.seepledger.io.table;

import java.util.LinkedHashSet;
import java.util.List;
import java.util.Set;

/** Counts what stands in one column of a table. */
final class ColumnTally {

    private static final int MOST_DISTINCT = 20_000;

    private final String heading;
    private final Decimals decimals;
    private final Set<String> distinct = new LinkedHashSet<>();
    private boolean tooMany;
    private long numbers;
    private long texts;
    private long limits;
    private long blanks;
    private double least = Double.NaN;
    private double greatest = Double.NaN;

    ColumnTally(String heading, Dialect dialect) {
        this.heading = heading.strip();
        this.decimals = new Decimals(dialect);
    }

    void add(String cell) {
        if (!tooMany && distinct.add(cell) && distinct.size() > MOST_DISTINCT) {
            tooMany = true;
            distinct.clear();
        }
        if (cell.isEmpty() || cell.equalsIgnoreCase("nan")) {
            blanks++;
        } else if (mayBeNumber(cell.charAt(0))) {
            number(cell);
        } else {
            texts++;
        }
    }

    /** Spares the cost of an exception for each cell of a column of words. */
    private static boolean mayBeNumber(char first) {
        return first >= '0' && first <= '9' || "+-.,<".indexOf(first) >= 0;
    }

    private void number(String cell) {
        boolean limit = cell.charAt(0) == '<';
        try {
            double value = decimals.number(limit ? cell.substring(1).strip() : cell, "");
            numbers += limit ? 0 : 1;
            limits += limit ? 1 : 0;
            least = value >= least ? least : value;
            greatest = value <= greatest ? greatest : value;
        } catch (NumberFormatException e) {
            texts++;
        }
    }

    TableLook.Column column() {
        int bracket = heading.lastIndexOf('[');
        boolean unit = bracket >= 0 && heading.endsWith("]");
        return new TableLook.Column(
                heading,
                unit ? heading.substring(0, bracket).strip() : heading,
                unit ? heading.substring(bracket + 1, heading.length() - 1).strip() : "",
                numbers,
                texts,
                limits,
                blanks,
                least,
                greatest,
                List.copyOf(distinct));
    }
}
