package org.seepledger.report.page;

import static j2html.TagCreator.each;
import static j2html.TagCreator.h2;
import static j2html.TagCreator.h3;
import static j2html.TagCreator.p;
import static j2html.TagCreator.section;
import static j2html.TagCreator.table;
import static j2html.TagCreator.tbody;
import static j2html.TagCreator.text;
import static j2html.TagCreator.thead;
import static j2html.TagCreator.tr;

import j2html.tags.DomContent;
import j2html.tags.specialized.TrTag;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import java.util.Optional;
import org.seepledger.io.result.MassUnits;
import org.seepledger.io.table.MeasuredPanels;
import org.seepledger.plume.Crossing;
import org.seepledger.plume.NonDetects;
import org.seepledger.plume.Panels;
import org.seepledger.report.Wording;
import org.seepledger.unit.Measure;

/** What crosses control planes: a picture along the line, and a table by segment and layer or by measured panel. */
final class TransectsSection {

    static final String ID = "transects";

    private final SoluteReport report;
    private final Wording wording;

    private TransectsSection(SoluteReport report) {
        this.report = report;
        this.wording = report.wording();
    }

    static DomContent of(SoluteReport report) {
        if (report.crossings().isEmpty() && report.measured().isEmpty()) {
            return text("");
        }
        TransectsSection section = new TransectsSection(report);
        return section(
                        h2("Transects"),
                        p(
                                "Mass discharge is the sum over panels of specific discharge × concentration × area, which is not the"
                                        + " product of their means. Positive is forward, to the right of the line as it is drawn. The"
                                        + " last two columns say through which share of the area half and nine tenths of the mass"
                                        + " cross, whichever way, where it is densest."),
                        each(report.crossings(), section::drawn),
                        each(report.measured(), section::measured))
                .withId(ID);
    }

    private DomContent drawn(DrawnCrossing drawn) {
        Crossing crossing = drawn.crossing();
        int index = report.crossings().indexOf(drawn);
        Measure unit = crossing.solute().concentration().orElseThrow().unit();
        List<TrTag> rows = new ArrayList<>();
        for (int segment = 0; segment < crossing.transect().segments(); segment++) {
            for (int layer = 0; layer < crossing.layers(); layer++) {
                String name = "segment " + (segment + 1) + ", " + report.frame().layer(layer);
                rows.add(row(name, panels(crossing, segment, layer), unit)
                        .withData("segment", "segment " + (segment + 1))
                        .withData("layer", String.valueOf(layer + 1)));
            }
        }
        rows.add(row("all", panels(crossing, -1, -1), unit)
                .withData("segment", "*")
                .withData("layer", "*")
                .withClass("sum"));
        String name =
                crossing.solute().name() + " across " + crossing.transect().name();
        return section(
                h3(name),
                Figure.of(
                        Optional.of(drawn.picture()),
                        "transect-" + (index + 1),
                        drawn.picture().title()),
                framed(
                        name + ", mean over the record",
                        "Segment and layer",
                        unit,
                        rows,
                        crossing.transect().name(),
                        crossing.solute().name()));
    }

    private List<Panels> panels(Crossing crossing, int segment, int layer) {
        return Arrays.stream(NonDetects.values())
                .map(choice -> crossing.panels(report.record(), choice, segment, layer))
                .toList();
    }

    private DomContent measured(MeasuredPanels measured) {
        List<TrTag> rows = new ArrayList<>();
        for (int panel = 0; panel < measured.names().size(); panel++) {
            int only = panel;
            rows.add(row(
                            measured.names().get(panel),
                            measured.panels().stream()
                                    .map(all -> all.only(only))
                                    .toList(),
                            measured.concentration())
                    .withData("segment", measured.names().get(panel)));
        }
        rows.add(row("all", measured.panels(), measured.concentration())
                .withData("segment", "*")
                .withClass("sum"));
        String of = measured.solute().isEmpty() ? "" : measured.solute() + " across ";
        String name = of + measured.transect() + ", measured panels";
        return section(
                h3(name),
                framed(name, "Panel", measured.concentration(), rows, measured.transect(), measured.solute()));
    }

    private TrTag row(String name, List<Panels> choices, Measure unit) {
        Panels shown = choices.get(NonDetects.HALF.ordinal());
        double rate = report.units().rateFactor();
        Measure length = report.cover().aquifer().lengthUnit();
        return tr(
                Cells.row(name),
                Cells.number(shown.area()),
                Cells.number(shown.flow()),
                Cells.number(shown.discharge() * rate),
                Cells.number(choices.get(NonDetects.ZERO.ordinal()).discharge() * rate),
                Cells.number(choices.get(NonDetects.LIMIT.ordinal()).discharge() * rate),
                Cells.number(shown.fluxAveraged() * MassUnits.concentrationFactor(unit, length)),
                Cells.share(100 * shown.areaShareFor(0.5)),
                Cells.share(100 * shown.areaShareFor(0.9)));
    }

    private DomContent framed(
            String name, String rowsOf, Measure concentration, List<TrTag> rows, String transect, String solute) {
        Measure length = report.cover().aquifer().lengthUnit();
        Measure flow = Measure.power(length, 3).per(report.cover().aquifer().timeUnit());
        String title = name + ": mass in " + wording.unit(report.units().rate());
        return Cells.scrolling(
                title,
                table(
                                Cells.caption(title),
                                thead(tr(
                                        Cells.column(rowsOf),
                                        Cells.numberColumn("Area, "
                                                + wording.unit(report.units().area())),
                                        Cells.numberColumn("Water, " + wording.unit(flow)),
                                        Cells.numberColumn("Mass"),
                                        Cells.numberColumn("Non-detects as 0"),
                                        Cells.numberColumn("As their limit"),
                                        Cells.numberColumn("Flux-averaged, " + wording.unit(concentration)),
                                        Cells.numberColumn("Area for half"),
                                        Cells.numberColumn("For nine tenths"))),
                                tbody(each(rows, row -> row)))
                        .withClass("transect")
                        .withData("transect", transect)
                        .withData("solute", solute));
    }
}
