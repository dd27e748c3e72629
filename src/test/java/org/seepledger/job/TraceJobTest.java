package org.seepledger.job;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.assertj.core.api.Assertions.within;

import com.fasterxml.jackson.databind.JsonNode;
import com.fasterxml.jackson.databind.ObjectMapper;
import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.time.LocalDate;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.regex.Matcher;
import java.util.regex.Pattern;
import org.apache.commons.csv.CSVRecord;
import org.assertj.core.data.Offset;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.seepledger.aquifer.Window;
import org.seepledger.balance.Periods;
import org.seepledger.balance.WellRule;
import org.seepledger.fault.UsageFault;
import org.seepledger.io.raster.GeoTiff;
import org.seepledger.progress.Progress;

/** Each row of a budget is traced to values that stand in the files, and they add up to it. */
class TraceJobTest {

    private static final Pattern IN_BAND = Pattern.compile("band (\\d+), row (\\d+), col (\\d+)");
    private static final Pattern IN_COLUMN = Pattern.compile(
            "column (\\w+)(?:, layer (\\d+))?(?:, (?:interval|instant) (\\d+))?(?:, row (\\d+), col (\\d+))?");
    private static final Pattern IN_LINE = Pattern.compile("line (\\d+), column (\\w+)");

    /** Rounding of sums of some thousand terms, against the sum of their magnitudes. */
    private static final double ROUNDING = 1e-13;

    @TempDir
    private Path folder;

    private final Map<String, List<CSVRecord>> tables = new HashMap<>();
    private final Map<String, Double> looked = new HashMap<>();

    @Test
    void addsUpToEachRowOfHeadsAndStorage() throws IOException {
        SmallSets.heads(folder.resolve("set"));
        assertThat(traceAll()).isGreaterThan(50);
    }

    @Test
    void addsUpToEachRowOfFlux() throws IOException {
        SmallSets.flux(folder.resolve("set"));
        assertThat(traceAll()).isGreaterThan(15);
    }

    @Test
    void addsUpToEachRowOfFaceFlows() throws IOException {
        SmallSets.faces(folder.resolve("set"));
        assertThat(traceAll()).isGreaterThan(15);
    }

    @Test
    void anItemOverAllLayersAddsUpItsRows() throws IOException {
        SmallSets.heads(folder.resolve("set"));
        traceAll();
        double rows = 0;
        for (CSVRecord row : Rows.of(folder.resolve("budget/budget.csv"))) {
            if (row.get("prism").equals("a/b") && row.get("item").equals("river/bank")) {
                rows += Double.parseDouble(row.get("net_rate"));
            }
        }
        trace("a/b/record/river/bank/*", true);
        double sum = 0;
        for (CSVRecord line : Rows.of(folder.resolve("trace.csv"))) {
            sum += Double.parseDouble(line.get("value")) * Double.parseDouble(line.get("weight"));
        }
        assertThat(rows).isNotZero();
        assertThat(sum).isCloseTo(rows, within(1e-9 * Math.abs(rows)));
    }

    private int traceAll() throws IOException {
        Path set = folder.resolve("set");
        BalanceJob.run(
                new BalanceRequest(
                        set,
                        set.resolve("prisms.geojson"),
                        folder.resolve("budget"),
                        Periods.Every.RECORD,
                        Optional.empty(),
                        10,
                        Optional.empty(),
                        Optional.empty(),
                        WellRule.POINT,
                        true,
                        1,
                        false,
                        ReportRequest.dated(LocalDate.of(2024, 5, 31))),
                Progress.NONE);
        int traced = 0;
        for (CSVRecord row : Rows.of(folder.resolve("budget/budget.csv"))) {
            if (!row.get("item").endsWith("closure error")
                    && !row.get("net_rate").isEmpty()) {
                String place = row.get("prism") + "/" + row.get("period");
                trace(place + "/" + row.get("item") + "/" + row.get("layer"), true);
                assertAddsUp(row);
                traced++;
            }
        }
        return traced;
    }

    private void assertAddsUp(CSVRecord row) throws IOException {
        double sum = 0;
        double magnitude = 0;
        for (CSVRecord line : Rows.of(folder.resolve("trace.csv"))) {
            double value = Double.parseDouble(line.get("value"));
            double term = value * Double.parseDouble(line.get("weight"));
            sum += term;
            magnitude += Math.abs(term);
            String at = line.get("file") + ", " + line.get("place");
            if (!looked.containsKey(at)) {
                looked.put(at, standing(line.get("file"), line.get("place")));
            }
            assertThat(value).as(at).isEqualTo(looked.get(at));
        }
        assertThat(sum)
                .as("%s", row)
                .isCloseTo(Double.parseDouble(row.get("net_rate")), Offset.offset(ROUNDING * (1 + magnitude)));
    }

    /** The number that stands at a place of a file. */
    private double standing(String file, String place) throws IOException {
        Path path = folder.resolve("set").resolve(file);
        Matcher band = IN_BAND.matcher(place);
        if (band.matches()) {
            try (GeoTiff raster = GeoTiff.open(path, file)) {
                int row = Integer.parseInt(band.group(2)) - 1;
                double[] value = new double[1];
                Window cell = new Window(row, Integer.parseInt(band.group(3)) - 1, 1, 1);
                raster.readStored(Integer.parseInt(band.group(1)) - 1, cell, value, 0);
                return value[0];
            }
        }
        if (file.equals("aquifer.json")) {
            JsonNode root = new ObjectMapper().readTree(path.toFile());
            String counted = Pattern.compile(", entry (\\d+)")
                    .matcher(place)
                    .replaceAll(entry -> "/" + (Integer.parseInt(entry.group(1)) - 1));
            return root.at("/" + counted.replace(", ", "/").replace('.', '/')).doubleValue();
        }
        Matcher line = IN_LINE.matcher(place);
        if (line.matches()) {
            List<String> lines = Files.readAllLines(path);
            List<String> header = List.of(lines.get(0).split(","));
            String[] cells = lines.get(Integer.parseInt(line.group(1)) - 1).split(",", -1);
            return Double.parseDouble(cells[header.indexOf(line.group(2) + " [L]")]);
        }
        return inTable(file, IN_COLUMN.matcher(place));
    }

    private double inTable(String file, Matcher place) throws IOException {
        assertThat(place.matches()).isTrue();
        if (file.equals("rain.csv")) {
            return place.group(3).equals("1") ? 310.5 : 95.25;
        }
        if (!tables.containsKey(file)) {
            tables.put(file, Rows.of(folder.resolve("set").resolve(file)));
        }
        return tables.get(file).stream()
                .filter(line -> isAt(line, "row", place.group(4)) && isAt(line, "col", place.group(5)))
                .filter(line -> isAt(line, "layer", place.group(2)))
                .filter(line -> isAt(line, "interval", place.group(3)) && isAt(line, "instant", place.group(3)))
                .mapToDouble(line -> Double.parseDouble(cell(line, place.group(1))))
                .sum();
    }

    private static boolean isAt(CSVRecord line, String column, String wanted) {
        return !line.isMapped(column) || line.get(column).equals(wanted);
    }

    private static String cell(CSVRecord line, String column) {
        return line.toMap().entrySet().stream()
                .filter(entry -> entry.getKey().equals(column) || entry.getKey().startsWith(column + " ["))
                .findFirst()
                .orElseThrow()
                .getValue();
    }

    @Test
    void countsADryCellsHeadWithItsBottom() throws IOException {
        SmallSets.heads(folder.resolve("set"));
        trace("a/b/record/river/bank/1", false);
        List<CSVRecord> lines = Rows.of(folder.resolve("trace.csv"));
        assertThat(lines)
                .filteredOn(line -> line.get("value").equals("-999.0"))
                .isNotEmpty()
                .allMatch(line -> line.get("weight").equals("0.0"));
        assertThat(lines).anyMatch(line -> line.get("place").equals("layers, entry 1, bottom"));
        assertThat(lines).anyMatch(line -> line.get("place").equals("head.offset"));
    }

    @Test
    void saysWhichRowIsNearest() throws IOException {
        SmallSets.heads(folder.resolve("set"));
        assertThatThrownBy(() -> trace("a/b/record/rver/bank/1", false))
                .isInstanceOf(UsageFault.class)
                .hasMessageContaining("river/bank/1");
        assertThatThrownBy(() -> trace("a/b/rekord/river/bank/1", false))
                .isInstanceOf(UsageFault.class)
                .hasMessageContaining("\"record\"");
        assertThatThrownBy(() -> trace("cc/record/side 1/1", false))
                .isInstanceOf(UsageFault.class)
                .hasMessageContaining("The nearest is \"c\"");
        assertThatThrownBy(() -> trace("c/record/closure error/*", false))
                .isInstanceOf(UsageFault.class)
                .hasMessageContaining("residual");
        assertThat(folder.resolve("trace.csv")).doesNotExist();
    }

    /** The prism is called a/b. */
    @ParameterizedTest
    @CsvSource(
            delimiter = '|',
            value = {
                "a/c/record/side 1/1 | no prism \"a/c\". The nearest is \"a/b\".",
                "a/b/recrod/side 1/1 | no period \"recrod\". The nearest is \"record\".",
                "a/b/record/sidr 3/1 | no item and layer \"sidr 3/1\". The nearest is \"side 3/1\".",
                "a/b | nothing follows the prism \"a/b\"",
                "a/b/record/unheard-of thing/7 | \"side 3\"",
            })
    void namesTheNearestOfWhatThereIsNot(String row, String words) throws IOException {
        SmallSets.heads(folder.resolve("set"));
        assertThatThrownBy(() -> trace(row, false))
                .isInstanceOf(UsageFault.class)
                .hasMessageContaining(words)
                .hasMessageEndingWith("Name it as PRISM/PERIOD/ITEM/LAYER, with the words of budget.csv.");
    }

    @Test
    void tellsRowsOfOneNameApartByTheirGroup() throws IOException {
        SmallSets.heads(folder.resolve("set"));
        Path aquifer = folder.resolve("set/aquifer.json");
        Files.writeString(aquifer, Files.readString(aquifer).replace("\"rain\"", "\"side 3\""));
        assertThatThrownBy(() -> trace("a/b/record/side 3/1", false))
                .isInstanceOf(UsageFault.class)
                .hasMessageContaining("a/b/record/source/side 3/1");
        trace("a/b/record/source/side 3/1", false);
        assertThat(Rows.of(folder.resolve("trace.csv")))
                .isNotEmpty()
                .noneMatch(line -> line.get("file").equals("head.csv"));
    }

    @Test
    void replacesATraceAndNothingElse() throws IOException {
        SmallSets.faces(folder.resolve("set"));
        trace("c/record/side 1/2", false);
        assertThatThrownBy(() -> trace("c/record/side 1/2", false)).isInstanceOf(UsageFault.class);
        trace("c/record/side 1/2", true);
        Files.writeString(folder.resolve("trace.csv"), "something else");
        assertThatThrownBy(() -> trace("c/record/side 1/2", true)).isInstanceOf(UsageFault.class);
        assertThat(folder.resolve("trace.csv")).hasContent("something else");
    }

    private void trace(String row, boolean overwrite) throws IOException {
        Path set = folder.resolve("set");
        TraceJob.run(
                new TraceRequest(
                        set,
                        set.resolve("prisms.geojson"),
                        row,
                        folder.resolve("trace.csv"),
                        Periods.Every.RECORD,
                        Optional.empty(),
                        10,
                        Optional.empty(),
                        WellRule.POINT,
                        true,
                        1,
                        overwrite),
                Progress.NONE);
    }
}
