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
import java.util.Map;
import org.seepledger.ledger.Period;
import org.seepledger.report.Wording;

/** The head of the first page: letterhead, title, who, what and when; and the contents. */
final class TitleBlock {

    private TitleBlock() {}

    /**
     * The head of a report.
     *
     * @param cover what every report has
     * @param frame the units
     * @param record the whole record
     * @param prisms the prisms' names
     * @param solutes the solutes' names; none for a report on water
     */
    static DomContent of(Cover cover, BudgetFrame frame, Period record, List<String> prisms, List<String> solutes) {
        Masthead masthead = cover.masthead();
        return header(
                        iff(
                                !masthead.letterhead().isEmpty(),
                                div(each(masthead.letterhead(), line -> p(line)))
                                        .withClass("letterhead")),
                        h1(masthead.title()),
                        dl(facts(cover, frame, record, prisms, solutes).toArray(DomContent[]::new))
                                .withClass("facts"))
                .withClass("title-block");
    }

    private static List<DomContent> facts(
            Cover cover, BudgetFrame frame, Period record, List<String> prisms, List<String> solutes) {
        Masthead masthead = cover.masthead();
        List<DomContent> facts = new ArrayList<>();
        masthead.author().ifPresent(author -> facts.add(fact("Author", author)));
        masthead.reference().ifPresent(reference -> facts.add(fact("Reference", reference)));
        String date = masthead.date().toString();
        facts.add(div(dt("Date"), dd(time(date).attr("datetime", date))));
        facts.add(fact("Aquifer", cover.aquifer().name()));
        facts.add(fact("Prisms", Wording.listed(prisms)));
        if (!solutes.isEmpty()) {
            facts.add(fact("Solutes", Wording.listed(solutes)));
        }
        facts.add(fact(
                "Record",
                frame.span(record) + ", "
                        + Wording.counted(cover.aquifer().times().intervals(), "interval")));
        facts.add(fact("Coordinates", cover.crs().orElse("local")));
        facts.add(fact(
                "Units",
                frame.wording().unit(frame.units().rate()) + ", "
                        + frame.wording().unit(frame.units().volume())));
        facts.add(fact("Made with", "Seepledger " + cover.version()));
        return facts;
    }

    private static DomContent fact(String name, String value) {
        return div(dt(name), dd(value));
    }

    /**
     * Where to find what.
     *
     * @param cover what every report has
     * @param lines the budgets that have sections of their own
     * @param more further sections, by id
     */
    static DomContent contents(Cover cover, List<TotalsTable.Line> lines, Map<String, String> more) {
        List<DomContent> links = new ArrayList<>();
        if (!cover.statement().warnings().isEmpty()) {
            links.add(link("#warnings", "Warnings"));
        }
        links.add(link("#answer", "The answer"));
        lines.forEach(
                line -> links.add(link("#" + line.about().id(), line.about().name())));
        more.forEach((id, name) -> links.add(link("#" + id, name)));
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
