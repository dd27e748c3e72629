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
import java.util.stream.IntStream;
import org.seepledger.ledger.PeriodBudget;
import org.seepledger.ledger.Total;
import org.seepledger.report.PrismResult;

/** The totals of budgets, a row for each: of all prisms over the record, or of a prism by period. */
final class TotalsTable {

    private final Report report;
    private final List<Total> totals;

    private TotalsTable(Report report) {
        this.report = report;
        this.totals = Total.rows(report.results().get(0).storageKnown());
    }

    /** All prisms over the record, each with a link to its section. */
    static DomContent ofPrisms(Report report) {
        TotalsTable table = new TotalsTable(report);
        List<TrTag> rows = IntStream.range(0, report.results().size())
                .mapToObj(table::ofPrism)
                .toList();
        return table.framed(
                "All prisms over the record, ",
                List.of(Cells.column("Prism")),
                rows,
                framed -> framed.withClass("glance"));
    }

    private TrTag ofPrism(int prism) {
        PrismResult result = report.results().get(prism);
        DomContent name = Cells.row("").with(a(result.prism()).withHref("#" + PrismSection.id(prism)));
        return row(List.of(name), result.record()).withData("prism", result.prism());
    }

    /** A prism by period. */
    static DomContent ofPeriods(Report report, PrismResult result) {
        TotalsTable table = new TotalsTable(report);
        List<TrTag> rows = result.periods().stream().map(table::ofPeriod).toList();
        return table.framed(
                result.prism() + ": totals by period, ",
                List.of(Cells.column("Period"), Cells.column("From, to")),
                rows,
                framed -> framed.withClass("periods").withData("prism", result.prism()));
    }

    private TrTag ofPeriod(PeriodBudget budget) {
        DomContent span = td(report.span(budget.period())).withClass("span");
        return row(List.of(Cells.row(budget.period().name()), span), budget)
                .withData("period", budget.period().name());
    }

    private TrTag row(List<DomContent> names, PeriodBudget budget) {
        List<DomContent> cells = new ArrayList<>(names);
        for (Total total : totals) {
            double value = budget.totals().get(total);
            cells.add(
                    total.isPercentage() ? Cells.percent(value) : Cells.number(report.amount(value, budget.period())));
        }
        return tr(cells.toArray(DomContent[]::new));
    }

    private DomContent framed(String title, List<DomContent> names, List<TrTag> rows, UnaryOperator<TableTag> marked) {
        List<DomContent> columns = new ArrayList<>(names);
        totals.forEach(total -> columns.add(Cells.numberColumn(capital(total.toString()))));
        String caption = title + report.amountsAndUnit();
        TableTag table = table(
                Cells.caption(caption), thead(tr(columns.toArray(DomContent[]::new))), tbody(each(rows, row -> row)));
        return Cells.scrolling(caption, marked.apply(table));
    }

    private static String capital(String words) {
        return Character.toUpperCase(words.charAt(0)) + words.substring(1);
    }
}
