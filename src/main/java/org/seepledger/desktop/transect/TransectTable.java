package org.seepledger.desktop.transect;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import java.util.function.Function;
import org.seepledger.desktop.port.CopyTable;
import org.seepledger.desktop.session.OpenSet;
import org.seepledger.desktop.words.Words;
import org.seepledger.io.result.MassUnits;
import org.seepledger.io.table.CsvText;
import org.seepledger.io.table.MeasuredPanels;
import org.seepledger.ledger.Disclaimer;
import org.seepledger.ledger.Period;
import org.seepledger.ledger.SoluteCautions;
import org.seepledger.plume.Crossing;
import org.seepledger.plume.NonDetects;
import org.seepledger.plume.Panels;
import org.seepledger.report.Wording;
import org.seepledger.unit.Figures;
import org.seepledger.unit.Measure;

/**
 * What crosses one transect, part by part, in the digits of the command.
 *
 * @param whose whose it is, of what and when
 * @param rows a row for each part, then all together
 * @param half the least share of the area that half of the mass crosses
 * @param mostly the least share of the area that nine tenths of the mass cross
 * @param units the units of areas, flows, rates and concentrations
 */
record TransectTable(String whose, List<TransectRow> rows, double half, double mostly, Units units) {

    /** The units of a table, as users write them. */
    record Units(Measure area, Measure flow, Measure rate, Measure concentration) {}

    private interface ByChoice {
        Panels of(NonDetects choice);
    }

    /** Makes rows of panels. */
    private record Maker(MassUnits units, Measure length, Measure concentration, Panels all) {

        TransectRow row(String name, String layer, boolean total, ByChoice panels) {
            Panels shown = panels.of(NonDetects.HALF);
            return new TransectRow(
                    name,
                    layer,
                    total,
                    shown.area(),
                    Arrays.stream(shown.flows()).sum(),
                    rate(shown),
                    rate(panels.of(NonDetects.ZERO)),
                    rate(panels.of(NonDetects.LIMIT)),
                    shown.fluxAveraged() * MassUnits.concentrationFactor(concentration, length),
                    100 * shown.discharge() / all.discharge(),
                    100 * shown.area() / all.area());
        }

        private double rate(Panels panels) {
            return panels.discharge() * units.rateFactor();
        }
    }

    static TransectTable of(OpenSet set, MassUnits units, Crossing crossing, Period period, String when) {
        Measure unit = crossing.solute().concentration().orElseThrow().unit();
        Panels all = crossing.panels(period, NonDetects.HALF, -1, -1);
        Maker maker = new Maker(units, set.aquifer().lengthUnit(), unit, all);
        List<TransectRow> rows = new ArrayList<>();
        for (int segment = 0; segment < crossing.transect().segments(); segment++) {
            for (int layer = 0; layer < crossing.layers(); layer++) {
                int of = segment;
                int in = layer;
                rows.add(maker.row(
                        Words.of("transect.segment", segment + 1),
                        set.aquifer().layers().get(layer).name(),
                        false,
                        choice -> crossing.panels(period, choice, of, in)));
            }
        }
        rows.add(maker.row(Words.of("transect.all"), "", true, choice -> crossing.panels(period, choice, -1, -1)));
        String whose = Words.of(
                "transect.belongs",
                crossing.solute().name(),
                crossing.transect().name(),
                when);
        return new TransectTable(
                whose, rows, 100 * all.areaShareFor(0.5), 100 * all.areaShareFor(0.9), units(set, units, unit));
    }

    static TransectTable of(OpenSet set, MassUnits units, MeasuredPanels measured) {
        List<Panels> panels = measured.panels();
        Panels all = panels.get(NonDetects.HALF.ordinal());
        Maker maker = new Maker(units, set.aquifer().lengthUnit(), measured.concentration(), all);
        List<TransectRow> rows = new ArrayList<>();
        for (int panel = 0; panel < measured.names().size(); panel++) {
            int only = panel;
            rows.add(maker.row(
                    measured.names().get(panel),
                    "",
                    false,
                    choice -> panels.get(choice.ordinal()).only(only)));
        }
        rows.add(maker.row(Words.of("transect.all"), "", true, choice -> panels.get(choice.ordinal())));
        String whose = Words.of("transect.measured", measured.solute(), measured.transect());
        return new TransectTable(
                whose,
                rows,
                100 * all.areaShareFor(0.5),
                100 * all.areaShareFor(0.9),
                units(set, units, measured.concentration()));
    }

    private static Units units(OpenSet set, MassUnits units, Measure concentration) {
        Measure length = set.aquifer().lengthUnit();
        return new Units(
                Measure.power(length, 2),
                Measure.power(length, 3).per(set.aquifer().timeUnit()),
                units.rate(),
                concentration);
    }

    /** Through how little of the area most of the mass crosses, in a sentence. */
    String concentrated() {
        return Double.isNaN(half)
                ? Words.of("transect.nothing")
                : Words.of("transect.shares", Figures.typesetPercent(half), Figures.typesetPercent(mostly));
    }

    /** What each column is called, with its unit as it is read. */
    List<String> titles() {
        return header(Wording::raised, "transect.low", "transect.high");
    }

    private List<String> header(Function<Measure, String> unit, String low, String high) {
        return List.of(
                Words.of("transect.part"),
                Words.of("transect.layer"),
                Words.of("transect.discharge", unit.apply(units.rate)),
                Words.of("transect.share"),
                Words.of("transect.areashare"),
                Words.of("transect.concentration", unit.apply(units.concentration)),
                Words.of(low, unit.apply(units.rate)),
                Words.of(high, unit.apply(units.rate)),
                Words.of("transect.area", unit.apply(units.area)),
                Words.of("transect.flow", unit.apply(units.flow)));
    }

    CopyTable copy() {
        List<String> header = header(Measure::toString, "transect.low.full", "transect.high.full");
        String foot = concentrated() + " " + Disclaimer.text() + " " + String.join(" ", SoluteCautions.sentences());
        return new CopyTable(
                whose, header, rows.stream().map(TransectTable::cells).toList(), foot);
    }

    private static List<String> cells(TransectRow row) {
        return List.of(
                row.name(),
                CsvText.text(row.layer()),
                CsvText.number(row.discharge()),
                CsvText.number(row.share()),
                CsvText.number(row.areaShare()),
                CsvText.number(row.concentration()),
                CsvText.number(row.low()),
                CsvText.number(row.high()),
                CsvText.number(row.area()),
                CsvText.number(row.flow()));
    }
}
