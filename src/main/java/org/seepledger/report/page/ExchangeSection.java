package org.seepledger.report.page;

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
import java.util.List;
import org.seepledger.ledger.ExchangeFlow;
import org.seepledger.picture.Picture;

/** What prisms give to each other and to the outside, as a diagram and a table. */
final class ExchangeSection {

    private ExchangeSection() {}

    static DomContent of(Report report) {
        return section(
                        h2("Exchange"),
                        p("What prisms give to each other through shared sides and lids, gross, over the record;"
                                + " what is left of their faces goes to and comes from outside."),
                        Figure.of(
                                report.exchangePicture(),
                                "exchange-flows",
                                report.exchangePicture().map(Picture::title).orElse("")),
                        flows(report))
                .withId("exchange");
    }

    private static DomContent flows(Report report) {
        String title = "Exchange: record, " + report.frame().amountsAndUnit();
        List<ExchangeFlow> flows = report.exchange().stream()
                .filter(flow -> flow.volume(report.record()) != 0)
                .toList();
        return flows.isEmpty()
                ? p("Nothing flows between them.")
                : Cells.scrolling(
                        title,
                        table(
                                        Cells.caption(title),
                                        thead(tr(Cells.column("From"), Cells.column("To"), Cells.numberColumn("Flow"))),
                                        tbody(each(flows, flow -> row(report, flow))))
                                .withClass("exchange"));
    }

    private static DomContent row(Report report, ExchangeFlow flow) {
        return tr(
                        Cells.row(flow.giver()),
                        td(flow.receiver()),
                        Cells.number(report.frame().amount(flow.volume(report.record()), report.record())))
                .withData("giver", flow.giver())
                .withData("receiver", flow.receiver());
    }
}
