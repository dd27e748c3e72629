package org.seepledger.report.page;

import static j2html.TagCreator.each;
import static j2html.TagCreator.table;
import static j2html.TagCreator.tbody;
import static j2html.TagCreator.thead;
import static j2html.TagCreator.tr;

import j2html.tags.DomContent;
import j2html.tags.specialized.TrTag;
import java.util.ArrayList;
import java.util.List;
import org.seepledger.ledger.Period;
import org.seepledger.ledger.Total;
import org.seepledger.plume.NonDetects;
import org.seepledger.report.PlumeResult;

/** What a budget's totals over the record would be with non-detects as 0, half their limit and their limit, as masses. */
final class BracketTable {

    private BracketTable() {}

    static DomContent of(SoluteReport report, PlumeResult result, About about) {
        String title = about.name() + ": totals over the record by how non-detects count, masses in "
                + report.wording().unit(report.units().mass());
        List<TrTag> rows = Total.rows(result.budget().storageKnown()).stream()
                .filter(total -> !total.isPercentage())
                .map(total -> row(report, result, total))
                .toList();
        return Cells.scrolling(
                title,
                about.mark(table(
                                Cells.caption(title),
                                thead(tr(
                                        Cells.column("Total"),
                                        Cells.numberColumn("As 0"),
                                        Cells.numberColumn("Half the limit"),
                                        Cells.numberColumn("The limit"))),
                                tbody(each(rows, row -> row))))
                        .withClass("bracket")
                        .withData("period", report.record().name()));
    }

    private static TrTag row(SoluteReport report, PlumeResult result, Total total) {
        Period record = report.record();
        List<DomContent> cells = new ArrayList<>(List.of(Cells.row(total.toString())));
        for (NonDetects choice : NonDetects.values()) {
            double mass =
                    result.plume().ledgers().get(choice).budget(record).totals().get(total);
            cells.add(Cells.number(mass * report.units().massFactor()));
        }
        return tr(cells.toArray(DomContent[]::new)).withData("item", total.toString());
    }
}
