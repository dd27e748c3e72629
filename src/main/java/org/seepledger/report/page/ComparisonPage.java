package org.seepledger.report.page;

import static j2html.TagCreator.aside;
import static j2html.TagCreator.body;
import static j2html.TagCreator.code;
import static j2html.TagCreator.dd;
import static j2html.TagCreator.div;
import static j2html.TagCreator.dl;
import static j2html.TagCreator.document;
import static j2html.TagCreator.dt;
import static j2html.TagCreator.each;
import static j2html.TagCreator.footer;
import static j2html.TagCreator.h1;
import static j2html.TagCreator.h2;
import static j2html.TagCreator.header;
import static j2html.TagCreator.html;
import static j2html.TagCreator.main;
import static j2html.TagCreator.p;
import static j2html.TagCreator.section;
import static j2html.TagCreator.table;
import static j2html.TagCreator.tbody;
import static j2html.TagCreator.td;
import static j2html.TagCreator.text;
import static j2html.TagCreator.thead;
import static j2html.TagCreator.tr;

import j2html.tags.DomContent;
import java.time.LocalDate;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.function.Function;
import org.seepledger.ledger.Disclaimer;
import org.seepledger.report.ComparisonText;
import org.seepledger.report.Wording;
import org.seepledger.review.change.Difference;
import org.seepledger.review.change.RecordedRow;
import org.seepledger.review.change.Split;
import org.seepledger.unit.Measure;

/** Writes a comparison of two runs as one HTML page. */
public final class ComparisonPage {

    private static final int ROWS_SHOWN = 200;

    private ComparisonPage() {}

    /**
     * {@return the page}
     *
     * @param comparison what it says
     * @param first the first run's folder
     * @param second the second run's folder
     * @param date the date that it carries
     * @param version the program's version
     */
    public static String of(ComparisonText comparison, String first, String second, LocalDate date, String version) {
        String title = "Two runs compared";
        return document(html(
                        PageHead.of(title, version),
                        body(
                                header(
                                        h1(title),
                                        dl(
                                                        fact("First run", first),
                                                        fact("Second run", second),
                                                        fact("Date", date.toString()),
                                                        fact("Made with", "Seepledger " + version))
                                                .withClass("facts")),
                                aside(disclaimer()).withClass("disclaimer").attr("aria-label", "Disclaimer"),
                                main(content(comparison)),
                                footer(h2("Disclaimer"), disclaimer()).withClass("disclaimer")))
                .withLang("en"));
    }

    private static DomContent fact(String name, String value) {
        return div(dt(name), dd(value));
    }

    private static DomContent disclaimer() {
        return each(Disclaimer.sentences(), sentence -> p(sentence));
    }

    private static DomContent content(ComparisonText comparison) {
        return each(
                section(h2("The answer"), each(comparison.sentences(), sentence -> p(sentence.strip())))
                        .withId("answer"),
                changes("Options that differ", comparison.changedOptions()),
                changes("Inputs that differ", comparison.changedInputs()),
                differences(comparison.large()));
    }

    private static DomContent changes(String title, Map<String, String> changes) {
        return changes.isEmpty()
                ? text("")
                : section(
                        h2(title),
                        dl(each(changes, (name, change) -> div(dt(code(name)), dd(change))))
                                .withClass("facts options"));
    }

    private static DomContent differences(List<Difference> differences) {
        if (differences.isEmpty()) {
            return text("");
        }
        String title = "Net rates that differ, the largest first";
        List<Difference> shown = differences.subList(0, Math.min(ROWS_SHOWN, differences.size()));
        return section(
                h2("Differences"),
                p(
                        "The parts by area, period, inputs and unit add to the difference. Each is the mean of what the change does in all"
                                + " orders in which area, period and inputs can be changed. differences.csv has all rows, and volumes."),
                Cells.scrolling(
                        title,
                        table(
                                        Cells.caption(title),
                                        thead(tr(
                                                Cells.column("Prism"),
                                                Cells.column("Period"),
                                                Cells.column("Item"),
                                                Cells.column("Layer"),
                                                Cells.numberColumn("First" + unit(shown, Difference::first)),
                                                Cells.numberColumn("Second" + unit(shown, Difference::second)),
                                                Cells.numberColumn("Difference"),
                                                Cells.numberColumn("Percent"),
                                                Cells.numberColumn("By area"),
                                                Cells.numberColumn("By period"),
                                                Cells.numberColumn("By inputs"),
                                                Cells.numberColumn("By unit"))),
                                        tbody(each(shown, ComparisonPage::row)))
                                .withClass("budget parts")));
    }

    /** A run has one unit for all its rates. */
    private static String unit(List<Difference> differences, Function<Difference, Optional<RecordedRow>> run) {
        return differences.stream()
                .map(one -> Difference.unit(run.apply(one), false))
                .filter(unit -> !unit.isEmpty())
                .findFirst()
                .map(unit -> ", " + Wording.raised(Measure.of(unit)))
                .orElse("");
    }

    private static DomContent row(Difference difference) {
        Optional<Split> split = difference.rate();
        return tr(
                Cells.row(difference.any().prism()),
                td(difference.any().period()),
                td(difference.any().item()),
                td(difference.any().layer()),
                Cells.number(Difference.value(difference.first(), false)),
                Cells.number(Difference.value(difference.second(), false)),
                Cells.number(difference.off(false)),
                Cells.percent(difference.percent(false)),
                Cells.number(split.map(Split::area).orElse(Double.NaN)),
                Cells.number(split.map(Split::period).orElse(Double.NaN)),
                Cells.number(split.map(Split::inputs).orElse(Double.NaN)),
                Cells.number(split.map(Split::unit).orElse(Double.NaN)));
    }
}
