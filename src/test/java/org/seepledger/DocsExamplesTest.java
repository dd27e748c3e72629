package org.seepledger;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import com.fasterxml.jackson.databind.JsonNode;
import com.fasterxml.jackson.databind.ObjectMapper;
import java.io.IOException;
import java.io.Reader;
import java.nio.file.Files;
import java.nio.file.Path;
import java.time.LocalDate;
import java.util.List;
import java.util.Optional;
import java.util.Set;
import java.util.TreeSet;
import java.util.regex.Matcher;
import java.util.regex.Pattern;
import org.apache.commons.csv.CSVFormat;
import org.apache.commons.csv.CSVParser;
import org.apache.commons.csv.CSVRecord;
import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.seepledger.balance.Periods.Every;
import org.seepledger.balance.WellRule;
import org.seepledger.job.BalanceJob;
import org.seepledger.job.BalanceRequest;
import org.seepledger.job.InspectJob;
import org.seepledger.job.ReportRequest;
import org.seepledger.progress.Progress;

/** The examples of {@code docs/formats.md} run as they stand, and the numbers that the page works out by hand hold. */
class DocsExamplesTest {

    private static final Path PAGE = Path.of("docs", "formats.md");
    private static final Path SCHEMA = Path.of("docs", "aquifer.schema.json");
    private static final Pattern EXAMPLE =
            Pattern.compile("<!-- example: (\\S+) -->\\R```\\w+\\R(.*?)^```$", Pattern.DOTALL | Pattern.MULTILINE);

    /** Rows are compared with numbers of the page's own four to six digits. */
    private static final double AS_PRINTED = 1e-4;

    @TempDir
    private Path folder;

    private String page;

    @BeforeEach
    void layOut() throws IOException {
        page = Files.readString(PAGE);
        Matcher example = EXAMPLE.matcher(page);
        while (example.find()) {
            Path file = folder.resolve(example.group(1));
            Files.createDirectories(file.getParent());
            Files.writeString(file, example.group(2));
        }
    }

    @Test
    void noExampleIsLeftOut() {
        long marked =
                page.lines().filter(line -> line.contains("<!-- example:")).count();
        assertThat(EXAMPLE.matcher(page).results().count()).isEqualTo(marked).isEqualTo(10);
    }

    @Test
    void theFirstExampleIsInspectedWithNoOtherWarningThanOfItsZeros() {
        assertThat(InspectJob.run(folder.resolve("valley"), 1, Progress.NONE))
                .contains("Aquifer \"Invented valley\"", "heads    at each instant", "storage  known")
                .containsPattern("Warnings\\R  - \"flow y\" is 0 [^-]*- \"flow z\" is 0 everywhere\\.\\R\\R");
    }

    /** January of the meadow, as the page works it out: discharge × width, recharge × area, yield × area × rise. */
    @Test
    void theFirstExampleHasTheBudgetThatThePageWorksOut() throws IOException {
        List<CSVRecord> rows = balance("valley", Every.MONTH, Optional.empty(), WellRule.POINT);
        double oneSide = 0.05 * (45.031 - 30) * 80;
        assertRow(rows, "meadow", "2023-01", "side 3", oneSide, 0);
        assertRow(rows, "meadow", "2023-01", "side 4", oneSide, 0);
        assertRow(rows, "meadow", "2023-01", "valley side", 0, 2 * oneSide);
        assertRow(rows, "meadow", "2023-01", "recharge", 0.0002 * 12_800, 0);
        assertRow(rows, "meadow", "2023-01", "water-table storage", 0, 0.2 * 12_800 * 0.031 / 31);
        double elastic = 1e-5 * 12_800 * (15.031 * 15.031 - 15 * 15) / 2 / 31;
        assertRow(rows, "meadow", "2023-01", "elastic storage", 0, elastic);
        assertThat(number(row(rows, "meadow", "2023-01", "residual"), "net_rate"))
                .isCloseTo(-elastic, within(1e-9));
    }

    @Test
    void theFirstExamplesPeriodsAreUnderstood() throws IOException {
        Path periods = folder.resolve("valley/periods.csv");
        List<CSVRecord> rows = balance("valley", Every.INTERVAL, Optional.of(periods), WellRule.POINT);
        assertThat(row(rows, "gravel below", "February", "residual").get("to_date"))
                .isEqualTo("2023-03-01");
        assertThat(number(row(rows, "meadow", "first half of January", "recharge"), "inflow_volume"))
                .isCloseTo(0.0002 * 12_800 * 15, within(1e-9));
    }

    @Test
    void theSecondExampleTakesInWhatItsWellTakesOut() throws IOException {
        List<CSVRecord> rows = balance("ditch", Every.RECORD, Optional.empty(), WellRule.POINT);
        assertRow(rows, "strip", "record", "side 1", 10, 0);
        assertRow(rows, "strip", "record", "side 2", 12, 0);
        assertRow(rows, "strip", "record", "side 3", 10, 0);
        assertRow(rows, "strip", "record", "side 4", 18, 0);
        assertRow(rows, "strip", "record", "supply", 0, 50);
    }

    @Test
    void theSecondExamplesWellCanBeSpread() throws IOException {
        List<CSVRecord> rows = balance("ditch", Every.RECORD, Optional.empty(), WellRule.SPREAD);
        assertRow(rows, "strip", "record", "side 1", 0, 0);
        assertRow(rows, "strip", "record", "side 3", 0, 0);
        assertRow(rows, "strip", "record", "supply", 0, 30);
    }

    @Test
    void everyKeyOfTheSchemaIsOnThePage() throws IOException {
        Set<String> keys = new TreeSet<>();
        collectKeys(new ObjectMapper().readTree(SCHEMA.toFile()), keys);
        assertThat(keys)
                .hasSizeGreaterThan(40)
                .allSatisfy(key -> assertThat(page)
                        .as("docs/formats.md mentions \"%s\"", key)
                        .containsPattern("[`\"]" + Pattern.quote(key) + "[`\"]"));
    }

    private static void collectKeys(JsonNode schema, Set<String> keys) {
        schema.path("properties").fieldNames().forEachRemaining(keys::add);
        schema.forEach(child -> collectKeys(child, keys));
    }

    private List<CSVRecord> balance(String name, Every every, Optional<Path> periods, WellRule wells)
            throws IOException {
        Path set = folder.resolve(name);
        Path out = folder.resolve("budget");
        BalanceJob.run(
                new BalanceRequest(
                        set,
                        set.resolve("prisms.geojson"),
                        out,
                        every,
                        periods,
                        10,
                        Optional.empty(),
                        Optional.empty(),
                        wells,
                        false,
                        1,
                        false,
                        ReportRequest.dated(LocalDate.of(2024, 5, 31))),
                Progress.NONE);
        CSVFormat format =
                CSVFormat.RFC4180.builder().setCommentMarker('#').setHeader().get();
        try (Reader text = Files.newBufferedReader(out.resolve("budget.csv"));
                CSVParser rows = format.parse(text)) {
            return rows.getRecords();
        }
    }

    private static CSVRecord row(List<CSVRecord> rows, String prism, String period, String item) {
        List<CSVRecord> found = rows.stream()
                .filter(row -> row.get("prism").equals(prism)
                        && row.get("period").equals(period)
                        && row.get("item").equals(item))
                .toList();
        assertThat(found).as("rows of %s, %s, %s", prism, period, item).hasSize(1);
        return found.get(0);
    }

    private static void assertRow(
            List<CSVRecord> rows, String prism, String period, String item, double inflow, double outflow) {
        CSVRecord row = row(rows, prism, period, item);
        assertThat(number(row, "inflow_rate")).as("inflow through %s", item).isCloseTo(inflow, within(AS_PRINTED));
        assertThat(number(row, "outflow_rate")).as("outflow through %s", item).isCloseTo(outflow, within(AS_PRINTED));
    }

    private static double number(CSVRecord row, String column) {
        return Double.parseDouble(row.get(column));
    }
}
