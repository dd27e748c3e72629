package org.seepledger.report.page;

import static j2html.TagCreator.each;
import static j2html.TagCreator.h2;
import static j2html.TagCreator.h3;
import static j2html.TagCreator.p;
import static j2html.TagCreator.section;
import static j2html.TagCreator.text;

import j2html.tags.DomContent;
import java.util.List;
import java.util.Optional;
import java.util.stream.Stream;
import org.seepledger.ledger.PeriodBudget;
import org.seepledger.picture.Picture;
import org.seepledger.report.PrismResult;

/** One prism: its pictures, its tables, and where it does not close. */
final class PrismSection {

    private PrismSection() {}

    static String id(int prism) {
        return "prism-" + (prism + 1);
    }

    static DomContent of(Report report, int prism) {
        PrismResult result = report.results().get(prism);
        PrismPictures pictures = report.pictures().get(prism);
        String id = id(prism);
        About about = report.lines().get(prism).about();
        return section(
                        h2(result.prism()),
                        pictures(
                                "Where it lies and what flows",
                                Figure.of(pictures.map(), id + "-map", caption(pictures.map())),
                                Figure.of(pictures.section(), id + "-section", caption(pictures.section()))),
                        pictures(
                                "Gains, losses and storage",
                                Figure.of(pictures.blocks(), id + "-blocks", caption(pictures.blocks())),
                                Figure.of(pictures.series(), id + "-series", caption(pictures.series())),
                                Figure.of(pictures.storage(), id + "-storage", caption(pictures.storage()))),
                        tables(report, about, result),
                        ClosureSection.of(report, result, pictures, id))
                .withId(id)
                .withClass("prism");
    }

    private static String caption(Optional<Picture> picture) {
        return picture.map(Picture::title).orElse("");
    }

    private static DomContent pictures(String title, DomContent... figures) {
        boolean any = Stream.of(figures).anyMatch(figure -> !figure.render().isEmpty());
        return any ? section(h3(title), each(figures)) : text("");
    }

    private static DomContent tables(Report report, About about, PrismResult result) {
        List<PeriodBudget> budgets = report.tables().of(result.budget());
        return section(
                h3("Budget"),
                p(
                        "In and out are gross and never negative; net is in less out, and beside it its share of throughput. Rows of a layer add up to their item,"
                                + " items to their group. Items without any flow are not shown by layer."
                                + " A dash is a number that cannot be given."),
                each(budgets, budget -> BudgetTable.of(report.frame(), about, budget)));
    }
}
