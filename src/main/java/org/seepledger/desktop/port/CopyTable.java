package org.seepledger.desktop.port;

import java.util.List;
import org.seepledger.io.table.CsvText;

/**
 * A table as it is copied, for a spreadsheet and for a text.
 *
 * @param title what it is
 * @param header what each column is called
 * @param rows cells, as many as the header has; a row of one cell is a heading. A first cell is text, the others are taken as
 *     they are
 * @param foot what stands below, as the caution
 */
public record CopyTable(String title, List<String> header, List<List<String>> rows, String foot) {

    /** Copies the lists. */
    public CopyTable {
        header = List.copyOf(header);
        rows = rows.stream().map(List::copyOf).toList();
    }

    /**
     * Puts the table on a board.
     *
     * @param board the board
     */
    public void on(CopyBoard board) {
        board.table(tabSeparated(), html());
    }

    private String tabSeparated() {
        StringBuilder text = new StringBuilder(plain(title)).append('\n');
        text.append(String.join("\t", header)).append('\n');
        for (List<String> row : rows) {
            text.append(CsvText.text(plain(row.get(0))));
            for (int column = 1; column < header.size(); column++) {
                text.append('\t').append(row.size() > 1 ? row.get(column) : "");
            }
            text.append('\n');
        }
        return text.append(plain(foot)).append('\n').toString();
    }

    private String html() {
        StringBuilder text = new StringBuilder("<table><caption>").append(escaped(title));
        text.append("</caption><thead>");
        row(text, "<th>", "</th>", header);
        text.append("</thead><tbody>");
        for (List<String> row : rows) {
            if (row.size() == 1) {
                row(text, "<th colspan=\"" + header.size() + "\">", "</th>", row);
            } else {
                row(text, "<td>", "</td>", row);
            }
        }
        return text.append("</tbody></table><p>")
                .append(escaped(foot))
                .append("</p>")
                .toString();
    }

    private static void row(StringBuilder text, String begin, String end, List<String> cells) {
        text.append("<tr>");
        cells.forEach(cell -> text.append(begin).append(escaped(plain(cell))).append(end));
        text.append("</tr>");
    }

    private static String plain(String text) {
        return text.replaceAll("[\\p{Cntrl}]+", " ");
    }

    private static String escaped(String text) {
        return text.replace("&", "&amp;")
                .replace("<", "&lt;")
                .replace(">", "&gt;")
                .replace("\"", "&quot;");
    }
}
