package org.seepledger.report.page;

import static j2html.TagCreator.data;
import static j2html.TagCreator.div;
import static j2html.TagCreator.span;
import static j2html.TagCreator.td;
import static j2html.TagCreator.th;

import j2html.TagCreator;
import j2html.tags.DomContent;
import j2html.tags.specialized.CaptionTag;
import j2html.tags.specialized.TableTag;
import j2html.tags.specialized.TdTag;
import j2html.tags.specialized.ThTag;
import java.util.function.DoubleFunction;
import org.seepledger.unit.Figures;

/** The parts that all tables are made of. */
final class Cells {

    private Cells() {}

    /** A number to four digits, with all its digits beside it; a dash where it cannot be given. */
    static TdTag number(double value) {
        return number(value, Figures::tabular);
    }

    /** A percentage, in the same way. */
    static TdTag percent(double value) {
        return number(value, Figures::typesetPercent);
    }

    /** A share in percent, of which less than a hundredth is only said to be that. */
    static TdTag share(double value) {
        boolean little = value != 0 && Math.abs(value) < 0.005;
        return number(value, share -> little ? "<0.01\u202f%" : Figures.typesetPercent(share));
    }

    /** A whole number that names something, as a row. */
    static TdTag ordinal(int value) {
        return td(String.valueOf(value)).withClass("num");
    }

    private static TdTag number(double value, DoubleFunction<String> shown) {
        DomContent content = Double.isNaN(value)
                ? span("–").withClass("none").attr("role", "img").attr("aria-label", "cannot be given")
                : data(shown.apply(value)).attr("value", String.valueOf(value));
        return td(content).withClass("num");
    }

    /** A table's caption, which stays in sight where the table scrolls. */
    static CaptionTag caption(String words) {
        return TagCreator.caption(span(words));
    }

    static ThTag column(String name) {
        return th(name).attr("scope", "col");
    }

    static ThTag numberColumn(String name) {
        return column(name).withClass("num");
    }

    static ThTag row(String name) {
        return th(name).attr("scope", "row");
    }

    /** A table in a box of its own, which scrolls where the page is narrower; named so that a keyboard can reach it. */
    static DomContent scrolling(String label, TableTag table) {
        return div(table)
                .withClass("scroll")
                .attr("role", "region")
                .attr("aria-label", label)
                .withTabindex(0);
    }
}
