package org.seepledger.io.result;

import java.io.IOException;
import java.nio.file.Path;
import java.util.List;
import java.util.Optional;
import org.seepledger.aquifer.Times;
import org.seepledger.io.table.CsvText;
import org.seepledger.io.table.MeasuredPanels;
import org.seepledger.ledger.Period;
import org.seepledger.plume.Crossing;
import org.seepledger.plume.NonDetects;
import org.seepledger.plume.Panels;
import org.seepledger.unit.Measure;

/** Writes {@code transect.csv}: what crosses control planes, by segment and layer or measured panel, and in all. */
public final class TransectCsv {

    private static final String[] HEADER = {
        "transect",
        "solute",
        "period",
        "from",
        "to",
        "from_date",
        "to_date",
        "segment",
        "layer",
        "area",
        "net_flow",
        "net_rate",
        "net_mass",
        "net_rate_nd_zero",
        "net_rate_nd_limit",
        "flux_averaged_concentration",
        "area_share_for_half",
        "area_share_for_nine_tenths",
        "area_unit",
        "flow_unit",
        "rate_unit",
        "mass_unit",
        "concentration_unit"
    };
    private static final String ALL = "*";

    private final Times times;
    private final MassUnits units;
    private final Measure length;
    private final ResultTable rows;

    private TransectCsv(Times times, MassUnits units, Measure length, ResultTable rows) {
        this.times = times;
        this.units = units;
        this.length = length;
        this.rows = rows;
    }

    /**
     * Writes the table.
     *
     * @param file the file, which must not exist
     * @param statement what stands before the rows
     * @param crossings what crosses drawn transects
     * @param measured what crosses measured ones
     * @param periods the periods to give for drawn ones
     * @param times the record's instants
     * @param units the units to give
     * @param length the set's length unit
     * @throws IOException if it cannot be written
     */
    public static void write(
            Path file,
            Statement statement,
            List<Crossing> crossings,
            List<MeasuredPanels> measured,
            List<Period> periods,
            Times times,
            MassUnits units,
            Measure length)
            throws IOException {
        try (ResultTable rows = ResultTable.open(file, PlumeCsv.notes(statement), HEADER)) {
            TransectCsv table = new TransectCsv(times, units, length, rows);
            for (Crossing crossing : crossings) {
                for (Period period : periods) {
                    table.write(crossing, period);
                }
            }
            for (MeasuredPanels panels : measured) {
                table.write(panels);
            }
        }
    }

    private void write(Crossing crossing, Period period) throws IOException {
        Measure unit = crossing.solute().concentration().orElseThrow().unit();
        for (int segment = 0; segment < crossing.transect().segments(); segment++) {
            for (int layer = 0; layer < crossing.layers(); layer++) {
                begin(crossing, period);
                rows.cells("segment " + (segment + 1), String.valueOf(layer + 1));
                int of = segment;
                int in = layer;
                end(choice -> crossing.panels(period, choice, of, in), Optional.of(period), unit);
            }
        }
        begin(crossing, period);
        rows.cells(ALL, ALL);
        end(choice -> crossing.panels(period, choice, -1, -1), Optional.of(period), unit);
    }

    private void begin(Crossing crossing, Period period) throws IOException {
        rows.cells(
                CsvText.text(crossing.transect().name()),
                CsvText.text(crossing.solute().name()));
        rows.cells(CsvText.text(period.name()));
        rows.span(period, times);
    }

    private void write(MeasuredPanels measured) throws IOException {
        for (int panel = 0; panel < measured.names().size(); panel++) {
            int only = panel;
            begin(measured);
            rows.cells(CsvText.text(measured.names().get(panel)), "");
            end(
                    choice -> measured.panels().get(choice.ordinal()).only(only),
                    Optional.empty(),
                    measured.concentration());
        }
        begin(measured);
        rows.cells(ALL, "");
        end(choice -> measured.panels().get(choice.ordinal()), Optional.empty(), measured.concentration());
    }

    private void begin(MeasuredPanels measured) throws IOException {
        rows.cells(CsvText.text(measured.transect()), CsvText.text(measured.solute()), "", "", "", "", "");
    }

    private interface ByChoice {
        Panels of(NonDetects choice);
    }

    private void end(ByChoice panels, Optional<Period> period, Measure unit) throws IOException {
        Panels shown = panels.of(NonDetects.HALF);
        double mass =
                period.map(covered -> shown.discharge() * covered.duration()).orElse(Double.NaN);
        rows.cells(CsvText.number(shown.area()), CsvText.number(shown.flow()), rate(shown));
        rows.cells(CsvText.number(mass * units.massFactor()));
        rows.cells(rate(panels.of(NonDetects.ZERO)), rate(panels.of(NonDetects.LIMIT)));
        rows.cells(CsvText.number(shown.fluxAveraged() * MassUnits.concentrationFactor(unit, length)));
        rows.cells(CsvText.number(shown.areaShareFor(0.5)), CsvText.number(shown.areaShareFor(0.9)));
        rows.cells(
                units.area().toString(),
                Measure.power(length, 3).per(times.unit()).toString());
        rows.cells(units.rate().toString(), units.mass().toString(), unit.toString());
        rows.endRow();
    }

    private String rate(Panels panels) {
        return CsvText.number(panels.discharge() * units.rateFactor());
    }
}
