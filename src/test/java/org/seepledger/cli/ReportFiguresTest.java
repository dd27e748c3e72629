package org.seepledger.cli;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.HashSet;
import java.util.List;
import java.util.Set;
import org.apache.commons.csv.CSVFormat;
import org.apache.commons.csv.CSVParser;
import org.apache.commons.csv.CSVRecord;
import org.junit.jupiter.api.BeforeAll;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.w3c.dom.Element;

/** The numbers of {@code report.html} are those of {@code budget.csv}, to the last bit, and shown as they round. */
class ReportFiguresTest {

    private static final List<String> TOTALS =
            List.of("inflow", "outflow", "storage change", "residual", "closure error", "net closure error");

    private static final long LARGEST = 5_000_000;

    @TempDir
    static Path folder;

    private static Path monthly;
    private static Path whole;

    @BeforeAll
    static void run() {
        monthly = valley("monthly", "--every", "month", "--report-periods", "all", "--report-periods", "record");
        whole = valley("whole", "--every", "record", "--report-amounts", "volume", "--volume-unit", "ML");
    }

    private static Path valley(String name, String... options) {
        Path out = folder.resolve(name);
        List<String> all = new ArrayList<>(List.of("balance", "sample-aquifers/valley"));
        all.addAll(List.of("--prisms", "sample-aquifers/valley/prisms.geojson", "--out", out.toString()));
        all.addAll(List.of(options));
        Ran ran = Ran.of(all.toArray(String[]::new));
        assertThat(ran.err()).isEmpty();
        assertThat(ran.status()).isZero();
        return out;
    }

    @Test
    void ratesOfEveryMonthAreThoseOfTheTable() {
        assertRows(monthly, "rate", 4 * 24);
    }

    @Test
    void volumesOfTheRecordAreThoseOfTheTable() {
        assertRows(whole, "volume", 4);
    }

    /** Every row of the CSV stands in the report, but for layers of items without any flow; and every cell agrees. */
    private static void assertRows(Path out, String amounts, int tables) {
        ReportHtml report = ReportHtml.of(out);
        Budget budget = Budget.of(out);
        Set<String> shown = new HashSet<>();
        int found = 0;
        for (Element table : report.ofClass("budget")) {
            String prism = table.getAttribute("data-prism");
            String period = table.getAttribute("data-period");
            found += period.equals("record") && tables > 4 ? 0 : 1;
            for (Element row : ReportHtml.within(table, "tr")) {
                String layer = row.getAttribute("data-layer");
                String key =
                        String.join("/", prism, period, row.getAttribute("data-group"), row.getAttribute("data-item"));
                if (!layer.isEmpty() && !(period.equals("record") && tables > 4)) {
                    shown.add(key + "/" + layer);
                    assertRow(row, csv(budget, key + "/" + layer), amounts);
                } else if (layer.isEmpty() && row.hasAttribute("data-item") && isIdle(row)) {
                    shown.add(key + "/idle");
                }
            }
        }
        assertThat(found).isEqualTo(tables);
        assertThat(budget.rows()).allSatisfy(row -> {
            String item = String.join("/", row.get("prism"), row.get("period"), row.get("group"), row.get("item"));
            boolean idle = shown.contains(item + "/idle");
            assertThat(idle || shown.contains(item + "/" + row.get("layer")))
                    .as(item)
                    .isTrue();
            if (idle) {
                assertThat(row.get("inflow_rate") + row.get("outflow_rate")).isEqualTo("0.00.0");
            }
        });
    }

    private static boolean isIdle(Element row) {
        return ReportHtml.number(ReportHtml.cells(row).get(0)) == 0
                && ReportHtml.number(ReportHtml.cells(row).get(1)) == 0;
    }

    private static CSVRecord csv(Budget budget, String key) {
        return budget.rows().stream()
                .filter(row -> key.equals(String.join(
                        "/", row.get("prism"), row.get("period"), row.get("group"), row.get("item"), row.get("layer"))))
                .findFirst()
                .orElseThrow(() -> new AssertionError("no row " + key));
    }

    private static void assertRow(Element row, CSVRecord csv, String amounts) {
        List<Element> cells = ReportHtml.cells(row);
        if (csv.get("group").equals("total")) {
            String column = csv.get("rate_unit").equals("%") ? "net_rate" : "net_" + amounts;
            ReportHtml.assertCell(
                    cells.get(0), csv.get(column), csv.get("rate_unit").equals("%"));
            return;
        }
        List<String> columns = List.of("inflow_", "outflow_", "net_");
        for (int i = 0; i < columns.size(); i++) {
            ReportHtml.assertCell(cells.get(i), csv.get(columns.get(i) + amounts), false);
        }
    }

    @Test
    void layersAddUpToItemsAndItemsToGroups() {
        ReportHtml report = ReportHtml.of(monthly);
        for (Element table : report.ofClass("budget")) {
            for (Element body : ReportHtml.within(table, "tbody")) {
                double items = 0;
                double layers = 0;
                for (Element row : ReportHtml.within(body, "tr")) {
                    String style = row.getAttribute("class");
                    double inflow = ReportHtml.cells(row).isEmpty()
                            ? 0
                            : ReportHtml.number(ReportHtml.cells(row).get(0));
                    boolean item = style.equals("item") || style.isEmpty() && row.hasAttribute("data-layer");
                    items += item && !row.getAttribute("data-group").equals("total") ? inflow : 0;
                    layers += row.hasAttribute("data-layer")
                                    && !row.getAttribute("data-group").equals("total")
                            ? inflow
                            : 0;
                    if (style.equals("sum")) {
                        assertThat(inflow).isCloseTo(items, within(1e-9)).isCloseTo(layers, within(1e-9));
                    }
                }
            }
        }
    }

    @Test
    void totalsByPeriodAreThoseOfTheTable() {
        Budget budget = Budget.of(monthly);
        for (Element table : ReportHtml.of(monthly).ofClass("periods")) {
            List<Element> rows = ReportHtml.within(table, "tr").stream()
                    .filter(row -> row.hasAttribute("data-period"))
                    .toList();
            assertThat(rows).hasSize(24);
            for (Element row : rows) {
                for (int i = 0; i < TOTALS.size(); i++) {
                    String key = String.join(
                            "/",
                            table.getAttribute("data-prism"),
                            row.getAttribute("data-period"),
                            "total",
                            TOTALS.get(i),
                            "*");
                    ReportHtml.assertCell(
                            ReportHtml.cells(row).get(i + 1), csv(budget, key).get("net_rate"), i >= 4);
                }
            }
        }
    }

    @Test
    void totalsOfAllPrismsAreThoseOfTheTable() {
        Budget budget = Budget.of(whole);
        List<Element> rows = ReportHtml.within(
                        ReportHtml.of(whole).ofClass("glance").get(0), "tr")
                .stream()
                .filter(row -> row.hasAttribute("data-prism"))
                .toList();
        assertThat(rows).hasSize(4);
        for (Element row : rows) {
            for (int i = 0; i < TOTALS.size(); i++) {
                CSVRecord csv = csv(budget, row.getAttribute("data-prism") + "/record/total/" + TOTALS.get(i) + "/*");
                ReportHtml.assertCell(
                        ReportHtml.cells(row).get(i), csv.get(i >= 4 ? "net_rate" : "net_volume"), i >= 4);
            }
        }
    }

    @Test
    void exchangeIsThatOfTheTable() throws IOException {
        List<CSVRecord> flows;
        CSVFormat format =
                CSVFormat.RFC4180.builder().setCommentMarker('#').setHeader().get();
        try (CSVParser parser = CSVParser.parse(Files.readString(whole.resolve("exchange.csv")), format)) {
            flows = parser.getRecords().stream()
                    .filter(row -> !row.get("flow_volume").equals("0.0"))
                    .toList();
        }
        List<Element> rows = ReportHtml.of(whole).all("tr").stream()
                .filter(row -> row.hasAttribute("data-giver"))
                .toList();
        assertThat(rows).hasSameSizeAs(flows).hasSizeGreaterThan(8);
        for (int i = 0; i < rows.size(); i++) {
            assertThat(rows.get(i).getAttribute("data-giver"))
                    .isEqualTo(flows.get(i).get("giver"));
            assertThat(rows.get(i).getAttribute("data-receiver"))
                    .isEqualTo(flows.get(i).get("receiver"));
            ReportHtml.assertCell(
                    ReportHtml.cells(rows.get(i)).get(1), flows.get(i).get("flow_volume"), false);
        }
    }

    /** With a table of every row of every month, far more than a reader is likely to ask for. */
    @Test
    void isSmallEnoughToSend() throws IOException {
        assertThat(Files.size(monthly.resolve("report.html"))).isLessThan(LARGEST);
    }
}
