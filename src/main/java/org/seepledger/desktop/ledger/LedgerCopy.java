package org.seepledger.desktop.ledger;

import java.util.ArrayList;
import java.util.List;
import java.util.stream.DoubleStream;
import org.seepledger.desktop.port.CopyTable;
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

    CopyTable table() {
        return new CopyTable(title, header(), rows.stream().map(this::cells).toList(), caution());
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
        List<String> cells = new ArrayList<>(List.of(row.label()));
        if (row.kind() == LedgerRow.Kind.HEADING) {
            return cells;
        }
        DoubleStream numbers = ofSolute()
                ? DoubleStream.of(row.inflow(), row.outflow(), row.net(), row.low(), row.high())
                : DoubleStream.of(row.inflow(), row.outflow(), row.net());
        numbers.forEach(number -> cells.add(CsvText.number(number)));
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
}
