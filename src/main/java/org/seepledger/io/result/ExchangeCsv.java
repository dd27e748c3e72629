package org.seepledger.io.result;

import java.io.IOException;
import java.nio.file.Path;
import java.util.List;
import org.seepledger.aquifer.Times;
import org.seepledger.io.table.CsvText;
import org.seepledger.ledger.ExchangeFlow;
import org.seepledger.ledger.Period;

/** Writes {@code exchange.csv}: what prisms give to each other and to the outside, by period. */
public final class ExchangeCsv {

    private static final String[] HEADER = {
        "period",
        "from",
        "to",
        "from_date",
        "to_date",
        "giver",
        "receiver",
        "flow_rate",
        "flow_volume",
        "rate_unit",
        "volume_unit"
    };

    private ExchangeCsv() {}

    /**
     * Writes the table.
     *
     * @param file the file
     * @param statement what stands before the rows
     * @param flows the flows by giver and receiver
     * @param periods the periods
     * @param times the record's instants, for dates
     * @param units the units to give
     * @throws IOException if it cannot be written
     */
    public static void write(
            Path file,
            Statement statement,
            List<ExchangeFlow> flows,
            List<Period> periods,
            Times times,
            ResultUnits units)
            throws IOException {
        try (ResultTable table = ResultTable.open(file, statement.lines(), HEADER)) {
            for (Period period : periods) {
                for (ExchangeFlow flow : flows) {
                    double volume = flow.volume(period);
                    table.cell(CsvText.text(period.name()));
                    table.span(period, times);
                    table.cell(CsvText.text(flow.giver()));
                    table.cell(CsvText.text(flow.receiver()));
                    table.cell(CsvText.number(volume / period.duration() * units.rateFactor()));
                    table.cell(CsvText.number(volume * units.volumeFactor()));
                    table.cell(units.rate().toString());
                    table.cell(units.volume().toString());
                    table.endRow();
                }
            }
        }
    }
}
