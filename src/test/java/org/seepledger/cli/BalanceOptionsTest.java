package org.seepledger.cli;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

/** Every option of {@code balance}, and every exit status. */
class BalanceOptionsTest {

    @TempDir
    Path folder;

    private AquiferFiles dated() {
        return new AquiferFiles(folder)
                .with("start_date", "'2021-09-20'")
                .with("times", "[0, 10, 30, 460]")
                .with("flow/x", "{'file': 'q.csv'}")
                .file("q.csv", "interval,qx\n1,0.1\n2,-0.1\n3,0.2\n");
    }

    private static Budget budget(AquiferFiles files, String... options) {
        Ran ran = files.balance(options);
        assertThat(ran.err()).isEmpty();
        assertThat(ran.status()).isZero();
        return Budget.of(files.out());
    }

    private static List<String> periods(Budget budget) {
        return budget.rows().stream().map(row -> row.get("period")).distinct().toList();
    }

    private static String span(Budget budget, String period) {
        var row = budget.row("block", period, "total", "inflow", "*");
        return row.get("from") + " " + row.get("to") + " " + row.get("from_date") + " " + row.get("to_date");
    }

    @Test
    void intervalsAreTheDefault() {
        assertThat(periods(budget(dated()))).containsExactly("interval 1", "interval 2", "interval 3");
    }

    @Test
    void everyMonth() {
        Budget budget = budget(dated(), "--every", "month");
        assertThat(periods(budget)).hasSize(16).startsWith("2021-09", "2021-10").endsWith("2022-12");
        assertThat(span(budget, "2021-09")).isEqualTo("0.0 11.0 2021-09-20 2021-10-01");
        assertThat(span(budget, "2022-12")).isEqualTo("437.0 460.0 2022-12-01 2022-12-24");
        // September holds ten days of 0.1 m/d out through side 2 and one of 0.1 m/d in: 4 m2/d × 10 and 4 × 1.
        assertThat(budget.number("outflow_volume", "block", "2021-09", "side", "side 2", "1"))
                .isCloseTo(40, within(1e-12));
        assertThat(budget.number("inflow_volume", "block", "2021-09", "side", "side 2", "1"))
                .isCloseTo(4, within(1e-12));
        assertThat(budget.number("outflow_rate", "block", "2021-09", "side", "side 2", "1"))
                .isCloseTo(40 / 11.0, within(1e-12));
    }

    @Test
    void everyYear() {
        assertThat(periods(budget(dated(), "--every", "year"))).containsExactly("2021", "2022");
    }

    @Test
    void everyWaterYearNamedByItsEnd() {
        Budget budget = budget(dated(), "--every", "water-year");
        assertThat(periods(budget)).containsExactly("water year 2021", "water year 2022", "water year 2023");
        assertThat(span(budget, "water year 2022")).isEqualTo("11.0 376.0 2021-10-01 2022-10-01");
    }

    @Test
    void waterYearsFromAnotherMonth() {
        Budget budget = budget(dated(), "--every", "water-year", "--water-year-start", "4");
        assertThat(periods(budget)).containsExactly("water year 2022", "water year 2023");
        assertThat(span(budget, "water year 2023")).isEqualTo("193.0 460.0 2022-04-01 2022-12-24");
    }

    @Test
    void theWholeRecord() {
        Budget budget = budget(dated(), "--every", "record");
        assertThat(periods(budget)).containsExactly("record");
        assertThat(budget.number("outflow_volume", "block", "record", "side", "side 2", "2"))
                .isCloseTo(5 * 10 + 10 * 430, within(1e-9));
        assertThat(budget.number("inflow_volume", "block", "record", "side", "side 2", "2"))
                .isCloseTo(5 * 20, within(1e-9));
    }

    @Test
    void periodsOfTheUsersOwn() throws IOException {
        Path file = Files.writeString(
                folder.resolve("periods.csv"), "name;from;to\nwet;2021-10-01;2022-04-01\nlate;450;600\n");
        Budget budget = budget(dated(), "--periods", file.toString());
        assertThat(periods(budget)).containsExactly("wet", "late");
        assertThat(span(budget, "wet")).startsWith("11.0 193.0");
        assertThat(span(budget, "late")).as("as far as the record goes").startsWith("450.0 460.0");
    }

    @Test
    void doesNotDependOnThreads() {
        AquiferFiles files = dated();
        String one = budget(files, "--threads", "1").table();
        assertThat(budget(files, "--threads", "4", "--overwrite").table()).isEqualTo(one);
    }

    /** A well of 1 m3/d in a cell of which the prism holds a quarter, with the well in it. */
    @ParameterizedTest
    @CsvSource({"point, 1", "spread, 0.25"})
    void wellsInCutCells(String rule, double counted) {
        AquiferFiles files = new AquiferFiles(folder)
                .with("sources", "[{'category': 'pumping', 'kind': 'points', 'file': 'w.csv'}]")
                .file("w.csv", "name,x,y,layer,rate\nW,12,12,1,-1\n")
                .prism("block", "", "'type': 'Polygon', 'coordinates': [[[5,5],[15,5],[15,15],[5,15],[5,5]]]");
        assertThat(budget(files, "--wells", rule)
                        .number("outflow_rate", "block", "interval 1", "source", "pumping", "1"))
                .isCloseTo(counted, within(1e-12));
    }

    @Test
    void clipsAtTheGridsEdge() {
        AquiferFiles files = new AquiferFiles(folder)
                .prism("block", "", "'type': 'Polygon', 'coordinates': [[[30,10],[50,10],[50,20],[30,20],[30,10]]]");
        Ran ran = files.balance("--clip");
        assertThat(ran.err()).isEmpty();
        assertThat(ran.status()).isZero();
        assertThat(ran.out()).contains("cut at the grid's edge");
        Budget budget = Budget.of(files.out());
        assertThat(budget.number("outflow_rate", "block", "interval 1", "side", "grid edge", "1"))
                .isCloseTo(4, within(1e-12));
        assertThat(budget.rows().stream().map(row -> row.get("item")).distinct())
                .contains("side 1", "side 3", "side 4", "grid edge");
    }

    @Test
    void showsProgressOnStandardErrorIfAsked() {
        AquiferFiles files = new AquiferFiles(folder);
        assertThat(files.balance("--progress").err()).contains("balancing: 2 steps");
        assertThat(files.balanceAsItStands("--overwrite", "--no-progress").err())
                .isEmpty();
        assertThat(files.balanceAsItStands("--overwrite").err())
                .as("nobody watches")
                .isEmpty();
    }

    /** 0.003 m/d of recharge on 200 m2 is not in the flux: of 13.2 m3/d that come in, 0.6 go nowhere. */
    @ParameterizedTest
    @CsvSource({"4.6, 0", "4.5, 4", "0, 4", "100, 0"})
    void failsBeyondTheGreatestClosureError(String percent, int status) {
        AquiferFiles files =
                new AquiferFiles(folder).with("sources", "[{'category': 'recharge', 'kind': 'areal', 'rate': 0.003}]");
        Ran ran = files.balance("--max-closure-error", percent);
        assertThat(ran.err()).isEmpty();
        assertThat(ran.status()).isEqualTo(status);
        assertThat(ran.out().contains("more than the")).isEqualTo(status == 4);
        double error = 100 * 0.6 / 13.2;
        assertThat(Budget.of(files.out()).number("net_rate", "block", "interval 1", "total", "closure error", "*"))
                .isCloseTo(error, within(1e-9));
    }

    @Test
    void takesTheClosureErrorOfTheWorstPeriodWithoutItsSign() {
        AquiferFiles files = new AquiferFiles(folder)
                .with("sources", "[{'category': 'recharge', 'kind': 'areal', 'rate': {'file': 'r.csv'}}]")
                .file("r.csv", "interval,rate\n1,-0.006\n2,0.003\n");
        assertThat(files.balance("--max-closure-error", "5").status()).isEqualTo(4);
        assertThat(files.balance("--max-closure-error", "5", "--every", "record", "--overwrite")
                        .status())
                .isZero();
    }

    @Test
    void saysWhenThereIsNoClosureErrorToCheck() {
        Ran ran = new AquiferFiles(folder).without("head").balance("--max-closure-error", "1");
        assertThat(ran.status()).isZero();
        assertThat(ran.out()).contains("--max-closure-error was not checked");
    }

    @ParameterizedTest
    @CsvSource(
            delimiter = '|',
            value = {
                "--every fortnight | give one of interval, month, year, water-year, record",
                "--water-year-start 13 | give a month from 1 to 12",
                "--water-year-start x | --water-year-start",
                "--wells line | give one of point, spread",
                "--threads 0 | give 1 or more",
                "--max-closure-error -1 | give a percentage of 0 or more",
                "--max-closure-error NaN | give a percentage of 0 or more",
                "--rate-unit m3 | measures something else; give a unit as m3/d",
                "--volume-unit m2 | measures something else; give a unit as m3",
                "--mass-unit m | measures something else; give a unit as kg",
                "--rate-unit quart/d | \"quart/d\" is not a known unit",
                "--every month --periods p.csv | mutually exclusive",
                "--evry month | Did you mean --every?",
                "more | Unmatched argument",
            })
    void refusesOptionsThatCannotBe(String options, String words) {
        AquiferFiles files = new AquiferFiles(folder);
        Ran ran = files.balance(options.split(" "));
        assertThat(ran.err()).contains(words).doesNotContain("Exception");
        assertThat(ran.err().lines()).hasSize(1);
        assertThat(ran.status()).isEqualTo(2);
        assertThat(ran.out()).isEmpty();
        assertThat(files.left()).containsExactly("aquifer", "prisms.geojson");
    }

    @Test
    void needsItsArguments() {
        Ran ran = Ran.of("balance");
        assertThat(ran.status()).isEqualTo(2);
        assertThat(ran.err()).contains("--prisms", "--out", "AQUIFER", "See seepledger balance --help.");
        assertThat(ran.err().lines()).hasSize(1);
    }

    @Test
    void tellsOverlappingPrisms() {
        AquiferFiles files = new AquiferFiles(folder)
                .prism("a", "", AquiferFiles.BLOCK)
                .prism("b", "", "'type': 'Polygon', 'coordinates': [[[20,10],[40,10],[40,20],[20,20],[20,10]]]");
        Ran ran = files.balance();
        assertThat(ran.status()).isZero();
        assertThat(ran.out()).contains("\"a\" and \"b\" overlap over 100 m2");
    }
}
