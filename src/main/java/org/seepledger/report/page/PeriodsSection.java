package org.seepledger.report.page;

import static j2html.TagCreator.each;
import static j2html.TagCreator.h2;
import static j2html.TagCreator.p;
import static j2html.TagCreator.section;

import j2html.tags.DomContent;
import java.util.List;

/** The totals of each budget by period. */
final class PeriodsSection {

    private PeriodsSection() {}

    static DomContent of(BudgetFrame frame, List<TotalsTable.Line> lines, String file) {
        return section(
                        h2("Periods"),
                        p("Totals by period. All rows of every period stand in " + file + "."),
                        each(lines, line -> TotalsTable.ofPeriods(frame, line)))
                .withId("periods");
    }
}
