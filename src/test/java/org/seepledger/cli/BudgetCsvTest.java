package org.seepledger.cli;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.security.MessageDigest;
import java.security.NoSuchAlgorithmException;
import java.util.HexFormat;
import java.util.List;
import org.apache.commons.csv.CSVRecord;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

/** {@code budget.csv} as the contract has it. Expected flows: flux × width × saturated thickness, worked out by hand. */
class BudgetCsvTest {

    private static final String HEADER =
            "prism,period,from,to,from_date,to_date,group,item,layer,inflow_rate,outflow_rate,"
                    + "net_rate,inflow_volume,outflow_volume,net_volume,rate_unit,volume_unit";

    @TempDir
    Path folder;

    private Budget budget(AquiferFiles files, String... options) {
        Ran ran = files.balance(options);
        assertThat(ran.err()).isEmpty();
        assertThat(ran.status()).isZero();
        return Budget.of(files.out());
    }

    private static String account(CSVRecord row) {
        return row.get("group") + "/" + row.get("item") + "/" + row.get("layer");
    }

    @Test
    void hasTheHeaderAndTheRowsInOrder() throws IOException {
        AquiferFiles files = new AquiferFiles(folder)
                .with("sources", "[{'category': 'recharge', 'kind': 'areal', 'rate': 0}]")
                .prism("second", "'layers': [2, 2]", AquiferFiles.BLOCK)
                .prism("a first", "", AquiferFiles.BLOCK);
        Budget budget = budget(files);
        String text = Files.readString(files.out().resolve("budget.csv"));
        assertThat(text.lines().filter(line -> !line.startsWith("#")).findFirst())
                .contains(HEADER);
        assertThat(text.replace("\r\n", "")).doesNotContain("\n", "\r");
        assertThat(budget.rows().stream()
                        .map(row -> row.get("prism") + "/" + row.get("period"))
                        .distinct())
                .as("as the prisms stand in their file, then by time")
                .containsExactly("second/interval 1", "second/interval 2", "a first/interval 1", "a first/interval 2");
        assertThat(budget.rows().stream()
                        .filter(row -> row.get("prism").equals("a first"))
                        .limit(22)
                        .map(BudgetCsvTest::account))
                .containsExactly(
                        "side/side 1/1",
                        "side/side 1/2",
                        "side/side 2/1",
                        "side/side 2/2",
                        "side/side 3/1",
                        "side/side 3/2",
                        "side/side 4/1",
                        "side/side 4/2",
                        "lid/top/1",
                        "lid/bottom/2",
                        "source/recharge/1",
                        "source/recharge/2",
                        "storage/water-table storage/1",
                        "storage/water-table storage/2",
                        "storage/elastic storage/1",
                        "storage/elastic storage/2",
                        "total/inflow/*",
                        "total/outflow/*",
                        "total/storage change/*",
                        "total/residual/*",
                        "total/closure error/*",
                        "total/net closure error/*");
        assertThat(budget.rows().stream().filter(row -> row.get("prism").equals("second")))
                .hasSize(2 * (4 + 2 + 1 + 2 + 6));
    }

    @Test
    void givesGrossFlowsThroughEachSideAndLayer() {
        Budget budget = budget(new AquiferFiles(folder));
        String[][] expected = {
            {"side 1", "1", "1.6", "0.0"},
            {"side 1", "2", "2.0", "0.0"},
            {"side 2", "1", "0.0", "4.0"},
            {"side 2", "2", "0.0", "5.0"},
            {"side 3", "1", "0.0", "1.6"},
            {"side 3", "2", "0.0", "2.0"},
            {"side 4", "1", "4.0", "0.0"},
            {"side 4", "2", "5.0", "0.0"},
        };
        for (String[] side : expected) {
            CSVRecord row = budget.row("block", "interval 2", "side", side[0], side[1]);
            double in = Double.parseDouble(side[2]);
            double out = Double.parseDouble(side[3]);
            assertThat(numbers(row, "rate"))
                    .as(account(row))
                    .containsExactly(new double[] {in, out, in - out}, within(1e-14));
            assertThat(numbers(row, "volume"))
                    .as(account(row))
                    .containsExactly(new double[] {10 * in, 10 * out, 10 * (in - out)}, within(1e-12));
            assertThat(row.get("rate_unit")).isEqualTo("m3/d");
            assertThat(row.get("volume_unit")).isEqualTo("m3");
            assertThat(row.get("from") + " " + row.get("to")).isEqualTo("10.0 20.0");
            assertThat(row.get("from_date") + row.get("to_date")).isEmpty();
        }
        assertThat(budget.row("block", "interval 1", "lid", "top", "1").get("inflow_rate"))
                .isEqualTo("0.0");
    }

    private static double[] numbers(CSVRecord row, String kind) {
        return new double[] {
            Double.parseDouble(row.get("inflow_" + kind)),
            Double.parseDouble(row.get("outflow_" + kind)),
            Double.parseDouble(row.get("net_" + kind))
        };
    }

    @Test
    void totalsStandUnderNetAloneAndAreTheSumsOfRows() {
        AquiferFiles files = new AquiferFiles(folder)
                .with("sources", "[{'category': 'recharge', 'kind': 'areal', 'rate': 0.003}]")
                .with("head", "{'file': 'h.csv', 'column': 'h'}")
                .file("h.csv", "instant,h\n0,9\n1,8.5\n2,8.7\n")
                .with("storage", "{'specific_yield': 0.2, 'specific_storage': 1e-5}");
        Budget budget = budget(files);
        for (String period : List.of("interval 1", "interval 2")) {
            double[] sums = new double[4];
            for (CSVRecord row : budget.rows()) {
                if (row.get("period").equals(period) && !row.get("group").equals("total")) {
                    int first = row.get("group").equals("storage") ? 2 : 0;
                    sums[first] += Double.parseDouble(row.get("inflow_rate"));
                    sums[first + 1] += Double.parseDouble(row.get("outflow_rate"));
                }
                if (row.get("group").equals("total")) {
                    assertThat(row.get("inflow_rate")
                                    + row.get("outflow_rate")
                                    + row.get("inflow_volume")
                                    + row.get("outflow_volume"))
                            .isEmpty();
                }
            }
            double residual = sums[0] - sums[1] - (sums[3] - sums[2]);
            double throughput = Math.max(sums[0] + sums[2], sums[1] + sums[3]);
            assertThat(total(budget, period, "inflow")).isCloseTo(sums[0], within(1e-12));
            assertThat(total(budget, period, "outflow")).isCloseTo(sums[1], within(1e-12));
            assertThat(total(budget, period, "storage change")).isCloseTo(sums[3] - sums[2], within(1e-12));
            assertThat(total(budget, period, "residual")).isCloseTo(residual, within(1e-12));
            assertThat(total(budget, period, "closure error")).isCloseTo(100 * residual / throughput, within(1e-11));
            CSVRecord error = budget.row("block", period, "total", "closure error", "*");
            assertThat(List.of(error.get("rate_unit"), error.get("net_volume"), error.get("volume_unit")))
                    .containsExactly("%", "", "");
        }
        // Specific yield × area × fall of the water table ÷ interval: 0.2 × 200 × 0.5 ÷ 10.
        assertThat(budget.number("inflow_rate", "block", "interval 1", "storage", "water-table storage", "1"))
                .isCloseTo(2, within(1e-12));
        assertThat(budget.number("outflow_rate", "block", "interval 2", "storage", "water-table storage", "1"))
                .isCloseTo(0.8, within(1e-12));
    }

    private static double total(Budget budget, String period, String item) {
        return budget.number("net_rate", "block", period, "total", item, "*");
    }

    @Test
    void leavesWhatIsUnknownEmptyAndGivesTheUnexplained() {
        Budget budget = budget(new AquiferFiles(folder).without("head"));
        for (String item : List.of("storage change", "residual", "closure error", "net closure error")) {
            CSVRecord row = budget.row("block", "interval 1", "total", item, "*");
            assertThat(row.get("net_rate") + row.get("net_volume")).as(item).isEmpty();
        }
        CSVRecord storage = budget.row("block", "interval 1", "storage", "water-table storage", "1");
        assertThat(storage.get("inflow_rate") + storage.get("outflow_rate") + storage.get("net_volume"))
                .isEmpty();
        assertThat(total(budget, "interval 1", "unexplained, storage included")).isCloseTo(0, within(1e-12));
        assertThat(budget(new AquiferFiles(folder.resolve("known"))).rows())
                .noneMatch(row -> row.get("item").startsWith("unexplained"));
    }

    @Test
    void leavesAClosedSideEmptyAndWarns() {
        AquiferFiles files = new AquiferFiles(folder)
                .with("flow/outer_faces", "{'sides': 'closed'}")
                .prism("edge", "", "'type': 'Polygon', 'coordinates': [[[0,0],[20,0],[20,20],[0,20],[0,0]]]");
        Ran ran = files.balance();
        assertThat(ran.out()).contains("\"side 1\" of \"edge\" lies on a closed outer face");
        Budget budget = Budget.of(files.out());
        CSVRecord closed = budget.row("edge", "interval 1", "side", "side 1", "1");
        assertThat(closed.get("inflow_rate") + closed.get("outflow_rate") + closed.get("net_volume"))
                .isEmpty();
        assertThat(budget.row("edge", "interval 1", "side", "side 2", "1").get("outflow_rate"))
                .isNotEmpty();
        assertThat(budget.row("edge", "interval 1", "total", "inflow", "*").get("net_rate"))
                .isEqualTo("0.0");
    }

    @Test
    void convertsUnitsAndGivesDates() {
        AquiferFiles files = new AquiferFiles(folder).with("start_date", "'2021-10-01'");
        Budget budget = budget(files, "--rate-unit", "L/s", "--volume-unit", "ML");
        CSVRecord row = budget.row("block", "interval 2", "side", "side 2", "1");
        // 1 m3/d is 1000 / 86400 L/s, 1 m3 is 0.001 ML.
        assertThat(Double.parseDouble(row.get("outflow_rate"))).isCloseTo(4 * 1000.0 / 86400, within(1e-15));
        assertThat(Double.parseDouble(row.get("outflow_volume"))).isCloseTo(0.04, within(1e-15));
        assertThat(row.get("rate_unit") + " " + row.get("volume_unit")).isEqualTo("L/s ML");
        assertThat(row.get("from_date") + " " + row.get("to_date")).isEqualTo("2021-10-11 2021-10-21");
    }

    @Test
    void keepsFormulasOfSpreadsheetsFromRunning() throws IOException {
        String category = "=HYPERLINK(\"x\",\"y\")";
        AquiferFiles files = new AquiferFiles(folder)
                .with(
                        "sources",
                        "[{'category': '@SUM(A1)', 'kind': 'areal', 'rate': 0}, {'category': '\\t=1', 'kind': 'areal', 'rate': 0}]")
                .prism("+cmd, \"quoted\" x", "", AquiferFiles.BLOCK)
                .prism(category, "'boundaries': {'-river': ['side 1-2']}", AquiferFiles.BLOCK);
        Budget budget = budget(files, "--periods", periods("=A1,0,20\n"));
        assertThat(budget.rows().stream().map(row -> row.get("prism")).distinct())
                .containsExactly("'+cmd, \"quoted\" x", "'" + category);
        assertThat(budget.rows().stream().map(row -> row.get("item"))).contains("'-river", "'@SUM(A1)", "'\t=1");
        assertThat(budget.rows().stream().map(row -> row.get("period"))).containsOnly("'=A1");
    }

    private String periods(String lines) throws IOException {
        return Files.writeString(folder.resolve("periods.csv"), "name,from,to\n" + lines)
                .toString();
    }

    @Test
    void saysWhatItIsBeforeTheRows() throws IOException, NoSuchAlgorithmException {
        AquiferFiles files = new AquiferFiles(folder)
                .with(
                        "sources",
                        "[{'category': 'recharge', 'kind': 'areal', 'rate': 0, 'origin': 'estimated', 'reference':"
                                + " 'water balance,\\n2023', 'uncertainty': {'percent': 20}}]")
                .with("flow/origin", "'simulated'")
                .with("head", "{'file': 'h.csv'}")
                .file("h.csv", "row,col,h [cm]\n" + AquiferFiles.everywhere(3, 4, "900"));
        Budget budget = budget(files);
        String notes = String.join("\n", budget.notes());
        assertThat(notes)
                .contains("# Water budget of \"Invented test\" by seepledger ")
                .contains("# Input: aquifer.json, SHA-256 "
                        + sha256(files.aquifer().resolve("aquifer.json")))
                .contains("# Input: h.csv, SHA-256 " + sha256(files.aquifer().resolve("h.csv")))
                .contains("# Input: " + files.prisms() + ", SHA-256 " + sha256(files.prisms()))
                .contains("# Origin: flow: simulated, uncertainty not stated")
                .contains("# Origin: recharge: estimated, water balance, 2023, standard deviation 20 %")
                .contains("# Method: ")
                .contains("# Signs: inflow and outflow are never negative")
                .contains("not a determination of compliance");
    }

    private static String sha256(Path file) throws IOException, NoSuchAlgorithmException {
        byte[] digest = MessageDigest.getInstance("SHA-256").digest(Files.readAllBytes(file));
        return HexFormat.of().formatHex(digest);
    }

    @Test
    void addsSourcesOfOneCategoryAndKeepsGainsAndLossesApart() {
        AquiferFiles files = new AquiferFiles(folder)
                .with(
                        "sources",
                        "[{'category': 'river', 'kind': 'cells', 'rate': {'file': 'r.csv', 'column': 'flow'}},"
                                + "{'category': 'river', 'kind': 'areal', 'rate': {'value': 36.525, 'unit': 'cm/yr'}},"
                                + "{'category': 'pumping', 'kind': 'points', 'file': 'w.csv'}]")
                .file("r.csv", "row,col,layer,flow\n2,2,1,3\n2,2,1,4\n2,3,1,-5\n")
                .file(
                        "w.csv",
                        "name,x,y,layer,from,to,rate [L/s],category\nA,15,15,2,,,-0.01,\nB,25,15,2,0,5,-0.02,supply\n");
        Budget budget = budget(files);
        // 3 + 4 in one cell, 36.525 cm/yr = 0.001 m/d on 100 m2 for each of two cells; the other cell takes 5 − 0.1.
        CSVRecord river = budget.row("block", "interval 1", "source", "river", "1");
        assertThat(Double.parseDouble(river.get("net_rate"))).isCloseTo(7 - 5 + 0.2, within(1e-12));
        assertThat(Double.parseDouble(river.get("inflow_rate"))).isBetween(7.0, 7.2 + 1e-12);
        assertThat(Double.parseDouble(river.get("outflow_rate"))).isBetween(4.9 - 1e-12, 5.0);
        assertThat(budget.number("outflow_rate", "block", "interval 1", "source", "pumping", "2"))
                .isCloseTo(0.864, within(1e-12));
        assertThat(budget.number("outflow_rate", "block", "interval 1", "source", "supply", "2"))
                .as("half of the interval")
                .isCloseTo(0.864, within(1e-12));
        assertThat(budget.number("outflow_rate", "block", "interval 2", "source", "supply", "2"))
                .isZero();
    }
}
