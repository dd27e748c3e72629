package org.seepledger.report.page;

import static j2html.TagCreator.caption;
import static j2html.TagCreator.each;
import static j2html.TagCreator.h2;
import static j2html.TagCreator.p;
import static j2html.TagCreator.section;
import static j2html.TagCreator.table;
import static j2html.TagCreator.tbody;
import static j2html.TagCreator.td;
import static j2html.TagCreator.thead;
import static j2html.TagCreator.tr;

import j2html.tags.DomContent;
import java.util.ArrayList;
import java.util.List;
import org.seepledger.ledger.PeriodBudget;
import org.seepledger.ledger.Total;
import org.seepledger.report.PrismResult;

/** The totals of each prism by period. */
final class PeriodsSection {

    private PeriodsSection() {}

    static DomContent of(Report report) {
        return section(
                        h2("Periods"),
                        p("Totals by period. All rows of every period stand in budget.csv."),
                        each(report.results(), result -> of(report, result)))
                .withId("periods");
    }

    private static DomContent of(Report report, PrismResult result) {
        String title = result.prism() + ": totals by period, "
                + (report.amounts() == Amounts.RATE ? "mean rates in " : "volumes in ") + report.amountUnit();
        List<Total> totals = Total.rows(result.storageKnown());
        List<DomContent> columns = new ArrayList<>(List.of(Cells.column("Period"), Cells.column("From, to")));
        totals.forEach(total -> columns.add(Cells.numberColumn(capital(total.toString()))));
        return Cells.scrolling(
                title,
                table(
                                caption(title),
                                thead(tr(columns.toArray(DomContent[]::new))),
                                tbody(each(result.periods(), budget -> row(report, totals, budget))))
                        .withClass("periods")
                        .withData("prism", result.prism()));
    }

    private static String capital(String words) {
        return Character.toUpperCase(words.charAt(0)) + words.substring(1);
    }

    private static DomContent row(Report report, List<Total> totals, PeriodBudget budget) {
        List<DomContent> cells = new ArrayList<>();
        cells.add(Cells.row(budget.period().name()));
        cells.add(td(report.span(budget.period())).withClass("span"));
        for (Total total : totals) {
            double value = budget.totals().get(total);
            cells.add(
                    total.isPercentage() ? Cells.percent(value) : Cells.number(report.amount(value, budget.period())));
        }
        return tr(cells.toArray(DomContent[]::new))
                .withData("period", budget.period().name());
    }
}
