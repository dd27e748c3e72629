package org.seepledger.cli;

import static org.assertj.core.api.Assertions.assertThat;

import com.fasterxml.jackson.databind.JsonNode;
import com.fasterxml.jackson.databind.ObjectMapper;
import java.io.IOException;
import java.io.Reader;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import org.apache.commons.csv.CSVFormat;
import org.apache.commons.csv.CSVParser;
import org.apache.commons.csv.CSVRecord;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

/** {@code seepledger review} as a user meets it. */
class ReviewCommandTest {

    private static final Path TERRACE = Path.of("sample-aquifers", "terrace");

    @TempDir
    private Path folder;

    private Ran review(Path set, Path submitted, String... more) {
        List<String> arguments = new java.util.ArrayList<>(List.of(
                "review",
                set.toString(),
                "--prisms",
                set.resolve("prisms.geojson").toString(),
                "--submitted",
                submitted.toString(),
                "--out",
                folder.resolve("review").toString(),
                "--overwrite"));
        arguments.addAll(List.of(more));
        return Ran.of(arguments.toArray(String[]::new));
    }

    private List<CSVRecord> findings() throws IOException {
        CSVFormat format = CSVFormat.RFC4180
                .builder()
                .setCommentMarker('#')
                .setHeader()
                .setSkipHeaderRecord(true)
                .get();
        try (Reader text = Files.newBufferedReader(folder.resolve("review/findings.csv"));
                CSVParser rows = format.parse(text)) {
            return rows.getRecords();
        }
    }

    @ParameterizedTest
    @CsvSource({
        "terrace,interval",
        "terrace,month",
        "terrace,year",
        "terrace,water-year",
        "terrace,record",
        "depot,interval",
        "depot,year",
        "depot,record",
        "valley,month",
        "valley,year",
        "valley,water-year",
        "valley,record"
    })
    void ourOwnBudgetIsSound(String sample, String every) throws IOException {
        Path set = Path.of("sample-aquifers", sample);
        Ran.of(
                "balance",
                set.toString(),
                "--prisms",
                set.resolve("prisms.geojson").toString(),
                "--every",
                every,
                "--out",
                folder.resolve("budget").toString());
        Ran ran = review(set, folder.resolve("budget/budget.csv"));
        assertThat(ran.err()).isEmpty();
        assertThat(ran.status()).isZero();
        assertThat(findings()).allSatisfy(row -> assertThat(row.get("severity")).isEqualTo("note"));
        long rows = Files.lines(folder.resolve("budget/budget.csv"))
                .filter(line -> line.contains(",side,"))
                .count();
        assertThat(Files.lines(folder.resolve("review/side_by_side.csv")).filter(line -> line.contains("side")))
                .hasSizeGreaterThan((int) rows);
    }

    @Test
    void theSamplesSubmissionHasTheSlipsThatWerePutIntoIt() throws IOException {
        Ran ran = review(TERRACE, TERRACE.resolve("submitted.csv"));
        assertThat(ran.err()).isEmpty();
        assertThat(ran.status()).isEqualTo(4);
        assertThat(findings().stream()
                        .filter(row -> row.get("severity").equals("fault"))
                        .map(row -> row.get("code")))
                .containsExactly("unit", "sign", "well", "sum");
        assertThat(ran.out()).contains("4 faults", "Deep 1", "side 3");
        assertThat(Files.readString(folder.resolve("review/review.html")))
                .contains("Questions to the author", "not a determination of compliance");
        JsonNode record =
                new ObjectMapper().readTree(folder.resolve("review/run.json").toFile());
        assertThat(record.path("command").asText()).isEqualTo("review");
        assertThat(record.path("outputs").findValuesAsText("name"))
                .contains("findings.csv", "side_by_side.csv", "mapping.json", "review.html");
    }

    @Test
    void aCorrectedMappingIsGoneBy() throws IOException {
        Path submitted = folder.resolve("odd.csv");
        Files.writeString(submitted, """
                Place,What,Figure
                far north,alpha,302.6
                far north,beta,-39
                """);
        Path mapping = folder.resolve("mapping-given.json");
        Files.writeString(mapping, """
                {"unit": "m3/d", "areas": {"far north": "upper terrace"},
                 "columns": [{"heading": "Place", "is": "area"}, {"heading": "What", "is": "term"}, {"heading": "Figure", "is": "value"}],
                 "terms": [{"label": "alpha", "is": "item", "items": ["source/recharge"], "counts": "in"},
                           {"label": "beta", "is": "item", "items": ["lid/bottom"], "counts": "net"}]}
                """);
        Ran ran = review(TERRACE, submitted, "--mapping", mapping.toString());
        assertThat(ran.err()).isEmpty();
        assertThat(Files.readString(folder.resolve("review/side_by_side.csv")))
                .contains("upper terrace,", "alpha,in,302.6", "beta,net,-39.0");
        String used = Files.readString(folder.resolve("review/mapping.json"));
        assertThat(used).contains("far north", "source/recharge");
        Files.copy(folder.resolve("review/mapping.json"), folder.resolve("used.json"));
        String before =
                Files.readString(folder.resolve("review/side_by_side.csv")).replaceAll("(?m)^#.*$", "");
        review(TERRACE, submitted, "--mapping", folder.resolve("used.json").toString());
        assertThat(Files.readString(folder.resolve("review/side_by_side.csv")).replaceAll("(?m)^#.*$", ""))
                .isEqualTo(before);
    }

    @Test
    void aMappingThatHoldsWhatItCannotIsRefused() throws IOException {
        Path mapping = folder.resolve("mapping.json");
        Files.writeString(mapping, "{\"colums\": []}");
        Ran ran = review(TERRACE, TERRACE.resolve("submitted.csv"), "--mapping", mapping.toString());
        assertThat(ran.status()).isEqualTo(3);
        assertThat(ran.err()).contains("colums", "did you mean \"columns\"?");
        Files.writeString(mapping, "{\"terms\": [{\"label\": \"a\", \"is\": \"itm\"}]}");
        assertThat(review(TERRACE, TERRACE.resolve("submitted.csv"), "--mapping", mapping.toString())
                        .err())
                .contains("terms, entry 1, is", "\"itm\"", "item, total in");
    }

    @Test
    void noCellStartsAFormula() throws IOException {
        Path submitted = folder.resolve("formulas.csv");
        Files.writeString(submitted, """
                Area,Item,Value (m3/d)
                =HYPERLINK("x"),@sum,12
                +cmd,-1+1,13
                =1+1,Total inflow,99
                """);
        review(TERRACE, submitted);
        Ran alone = Ran.of(
                "review",
                "--submitted",
                submitted.toString(),
                "--out",
                folder.resolve("alone").toString());
        assertThat(alone.status()).isIn(0, 4);
        CSVFormat format = CSVFormat.RFC4180.builder().setCommentMarker('#').get();
        for (String file : List.of("review/findings.csv", "review/side_by_side.csv", "alone/findings.csv")) {
            try (Reader text = Files.newBufferedReader(folder.resolve(file));
                    CSVParser rows = format.parse(text)) {
                rows.forEach(row -> row.forEach(cell -> assertThat(cell)
                        .as(file)
                        .satisfiesAnyOf(
                                text1 -> assertThat(text1).doesNotMatch("(?s)^[=+\\-@\\t\\r].*"),
                                text2 -> assertThat(text2).matches("-?[0-9.eE+-]+"))));
            }
        }
    }

    @Test
    void withoutAnAquiferTheTableAloneIsLookedAt() {
        Ran ran = Ran.of(
                "review",
                "--submitted",
                TERRACE.resolve("submitted.csv").toString(),
                "--out",
                folder.resolve("alone").toString());
        assertThat(ran.out()).contains("The table was looked at by itself", "fault sum");
        assertThat(ran.status()).isEqualTo(4);
    }

    @Test
    void refusesHalfARequestAndFilesThatAreNone() {
        Ran half = Ran.of(
                "review",
                TERRACE.toString(),
                "--submitted",
                "x.csv",
                "--out",
                folder.resolve("o").toString());
        assertThat(half.status()).isEqualTo(2);
        assertThat(half.err()).contains("Give both AQUIFER and --prisms, or neither");
        Ran none = Ran.of(
                "review",
                "--submitted",
                TERRACE.resolve("submited.csv").toString(),
                "--out",
                folder.resolve("o").toString());
        assertThat(none.status()).isEqualTo(3);
        assertThat(none.err()).contains("Did you mean \"submitted.csv\"?");
        assertThat(folder.resolve("o")).doesNotExist();
        Ran tolerance = review(TERRACE, TERRACE.resolve("submitted.csv"), "--tolerance", "-1");
        assertThat(tolerance.status()).isEqualTo(2);
    }

    /** Three terms stand for one period that the table does not name. */
    @Test
    void aPeriodWithoutANameIsNotSpokenOf() throws IOException {
        Path submitted = folder.resolve("litres.csv");
        Files.writeString(submitted, """
                Water budget of the well field
                Term,Inflow [L/s],Outflow [L/s]
                Lateral flow,1866,171.7
                Recharge,133.2,
                Public supply,,1680
                Irrigation,,140
                """);
        Ran ran = review(TERRACE, submitted);
        assertThat(ran.out()).contains("fault units").doesNotContain("The numbers are those of");
    }

    @Test
    void aTableThatIsNoBudgetIsDoubted() {
        Ran ran = Ran.of(
                "review",
                "--submitted",
                TERRACE.resolve("head.csv").toString(),
                "--out",
                folder.resolve("o").toString());
        assertThat(ran.status()).isZero();
        assertThat(ran.out()).contains("1 doubt for the author", "doubt not-tied");
    }

    @Test
    void wholeCellsAreHeldAgainstWholeCells() throws IOException {
        Ran ran = review(TERRACE, TERRACE.resolve("submitted.csv"), "--whole-cells");
        assertThat(ran.err()).isEmpty();
        assertThat(Files.readString(folder.resolve("review/run.json"))).contains("\"whole-cells\" : \"true\"");
    }
}
