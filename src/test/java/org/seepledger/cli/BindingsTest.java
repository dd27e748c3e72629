package org.seepledger.cli;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.nio.file.Path;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.ValueSource;

/** Every form in which a value can be given, and that the form does not change the budget. */
class BindingsTest {

    @TempDir
    Path folder;

    private static Budget budget(AquiferFiles files, String... options) {
        Ran ran = files.balance(options);
        assertThat(ran.err()).isEmpty();
        assertThat(ran.status()).isZero();
        return Budget.of(files.out());
    }

    private AquiferFiles files(String name) {
        return new AquiferFiles(folder.resolve(name));
    }

    /** The flux through side 2, which is 20 m long less its thickness of 4 m in layer 1 and 5 m in layer 2. */
    private static double eastward(Budget budget, String interval, String layer) {
        double thickness = layer.equals("1") ? 4 : 5;
        return budget.number("net_rate", "block", "interval " + interval, "side", "side 2", layer) / -10 / thickness;
    }

    private static TinyTiff raster(double... bands) {
        TinyTiff raster = new TinyTiff(3, 4);
        for (double band : bands) {
            raster.band((row, column) -> band);
        }
        return raster;
    }

    /** Each gives 0.25 m/d in layer 1 and 0.5 m/d in layer 2, in both intervals. */
    @ParameterizedTest
    @ValueSource(
            strings = {
                "[0.25, 0.5]",
                "[0.25, {'value': 0.5}]",
                "[{'value': 250, 'unit': 'mm/d'}, {'value': 500, 'scale': 0.001}]",
                "[{'value': 0.125, 'scale': 2}, {'value': 0.25, 'offset': 0.25}]",
                "'q_l{layer}.tif'",
                "{'file': 'bands.tif', 'band': 'layer'}",
                "[{'file': 'bands.tif', 'band': 1}, {'file': 'bands.tif', 'band': 2}]",
                "['q_l1.tif', {'file': 'q_l2.tif'}]",
                "[{'file': 'half.tif', 'scale': 2}, {'file': 'half.tif', 'scale': 2, 'offset': 0.25}]",
                "['scaled.tif', 0.5]",
                "[{'file': 'scaled.tif', 'unit': 'm/d', 'scale': 1, 'offset': 0}, 0.5]",
                "{'file': 'layers.csv', 'column': 'qx'}",
                "{'file': 'layers.csv'}",
                "'layers.csv'",
                "{'file': 'cells.csv', 'column': 'qx', 'unit': 'mm/d'}",
                "{'file': 'header.csv', 'column': 'qx'}",
            })
    void byLayer(String binding) {
        AquiferFiles files = files("a")
                .with("flow/x", binding)
                .file("q_l1.tif", raster(0.25).bytes())
                .file("q_l2.tif", raster(0.5).bytes())
                .file("half.tif", raster(0.125).bytes())
                .file("bands.tif", raster(0.25, 0.5).bytes())
                .file("scaled.tif", raster(300).scaled(0.001, -0.05).bytes())
                .file("layers.csv", "layer,qx\n1,0.25\n2,0.5\n")
                .file("cells.csv", cells("qx", "250", "500"))
                .file("header.csv", cells("qx [mm/d]", "250", "500"));
        Budget budget = budget(files);
        for (String interval : new String[] {"1", "2"}) {
            assertThat(eastward(budget, interval, "1")).isCloseTo(0.25, within(1e-14));
            assertThat(eastward(budget, interval, "2")).isCloseTo(0.5, within(1e-14));
        }
    }

    private static String cells(String header, String first, String second) {
        String lines = AquiferFiles.everywhere(3, 4, "1," + first) + AquiferFiles.everywhere(3, 4, "2," + second);
        return "row,col,layer," + header + "\n" + lines;
    }

    /** Each gives 0.25 m/d in interval 1 and 0.5 m/d in interval 2. */
    @ParameterizedTest
    @ValueSource(
            strings = {
                "'q_{interval}.tif'",
                "{'file': 'bands.tif', 'band': 'interval'}",
                "{'file': 'times.csv', 'column': 'qx'}",
                "['q_{interval}.tif', 'times.csv']",
                "{'file': 'q_l{layer}.tif', 'band': 'interval'}",
                "{'file': 'q_{interval}.tif', 'band': 'layer'}",
            })
    void byInterval(String binding) {
        AquiferFiles files = files("a")
                .with("flow/x", binding)
                .file("q_1.tif", raster(0.25, 0.25).bytes())
                .file("q_2.tif", raster(0.5, 0.5).bytes())
                .file("bands.tif", raster(0.25, 0.5).bytes())
                .file("q_l1.tif", raster(0.25, 0.5).bytes())
                .file("q_l2.tif", raster(0.25, 0.5).bytes())
                .file("times.csv", "interval,qx\n1,0.25\n2,0.5\n");
        Budget budget = budget(files);
        assertThat(eastward(budget, "1", "2")).isCloseTo(0.25, within(1e-14));
        assertThat(eastward(budget, "2", "2")).isCloseTo(0.5, within(1e-14));
    }

    /** Snapshots 0.1, 0.3, 0.7: intervals take the means of their ends. */
    @ParameterizedTest
    @ValueSource(strings = {"'q_{instant}.tif'", "{'file': 'bands.tif', 'band': 'instant'}", "{'file': 'times.csv'}"})
    void snapshots(String binding) {
        AquiferFiles files = files("a")
                .with("flow/x", binding)
                .with("flow/at", "'instant'")
                .file("q_0.tif", raster(0.125).bytes())
                .file("q_1.tif", raster(0.375).bytes())
                .file("q_2.tif", raster(0.75).bytes())
                .file("bands.tif", raster(0.125, 0.375, 0.75).bytes())
                .file("times.csv", "instant,qx\n0,0.125\n1,0.375\n2,0.75\n");
        Ran ran = files.balance();
        assertThat(ran.out()).contains("Flow is given as snapshots at instants");
        Budget budget = Budget.of(files.out());
        assertThat(eastward(budget, "1", "2")).isCloseTo(0.25, within(1e-14));
        assertThat(eastward(budget, "2", "2")).isCloseTo(0.5625, within(1e-14));
    }

    /** Heads 9, 8, 7 m: 0.2 × 200 m2 × 1 m ÷ 10 d come from the water table in each interval. */
    @ParameterizedTest
    @ValueSource(
            strings = {
                "'h_{instant}.tif'",
                "{'file': 'bands.tif', 'band': 'instant'}",
                "{'file': 'times.csv', 'column': 'h'}",
                "{'file': 'h_{instant}.tif', 'unit': 'm'}",
            })
    void headsAtInstants(String binding) {
        AquiferFiles files = files("a")
                .with("head", binding)
                .with("storage", "{'specific_yield': [0.2, 0.9], 'specific_storage': 0}")
                .file("h_0.tif", raster(9).bytes())
                .file("h_1.tif", raster(8).bytes())
                .file("h_2.tif", raster(7).bytes())
                .file("bands.tif", raster(9, 8, 7).bytes())
                .file("times.csv", "instant,h [ft]\n0,29.52755905511811\n1,26.246719160104988\n2,22.96587926509186\n");
        Budget budget = budget(files);
        for (String interval : new String[] {"interval 1", "interval 2"}) {
            assertThat(budget.number("inflow_rate", "block", interval, "storage", "water-table storage", "1"))
                    .isCloseTo(4, within(1e-12));
            assertThat(budget.number("inflow_rate", "block", interval, "storage", "water-table storage", "2"))
                    .isZero();
        }
    }

    /** A mark that floats do not hold exactly means dry as stored: the cells fall dry, 4 m × 0.2 × 200 m2 ÷ 10 d. */
    @ParameterizedTest
    @CsvSource(
            delimiter = '|',
            value = {
                "{'file': 'h_{instant}.tif', 'dry': -888.88}",
                "{'file': 'h.csv', 'dry': -888.88}",
                "{'file': 'cm_{instant}.tif', 'dry': -888.88, 'unit': 'cm'}",
            })
    void dryHeads(String binding) {
        AquiferFiles files = files("a")
                .with("head", "[" + binding + ", {'file': 'deep.csv'}]")
                .with("storage", "{'specific_yield': 0.2, 'specific_storage': 0}")
                .file("h_0.tif", raster(9).bytes())
                .file("h_1.tif", raster(-888.88).bytes())
                .file("h_2.tif", raster(-888.88).bytes())
                .file("cm_0.tif", raster(900).bytes())
                .file("cm_1.tif", raster(-888.88).bytes())
                .file("cm_2.tif", raster(-888.88).bytes())
                .file("h.csv", "instant,h\n0,9\n1,-888.88\n2,-888.88\n")
                .file("deep.csv", "instant,h\n0,4\n1,4\n2,4\n");
        Budget budget = budget(files);
        assertThat(budget.number("inflow_rate", "block", "interval 1", "storage", "water-table storage", "1"))
                .isCloseTo(16, within(1e-12));
        assertThat(budget.number("net_rate", "block", "interval 2", "storage", "water-table storage", "1"))
                .isZero();
    }

    @Test
    void tablesAndRastersOfTheSameDataGiveTheSameDigits() {
        TinyTiff.Formula flux = (row, column) -> (float) Math.sin(1 + row * 0.7 + column * 1.3);
        TinyTiff.Formula head = (row, column) -> (float) (8 + Math.cos(row - column * 0.4));
        StringBuilder table = new StringBuilder("row,col,qx,h\n");
        for (int row = 0; row < 3; row++) {
            for (int column = 0; column < 4; column++) {
                table.append(row + 1).append(',').append(column + 1).append(',');
                table.append(flux.at(row, column))
                        .append(',')
                        .append(head.at(row, column))
                        .append('\n');
            }
        }
        String slanted = "'type': 'Polygon', 'coordinates': [[[7,3],[33,9],[28,26],[11,21],[7,3]]]";
        Budget fromTable = budget(files("table")
                .with("flow/x", "{'file': 'v.csv', 'column': 'qx'}")
                .with("head", "{'file': 'v.csv', 'column': 'h'}")
                .file("v.csv", table.toString())
                .prism("p", "", slanted));
        Budget fromRasters = budget(files("rasters")
                .with("flow/x", "'qx.tif'")
                .with("head", "'h.tif'")
                .file("qx.tif", new TinyTiff(3, 4).band(flux).bytes())
                .file("h.tif", new TinyTiff(3, 4).band(head).bytes())
                .prism("p", "", slanted));
        assertThat(fromRasters.table()).isEqualTo(fromTable.table());
    }

    @Test
    void takesTheGridOfARaster() {
        AquiferFiles like = files("like")
                .with("grid", "{'like': 'ground.tif'}")
                .file("ground.tif", raster(10).bytes())
                .with("layers", "[{'top': 'ground.tif', 'bottom': 5}, {'bottom': 0}]");
        assertThat(budget(like).table()).isEqualTo(budget(files("plain")).table());
    }

    /** Columns of 10, 20 and 5 m: a raster has no way to say that. */
    @Test
    void matchesARasterOfAnUnevenGridByItsShape() {
        AquiferFiles files = files("a")
                .with("grid/x", "{'edges': [0, 10, 30, 35, 40]}")
                .with("flow/x", "'qx.tif'")
                .file("qx.tif", raster(0.25).nowhere().bytes());
        Ran ran = files.balance();
        assertThat(ran.status()).isZero();
        assertThat(ran.out()).contains("qx.tif is matched to the grid by its shape alone", "row 1 northernmost");
        assertThat(eastward(Budget.of(files.out()), "1", "1")).isCloseTo(0.25, within(1e-14));
    }

    @Test
    void warnsOfRastersInAnotherCrs() {
        AquiferFiles files = files("a")
                .with("crs", "'EPSG:32633'")
                .with("flow/x", "'q_l{layer}.tif'")
                .with("head", "'h.tif'")
                .prismsIn("EPSG:32633")
                .file("q_l1.tif", raster(0.25).epsg(25833).bytes())
                .file("q_l2.tif", raster(0.25).epsg(25833).bytes())
                .file("h.tif", raster(9).epsg(32633).bytes());
        Ran ran = files.balance();
        assertThat(ran.err()).isEmpty();
        assertThat(ran.out())
                .contains("\"q_l1.tif\" says that it is in EPSG:25833 (so do 1 more), but the set's crs is EPSG:32633")
                .doesNotContain("\"h.tif\"");
    }

    @Test
    void placeWithoutValueIsInactive() {
        AquiferFiles files = files("a")
                .with("flow/x", "'q.tif'")
                .file(
                        "q.tif",
                        new TinyTiff(3, 4)
                                .band((row, column) -> column == 1 ? -99 : 0.25)
                                .noData("-99")
                                .bytes());
        Ran ran = files.balance();
        assertThat(ran.status()).isZero();
        assertThat(ran.out()).contains("In \"block\", layer 1, cells over 100 m2 are inactive");
    }
}
