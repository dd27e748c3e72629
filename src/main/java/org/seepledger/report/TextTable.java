package org.seepledger.report;

import java.util.ArrayList;
import java.util.List;

/** Columns of plain text: the first flush left, the others flush right; or facts, two columns flush left. */
final class TextTable {

    private final List<String[]> rows = new ArrayList<>();
    private boolean leftOnly;

    TextTable row(String... cells) {
        rows.add(cells);
        return this;
    }

    void fact(String name, String value) {
        rows.add(new String[] {name, value});
        leftOnly = true;
    }

    void appendTo(StringBuilder text, String indent) {
        int[] widths = new int[rows.get(0).length];
        for (String[] row : rows) {
            for (int i = 0; i < widths.length; i++) {
                widths[i] = Math.max(widths[i], row[i].length());
            }
        }
        for (String[] row : rows) {
            StringBuilder line = new StringBuilder(indent).append(pad(row[0], widths[0], false));
            for (int i = 1; i < widths.length; i++) {
                line.append("  ").append(pad(row[i], widths[i], !leftOnly));
            }
            text.append(line.toString().stripTrailing()).append('\n');
        }
    }

    private static String pad(String cell, int width, boolean right) {
        String blanks = " ".repeat(width - cell.length());
        return right ? blanks + cell : cell + blanks;
    }
}
