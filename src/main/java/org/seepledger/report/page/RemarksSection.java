package org.seepledger.report.page;

import static j2html.TagCreator.a;
import static j2html.TagCreator.each;
import static j2html.TagCreator.h2;
import static j2html.TagCreator.li;
import static j2html.TagCreator.p;
import static j2html.TagCreator.section;
import static j2html.TagCreator.text;
import static j2html.TagCreator.ul;

import j2html.tags.DomContent;
import java.util.List;
import org.seepledger.report.Wording;

/** What the reader must know beside the numbers. */
final class RemarksSection {

    /** So many warnings stand before the answer; the rest at the end. */
    private static final int WARNINGS_FIRST = 6;

    private RemarksSection() {}

    /** The first warnings, before the answer; nothing where there are none. */
    static DomContent first(Cover cover) {
        List<String> warnings = cover.statement().warnings();
        if (warnings.isEmpty()) {
            return text("");
        }
        int more = warnings.size() - WARNINGS_FIRST;
        return section(
                        h2(Wording.counted(warnings.size(), "warning")),
                        ul(each(warnings.subList(0, Math.min(WARNINGS_FIRST, warnings.size())), words -> li(words))),
                        more > 0 ? p(a("And " + more + " more.").withHref("#all-warnings")) : text(""))
                .withId("warnings")
                .withClass("warnings");
    }

    /** All warnings where not all of them stand before the answer, and the notes. */
    static DomContent all(Cover cover) {
        List<String> warnings = cover.statement().warnings();
        return each(
                warnings.size() > WARNINGS_FIRST ? list("All warnings", "all-warnings", warnings) : text(""),
                cover.notes().isEmpty() ? text("") : list("Notes", "notes", cover.notes()));
    }

    private static DomContent list(String title, String id, List<String> lines) {
        return section(h2(title), ul(each(lines, line -> li(line)))).withId(id);
    }
}
