package org.seepledger.report.page;

import static j2html.TagCreator.each;
import static j2html.TagCreator.h2;
import static j2html.TagCreator.p;
import static j2html.TagCreator.section;

import j2html.tags.DomContent;

/** The totals of each prism by period. */
final class PeriodsSection {

    private PeriodsSection() {}

    static DomContent of(Report report) {
        return section(
                        h2("Periods"),
                        p("Totals by period. All rows of every period stand in budget.csv."),
                        each(report.results(), result -> TotalsTable.ofPeriods(report, result)))
                .withId("periods");
    }
}
