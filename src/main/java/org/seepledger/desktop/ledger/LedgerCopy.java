package org.seepledger.desktop.ledger;

import java.util.ArrayList;
import java.util.List;
import java.util.stream.DoubleStream;
import org.seepledger.desktop.words.Words;
import org.seepledger.io.table.CsvText;
import org.seepledger.ledger.Disclaimer;
import org.seepledger.ledger.SoluteCautions;

/**
 * A ledger as it is copied: with its units, in full precision.
 *
 * @param title whose budget it is, and of when
 * @param unit the unit of its numbers
 * @param massUnit the unit of what is held; empty for a budget of water, which has no bracket
 * @param rows its rows
 */
record LedgerCopy(String title, String unit, String massUnit, List<LedgerRow> rows) {

    String tabSeparated() {
        StringBuilder text = new StringBuilder(plain(title)).append('\n');
        text.append(String.join("\t", header())).append('\n');
        for (LedgerRow row : rows) {
            text.append(String.join("\t", cells(row))).append('\n');
        }
        return text.append(plain(caution())).append('\n').toString();
    }

    String html() {
        StringBuilder text = new StringBuilder("<table><caption>");
        text.append(escaped(title)).append("</caption><thead><tr>");
        header().forEach(cell -> text.append("<th>").append(escaped(cell)).append("</th>"));
        text.append("</tr></thead><tbody>");
        for (LedgerRow row : rows) {
            if (row.kind() == LedgerRow.Kind.HEADING) {
                text.append("<tr><th colspan=\"" + header().size() + "\">")
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
                .append(escaped(caution()))
                .append("</p>")
                .toString();
    }

    private String caution() {
        return ofSolute() ? Disclaimer.text() + " " + String.join(" ", SoluteCautions.sentences()) : Disclaimer.text();
    }

    private boolean ofSolute() {
        return !massUnit.isEmpty();
    }

    private List<String> header() {
        List<String> header = new ArrayList<>(List.of(
                Words.of("ledger.item"), Words.of("ledger.in"), Words.of("ledger.out"), Words.of("ledger.net")));
        if (ofSolute()) {
            header.add(Words.of("ledger.zero.full"));
            header.add(Words.of("ledger.limit.full"));
        }
        header.add(Words.of("ledger.unit"));
        return header;
    }

    private List<String> cells(LedgerRow row) {
        List<String> cells = new ArrayList<>(List.of(CsvText.text(plain(row.label()))));
        boolean heading = row.kind() == LedgerRow.Kind.HEADING;
        DoubleStream numbers = ofSolute()
                ? DoubleStream.of(row.inflow(), row.outflow(), row.net(), row.low(), row.high())
                : DoubleStream.of(row.inflow(), row.outflow(), row.net());
        numbers.forEach(number -> cells.add(heading ? "" : CsvText.number(number)));
        cells.add(unit(row.kind()));
        return cells;
    }

    private String unit(LedgerRow.Kind kind) {
        return switch (kind) {
            case HEADING -> "";
            case PERCENTAGE -> "%";
            case HELD -> massUnit;
            case ENTRY, TOTAL -> unit;
        };
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
