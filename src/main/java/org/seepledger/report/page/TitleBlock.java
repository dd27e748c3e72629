package org.seepledger.report.page;

import static j2html.TagCreator.a;
import static j2html.TagCreator.dd;
import static j2html.TagCreator.div;
import static j2html.TagCreator.dl;
import static j2html.TagCreator.dt;
import static j2html.TagCreator.each;
import static j2html.TagCreator.h1;
import static j2html.TagCreator.header;
import static j2html.TagCreator.iff;
import static j2html.TagCreator.li;
import static j2html.TagCreator.nav;
import static j2html.TagCreator.ol;
import static j2html.TagCreator.p;
import static j2html.TagCreator.time;

import j2html.tags.DomContent;
import java.util.ArrayList;
import java.util.List;
import org.seepledger.report.PrismResult;
import org.seepledger.report.Wording;

/** The head of the first page: letterhead, title, who, what and when; and the contents. */
final class TitleBlock {

    private TitleBlock() {}

    static DomContent of(Report report) {
        Masthead masthead = report.masthead();
        return header(
                        iff(
                                !masthead.letterhead().isEmpty(),
                                div(each(masthead.letterhead(), line -> p(line)))
                                        .withClass("letterhead")),
                        h1(masthead.title()),
                        dl(facts(report).toArray(DomContent[]::new)).withClass("facts"))
                .withClass("title-block");
    }

    private static List<DomContent> facts(Report report) {
        Masthead masthead = report.masthead();
        List<DomContent> facts = new ArrayList<>();
        masthead.author().ifPresent(author -> facts.add(fact("Author", author)));
        masthead.reference().ifPresent(reference -> facts.add(fact("Reference", reference)));
        String date = masthead.date().toString();
        facts.add(div(dt("Date"), dd(time(date).attr("datetime", date))));
        facts.add(fact("Aquifer", report.aquifer().name()));
        facts.add(fact("Prisms", prisms(report)));
        facts.add(fact(
                "Record",
                report.span(report.record()) + ", "
                        + Wording.counted(report.aquifer().times().intervals(), "interval")));
        facts.add(fact("Coordinates", report.crs().orElse("local")));
        facts.add(fact(
                "Units",
                report.wording().unit(report.units().rate()) + ", "
                        + report.wording().unit(report.units().volume())));
        facts.add(fact("Made with", "Seepledger " + report.version()));
        return facts;
    }

    private static String prisms(Report report) {
        return Wording.listed(report.results().stream().map(PrismResult::prism).toList());
    }

    private static DomContent fact(String name, String value) {
        return div(dt(name), dd(value));
    }

    /** Where to find what. */
    static DomContent contents(Report report) {
        List<DomContent> links = new ArrayList<>();
        if (!report.statement().warnings().isEmpty()) {
            links.add(link("#warnings", "Warnings"));
        }
        links.add(link("#answer", "The answer"));
        for (int prism = 0; prism < report.results().size(); prism++) {
            links.add(link(
                    "#" + PrismSection.id(prism), report.results().get(prism).prism()));
        }
        links.add(link("#exchange", "Exchange"));
        links.add(link("#periods", "Periods"));
        links.add(link("#inputs", "Inputs"));
        links.add(link("#origins", "Origins"));
        links.add(link("#method", "Method"));
        links.add(link("#disclaimer", "Disclaimer"));
        return nav(ol(links.toArray(DomContent[]::new))).attr("aria-label", "Contents");
    }

    private static DomContent link(String to, String words) {
        return li(a(words).withHref(to));
    }
}
