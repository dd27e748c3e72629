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
import org.seepledger.io.result.Statement;

/** How the numbers were worked out and what they mean. */
final class MethodSection {

    private MethodSection() {}

    static DomContent of(Report report) {
        return section(
                        h2("Method and conventions"),
                        p("Flow was given as " + report.aquifer().flow().given() + "."),
                        p(typeset(Statement.METHOD)),
                        p(typeset(Statement.SIGNS)),
                        p(
                                "Throughput is the larger of all gains and all losses, gross, storage among them. The net closure"
                                        + " error sets the residual against the larger sum of the items' net gains or net losses,"
                                        + " an item's net taken over all layers."),
                        p(
                                "Rates are means over a period, volumes totals. What flows in during one interval and out in the"
                                        + " next counts under both in a period that holds the two. Tables show four significant"
                                        + " digits; budget.csv has all of them."),
                        p("Faces, sources and storage are booked twice by different routes, face by face and as the"
                                + " imbalance of the cells inside; the run ends without result unless the two agree to"
                                + " rounding."),
                        h3("Options of the run"),
                        dl(each(report.options(), (name, value) -> div(dt(code(name)), dd(code(value)))))
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
