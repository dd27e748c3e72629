package org.seepledger.report.page;

import static j2html.TagCreator.div;
import static j2html.TagCreator.each;
import static j2html.TagCreator.h3;
import static j2html.TagCreator.li;
import static j2html.TagCreator.p;
import static j2html.TagCreator.section;
import static j2html.TagCreator.table;
import static j2html.TagCreator.tbody;
import static j2html.TagCreator.td;
import static j2html.TagCreator.text;
import static j2html.TagCreator.thead;
import static j2html.TagCreator.tr;
import static j2html.TagCreator.ul;

import j2html.tags.DomContent;
import j2html.tags.specialized.TrTag;
import java.util.List;
import java.util.Locale;
import org.seepledger.balance.HotSpot;
import org.seepledger.ledger.PeriodBudget;
import org.seepledger.report.CellPlace;
import org.seepledger.report.ClosureLeads;
import org.seepledger.report.PrismResult;

/** Where a prism does not close, and what may be the reason. */
final class ClosureSection {

    private final Report report;
    private final PrismResult result;

    private ClosureSection(Report report, PrismResult result) {
        this.report = report;
        this.result = result;
    }

    static DomContent of(Report report, PrismResult result, PrismPictures pictures, String id) {
        ClosureSection section = new ClosureSection(report, result);
        String caption = pictures.imbalance().map(picture -> picture.title()).orElse("");
        return section(
                h3("Where it does not close, and why it may not"),
                p(section.inShort()),
                Figure.of(pictures.imbalance(), id + "-imbalance", caption),
                result.isWorthLocating() ? section.cells() : text(""),
                result.isWorthLocating() ? section.leads() : text(""));
    }

    private String inShort() {
        if (!result.storageKnown()) {
            return "Change in storage is not known, so that no cell can be told to balance or not.";
        }
        if (!result.isWorthLocating()) {
            return "Every cell balances to rounding; there is nothing to locate.";
        }
        double duration = result.record().period().duration();
        return "What the cells inside gain and nothing accounts for adds up to "
                + report.wording().rate(result.whereabouts().magnitude() * duration, duration)
                + " regardless of sign, and to "
                + report.wording().rate(result.record().totals().residual(), duration)
                + " with signs: cells that err in opposite directions offset each other.";
    }

    private DomContent cells() {
        String unit = report.wording().unit(report.units().rate());
        String title = result.prism() + ": the cells furthest from balance, mean over the record in " + unit;
        List<HotSpot> spots = result.whereabouts().largest();
        return Cells.scrolling(
                title,
                table(
                                Cells.caption(title),
                                thead(tr(
                                        Cells.column("Layer"),
                                        Cells.numberColumn("Row"),
                                        Cells.numberColumn("Column"),
                                        Cells.numberColumn("x"),
                                        Cells.numberColumn("y"),
                                        Cells.numberColumn("Gains unexplained"),
                                        Cells.numberColumn("Of throughput"),
                                        Cells.column("Wells there"))),
                                tbody(each(spots, this::row)))
                        .withClass("cells"));
    }

    private TrTag row(HotSpot spot) {
        CellPlace place = CellPlace.of(report.aquifer().grid(), spot);
        PeriodBudget record = result.record();
        double throughput = record.totals().throughput() / record.period().duration();
        return tr(
                Cells.row(report.aquifer().layers().get(spot.layer()).name()),
                Cells.ordinal(spot.row() + 1),
                Cells.ordinal(spot.column() + 1),
                coordinate(place.x()),
                coordinate(place.y()),
                Cells.number(spot.imbalance() * report.units().rateFactor()),
                Cells.percent(100 * spot.imbalance() / throughput),
                td(String.join(", ", ClosureLeads.wellsIn(report.aquifer(), spot))));
    }

    private static DomContent coordinate(double value) {
        return td(String.format(Locale.ROOT, "%.1f", value)).withClass("num");
    }

    private DomContent leads() {
        return div(
                p(
                        "What the program knows of this set that can leave a residual. These are leads to follow, not findings:"),
                ul(each(ClosureLeads.of(report.aquifer(), result), lead -> li(lead))));
    }
}
