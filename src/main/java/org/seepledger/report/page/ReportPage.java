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
import java.util.stream.IntStream;
import org.seepledger.ledger.Disclaimer;

/** Writes a report as one HTML page (the HTML standard of WHATWG) that needs nothing but itself. */
public final class ReportPage {

    private ReportPage() {}

    /**
     * {@return the page}
     *
     * @param report what it is made of
     */
    public static String of(Report report) {
        return document(html(
                        head(report),
                        body(
                                a("Skip to the answer").withHref("#answer").withClass("skip"),
                                TitleBlock.of(report),
                                aside(disclaimer()).withClass("disclaimer").attr("aria-label", "Disclaimer"),
                                TitleBlock.contents(report),
                                main(content(report)),
                                footer(h2("Disclaimer"), disclaimer())
                                        .withId("disclaimer")
                                        .withClass("disclaimer")))
                .withLang("en"));
    }

    private static HeadTag head(Report report) {
        HeadTag head = PageHead.of(report.masthead().title(), report.version());
        report.masthead()
                .author()
                .ifPresent(author -> head.with(meta().withName("author").withContent(author)));
        return head;
    }

    private static DomContent content(Report report) {
        return each(
                RemarksSection.first(report),
                AnswerSection.of(report),
                each(IntStream.range(0, report.results().size()).mapToObj(prism -> PrismSection.of(report, prism))),
                ExchangeSection.of(report),
                PeriodsSection.of(report),
                InputsSection.files(report),
                InputsSection.origins(report),
                MethodSection.of(report),
                RemarksSection.all(report));
    }

    private static DomContent disclaimer() {
        return each(Disclaimer.sentences(), sentence -> p(sentence));
    }
}
