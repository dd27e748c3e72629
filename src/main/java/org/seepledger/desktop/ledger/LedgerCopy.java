package org.seepledger.desktop.ledger;

import java.util.List;
import org.seepledger.desktop.words.Words;
import org.seepledger.io.table.CsvText;
import org.seepledger.ledger.Disclaimer;

/**
 * A ledger as it is copied: with its units, in full precision.
 *
 * @param title whose budget it is, and of when
 * @param unit the unit of its numbers
 * @param rows its rows
 */
record LedgerCopy(String title, String unit, List<LedgerRow> rows) {

    String tabSeparated() {
        StringBuilder text = new StringBuilder(plain(title)).append('\n');
        text.append(String.join("\t", header())).append('\n');
        for (LedgerRow row : rows) {
            text.append(String.join("\t", cells(row))).append('\n');
        }
        return text.append(plain(Disclaimer.text())).append('\n').toString();
    }

    String html() {
        StringBuilder text = new StringBuilder("<table><caption>");
        text.append(escaped(title)).append("</caption><thead><tr>");
        header().forEach(cell -> text.append("<th>").append(escaped(cell)).append("</th>"));
        text.append("</tr></thead><tbody>");
        for (LedgerRow row : rows) {
            if (row.kind() == LedgerRow.Kind.HEADING) {
                text.append("<tr><th colspan=\"5\">")
                        .append(escaped(row.label()))
                        .append("</th></tr>");
            } else {
                text.append("<tr>");
                cells(row)
                        .forEach(cell ->
                                text.append("<td>").append(escaped(cell)).append("</td>"));
                text.append("</tr>");
            }
        }
        return text.append("</tbody></table><p>")
                .append(escaped(Disclaimer.text()))
                .append("</p>")
                .toString();
    }

    private List<String> header() {
        return List.of(
                Words.of("ledger.item"),
                Words.of("ledger.in"),
                Words.of("ledger.out"),
                Words.of("ledger.net"),
                Words.of("ledger.unit"));
    }

    private List<String> cells(LedgerRow row) {
        String name = CsvText.text(plain(row.label()));
        if (row.kind() == LedgerRow.Kind.HEADING) {
            return List.of(name, "", "", "", "");
        }
        return List.of(
                name,
                CsvText.number(row.inflow()),
                CsvText.number(row.outflow()),
                CsvText.number(row.net()),
                row.kind() == LedgerRow.Kind.PERCENTAGE ? "%" : unit);
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
