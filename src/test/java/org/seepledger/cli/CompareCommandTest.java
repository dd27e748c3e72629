package org.seepledger.cli;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.io.IOException;
import java.io.Reader;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import org.apache.commons.csv.CSVFormat;
import org.apache.commons.csv.CSVParser;
import org.apache.commons.csv.CSVRecord;
import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

/** {@code seepledger compare}: uniform flow of 0.1 m/d to the east through a block 10 m high, 10 m wide. */
class CompareCommandTest {

    @TempDir
    private Path folder;

    private AquiferFiles files;

    @BeforeEach
    void layOut() {
        files = new AquiferFiles(folder.resolve("set")).with("start_date", "'2020-01-01'");
    }

    private void balance(String name, String flux, double east, String... more) throws IOException {
        files.with("flow/x", flux).write();
        Path prisms = folder.resolve(name + ".geojson");
        Files.writeString(prisms, """
                {"type": "FeatureCollection", "features": [{"type": "Feature", "properties": {"name": "block", "layers": [1, 1]},
                 "geometry": {"type": "Polygon", "coordinates": [[[10,10],[%s,10],[%s,20],[10,20],[10,10]]]}}]}
                """.formatted(east, east));
        List<String> arguments = new java.util.ArrayList<>(List.of(
                "balance",
                files.aquifer().toString(),
                "--prisms",
                prisms.toString(),
                "--out",
                folder.resolve(name).toString()));
        arguments.addAll(List.of(more));
        Ran ran = Ran.of(arguments.toArray(String[]::new));
        assertThat(ran.err()).isEmpty();
    }

    private Ran compare() {
        return Ran.of(
                "compare",
                folder.resolve("one").toString(),
                folder.resolve("two").toString(),
                "--out",
                folder.resolve("difference").toString(),
                "--overwrite");
    }

    private List<CSVRecord> rows() throws IOException {
        CSVFormat format = CSVFormat.RFC4180
                .builder()
                .setCommentMarker('#')
                .setHeader()
                .setSkipHeaderRecord(true)
                .get();
        try (Reader text = Files.newBufferedReader(folder.resolve("difference/differences.csv"));
                CSVParser rows = format.parse(text)) {
            return rows.getRecords();
        }
    }

    private static double number(CSVRecord row, String column) {
        return Double.parseDouble(row.get(column));
    }

    private static void assertPartsAdd(CSVRecord row) {
        double parts =
                number(row, "by_area") + number(row, "by_period") + number(row, "by_inputs") + number(row, "by_unit");
        assertThat(parts)
                .isCloseTo(number(row, "difference"), within(1e-9 * (1 + Math.abs(number(row, "difference")))));
    }

    @Test
    void areaPeriodAndUnitHaveTheirParts() throws IOException {
        balance("one", "0.1", 30, "--every", "interval");
        balance("two", "0.1", 25, "--every", "record", "--volume-unit", "L");
        Ran ran = compare();
        assertThat(ran.err()).isEmpty();
        assertThat(ran.status()).isZero();
        assertThat(ran.out()).contains("Option every: interval → record");
        balance("three", "0.1", 25, "--every", "interval", "--volume-unit", "L");
        Ran.of(
                "compare",
                folder.resolve("one").toString(),
                folder.resolve("three").toString(),
                "--out",
                folder.resolve("difference").toString(),
                "--overwrite");
        List<CSVRecord> south = rows().stream()
                .filter(row ->
                        row.get("item").equals("side 1") && row.get("quantity").equals("net_volume"))
                .toList();
        assertThat(south).hasSize(2);
        for (CSVRecord row : south) {
            assertThat(number(row, "first")).as("0.02 m/d × 20 m × 4 m × 10 d").isCloseTo(16, within(1e-9));
            assertThat(number(row, "second")).isCloseTo(12_000, within(1e-6));
            assertThat(number(row, "by_area")).isCloseTo(-4, within(1e-9));
            assertThat(number(row, "by_unit")).isCloseTo(12_000 - 12, within(1e-6));
            assertThat(number(row, "by_inputs")).isZero();
            assertPartsAdd(row);
        }
    }

    @Test
    void inputsThatAreGoneAreSaidAndDifferencesStand() throws IOException {
        balance("one", "0.1", 30);
        balance("two", "0.2", 30);
        Ran ran = compare();
        assertThat(ran.status()).isZero();
        assertThat(ran.out()).contains("aquifer.json (changed)", "cannot be told", "no file with the recorded hash");
        CSVRecord west = rows().stream()
                .filter(row -> row.get("item").equals("side 4"))
                .findFirst()
                .orElseThrow();
        assertThat(number(west, "difference")).isCloseTo(4, within(1e-9));
        assertThat(number(west, "percent")).isCloseTo(100, within(1e-9));
        assertThat(west.get("by_inputs")).isEmpty();
    }

    @Test
    void inputsThatAreThereHaveTheirPart() throws IOException {
        balance("one", "0.1", 30);
        AquiferFiles other = new AquiferFiles(folder.resolve("other")).with("start_date", "'2020-01-01'");
        files = other;
        balance("two", "0.2", 25);
        Ran ran = compare();
        assertThat(ran.err()).isEmpty();
        CSVRecord west = rows().stream()
                .filter(row -> row.get("item").equals("side 4"))
                .findFirst()
                .orElseThrow();
        assertThat(number(west, "by_inputs")).isCloseTo(4, within(1e-9));
        assertThat(number(west, "by_area")).isZero();
        rows().stream().filter(row -> !row.get("by_area").isEmpty()).forEach(CompareCommandTest::assertPartsAdd);
        assertThat(Files.readString(folder.resolve("difference/inputs.csv")))
                .contains("aquifer.json,")
                .contains("changed");
        assertThat(Files.readString(folder.resolve("difference/compare.html"))).contains("Two runs compared");
    }

    @Test
    void foldersThatWereChangedOrAreNoneAreRefused() throws IOException {
        balance("one", "0.1", 30);
        balance("two", "0.1", 30);
        Files.writeString(folder.resolve("two/budget.csv"), "prism\n");
        Ran changed = compare();
        assertThat(changed.status()).isEqualTo(3);
        assertThat(changed.err()).contains("changed after the run");
        Ran none = Ran.of(
                "compare",
                folder.toString(),
                folder.toString(),
                "--out",
                folder.resolve("difference").toString());
        assertThat(none.status()).isEqualTo(3);
        assertThat(none.err()).contains(folder + ": found no run.json; expected the output folder of an earlier run.");
    }
}
