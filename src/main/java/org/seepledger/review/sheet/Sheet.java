package org.seepledger.review.sheet;

import java.util.List;
import java.util.Optional;

/**
 * A table as it was submitted.
 *
 * @param name the sheet's name in its workbook; empty in a text file
 * @param commaFree whether its cells are parted by something else than commas, so that a comma may be the decimal sign
 * @param rows its rows, each as long as it was written; blank rows are kept, so that places can be told
 */
public record Sheet(String name, boolean commaFree, List<List<String>> rows) {

    private static final int LETTERS = 26;

    /** Copies the lists. */
    public Sheet {
        rows = rows.stream().map(List::copyOf).toList();
    }

    /**
     * {@return what stands in a cell, without blanks around it; empty outside the table}
     *
     * @param row from 0
     * @param column from 0
     */
    public String cell(int row, int column) {
        if (row < 0
                || row >= rows.size()
                || column < 0
                || column >= rows.get(row).size()) {
            return "";
        }
        return rows.get(row).get(column).strip();
    }

    /**
     * {@return how many columns the widest row has}
     */
    public int columns() {
        return rows.stream().mapToInt(List::size).max().orElse(0);
    }

    /**
     * {@return whether a row has nothing in it}
     *
     * @param row from 0
     */
    public boolean isBlank(int row) {
        return rows.get(row).stream().allMatch(String::isBlank);
    }

    /**
     * {@return the only text of a row that has just one; empty for any other}
     *
     * @param row from 0
     */
    public Optional<String> loneText(int row) {
        List<String> texts =
                rows.get(row).stream().filter(text -> !text.isBlank()).toList();
        return texts.size() == 1 ? Optional.of(texts.get(0).strip()) : Optional.empty();
    }

    /**
     * {@return where a cell is, in the words of the program that the table was made with}
     *
     * @param row from 0
     * @param column from 0
     */
    public String place(int row, int column) {
        return name.isEmpty()
                ? "line " + (row + 1) + ", column " + (column + 1)
                : "sheet \"" + name + "\", cell " + letters(column) + (row + 1);
    }

    private static String letters(int column) {
        String last = String.valueOf((char) ('A' + column % LETTERS));
        return column < LETTERS ? last : letters(column / LETTERS - 1) + last;
    }
}
