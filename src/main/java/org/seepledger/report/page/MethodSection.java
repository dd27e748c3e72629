package org.seepledger.report.page;

import static j2html.TagCreator.code;
import static j2html.TagCreator.dd;
import static j2html.TagCreator.div;
import static j2html.TagCreator.dl;
import static j2html.TagCreator.dt;
import static j2html.TagCreator.each;
import static j2html.TagCreator.h2;
import static j2html.TagCreator.h3;
import static j2html.TagCreator.p;
import static j2html.TagCreator.section;

import j2html.tags.DomContent;
import java.util.stream.Stream;
import org.seepledger.io.result.PlumeCsv;
import org.seepledger.io.result.Statement;

/** How the numbers were worked out and what they mean. */
final class MethodSection {

    private MethodSection() {}

    static DomContent of(Cover cover) {
        return of(
                cover,
                p("Rates are means over a period, volumes totals. What flows in during one interval and out in the"
                        + " next counts under both in a period that holds the two. Tables show four significant"
                        + " digits; budget.csv has all of them."));
    }

    /** For solutes, with what their budgets rest on beside the water's. */
    static DomContent ofSolutes(Cover cover) {
        return of(
                cover,
                p(typeset(PlumeCsv.METHOD)),
                p(
                        "Decay is first order, by the mean of an interval's two ends; a daughter gains its yield times the parent's"
                                + " decay. Storage has three rows: the change of mass in place; what a falling water table leaves in"
                                + " pores and on grains above it; concentration × water taken into elastic storage."),
                p(
                        "Where a side cuts cells whose neighbours have another concentration, what crosses it is what the cell"
                                + " holds, while the cell's own balance is kept on its faces: the difference stands in the residual."
                                + " It is worked out for each budget, and falls with the cell size. Along cell faces there is none."),
                p(
                        "Trend: rank test of Mann (1945) and Kendall (1975), exact up to ten values and none below five; median"
                                + " slope of Sen (1968); first-order rate by least squares on logarithms with Student's t (Newell et"
                                + " al. 2002). Centre and spread are moments of mass (Freyberg 1986)."),
                p(
                        "Rates are means over a period, masses totals; what a prism holds is at a period's end. Tables show four"
                                + " significant digits; plume.csv, mass.csv, trend.csv and transect.csv have all of them."));
    }

    private static DomContent of(Cover cover, DomContent... more) {
        return section(
                        h2("Method and conventions"),
                        p("Flow was given as " + cover.aquifer().flow().given() + "."),
                        p(typeset(Statement.METHOD)),
                        p(typeset(Statement.SIGNS)),
                        p(
                                "Throughput is the larger of all gains and all losses, gross, storage among them. The net closure"
                                        + " error sets the residual against the larger sum of the items' net gains or net losses,"
                                        + " an item's net taken over all layers."),
                        each(Stream.of(more)),
                        p(
                                "Faces, sources and storage of water are booked twice by different routes, face by face and as the"
                                        + " imbalance of the cells inside; the run ends without result unless the two agree to"
                                        + " rounding."),
                        h3("Options of the run"),
                        dl(each(cover.options(), (name, value) -> div(dt(code(name)), dd(code(value)))))
                                .withClass("facts options"))
                .withId("method");
    }

    /** The same words with the signs that a page has and a table of plain letters has not. */
    private static String typeset(String plain) {
        return plain.replace(" - ", " − ")
                .replace(" x ", " × ")
                .replace(" / ", " ÷ ")
                .replace("Raviart-Thomas", "Raviart–Thomas");
    }
}
