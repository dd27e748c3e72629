package org.seepledger.cli;

import static org.assertj.core.api.Assertions.assertThat;

import java.io.IOException;
import java.io.Reader;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import org.apache.commons.csv.CSVFormat;
import org.apache.commons.csv.CSVRecord;
import org.junit.jupiter.api.BeforeAll;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.w3c.dom.Element;

/** The report of {@code plume}: valid, with the numbers of its tables to the last bit, and with the cautions. */
class SoluteReportTest {

    private static final String DEPOT = "sample-aquifers/depot";

    @TempDir
    static Path folder;

    private static Path yearly;
    private static Path whole;

    @BeforeAll
    static void run() {
        yearly = depot("yearly", "--every", "year", "--report-periods", "all");
        whole = depot("whole", "--every", "record", "--report-amounts", "volume", "--mass-unit", "g");
    }

    private static Path depot(String name, String... options) {
        Path out = folder.resolve(name);
        List<String> all = new ArrayList<>(List.of("plume", DEPOT, "--prisms", DEPOT + "/prisms.geojson"));
        all.addAll(List.of("--out", out.toString(), "--dispersion", "--above", "0.1 mg/L"));
        all.addAll(List.of("--transects", DEPOT + "/transects.geojson"));
        all.addAll(List.of(options));
        Ran ran = Ran.of(all.toArray(String[]::new));
        assertThat(ran.err()).isEmpty();
        assertThat(ran.status()).isZero();
        return out;
    }

    private static List<CSVRecord> rows(Path out, String file) throws IOException {
        CSVFormat format = CSVFormat.RFC4180
                .builder()
                .setCommentMarker('#')
                .setHeader()
                .setSkipHeaderRecord(true)
                .get();
        try (Reader text = Files.newBufferedReader(out.resolve(file))) {
            return format.parse(text).getRecords();
        }
    }

    private static String key(CSVRecord row, String... columns) {
        List<String> parts = new ArrayList<>();
        for (String column : columns) {
            parts.add(row.get(column));
        }
        return String.join("/", parts);
    }

    private static CSVRecord find(List<CSVRecord> rows, String key, String... columns) {
        return rows.stream()
                .filter(row -> key(row, columns).equals(key))
                .findFirst()
                .orElseThrow(() -> new AssertionError("no row " + key));
    }

    private static String about(Element table) {
        return table.getAttribute("data-prism") + "/" + table.getAttribute("data-solute") + "/"
                + table.getAttribute("data-period") + "/";
    }

    @Test
    void isValidHtml() throws Exception {
        assertThat(ReportHtml.of(yearly).faults()).isEmpty();
        assertThat(ReportHtml.of(whole).faults()).isEmpty();
    }

    @Test
    void ratesOfEveryYearAreThoseOfTheTable() throws IOException {
        assertThat(compared(yearly, "rate")).isGreaterThan(300);
    }

    @Test
    void massesOfTheRecordAreThoseOfTheTable() throws IOException {
        assertThat(compared(whole, "mass")).isGreaterThan(150);
    }

    private static int compared(Path out, String amounts) throws IOException {
        List<CSVRecord> csv = rows(out, "plume.csv");
        String[] columns = {"prism", "solute", "period", "group", "item", "layer"};
        int compared = 0;
        for (Element table : ReportHtml.of(out).ofClass("budget")) {
            for (Element row : ReportHtml.within(table, "tr")) {
                if (row.hasAttribute("data-layer")) {
                    String key = about(table) + row.getAttribute("data-group") + "/" + row.getAttribute("data-item")
                            + "/" + row.getAttribute("data-layer");
                    compared += compare(ReportHtml.cells(row), find(csv, key, columns), amounts);
                }
            }
        }
        return compared;
    }

    private static int compare(List<Element> cells, CSVRecord csv, String amounts) {
        if (csv.get("group").equals("total")) {
            boolean percent = csv.get("rate_unit").equals("%");
            ReportHtml.assertCell(cells.get(0), csv.get(percent ? "net_rate" : "net_" + amounts), percent);
            return 1;
        }
        ReportHtml.assertCell(cells.get(0), csv.get("inflow_" + amounts), false);
        ReportHtml.assertCell(cells.get(1), csv.get("outflow_" + amounts), false);
        ReportHtml.assertCell(cells.get(2), csv.get("net_" + amounts), false);
        return 3;
    }

    @Test
    void everyRowThatHasAnAmountStandsInTheReport() throws IOException {
        List<String> shown = new ArrayList<>();
        for (Element table : ReportHtml.of(whole).ofClass("budget")) {
            ReportHtml.within(table, "tr").stream()
                    .filter(row -> row.hasAttribute("data-layer"))
                    .forEach(row -> shown.add(about(table) + row.getAttribute("data-group") + "/"
                            + row.getAttribute("data-item") + "/" + row.getAttribute("data-layer")));
        }
        assertThat(rows(whole, "plume.csv"))
                .filteredOn(row -> !row.get("group").equals("mass"))
                .filteredOn(row -> !row.get("inflow_mass").equals("0.0")
                        || !row.get("outflow_mass").equals("0.0"))
                .allSatisfy(row ->
                        assertThat(shown).contains(key(row, "prism", "solute", "period", "group", "item", "layer")));
    }

    @Test
    void whatIsHeldAndItsBracketAreThoseOfTheTable() throws IOException {
        List<CSVRecord> csv = rows(whole, "plume.csv");
        int compared = 0;
        for (Element table : ReportHtml.of(whole).ofClass("held")) {
            for (Element row : ReportHtml.within(table, "tr")) {
                if (row.hasAttribute("data-layer")) {
                    String key = about(table) + "mass/" + row.getAttribute("data-item") + "/"
                            + row.getAttribute("data-layer");
                    CSVRecord found = find(csv, key, "prism", "solute", "period", "group", "item", "layer");
                    List<Element> cells = ReportHtml.cells(row);
                    ReportHtml.assertCell(cells.get(0), found.get("net_mass"), false);
                    ReportHtml.assertCell(cells.get(1), found.get("net_mass_nd_zero"), false);
                    ReportHtml.assertCell(cells.get(2), found.get("net_mass_nd_limit"), false);
                    compared++;
                }
            }
        }
        assertThat(compared).isGreaterThanOrEqualTo(8);
        for (Element table : ReportHtml.of(whole).ofClass("bracket")) {
            for (Element row : ReportHtml.within(table, "tr")) {
                if (row.hasAttribute("data-item")) {
                    CSVRecord found = find(
                            csv,
                            about(table) + "total/" + row.getAttribute("data-item"),
                            "prism",
                            "solute",
                            "period",
                            "group",
                            "item");
                    List<Element> cells = ReportHtml.cells(row);
                    ReportHtml.assertCell(cells.get(0), found.get("net_mass_nd_zero"), false);
                    ReportHtml.assertCell(cells.get(1), found.get("net_mass_nd_half"), false);
                    ReportHtml.assertCell(cells.get(2), found.get("net_mass_nd_limit"), false);
                }
            }
        }
    }

    @Test
    void instantsAreThoseOfTheTable() throws IOException {
        List<CSVRecord> csv = rows(whole, "mass.csv");
        for (Element table : ReportHtml.of(whole).ofClass("instants")) {
            for (Element row : ReportHtml.within(table, "tr")) {
                if (row.hasAttribute("data-instant")) {
                    CSVRecord found = find(
                            csv,
                            table.getAttribute("data-prism") + "/" + table.getAttribute("data-solute") + "/"
                                    + row.getAttribute("data-instant") + "/*",
                            "prism",
                            "solute",
                            "instant",
                            "layer");
                    List<String> columns = List.of("total", "total_nd_zero", "total_nd_limit");
                    for (int i = 0; i < columns.size(); i++) {
                        ReportHtml.assertCell(ReportHtml.cells(row).get(i), found.get(columns.get(i)), false);
                    }
                    columns = List.of("mean", "maximum", "rock_volume_above", "area_above");
                    for (int i = 0; i < columns.size(); i++) {
                        ReportHtml.assertCell(ReportHtml.cells(row).get(i + 4), found.get(columns.get(i)), false);
                    }
                }
            }
        }
    }

    @Test
    void transectsAreThoseOfTheTable() throws IOException {
        List<CSVRecord> csv = rows(whole, "transect.csv");
        List<String> columns = List.of(
                "area", "net_flow", "net_rate", "net_rate_nd_zero", "net_rate_nd_limit", "flux_averaged_concentration");
        List<Element> tables = ReportHtml.of(whole).ofClass("transect");
        assertThat(tables).isNotEmpty();
        for (Element table : tables) {
            for (Element row : ReportHtml.within(table, "tr")) {
                if (row.hasAttribute("data-segment")) {
                    String key = table.getAttribute("data-transect") + "/" + table.getAttribute("data-solute") + "/"
                            + row.getAttribute("data-segment") + "/" + row.getAttribute("data-layer");
                    CSVRecord found = find(csv, key, "transect", "solute", "segment", "layer");
                    for (int i = 0; i < columns.size(); i++) {
                        ReportHtml.assertCell(ReportHtml.cells(row).get(i), found.get(columns.get(i)), false);
                    }
                }
            }
        }
    }

    @Test
    void carriesTheCautionsForContaminants() {
        String text = ReportHtml.text(ReportHtml.of(whole).page().getDocumentElement());
        assertThat(text)
                .contains("no finding that water is safe to drink", "a falling number alone does not show which")
                .contains("What rests on non-detects?", "a bracket, not an estimate")
                .contains("cells with more than 0.1", "way of the centre of mass")
                .doesNotContain("NaN");
    }
}
