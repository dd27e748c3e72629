package org.seepledger.report.page;

import static j2html.TagCreator.each;
import static j2html.TagCreator.table;
import static j2html.TagCreator.tbody;
import static j2html.TagCreator.thead;
import static j2html.TagCreator.tr;

import j2html.tags.DomContent;
import j2html.tags.specialized.TrTag;
import java.util.ArrayList;
import java.util.List;
import java.util.function.ToDoubleBiFunction;
import org.seepledger.ledger.Period;
import org.seepledger.plume.NonDetects;
import org.seepledger.plume.Plume;
import org.seepledger.plume.Stock;
import org.seepledger.report.PlumeResult;

/** What a prism holds of a solute: at the record's end by layer and phase, and at each instant in all. */
final class HeldTable {

    private final SoluteReport report;
    private final PlumeResult result;
    private final About about;

    HeldTable(SoluteReport report, PlumeResult result, About about) {
        this.report = report;
        this.result = result;
        this.about = about;
    }

    /** By layer and phase, with the bracket of non-detects: the {@code mass} rows of {@code plume.csv}. */
    DomContent atEnd() {
        String title = about.name() + ": mass in place at the end of the record, in " + unit();
        List<TrTag> rows = new ArrayList<>();
        addPhase(rows, "dissolved", Stock::dissolved);
        addPhase(rows, "sorbed", Stock::sorbed);
        rows.add(row("all", Stock::total, result.plume().layers(), "Both phases, all layers")
                .withClass("sum"));
        return Cells.scrolling(
                title,
                about.mark(table(
                                Cells.caption(title),
                                thead(tr(
                                        Cells.column("Phase and layer"),
                                        Cells.numberColumn("Mass"),
                                        Cells.numberColumn("Non-detects as 0"),
                                        Cells.numberColumn("As their limit"))),
                                tbody(each(rows, row -> row))))
                        .withClass("held")
                        .withData("period", report.record().name()));
    }

    private void addPhase(List<TrTag> rows, String phase, ToDoubleBiFunction<Stock, NonDetects> what) {
        Plume plume = result.plume();
        for (int layer = 0; layer < plume.layers(); layer++) {
            String name = phase + ", " + report.frame().layer(plume.firstLayer() + layer);
            rows.add(row(phase, what, layer, name)
                    .withData("group", "mass")
                    .withData("layer", String.valueOf(plume.firstLayer() + layer + 1)));
        }
    }

    private TrTag row(String phase, ToDoubleBiFunction<Stock, NonDetects> what, int layer, String name) {
        Period record = report.record();
        List<DomContent> cells = new ArrayList<>(List.of(Cells.row(name)));
        for (NonDetects choice : List.of(NonDetects.HALF, NonDetects.ZERO, NonDetects.LIMIT)) {
            double held = result.plume()
                    .held(result.aquifer().times(), record.to(), layer, stock -> what.applyAsDouble(stock, choice));
            cells.add(Cells.number(held * report.units().massFactor()));
        }
        return tr(cells.toArray(DomContent[]::new)).withData("item", phase);
    }

    /** At each instant, all layers together: {@code mass.csv} and {@code trend.csv} have the same. */
    DomContent throughTime() {
        String concentration = report.wording().unit(result.concentrationUnit());
        String above = result.above().isPresent()
                ? ", above "
                        + report.wording()
                                .quantity(result.above().getAsDouble() * result.concentrationFactor(), concentration)
                : "";
        String title = about.name() + ": mass in place through time, masses in " + unit() + ", concentrations in "
                + concentration + above;
        List<DomContent> columns = new ArrayList<>(List.of(
                Cells.column("Instant"),
                Cells.numberColumn("Mass"),
                Cells.numberColumn("Non-detects as 0"),
                Cells.numberColumn("As their limit"),
                Cells.numberColumn("On non-detects"),
                Cells.numberColumn("Mean"),
                Cells.numberColumn("Greatest")));
        if (result.above().isPresent()) {
            columns.add(Cells.numberColumn(
                    "Rock above, " + report.wording().unit(report.units().volume())));
            columns.add(Cells.numberColumn(
                    "Area above, " + report.wording().unit(report.units().area())));
        }
        List<TrTag> rows = new ArrayList<>();
        for (int instant = 0; instant <= result.end(); instant++) {
            rows.add(instant(instant));
        }
        return Cells.scrolling(
                title,
                about.mark(table(
                                Cells.caption(title),
                                thead(tr(columns.toArray(DomContent[]::new))),
                                tbody(each(rows, row -> row))))
                        .withClass("instants"));
    }

    private TrTag instant(int instant) {
        Stock stock = result.plume().whole(instant);
        double mass = report.units().massFactor();
        double factor = result.concentrationFactor();
        String name = report.cover().time(result.aquifer().times().instant(instant), report.wording());
        List<DomContent> cells = new ArrayList<>(List.of(
                Cells.row(name),
                Cells.number(stock.total(NonDetects.HALF) * mass),
                Cells.number(stock.total(NonDetects.ZERO) * mass),
                Cells.number(stock.total(NonDetects.LIMIT) * mass),
                Cells.share(100 * stock.undetectedShare()),
                Cells.number(stock.mean() * factor),
                Cells.number(stock.maximum() * factor)));
        if (result.above().isPresent()) {
            cells.add(Cells.number(stock.rockAbove() * report.units().volumeFactor()));
            cells.add(Cells.number(stock.areaAbove()));
        }
        return tr(cells.toArray(DomContent[]::new)).withData("instant", String.valueOf(instant));
    }

    private String unit() {
        return report.wording().unit(report.units().mass());
    }
}
