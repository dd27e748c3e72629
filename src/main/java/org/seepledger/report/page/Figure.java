package org.seepledger.report.page;

import static j2html.TagCreator.div;
import static j2html.TagCreator.figcaption;
import static j2html.TagCreator.figure;
import static j2html.TagCreator.rawHtml;
import static j2html.TagCreator.text;

import j2html.tags.DomContent;
import java.util.Optional;
import org.seepledger.picture.Picture;
import org.seepledger.report.SvgWriter;

/** A picture with its caption, in a box that scrolls where the page is narrower. */
final class Figure {

    private Figure() {}

    /** A picture, or nothing; the name begins the ids within it. */
    static DomContent of(Optional<Picture> picture, String name, String caption) {
        return picture.map(given -> (DomContent) figure(
                                div(rawHtml(SvgWriter.element(given, name)))
                                        .withClass("scroll")
                                        .attr("role", "group")
                                        .attr("aria-label", caption)
                                        .withTabindex(0),
                                figcaption(caption))
                        .withId(name))
                .orElse(text(""));
    }
}
