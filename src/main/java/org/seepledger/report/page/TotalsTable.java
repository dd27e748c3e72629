package org.seepledger.report.page;

import static j2html.TagCreator.a;
import static j2html.TagCreator.each;
import static j2html.TagCreator.table;
import static j2html.TagCreator.tbody;
import static j2html.TagCreator.td;
import static j2html.TagCreator.thead;
import static j2html.TagCreator.tr;

import j2html.tags.DomContent;
import j2html.tags.specialized.TableTag;
import j2html.tags.specialized.TrTag;
import java.util.ArrayList;
import java.util.List;
import java.util.function.UnaryOperator;
import org.seepledger.ledger.PeriodBudget;
import org.seepledger.ledger.Total;
import org.seepledger.report.BudgetCourse;

/** The totals of budgets, a row for each: of all over the record, or of one by period. */
final class TotalsTable {

    private final BudgetFrame frame;
    private final List<Total> totals;

    /**
     * A budget.
     *
     * @param about what it is of
     * @param budget the budget
     */
    record Line(About about, BudgetCourse budget) {}

    private TotalsTable(BudgetFrame frame, boolean storageKnown) {
        this.frame = frame;
        this.totals = Total.rows(storageKnown);
    }

    /** All budgets over the record, each with a link to its section. */
    static DomContent ofRecords(BudgetFrame frame, String all, String column, List<Line> lines) {
        TotalsTable table = new TotalsTable(frame, lines.get(0).budget().storageKnown());
        return table.framed(
                all + " over the record, ",
                List.of(Cells.column(column)),
                lines.stream().map(table::ofRecord).toList(),
                framed -> framed.withClass("glance"));
    }

    private TrTag ofRecord(Line line) {
        DomContent name = Cells.row("")
                .with(a(line.about().name()).withHref("#" + line.about().id()));
        return line.about().mark(row(List.of(name), line.budget().record()));
    }

    /** A budget by period. */
    static DomContent ofPeriods(BudgetFrame frame, Line line) {
        TotalsTable table = new TotalsTable(frame, line.budget().storageKnown());
        return table.framed(
                line.about().name() + ": totals by period, ",
                List.of(Cells.column("Period"), Cells.column("From, to")),
                line.budget().periods().stream().map(table::ofPeriod).toList(),
                framed -> line.about().mark(framed.withClass("periods")));
    }

    private TrTag ofPeriod(PeriodBudget budget) {
        DomContent span = td(frame.span(budget.period())).withClass("span");
        return row(List.of(Cells.row(budget.period().name()), span), budget)
                .withData("period", budget.period().name());
    }

    private TrTag row(List<DomContent> names, PeriodBudget budget) {
        List<DomContent> cells = new ArrayList<>(names);
        for (Total total : totals) {
            double value = budget.totals().get(total);
            cells.add(total.isPercentage() ? Cells.percent(value) : Cells.number(frame.amount(value, budget.period())));
        }
        return tr(cells.toArray(DomContent[]::new));
    }

    private DomContent framed(String title, List<DomContent> names, List<TrTag> rows, UnaryOperator<TableTag> marked) {
        List<DomContent> columns = new ArrayList<>(names);
        totals.forEach(total -> columns.add(Cells.numberColumn(capital(total.toString()))));
        String caption = title + frame.amountsAndUnit();
        TableTag table = table(
                Cells.caption(caption), thead(tr(columns.toArray(DomContent[]::new))), tbody(each(rows, row -> row)));
        return Cells.scrolling(caption, marked.apply(table));
    }

    private static String capital(String words) {
        return Character.toUpperCase(words.charAt(0)) + words.substring(1);
    }
}
