package org.seepledger.report.page;

import static j2html.TagCreator.details;
import static j2html.TagCreator.div;
import static j2html.TagCreator.each;
import static j2html.TagCreator.summary;
import static j2html.TagCreator.table;
import static j2html.TagCreator.tbody;
import static j2html.TagCreator.text;
import static j2html.TagCreator.th;
import static j2html.TagCreator.thead;
import static j2html.TagCreator.tr;

import j2html.tags.DomContent;
import j2html.tags.specialized.TableTag;
import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import java.util.stream.Stream;
import org.seepledger.ledger.Group;
import org.seepledger.ledger.PeriodBudget;
import org.seepledger.ledger.Total;
import org.seepledger.report.Term;
import org.seepledger.report.Wording;

/** The budget of a prism and period as a table, of water or of a solute: items with their layers, groups with their sums, totals. */
final class BudgetTable {

    /** Up to so many sides stand in the table itself. */
    private static final int SIDES_SHOWN = 16;

    private static final int COLUMNS = 5;

    private final BudgetFrame frame;
    private final About about;
    private final PeriodBudget budget;
    private final BudgetRows rows;

    private BudgetTable(BudgetFrame frame, About about, PeriodBudget budget) {
        this.frame = frame;
        this.about = about;
        this.budget = budget;
        this.rows = new BudgetRows(frame, budget);
    }

    /** The table, and a second one for the smallest of very many sides. */
    static DomContent of(BudgetFrame frame, About about, PeriodBudget budget) {
        return new BudgetTable(frame, about, budget).write();
    }

    private DomContent write() {
        List<Term> folded = folded();
        String title = about.name() + ": " + budget.period().name() + ", " + frame.amountsAndUnit();
        List<DomContent> bodies = new ArrayList<>();
        for (Group group : Group.values()) {
            List<Term> terms = Term.of(budget).stream()
                    .filter(term -> term.group() == group)
                    .toList();
            if (!terms.isEmpty()) {
                bodies.add(body(group, terms, group == Group.SIDE ? folded : List.of()));
            }
        }
        bodies.add(totals());
        return div(Cells.scrolling(title, framed(title, bodies)), folded.isEmpty() ? text("") : fold(folded));
    }

    private TableTag framed(String title, List<DomContent> bodies) {
        return about.mark(table(
                        Cells.caption(title),
                        thead(tr(
                                Cells.column("Item"),
                                Cells.numberColumn("In"),
                                Cells.numberColumn("Out"),
                                Cells.numberColumn("Net"),
                                Cells.numberColumn("Of throughput"))),
                        each(bodies.stream())))
                .withClass("budget")
                .withData("period", budget.period().name());
    }

    private DomContent body(Group group, List<Term> terms, List<Term> folded) {
        List<DomContent> lines = new ArrayList<>();
        lines.add(tr(th(name(group)).attr("scope", "rowgroup").attr("colspan", COLUMNS))
                .withClass("group"));
        terms.stream().filter(term -> !folded.contains(term)).forEach(term -> lines.addAll(rows.of(term)));
        if (!folded.isEmpty()) {
            lines.add(rows.sum(Wording.counted(folded.size(), "smaller side") + ", below", folded, "folded"));
        }
        if (terms.size() > 1) {
            lines.add(rows.sum("All " + name(group).toLowerCase(Locale.ROOT), terms, "sum"));
        }
        return tbody(lines.toArray(DomContent[]::new));
    }

    private static String name(Group group) {
        return switch (group) {
            case SIDE -> "Sides";
            case LID -> "Lids";
            case SOURCE -> "Sources";
            case DISPERSION -> "Dispersion";
            case DECAY -> "Decay";
            case PRODUCTION -> "Production";
            case STORAGE -> "Storage";
            case TOTAL -> "Totals";
        };
    }

    private DomContent totals() {
        List<DomContent> lines = new ArrayList<>();
        lines.add(tr(th(name(Group.TOTAL)).attr("scope", "rowgroup").attr("colspan", COLUMNS))
                .withClass("group"));
        boolean known = !Double.isNaN(budget.totals().storageChange());
        Total.rows(known).forEach(total -> lines.add(rows.of(total)));
        return tbody(lines.toArray(DomContent[]::new)).withClass("totals");
    }

    /** Of very many sides, the ones with the least gross flow; those without a number stay in sight. */
    private List<Term> folded() {
        List<Term> sides = Term.of(budget).stream()
                .filter(term -> term.group() == Group.SIDE)
                .toList();
        List<Term> largest = Term.bySize(sides);
        if (sides.size() <= SIDES_SHOWN || largest.size() <= SIDES_SHOWN) {
            return List.of();
        }
        List<Term> smallest = largest.subList(SIDES_SHOWN, largest.size());
        return sides.stream().filter(smallest::contains).toList();
    }

    private DomContent fold(List<Term> folded) {
        String title = about.name() + ": " + budget.period().name() + ", the smaller sides, " + frame.amountsAndUnit();
        DomContent body =
                tbody(folded.stream().flatMap(term -> rows.of(term).stream()).toArray(DomContent[]::new));
        return details(
                summary(Wording.counted(folded.size(), "smaller side")),
                Cells.scrolling(title, framed(title, Stream.of(body).toList())));
    }
}
