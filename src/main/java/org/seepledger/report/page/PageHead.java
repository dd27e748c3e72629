package org.seepledger.report.page;

import static j2html.TagCreator.meta;
import static j2html.TagCreator.rawHtml;
import static j2html.TagCreator.style;
import static j2html.TagCreator.title;

import j2html.TagCreator;
import j2html.tags.specialized.HeadTag;
import java.io.IOException;
import java.io.InputStream;
import java.io.UncheckedIOException;
import java.nio.charset.StandardCharsets;
import org.seepledger.report.InkStyle;

/** The head of a page that needs nothing but itself: its name and its look. */
final class PageHead {

    private PageHead() {}

    static HeadTag of(String name, String version) {
        return TagCreator.head(
                meta().withCharset("utf-8"),
                title(name),
                meta().withName("viewport").withContent("width=device-width, initial-scale=1"),
                meta().withName("color-scheme").withContent("light dark"),
                meta().withName("generator").withContent("Seepledger " + version),
                style(rawHtml(InkStyle.css() + sheet() + PageFooter.css(name))));
    }

    private static String sheet() {
        try (InputStream sheet = PageHead.class.getResourceAsStream("page.css")) {
            return new String(sheet.readAllBytes(), StandardCharsets.UTF_8);
        } catch (IOException e) {
            throw new UncheckedIOException(e);
        }
    }
}
