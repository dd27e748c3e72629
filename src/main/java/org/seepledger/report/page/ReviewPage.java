package org.seepledger.report.page;

import static j2html.TagCreator.a;
import static j2html.TagCreator.article;
import static j2html.TagCreator.aside;
import static j2html.TagCreator.body;
import static j2html.TagCreator.code;
import static j2html.TagCreator.dd;
import static j2html.TagCreator.details;
import static j2html.TagCreator.div;
import static j2html.TagCreator.dl;
import static j2html.TagCreator.document;
import static j2html.TagCreator.dt;
import static j2html.TagCreator.each;
import static j2html.TagCreator.footer;
import static j2html.TagCreator.h1;
import static j2html.TagCreator.h2;
import static j2html.TagCreator.h3;
import static j2html.TagCreator.header;
import static j2html.TagCreator.html;
import static j2html.TagCreator.li;
import static j2html.TagCreator.main;
import static j2html.TagCreator.ol;
import static j2html.TagCreator.p;
import static j2html.TagCreator.section;
import static j2html.TagCreator.summary;
import static j2html.TagCreator.table;
import static j2html.TagCreator.tbody;
import static j2html.TagCreator.td;
import static j2html.TagCreator.text;
import static j2html.TagCreator.thead;
import static j2html.TagCreator.time;
import static j2html.TagCreator.tr;
import static j2html.TagCreator.ul;

import j2html.tags.DomContent;
import java.time.LocalDate;
import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.stream.Collectors;
import org.seepledger.io.result.Statement;
import org.seepledger.ledger.Disclaimer;
import org.seepledger.report.ReviewText;
import org.seepledger.review.check.Beside;
import org.seepledger.review.check.Code;
import org.seepledger.review.check.Finding;
import org.seepledger.review.check.Review;
import org.seepledger.review.check.Severity;
import org.seepledger.unit.Figures;

/** Writes a review as one HTML page, to be read and to be sent to the author of the budget. */
public final class ReviewPage {

    private static final int ROWS_SHOWN = 60;

    private final Review.Result result;
    private final boolean recomputed;
    private final Statement statement;

    private ReviewPage(Review.Result result, boolean recomputed, Statement statement) {
        this.result = result;
        this.recomputed = recomputed;
        this.statement = statement;
    }

    /**
     * {@return the page}
     *
     * @param result what the review came to
     * @param recomputed whether the table was held against a recomputed budget
     * @param statement its inputs and warnings
     * @param options the run's options as they took effect
     * @param date the date that it carries
     * @param version the program's version
     */
    public static String of(
            Review.Result result,
            boolean recomputed,
            Statement statement,
            Map<String, String> options,
            LocalDate date,
            String version) {
        ReviewPage page = new ReviewPage(result, recomputed, statement);
        String title = "Review of a submitted budget";
        return document(html(
                        PageHead.of(title, version),
                        body(
                                a("Skip to the verdict").withHref("#verdict").withClass("skip"),
                                header(
                                                h1(title),
                                                dl(
                                                                fact("Submitted", options.get("submitted")),
                                                                fact(
                                                                        "Held against",
                                                                        options.getOrDefault(
                                                                                "aquifer", "nothing: the table alone")),
                                                                div(
                                                                        dt("Date"),
                                                                        dd(time(date.toString())
                                                                                .attr("datetime", date.toString()))),
                                                                fact(
                                                                        "Tolerance",
                                                                        options.get("tolerance")
                                                                                + "\u202f% of throughput"),
                                                                fact("Made with", "Seepledger " + version))
                                                        .withClass("facts"))
                                        .withClass("title-block"),
                                aside(disclaimer()).withClass("disclaimer").attr("aria-label", "Disclaimer"),
                                main(page.content(options)),
                                footer(h2("Disclaimer"), disclaimer())
                                        .withId("disclaimer")
                                        .withClass("disclaimer")))
                .withLang("en"));
    }

    private static DomContent fact(String name, String value) {
        return div(dt(name), dd(value));
    }

    private static DomContent disclaimer() {
        return each(Disclaimer.sentences(), sentence -> p(sentence));
    }

    private DomContent content(Map<String, String> options) {
        return each(
                section(
                                h2("The verdict"),
                                p(ReviewText.verdict(result, recomputed)),
                                p(
                                        "A finding says what may be behind a number; it does not prove it. Its author may know better."))
                        .withId("verdict"),
                findings(Severity.FAULT, "Faults"),
                findings(Severity.DOUBT, "Doubts"),
                questions(),
                besides(),
                findings(Severity.NOTE, "Notes: what sound budgets have, too, and what was not checked"),
                files(options));
    }

    private DomContent findings(Severity severity, String title) {
        Map<Code, List<Finding>> byCode = new LinkedHashMap<>();
        result.findings().stream()
                .filter(finding -> finding.severity() == severity)
                .forEach(finding -> byCode.computeIfAbsent(finding.code(), any -> new ArrayList<>())
                        .add(finding));
        if (byCode.isEmpty()) {
            return text("");
        }
        List<DomContent> parts = new ArrayList<>();
        byCode.forEach((code, list) ->
                parts.add(article(h3(code.meaning()), ul(each(list, finding -> li(words(finding)))))));
        return section(h2(title), each(parts.stream())).withId(severity + "s");
    }

    private static String words(Finding finding) {
        StringBuilder words = new StringBuilder();
        if (!finding.prism().equals(Finding.SEVERAL)) {
            words.append(finding.prism()).append(finding.period().equals(Finding.SEVERAL) ? ": " : ", ");
        }
        if (!finding.period().equals(Finding.SEVERAL)) {
            words.append(finding.period()).append(": ");
        }
        words.append(finding.message());
        if (!Double.isNaN(finding.submitted()) && !Double.isNaN(finding.recomputed())) {
            words.append(" Submitted ").append(Figures.typeset(finding.submitted()));
            words.append(", recomputed ").append(Figures.typeset(finding.recomputed()));
            words.append(finding.unit().isEmpty() ? "." : " " + finding.unit() + ".");
        }
        return typeset(words.toString());
    }

    /** The same words with the quotation marks and the minus that a page has. */
    private static String typeset(String plain) {
        return plain.replaceAll("\"([^\"]*)\"", "\u201c$1\u201d").replaceAll("(?<=[ (])-(?=\\d)", "\u2212");
    }

    private DomContent questions() {
        List<String> asked = result.findings().stream()
                .filter(finding -> finding.severity() != Severity.NOTE)
                .map(finding -> (finding.item().equals(Finding.SEVERAL) ? "" : "\u201c" + finding.item() + "\u201d: ")
                        + finding.code().question())
                .distinct()
                .toList();
        return asked.isEmpty()
                ? text("")
                : section(h2("Questions to the author"), ol(each(asked, question -> li(question))))
                        .withId("questions");
    }

    private DomContent besides() {
        if (result.beside().isEmpty()) {
            return text("");
        }
        Map<String, List<Beside>> byPrism = result.beside().stream()
                .collect(Collectors.groupingBy(Beside::prism, LinkedHashMap::new, Collectors.toList()));
        List<DomContent> tables = new ArrayList<>();
        byPrism.forEach((prism, rows) -> tables.add(ofPrism(prism, rows)));
        return section(
                        h2("Submitted beside recomputed"),
                        p(
                                "Differences are in percent of the period's throughput, the larger of all gains and all losses. Figures that"
                                        + " do not agree come first; side_by_side.csv has all of them."),
                        each(tables.stream()))
                .withId("beside");
    }

    private static DomContent ofPrism(String prism, List<Beside> rows) {
        List<Beside> sorted = rows.stream()
                .sorted(java.util.Comparator.comparing(Beside::agrees).thenComparing(row -> -Math.abs(row.share())))
                .toList();
        String title = prism + ": "
                + (rows.stream().filter(row -> !row.agrees()).count()) + " of " + rows.size() + " figures do not agree";
        DomContent first = besideTable(title, sorted.subList(0, Math.min(ROWS_SHOWN, sorted.size())));
        if (sorted.size() <= ROWS_SHOWN) {
            return first;
        }
        List<Beside> more = sorted.subList(ROWS_SHOWN, sorted.size());
        boolean many = more.size() > 20 * ROWS_SHOWN;
        return div(
                first,
                many
                        ? p("The rest is in side_by_side.csv.")
                        : details(
                                summary(more.size() + " more figures"),
                                besideTable(prism + ": the other figures", more)));
    }

    private static DomContent besideTable(String title, List<Beside> rows) {
        return Cells.scrolling(
                title,
                table(
                                Cells.caption(title),
                                thead(tr(
                                        Cells.column("Term"),
                                        Cells.column("Counts"),
                                        Cells.column("Period"),
                                        Cells.numberColumn("Submitted"),
                                        Cells.numberColumn("Recomputed"),
                                        Cells.column("Unit"),
                                        Cells.numberColumn("Difference"),
                                        Cells.column("Agrees"))),
                                tbody(each(
                                        rows,
                                        row -> tr(
                                                Cells.row(row.term()),
                                                td(row.sense().toString()),
                                                td(row.period()),
                                                Cells.number(row.submitted()),
                                                Cells.number(row.recomputed()),
                                                td(row.unit()),
                                                Cells.percent(row.share()),
                                                td(row.agrees() ? "yes" : "no")))))
                        .withClass("budget"));
    }

    private DomContent files(Map<String, String> options) {
        return section(
                        h2("Inputs and options"),
                        ul(each(
                                statement.inputs(),
                                input -> li(code(input.name()), text(", SHA-256 "), code(input.sha256())))),
                        statement.warnings().isEmpty()
                                ? text("")
                                : ul(each(statement.warnings(), warning -> li("Warning: " + warning))),
                        dl(each(options, (name, value) -> div(dt(code(name)), dd(code(value)))))
                                .withClass("facts options"))
                .withId("inputs");
    }
}
