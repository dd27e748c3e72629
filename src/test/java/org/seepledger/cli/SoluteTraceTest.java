package org.seepledger.cli;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.io.IOException;
import java.io.Reader;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.Random;
import org.apache.commons.csv.CSVFormat;
import org.apache.commons.csv.CSVRecord;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

/** {@code seepledger trace --solute}: value × weight adds up to each row, and a weight is what a row grows by. */
class SoluteTraceTest {

    /** With a detection limit that some values are below, and marks where others are. */
    private static final String SOLUTES = """
            [{'name': 'salt', 'concentration': {'file': 'salt.csv', 'column': 'c'}, 'unit': 'mg/L', 'porosity': 0.25,
              'detection_limit': 1.5, 'bulk_density': 1600, 'sorption': {'isotherm': 'linear', 'kd': 0.15625},
              'half_life': 100, 'boundary_concentration': 2,
              'dispersion': {'longitudinal': 2, 'transverse': 0.2, 'vertical': 0.02}},
             {'name': 'brine', 'concentration': {'file': 'salt.csv', 'column': 'b'}, 'unit': 'ug/L', 'porosity': 0.25,
              'bulk_density': 1600, 'sorption': {'isotherm': 'freundlich', 'kf': 0.3, 'n': 0.8},
              'parent': 'salt', 'yield': 0.5}]
            """;

    @TempDir
    private Path folder;

    private AquiferFiles files(double firstCell) {
        Random random = new Random(7);
        StringBuilder salt = new StringBuilder("row,col,instant,c,b\n");
        for (int instant = 0; instant <= 2; instant++) {
            for (int row = 1; row <= 3; row++) {
                for (int column = 1; column <= 4; column++) {
                    double value = instant + row + column == 2 ? firstCell : 4 * random.nextDouble();
                    String marked = instant == 1 && row == 2 ? "<" + value : String.valueOf(value);
                    salt.append(row + "," + column + "," + instant + "," + marked + "," + random.nextDouble() + "\n");
                }
            }
        }
        return new AquiferFiles(folder)
                .with("head", "{'file': 'h.csv', 'column': 'h'}")
                .file("h.csv", "instant,h\n0,9\n1,8.5\n2,8.75\n")
                .with("storage", "{'specific_yield': 0.2, 'specific_storage': 1e-5}")
                .with(
                        "sources",
                        "[{'category': 'recharge', 'kind': 'areal', 'rate': 0.001, 'concentration': {'salt': 30}}]")
                .with("solutes", SOLUTES)
                .file("salt.csv", salt.toString())
                .prism("wedge", "", "'type': 'Polygon', 'coordinates': [[[3,2],[38,7],[26,29],[9,21],[3,2]]]");
    }

    private static List<CSVRecord> rows(Path file) throws IOException {
        CSVFormat format = CSVFormat.RFC4180
                .builder()
                .setCommentMarker('#')
                .setHeader()
                .setSkipHeaderRecord(true)
                .get();
        try (Reader text = Files.newBufferedReader(file)) {
            return format.parse(text).getRecords();
        }
    }

    private List<CSVRecord> plume(double firstCell) throws IOException {
        AquiferFiles files = files(firstCell).write();
        Path out = folder.resolve("plume");
        Ran ran = Ran.of(
                "plume",
                files.aquifer().toString(),
                "--prisms",
                files.prisms().toString(),
                "--out",
                out.toString(),
                "--every",
                "record",
                "--dispersion",
                "--overwrite");
        assertThat(ran.err()).isEmpty();
        return rows(out.resolve("plume.csv"));
    }

    private Ran trace(String solute, String row, String... more) {
        List<String> all = new ArrayList<>(List.of(
                "trace",
                folder.resolve("aquifer").toString(),
                "--prisms",
                folder.resolve("prisms.geojson").toString(),
                "--every",
                "record",
                "--solute",
                solute,
                "--row",
                row,
                "--out",
                folder.resolve("trace.csv").toString(),
                "--overwrite"));
        all.addAll(List.of(more));
        return Ran.of(all.toArray(String[]::new));
    }

    @Test
    void eachRowIsMadeOfStoredConcentrations() throws IOException {
        int traced = 0;
        for (CSVRecord row : plume(1)) {
            boolean linear = row.get("solute").equals("salt")
                    || !List.of("decay", "storage", "total").contains(row.get("group"));
            boolean traceable = !row.get("group").equals("mass")
                    && !row.get("net_rate").isEmpty()
                    && !row.get("item").endsWith("flow")
                    && !row.get("item").endsWith("error");
            if (linear && traceable) {
                String name = String.join(
                        "/", row.get("prism"), row.get("period"), row.get("group"), row.get("item"), row.get("layer"));
                Ran ran = trace(row.get("solute"), name, "--dispersion");
                assertThat(ran.err()).as(name).isEmpty();
                double sum = 0;
                for (CSVRecord line : rows(folder.resolve("trace.csv"))) {
                    assertThat(line.get("file")).isIn("salt.csv", "aquifer.json");
                    sum += Double.parseDouble(line.get("value")) * Double.parseDouble(line.get("weight"));
                }
                assertThat(sum).as(name).isCloseTo(Double.parseDouble(row.get("net_rate")), within(1e-15));
                traced++;
            }
        }
        assertThat(traced).isGreaterThan(30);
    }

    @Test
    void aWeightIsWhatTheRowGrowsBy() throws IOException {
        double before = residual(plume(2));
        trace("salt", "wedge/record/residual/*", "--dispersion");
        CSVRecord line = rows(folder.resolve("trace.csv")).stream()
                .filter(record -> record.get("place").startsWith("column c")
                        && record.get("place").contains("instant 0, row 1, col 1"))
                .findFirst()
                .orElseThrow();
        assertThat(Double.parseDouble(line.get("value"))).isEqualTo(2);
        double after = residual(plume(5));
        assertThat(after - before).isCloseTo(3 * Double.parseDouble(line.get("weight")), within(1e-16));
        assertThat(after).isNotEqualTo(before);
    }

    private static double residual(List<CSVRecord> rows) {
        return rows.stream()
                .filter(row -> row.get("prism").equals("wedge")
                        && row.get("solute").equals("salt")
                        && row.get("item").equals("residual"))
                .mapToDouble(row -> Double.parseDouble(row.get("net_rate")))
                .findFirst()
                .orElseThrow();
    }

    @ParameterizedTest
    @CsvSource(
            delimiter = ';',
            value = {
                "salt; wedge/record/inflow/*; not linear in concentrations",
                "salt; wedge/record/closure error/*; residual/*",
                "brine; wedge/record/residual/*; isotherm is not linear",
                "brine; wedge/record/mass change/1; isotherm is not linear",
                "sal; wedge/record/decay/1; The nearest is \"salt\"",
                "salt; wedge/record/dissolved/1; there is no item",
            })
    void whatHasNoWeightsIsRefused(String solute, String row, String reason) throws IOException {
        files(1).write();
        Ran ran = trace(solute, row, "--dispersion");
        assertThat(ran.status()).isEqualTo(2);
        assertThat(ran.err()).contains(reason).hasLineCount(1);
    }

    @Test
    void waterDoesNotDisperse() {
        AquiferFiles files = files(1).write();
        Ran ran = Ran.of(
                "trace",
                files.aquifer().toString(),
                "--prisms",
                files.prisms().toString(),
                "--row",
                "wedge/interval 1/side 1/1",
                "--dispersion",
                "--out",
                folder.resolve("trace.csv").toString());
        assertThat(ran.status()).isEqualTo(2);
        assertThat(ran.err()).contains("--dispersion goes with --solute");
    }
}
