package org.seepledger.io.result;

import java.io.IOException;
import org.seepledger.io.table.CsvText;
import org.seepledger.ledger.Entry;
import org.seepledger.ledger.Period;
import org.seepledger.ledger.Total;

/**
 * The cells of a budget's rows that hold amounts: as mean rates and as volumes, or masses, in and out and net, each with
 * its unit.
 *
 * @param rows the table
 * @param units the units to give
 */
record AmountCells(ResultTable rows, ResultUnits units) {

    /** Writes an account's cells. */
    void write(Entry entry, Period period) throws IOException {
        rows.cells(rate(entry.inflow(), period), rate(entry.outflow(), period), rate(entry.net(), period));
        rows.cells(amount(entry.inflow()), amount(entry.outflow()), amount(entry.net()));
        rows.cells(units.rate().toString(), units.volume().toString());
    }

    /** Writes a total's cells, which stand under net. */
    void write(Total total, double value, Period period) throws IOException {
        boolean percent = total.isPercentage();
        rows.cells("", "", percent ? CsvText.number(value) : rate(value, period));
        rows.cells("", "", percent ? "" : amount(value));
        rows.cells(
                percent ? "%" : units.rate().toString(),
                percent ? "" : units.volume().toString());
    }

    String rate(double volume, Period period) {
        return CsvText.number(volume / period.duration() * units.rateFactor());
    }

    String amount(double volume) {
        return CsvText.number(volume * units.volumeFactor());
    }
}
