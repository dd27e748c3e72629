package org.seepledger.report.page;

import static j2html.TagCreator.a;
import static j2html.TagCreator.aside;
import static j2html.TagCreator.body;
import static j2html.TagCreator.document;
import static j2html.TagCreator.each;
import static j2html.TagCreator.footer;
import static j2html.TagCreator.h2;
import static j2html.TagCreator.html;
import static j2html.TagCreator.main;
import static j2html.TagCreator.meta;
import static j2html.TagCreator.p;

import j2html.tags.DomContent;
import j2html.tags.specialized.HeadTag;
import java.util.List;
import java.util.Map;
import java.util.stream.IntStream;
import org.seepledger.ledger.Disclaimer;
import org.seepledger.ledger.SoluteCautions;
import org.seepledger.report.PrismResult;

/** Writes a report as one HTML page (the HTML standard of WHATWG) that needs nothing but itself. */
public final class ReportPage {

    private ReportPage() {}

    /**
     * {@return the page of a report on water}
     *
     * @param report what it is made of
     */
    public static String of(Report report) {
        Cover cover = report.cover();
        List<String> prisms = report.results().stream().map(PrismResult::prism).toList();
        return page(
                cover,
                TitleBlock.of(cover, report.frame(), report.record(), prisms, List.of()),
                TitleBlock.contents(cover, report.lines(), Map.of("exchange", "Exchange")),
                List.of(),
                each(
                        AnswerSection.of(report),
                        each(IntStream.range(0, report.results().size())
                                .mapToObj(prism -> PrismSection.of(report, prism))),
                        ExchangeSection.of(report),
                        PeriodsSection.of(report.frame(), report.lines(), "budget.csv")),
                MethodSection.of(cover));
    }

    /**
     * {@return the page of a report on solutes}
     *
     * @param report what it is made of
     */
    public static String of(SoluteReport report) {
        Cover cover = report.cover();
        return page(
                cover,
                TitleBlock.of(cover, report.frame(), report.record(), report.prisms(), report.solutes()),
                TitleBlock.contents(
                        cover,
                        report.lines(),
                        report.crossings().isEmpty() && report.measured().isEmpty()
                                ? Map.of()
                                : Map.of(TransectsSection.ID, "Transects")),
                SoluteCautions.sentences(),
                each(
                        AnswerSection.of(report),
                        each(IntStream.range(0, report.results().size())
                                .mapToObj(plume -> PlumeSection.of(report, plume))),
                        TransectsSection.of(report),
                        PeriodsSection.of(report.frame(), report.lines(), "plume.csv")),
                MethodSection.ofSolutes(cover));
    }

    private static String page(
            Cover cover,
            DomContent title,
            DomContent contents,
            List<String> cautions,
            DomContent results,
            DomContent method) {
        return document(html(
                        head(cover),
                        body(
                                a("Skip to the answer").withHref("#answer").withClass("skip"),
                                title,
                                aside(disclaimer(), each(cautions, sentence -> p(sentence)))
                                        .withClass("disclaimer")
                                        .attr("aria-label", "Disclaimer"),
                                contents,
                                main(
                                        RemarksSection.first(cover),
                                        results,
                                        InputsSection.files(cover),
                                        InputsSection.origins(cover),
                                        method,
                                        RemarksSection.all(cover)),
                                footer(h2("Disclaimer"), disclaimer(), each(cautions, sentence -> p(sentence)))
                                        .withId("disclaimer")
                                        .withClass("disclaimer")))
                .withLang("en"));
    }

    private static HeadTag head(Cover cover) {
        HeadTag head = PageHead.of(cover.masthead().title(), cover.version());
        cover.masthead()
                .author()
                .ifPresent(author -> head.with(meta().withName("author").withContent(author)));
        return head;
    }

    private static DomContent disclaimer() {
        return each(Disclaimer.sentences(), sentence -> p(sentence));
    }
}
