package org.seepledger.cli;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.io.IOException;
import java.io.Reader;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import org.apache.commons.csv.CSVFormat;
import org.apache.commons.csv.CSVRecord;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

/** {@code seepledger plume}, from files to files. */
class PlumeCommandTest {

    /**
     * Salt that decays into brine on its way, 4 mg/L everywhere at first and 2 mg/L at the end, but for a non-detect in row
     * 2, column 2, at the last instant.
     */
    private static final String SOLUTES = """
            [{'name': 'salt', 'concentration': {'file': 'salt.csv'}, 'unit': 'mg/L', 'porosity': 0.25,
              'bulk_density': 1600, 'sorption': {'isotherm': 'linear', 'kd': 0.15625}, 'half_life': 100,
              'dispersion': {'longitudinal': 2, 'transverse': 0.2, 'vertical': 0.02}},
             {'name': 'brine', 'concentration': 1, 'unit': 'ug/L', 'porosity': 0.25, 'parent': 'salt', 'yield': 0.5},
             {'name': 'unmeasured'}]
            """;

    @TempDir
    Path folder;

    private AquiferFiles files() {
        StringBuilder salt = new StringBuilder("row,col,instant,c\n");
        for (int instant = 0; instant <= 2; instant++) {
            for (int row = 1; row <= 3; row++) {
                for (int column = 1; column <= 4; column++) {
                    boolean below = instant == 2 && row == 2 && column == 2;
                    salt.append(row + "," + column + "," + instant + "," + (below ? "<3" : 4 - instant) + "\n");
                }
            }
        }
        return new AquiferFiles(folder).with("solutes", SOLUTES).file("salt.csv", salt.toString());
    }

    private List<CSVRecord> rows(String file) throws IOException {
        CSVFormat format = CSVFormat.RFC4180
                .builder()
                .setCommentMarker('#')
                .setHeader()
                .setSkipHeaderRecord(true)
                .get();
        try (Reader text = Files.newBufferedReader(folder.resolve("out").resolve(file))) {
            return format.parse(text).getRecords();
        }
    }

    private double value(String column, String solute, String period, String group, String item, String layer)
            throws IOException {
        return rows("plume.csv").stream()
                .filter(row ->
                        row.get("solute").equals(solute) && row.get("period").equals(period))
                .filter(row -> row.get("group").equals(group) && row.get("item").equals(item))
                .filter(row -> row.get("layer").equals(layer))
                .mapToDouble(row -> Double.parseDouble(row.get(column)))
                .findFirst()
                .orElseThrow();
    }

    private Ran done(String... options) {
        Ran ran = files().plume(options);
        assertThat(ran.err()).isEmpty();
        assertThat(ran.status()).isZero();
        return ran;
    }

    /**
     * Two cells of 10 m × 10 m, 4 m of water in layer 1 and 5 m in layer 2: 1,800 m³ of rock, 450 m³ of water. R is 1 + 1.6 ×
     * 0.15625 ÷ 0.25 = 2.
     */
    @Test
    void writesMassesAndFlows() throws IOException {
        done("--mass-unit", "g");
        assertThat(value("net_mass", "salt", "interval 1", "mass", "dissolved", "1"))
                .isCloseTo(200 * 3, within(1e-9));
        assertThat(value("net_mass", "salt", "interval 1", "mass", "sorbed", "2"))
                .isCloseTo(250 * 3, within(1e-9));
        assertThat(value("inflow_rate", "salt", "interval 1", "side", "side 4", "2"))
                .isCloseTo(0.1 * 10 * 5 * 3.5, within(1e-9));
        double decay = Math.log(2) / 100;
        assertThat(value("outflow_rate", "salt", "interval 1", "decay", "decay", "1"))
                .isCloseTo(decay * 400 * 3.5, within(1e-9));
        assertThat(value("inflow_mass", "brine", "interval 1", "production", "production", "1"))
                .isCloseTo(0.5 * decay * 400 * 3.5 * 10, within(1e-9));
        assertThat(value("inflow_rate", "salt", "interval 1", "storage", "mass change", "1"))
                .isCloseTo(400 / 10.0, within(1e-9));
        assertThat(rows("plume.csv")).noneMatch(row -> row.get("solute").equals("unmeasured"));
        assertThat(rows("plume.csv").get(0).get("mass_unit")).isEqualTo("g");
        assertThat(rows("plume.csv")).anyMatch(row -> row.get("rate_unit").equals("g/d"));
    }

    @Test
    void bracketsNonDetects() throws IOException {
        Ran ran = done();
        double[] expected = {100 * 2, 100 * 2 + 100 * 1.5, 100 * 2 + 100 * 3};
        String[] columns = {"net_mass_nd_zero", "net_mass_nd_half", "net_mass_nd_limit"};
        for (int i = 0; i < 3; i++) {
            assertThat(value(columns[i], "salt", "interval 2", "mass", "dissolved", "1"))
                    .isCloseTo(expected[i] * 1e-3, within(1e-12));
        }
        assertThat(ran.out())
                .contains("rests on non-detects at time 20 d", "a bracket, not an estimate")
                .contains("No concentration is given for unmeasured")
                .contains("Dispersion is given for salt")
                .contains("no finding that water is safe");
    }

    @Test
    void tellsVolumeAndAreaAboveAConcentration() throws IOException {
        done("--above", "2500 ug/L", "--volume-unit", "ML");
        CSVRecord first = rows("mass.csv").stream()
                .filter(row ->
                        row.get("solute").equals("salt") && row.get("layer").equals("*"))
                .findFirst()
                .orElseThrow();
        assertThat(Double.parseDouble(first.get("rock_volume_above"))).isCloseTo(1.8, within(1e-12));
        assertThat(Double.parseDouble(first.get("area_above"))).isCloseTo(200, within(1e-9));
        assertThat(Double.parseDouble(first.get("above"))).isCloseTo(2.5, within(1e-12));
        assertThat(Double.parseDouble(first.get("maximum"))).isCloseTo(4, within(1e-12));
        assertThat(first.get("concentration_unit")).isEqualTo("mg/L");
    }

    @Test
    void tellsTheTrend() throws IOException {
        done();
        List<CSVRecord> salt = rows("trend.csv").stream()
                .filter(row ->
                        row.get("solute").equals("salt") && row.get("quantity").equals("mass"))
                .toList();
        assertThat(salt).filteredOn(row -> row.get("kind").equals("value")).hasSize(3);
        CSVRecord slope = salt.stream()
                .filter(row -> row.get("kind").equals("slope"))
                .findFirst()
                .orElseThrow();
        assertThat(Double.parseDouble(slope.get("value"))).isNegative();
        assertThat(slope.get("unit")).isEqualTo("kg/d");
        assertThat(salt)
                .anyMatch(row -> row.get("kind").equals("probability")
                        && row.get("value").isEmpty()
                        && row.get("words").equals("none below 5 values"));
        assertThat(salt)
                .anyMatch(row -> row.get("kind").equals("first-order rate")
                        && row.get("words").contains("no rate of degradation"));
        assertThat(rows("trend.csv")).anyMatch(row -> row.get("quantity").equals("centre x"));
    }

    private static final String LINE = "{'type': 'FeatureCollection', 'features': [{'type': 'Feature', 'properties':"
            + " {'name': 'gate'}, 'geometry': {'type': 'LineString', 'coordinates': [[20, 30], [20, 0]]}}]}";

    private Ran crossing(String line, String panels) throws IOException {
        Path lines = Files.writeString(folder.resolve("lines.geojson"), line.replace('\'', '"'));
        Path measured = Files.writeString(folder.resolve("panels.csv"), panels);
        return files().plume("--transects", lines.toString(), "--panels", measured.toString(), "--rate-unit", "g/d");
    }

    /** Southward line, so that its right is west and eastward flow is negative: 0.1 m/d × 30 m × 4 m × 3.5 g/m³ in layer 1. */
    @Test
    void countsWhatCrosses() throws IOException {
        Ran ran = crossing(
                LINE,
                "transect,solute,panel,q [m/d],c [ug/L],area [m2]\nweir,salt,a,0.5,200,4\nweir,salt,b,0.1,<10,6\n");
        assertThat(ran.err()).isEmpty();
        List<CSVRecord> rows = rows("transect.csv");
        CSVRecord drawn = rows.stream()
                .filter(row ->
                        row.get("transect").equals("gate") && row.get("solute").equals("salt"))
                .findFirst()
                .orElseThrow();
        assertThat(drawn.get("segment")).isEqualTo("segment 1");
        assertThat(Double.parseDouble(drawn.get("net_rate"))).isCloseTo(-0.1 * 30 * 4 * 3.5, within(1e-9));
        assertThat(Double.parseDouble(drawn.get("area"))).isCloseTo(120, within(1e-9));
        CSVRecord measured = rows.get(rows.size() - 1);
        assertThat(measured.get("segment")).isEqualTo("*");
        assertThat(Double.parseDouble(measured.get("net_rate")))
                .isCloseTo(0.5 * 0.2 * 4 + 0.1 * 0.005 * 6, within(1e-12));
        assertThat(Double.parseDouble(measured.get("net_rate_nd_zero"))).isCloseTo(0.4, within(1e-12));
        assertThat(measured.get("concentration_unit")).isEqualTo("ug/L");
        assertThat(folder.resolve("out/run.json")).content().contains("lines.geojson", "panels.csv");
    }

    @ParameterizedTest
    @CsvSource(
            delimiter = '|',
            value = {
                "[20, 30], [20, -5] | t,1,1 | outside the grid",
                "[20, 30], [20, 30] | t,1,1 | at least two that differ",
                "[20, 30] | t,1,1 | at least two that differ",
                "[20, 30], [20, 0] | t,-1,1 | 0 or more",
                "[20, 30], [20, 0] | t,1,0 | more than 0",
            })
    void refusesWhatCannotBeCrossed(String line, String panel, String words) throws IOException {
        String[] cells = panel.split(",");
        Ran ran = crossing(
                LINE.replace("[20, 30], [20, 0]", line),
                "transect,q [m/d],c [mg/L],area [m2]\n" + cells[0] + ",1," + cells[1] + "," + cells[2] + "\n");
        assertThat(ran.status()).isEqualTo(3);
        assertThat(ran.err()).contains(words);
    }

    @Test
    void wantsTheUnitOfMeasuredConcentrations() throws IOException {
        assertThat(crossing(LINE, "transect,q,c,area\nt,1,1,1\n").err()).contains("no unit", "c [mg/L]");
    }

    @Test
    void booksDispersionByChoice() throws IOException {
        done();
        assertThat(rows("plume.csv")).noneMatch(row -> row.get("group").equals("dispersion"));
        assertThat(files().plume("--overwrite").out())
                .containsPattern("Warnings\\R(  - .*\\R)*  - Dispersion is given for salt and left out");
        files().plume("--overwrite", "--dispersion");
        assertThat(rows("plume.csv")).anyMatch(row -> row.get("group").equals("dispersion"));
        assertThat(value("net_mass", "salt", "interval 1", "dispersion", "side 2", "1"))
                .isZero();
    }

    @Test
    void endsWithFourWhereTheBudgetDoesNotClose() {
        Ran ran = files().plume("--max-closure-error", "1");
        assertThat(ran.status()).isEqualTo(4);
        assertThat(ran.out()).contains("more than the 1.0 % allowed");
    }

    @ParameterizedTest
    @CsvSource({
        "--above, 50, a concentration with its unit",
        "--above, 50 m, which measures something else",
        "--above, fifty mg/L, a concentration with its unit",
        "--rate-unit, m3/d, give a unit as kg/d",
        "--mass-unit, m, give a unit as kg"
    })
    void refusesWhatMakesNoSense(String option, String value, String words) {
        Ran ran = files().plume(option, value);
        assertThat(ran.status()).isEqualTo(2);
        assertThat(ran.err()).contains(words);
    }

    @Test
    void saysThatNothingIsThereToBalance() {
        Ran ran = files().with("solutes", "[{'name': 'salt'}]").plume();
        assertThat(ran.status()).isEqualTo(3);
        assertThat(ran.err()).contains("no solute with a \"concentration\"");
    }

    @ParameterizedTest
    @CsvSource(
            delimiter = '|',
            value = {
                "'detection_limit': 50 | every concentration is below its detection limit",
                "'half_life': 5 | more than 0.5",
                "'dispersion': {'longitudinal': 1} | spreads like a longitudinal dispersivity of half a cell, here up to 5",
            })
    void doubts(String keys, String words) {
        String solute = "[{'name': 'salt', 'concentration': 4, 'unit': 'mg/L', 'porosity': 0.25, " + keys + "}]";
        Ran ran = files().with("solutes", solute).plume("--dispersion");
        assertThat(ran.err()).isEmpty();
        assertThat(ran.out()).contains(words);
    }
}
