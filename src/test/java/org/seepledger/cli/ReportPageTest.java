package org.seepledger.cli;

import static org.assertj.core.api.Assertions.assertThat;

import com.fasterxml.jackson.databind.JsonNode;
import com.fasterxml.jackson.databind.ObjectMapper;
import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.time.Clock;
import java.time.Instant;
import java.time.ZoneOffset;
import java.util.ArrayList;
import java.util.HashSet;
import java.util.List;
import java.util.Locale;
import java.util.Set;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.ValueSource;
import org.w3c.dom.Attr;
import org.w3c.dom.Element;

/** {@code report.html} as a page: valid, whole in itself, safe with any name, and the same each time. */
class ReportPageTest {

    private static final String HOSTILE = "</style><script>alert('x')</script> \"&amp; <b>";

    /** Attributes that make a browser fetch something, or follow a link. */
    private static final Set<String> FETCHING = Set.of(
            "src", "href", "srcset", "data", "action", "formaction", "poster", "background", "xlink:href", "ping");

    @TempDir
    Path folder;

    private static ReportHtml report(AquiferFiles files, String... options) {
        Ran ran = files.balance(options);
        assertThat(ran.err()).isEmpty();
        assertThat(ran.status()).isZero();
        return ReportHtml.of(files.out());
    }

    private AquiferFiles hostile() {
        return new AquiferFiles(folder)
                .with("name", quoted(HOSTILE))
                .with("sources", "[{'category': " + quoted(HOSTILE) + ", 'kind': 'areal', 'rate': 0.001}]")
                .with("flow/reference", quoted(HOSTILE))
                .with("flow/origin", "'simulated'")
                .prism(HOSTILE, "", AquiferFiles.BLOCK);
    }

    /** A JSON text that {@link AquiferFiles} turns into double quotation marks and back. */
    private static String quoted(String text) {
        return "'" + text.replace("\"", "\\\"").replace("'", "\\u0027") + "'";
    }

    private AquiferFiles transientOne() {
        return new AquiferFiles(folder)
                .with("start_date", "'2021-09-20'")
                .with("head", "{'file': 'h.csv', 'column': 'h'}")
                .file("h.csv", "instant,h\n0,9\n1,8.5\n2,8.75\n")
                .with("storage", "{'specific_yield': 0.2, 'specific_storage': 1e-5}");
    }

    @ParameterizedTest
    @ValueSource(strings = {"hostile", "transient", "many sides", "overlapping"})
    void isValidHtml(String which) throws Exception {
        AquiferFiles files = switch (which) {
            case "hostile" -> hostile();
            case "transient" -> transientOne();
            case "many sides" -> manySides(100);
            default ->
                new AquiferFiles(folder).prism("a", "", AquiferFiles.BLOCK).prism("b", "", AquiferFiles.BLOCK);
        };
        ReportHtml report = report(files, "--report-author", HOSTILE, "--report-title", HOSTILE);
        assertThat(report.faults()).isEmpty();
    }

    @Test
    void loadsNothingAndRunsNothing() throws IOException {
        ReportHtml report = report(transientOne());
        for (String element :
                List.of("script", "link", "iframe", "object", "embed", "img", "base", "form", "audio", "video")) {
            assertThat(report.all(element)).as(element).isEmpty();
        }
        for (Element element : report.all("*")) {
            for (int i = 0; i < element.getAttributes().getLength(); i++) {
                Attr attribute = (Attr) element.getAttributes().item(i);
                String name = attribute.getName().toLowerCase(Locale.ROOT);
                assertThat(name).doesNotStartWith("on");
                if (FETCHING.contains(name)) {
                    assertThat(attribute.getValue())
                            .as(element.getTagName() + " " + name)
                            .matches("#.+|data:image/png;.+");
                }
            }
        }
        assertThat(Files.readString(report.file()))
                .doesNotContain("@import")
                .doesNotContainPattern("url\\(\\s*[\"']?(?!#)")
                .doesNotContainPattern("https?://(?!www\\.w3\\.org/2000/svg\")");
    }

    @Test
    void hostileNamesStayText() throws IOException {
        ReportHtml report = report(
                hostile(),
                "--report-title",
                HOSTILE,
                "--report-author",
                HOSTILE,
                "--report-reference",
                HOSTILE,
                "--report-letterhead",
                HOSTILE + "|second line");
        assertThat(report.all("script")).isEmpty();
        assertThat(report.all("b")).isEmpty();
        assertThat(report.all("style")).hasSize(1);
        assertThat(ReportHtml.text(report.all("h1").get(0))).isEqualTo(HOSTILE);
        assertThat(ReportHtml.text(report.all("title").get(0))).isEqualTo(HOSTILE);
        assertThat(ReportHtml.text(report.byId("prism-1"))).startsWith(HOSTILE);
        assertThat(ReportHtml.text(report.ofClass("letterhead").get(0))).isEqualTo(HOSTILE + "second line");
        assertThat(report.ofClass("budget").get(0).getAttribute("data-prism")).isEqualTo(HOSTILE);
        assertThat(Files.readString(report.file())).doesNotContain("<script").doesNotContain("<b>");
    }

    @Test
    void whatCannotBeGivenIsADash() {
        AquiferFiles files = new AquiferFiles(folder)
                .with("flow/outer_faces", "{'sides': 'closed', 'top': 'closed', 'bottom': 'closed'}")
                .with("head", "{'file': 'h.csv', 'column': 'h'}")
                .file("h.csv", "instant,h\n0,9\n1,8.5\n2,8.75\n")
                .prism("edge", "", "'type': 'Polygon', 'coordinates': [[[0,0],[20,0],[20,20],[0,20],[0,0]]]");
        ReportHtml report = report(files);
        Element table = report.budgets("edge", "record").get(0);
        Element side = row(table, "side 1", "1");
        assertThat(ReportHtml.cells(side)).hasSize(4).allSatisfy(cell -> {
            assertThat(cell.getTextContent()).isEqualTo("–");
            assertThat(ReportHtml.within(cell, "data")).isEmpty();
        });
        assertThat(ReportHtml.cells(row(table, "residual", "*")).get(0).getTextContent())
                .isEqualTo("–");
        assertThat(ReportHtml.text(report.byId("answer")))
                .contains("Closure cannot be judged", "No flow can be given for side 1 and side 4");
        assertThat(ReportHtml.text(report.byId("warnings"))).contains("Change in storage is not known");
    }

    private static Element row(Element table, String item, String layer) {
        return ReportHtml.within(table, "tr").stream()
                .filter(row -> row.getAttribute("data-item").equals(item)
                        && row.getAttribute("data-layer").equals(layer))
                .findFirst()
                .orElseThrow(() -> new AssertionError("no row for " + item + " in layer " + layer));
    }

    private AquiferFiles manySides(int sides) {
        List<String> places = new ArrayList<>();
        for (int i = 0; i <= sides; i++) {
            double angle = 2 * Math.PI * (i % sides) / sides;
            places.add("[" + (20 + 9 * Math.cos(angle)) + "," + (15 + 9 * Math.sin(angle)) + "]");
        }
        return new AquiferFiles(folder)
                .prism("round", "", "'type': 'Polygon', 'coordinates': [[" + String.join(",", places) + "]]");
    }

    @Test
    void aHundredSidesAreFoldedButForTheLargest() {
        ReportHtml report = report(manySides(100));
        List<Element> tables = report.budgets("round", "record");
        assertThat(tables).hasSize(2);
        assertThat(sides(tables.get(0))).hasSize(16);
        assertThat(sides(tables.get(1))).hasSize(84);
        Set<String> all = new HashSet<>(sides(tables.get(0)));
        all.addAll(sides(tables.get(1)));
        assertThat(all).hasSize(100);
        assertThat(tables.get(1).getParentNode().getParentNode().getNodeName()).isEqualTo("details");
        assertThat(ReportHtml.text(tables.get(0))).contains("84 smaller sides, below", "All sides");
    }

    private static List<String> sides(Element table) {
        return ReportHtml.within(table, "tr").stream()
                .filter(row -> row.getAttribute("data-group").equals("side"))
                .map(row -> row.getAttribute("data-item"))
                .distinct()
                .toList();
    }

    @Test
    void hasTheLandmarksAndHeadingsThatAReaderJumpsBy() {
        ReportHtml report = report(transientOne());
        assertThat(report.page().getDocumentElement().getAttribute("lang")).isEqualTo("en");
        for (String landmark : List.of("header", "main", "nav", "footer", "h1")) {
            assertThat(report.all(landmark)).as(landmark).hasSize(1);
        }
        assertThat(report.all("table")).isNotEmpty().allSatisfy(table -> {
            assertThat(ReportHtml.within(table, "caption")).hasSize(1);
            assertThat(ReportHtml.within(table, "th")).allMatch(cell -> cell.hasAttribute("scope"));
        });
        for (Element link : report.all("a")) {
            report.byId(link.getAttribute("href").substring(1));
        }
        assertThat(ReportHtml.text(report.page().getDocumentElement()))
                .as("the disclaimer stands at the beginning and at the end")
                .containsSubsequence(
                        "not a determination of compliance", "The answer", "not a determination of compliance");
    }

    @Test
    void carriesWhatTheOptionsSay() {
        ReportHtml report = report(
                transientOne(),
                "--report-title",
                "Budget of a meadow",
                "--report-author",
                "A. Writer",
                "--report-reference",
                "REF 7",
                "--report-letterhead",
                "Office|1 Invented Street",
                "--report-date",
                "2023-02-01",
                "--report-periods",
                "interval 2",
                "--report-amounts",
                "volume");
        String head = ReportHtml.text(report.all("header").get(0));
        assertThat(head)
                .contains("Budget of a meadow", "A. Writer", "REF 7", "1 Invented Street", "2023-02-01")
                .contains("2021-09-20 to 2021-10-10, 2 intervals");
        assertThat(report.ofClass("budget"))
                .extracting(table -> table.getAttribute("data-period"))
                .containsExactly("interval 2");
        assertThat(ReportHtml.text(ReportHtml.within(report.ofClass("budget").get(0), "caption")
                        .get(0)))
                .isEqualTo("block: interval 2, volumes in m³");
    }

    @Test
    void worstAndAllPeriodsCanBeAskedFor() {
        AquiferFiles files = transientOne();
        report(files, "--report-periods", "worst", "--report-periods", "record");
        assertThat(ReportHtml.of(files.out()).ofClass("budget"))
                .extracting(table -> table.getAttribute("data-period"))
                .containsExactly("record", "interval 1");
        report(files, "--report-periods", "all", "--overwrite");
        assertThat(ReportHtml.of(files.out()).ofClass("budget"))
                .extracting(table -> table.getAttribute("data-period"))
                .containsExactly("interval 1", "interval 2");
    }

    @Test
    void theRecordStandsInWhereNoPeriodIsTheWorst() {
        ReportHtml report = report(new AquiferFiles(folder).with("times", "[0, 10]"), "--report-periods", "worst");
        assertThat(report.ofClass("budget"))
                .extracting(table -> table.getAttribute("data-period"))
                .containsExactly("record");
    }

    @ParameterizedTest
    @CsvSource(
            delimiter = ';',
            value = {
                "--report-periods; interval 7; interval 1",
                "--report-date; 31.05.2024; 2024-05-31",
                "--report-amounts; mass; rate, volume",
                "--report-title; ' '; one line of 1 to 200 letters",
                "--report-letterhead; a||b; each part between |",
            })
    void whatDoesNotFitIsRefused(String option, String value, String remedy) {
        AquiferFiles files = transientOne();
        Ran ran = files.balance(option, value);
        assertThat(ran.status()).isEqualTo(2);
        assertThat(ran.err()).contains(option).contains(remedy);
        assertThat(ran.err().lines()).hasSize(1);
        assertThat(Files.exists(files.out())).isFalse();
    }

    @Test
    void isTheSameEachTimeAndHasTheDateOfTheClock() throws IOException {
        AquiferFiles files = transientOne().write();
        String[] command = {
            "balance",
            files.aquifer().toString(),
            "--prisms",
            files.prisms().toString(),
            "--overwrite",
            "--out",
            files.out().toString()
        };
        Clock clock = Clock.fixed(Instant.parse("2025-02-03T12:00:00Z"), ZoneOffset.UTC);
        assertThat(Ran.of(new Interrupt(), clock, command).status()).isZero();
        String first = Files.readString(files.out().resolve("report.html"));
        assertThat(first).contains("2025-02-03");
        assertThat(Ran.of(new Interrupt(), clock, command).status()).isZero();
        assertThat(Files.readString(files.out().resolve("report.html"))).isEqualTo(first);
        JsonNode options = new ObjectMapper()
                .readTree(files.out().resolve("run.json").toFile())
                .get("options");
        assertThat(options.get("report-date").asText()).isEqualTo("2025-02-03");
        assertThat(options.get("report-periods").asText()).isEqualTo("record");
    }
}
