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
import static j2html.TagCreator.rawHtml;
import static j2html.TagCreator.style;
import static j2html.TagCreator.title;

import j2html.TagCreator;
import j2html.tags.DomContent;
import j2html.tags.specialized.HeadTag;
import java.io.IOException;
import java.io.InputStream;
import java.io.UncheckedIOException;
import java.nio.charset.StandardCharsets;
import java.util.stream.IntStream;
import org.seepledger.ledger.Disclaimer;
import org.seepledger.report.InkStyle;

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
        String name = report.masthead().title();
        HeadTag head = TagCreator.head(
                meta().withCharset("utf-8"),
                title(name),
                meta().withName("viewport").withContent("width=device-width, initial-scale=1"),
                meta().withName("color-scheme").withContent("light dark"),
                meta().withName("generator").withContent("Seepledger " + report.version()));
        report.masthead()
                .author()
                .ifPresent(author -> head.with(meta().withName("author").withContent(author)));
        return head.with(style(rawHtml(InkStyle.css() + sheet() + PageFooter.css(name))));
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

    private static String sheet() {
        try (InputStream sheet = ReportPage.class.getResourceAsStream("page.css")) {
            return new String(sheet.readAllBytes(), StandardCharsets.UTF_8);
        } catch (IOException e) {
            throw new UncheckedIOException(e);
        }
    }
}
