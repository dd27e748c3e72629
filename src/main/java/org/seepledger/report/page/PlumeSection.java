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
import org.seepledger.ledger.PeriodBudget;
import org.seepledger.picture.Picture;
import org.seepledger.report.PlumeResult;

/** One solute in one prism: its pictures and its tables. */
final class PlumeSection {

    private PlumeSection() {}

    static DomContent of(SoluteReport report, int index) {
        PlumeResult result = report.results().get(index);
        PlumePictures pictures = report.pictures().get(index);
        About about = report.lines().get(index).about();
        String id = about.id();
        HeldTable held = new HeldTable(report, result, about);
        return section(
                        h2(about.name()),
                        section(
                                h3("Where it is, and where it goes"),
                                figure(Optional.of(pictures.map()), id + "-map"),
                                figure(pictures.section(), id + "-section")),
                        section(
                                h3("Mass in place"),
                                figure(Optional.of(pictures.mass()), id + "-mass"),
                                held.atEnd(),
                                held.throughTime()),
                        section(
                                h3("Discharge by face, gains, losses and storage"),
                                figure(Optional.of(pictures.blocks()), id + "-blocks"),
                                figure(pictures.series(), id + "-series")),
                        tables(report, result, about))
                .withId(id)
                .withClass("prism");
    }

    private static DomContent figure(Optional<Picture> picture, String id) {
        return Figure.of(picture, id, picture.map(Picture::title).orElse(""));
    }

    private static DomContent tables(SoluteReport report, PlumeResult result, About about) {
        List<PeriodBudget> budgets = report.tables().of(result.budget());
        boolean undetected = result.plume().stocks().stream()
                .anyMatch(layers -> layers.get(layers.size() - 1).nonDetects() > 0);
        return section(
                h3("Budget"),
                p(
                        "In and out are gross and never negative; net is in less out, and beside it its share of throughput. Sides,"
                                + " lids and sources carry the solute with the water; dispersion has rows of its own. Decay takes,"
                                + " production by the decay of another solute adds. Storage takes up (out) and releases (in). A dash is"
                                + " a number that cannot be given."),
                each(budgets, budget -> BudgetTable.of(report.frame(), about, budget)),
                undetected ? BracketTable.of(report, result, about) : text(""));
    }
}
