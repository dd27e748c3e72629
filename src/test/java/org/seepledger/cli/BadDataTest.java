package org.seepledger.cli;

import static org.assertj.core.api.Assertions.assertThat;

import java.nio.file.Files;
import java.nio.file.Path;
import java.util.Arrays;
import java.util.List;
import java.util.function.Consumer;
import java.util.stream.Stream;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;

/** Wrong data end with status 3 and one line that says where, what and how to mend it; nothing is written. */
class BadDataTest {

    private static final String PROFILE = "{'file': 'h.csv', 'column': 'h'}";
    private static final String AREAL = "[{'category': 'recharge', 'kind': 'areal', 'rate': %s}]";
    private static final String WELLS = "[{'category': 'pumping', 'kind': 'points', 'file': 'wells.csv'}]";
    private static final String TURNED_ROUND =
            "'type': 'Polygon', 'coordinates': [[[10,10],[50,10],[50,20],[10,20],[10,10]]]";

    @TempDir
    Path folder;

    /** A change to a good set, options, and the words that the line must hold. */
    private record Case(String name, Consumer<AquiferFiles> change, List<String> options, List<String> words) {

        @Override
        public String toString() {
            return name;
        }
    }

    private static Case bad(String name, Consumer<AquiferFiles> change, String... words) {
        return new Case(name, change, List.of(), Arrays.asList(words));
    }

    private static Case key(String path, String value, String... words) {
        return bad(path + " = " + value, files -> files.with(path, value), words);
    }

    /** A solute with some keys. */
    private static Case solute(String keys, String... words) {
        return key("solutes", "[{'name': 'a', " + keys + "}]", words);
    }

    static Stream<Case> keys() {
        return Stream.of(
                key("grids", "1", "aquifer.json: found the unknown key \"grids\"", "Did you mean \"grid\"?"),
                key("grid/rotatoin", "5", "aquifer.json, grid:", "\"rotatoin\"", "Did you mean \"rotation\"?"),
                key("grid/x/stepp", "5", "aquifer.json, grid.x:", "Did you mean \"step\"?"),
                key("layers", "[{'top': 1, 'botom': 0}]", "aquifer.json, layers, entry 1:", "Did you mean \"bottom\"?"),
                key("head", "[9, {'file': 'h.csv', 'colum': 'h'}]", "head, entry 2:", "Did you mean \"column\"?"),
                key("flow/outer_faces", "{'side': 'open'}", "flow.outer_faces:", "Did you mean \"sides\"?"),
                key("flow/xx", "1", "aquifer.json, flow:", "\"xx\"", "Did you mean \"x\"?"),
                key(
                        "flow/east",
                        "1",
                        "aquifer.json, flow:",
                        "\"east\" with a flow of kind \"darcy_flux\"",
                        "face_flow"),
                key("flow/conductivity", "1", "aquifer.json, flow:", "\"head_gradient\""),
                key("quite_something_else", "1", "\"quite_something_else\"", "Take it out."),
                key(
                        "sources",
                        "[{'category': 'a', 'kind': 'areal', 'rate': 0, 'refrence': 'b'}]",
                        "sources, entry 1:",
                        "Did you mean \"reference\"?"),
                key(
                        "sources",
                        "[{'category': 'a', 'kind': 'points', 'rate': 0, 'file': 'w.csv'}]",
                        "sources, entry 1, rate",
                        "correct the kind"),
                key("sources", "[{'category': 'a', 'kind': 'points'}]", "sources, entry 1: found no \"file\""),
                key("sources", "[{'category': 'a', 'kind': 'areal'}]", "sources, entry 1: found no \"rate\""),
                key("sources", "[{'kind': 'areal', 'rate': 0}]", "sources, entry 1: found no \"category\""),
                key("storage", "{'supplied': [{'rate': 0}]}", "storage.supplied, entry 1: found no \"item\""),
                bad("no times", files -> files.without("times"), "no \"times\"", "Instants in time_unit"),
                bad("no flow", files -> files.without("flow"), "found no \"flow\""),
                bad("no kind", files -> files.without("flow/kind"), "aquifer.json, flow: found no \"kind\""),
                bad("no y", files -> files.without("flow/y"), "aquifer.json, flow: found no \"y\""),
                bad("no top", files -> files.with("layers", "[{'bottom': 0}]"), "layers, entry 1: found no \"top\""),
                bad(
                        "no step",
                        files -> files.without("grid/x/step"),
                        "grid.x:",
                        "either \"from\", \"step\" and \"count\""),
                key("grid/x/edges", "[0, 1]", "grid.x:", "either \"from\", \"step\" and \"count\", or \"edges\" alone"),
                key("grid/like", "'h.tif'", "grid:", "or \"like\" alone"));
    }

    static Stream<Case> values() {
        return Stream.of(
                key("times", "[0]", "times: found the list [0]; expected at least 2 entries"),
                key("times", "'x'", "times: found \"x\"; expected a list in brackets"),
                key("times", "[0, 'a']", "times, entry 2: found \"a\"; expected a number"),
                key("times", "[0, 10, 10]", "times:", "instants must increase", "10.0"),
                key("grid/x/step", "0", "grid.x.step: found 0; expected a number greater than 0"),
                key("grid/x/count", "2.5", "grid.x.count: found 2.5; expected a whole number"),
                key("grid/x/count", "0", "grid.x.count: found 0; expected a number of 1 or more"),
                key("grid/x", "{'edges': [0, 20, 10, 40, 50]}", "grid.x:", "edge 3 is 10.0 after 20.0"),
                key("flow/kind", "'darcy'", "flow.kind: found \"darcy\"", "one of \"darcy_flux\", \"face_flow\""),
                key("flow/outer_faces", "{'top': 'ajar'}", "outer_faces.top: found \"ajar\"", "\"open\", \"closed\""),
                key("layers", "[]", "layers: found the list []; expected at least 1 entry"),
                key(
                        "layers",
                        "[{'top': true, 'bottom': 0}]",
                        "layers, entry 1, top: found true",
                        "a number, a text in quot"),
                key("head", "{'value': 'x'}", "head.value: found \"x\"; expected a number"),
                key("head", "{'file': 'h.tif', 'band': 0}", "head.band: found 0; expected a number of 1 or more"),
                key(
                        "head",
                        "{'file': 'h.tif', 'band': 'layers'}",
                        "head.band: found \"layers\"",
                        "\"layer\", \"interval\""),
                key("head", "{'unit': 'm'}", "aquifer.json, head:", "\"value\" and \"file\""),
                key("head", "{'value': 1, 'band': 1}", "aquifer.json, head:", "\"value\" with a band"),
                key("head", "[9]", "aquifer.json, head: found an array of 1", "each of the 2 layers"),
                key("head", "{'value': 9, 'unit': 'furlong'}", "head:", "the unknown unit \"furlong\"", "lengths m cm"),
                key("head", "{'value': 9, 'unit': 'd'}", "head:", "the unit \"d\"", "given in \"m\""),
                key("length_unit", "'metre'", "length_unit:", "the unknown unit \"metre\"", "lengths m cm"),
                key("length_unit", "'d'", "length_unit:", "unit of something else"),
                key("time_unit", "'m'", "time_unit:", "unit of something else"),
                key("crs", "5", "crs: found 5; expected a text in quotation marks or null"),
                key(
                        "crs",
                        "'EPSG:4326'",
                        "aquifer.json, crs:",
                        "geographic",
                        "areas in degrees mean nothing",
                        "Reproject"),
                key("crs", "'EPSG:1'", "aquifer.json, crs: found \"EPSG:1\", which is not a known CRS;"),
                key("start_date", "'1 October'", "start_date: found \"1 October\"", "2021-10-01"),
                key("storage", "{'specific_storage': 1e-5, 'storativity': 1e-4}", "storage:", "at most one of"),
                key("solutes", "[{'name': 'a', 'porosty': 0.2}]", "Did you mean \"porosity\"?"),
                key("solutes", "[{'porosity': 0.2}]", "found no \"name\""),
                key("solutes", "[{'name': 'a'}, {'name': 'a'}]", "\"a\"", "names that differ"),
                key(
                        "solutes",
                        "[{'name': 'a', 'porosity': {'value': 1, 'unit': 'm'}}]",
                        "solutes, entry 1, porosity: found the unit"),
                key("solutes", "[{'name': 'a', 'sorption': {'isotherm': 'straight'}}]", "one of \"linear\""),
                key(
                        "solutes",
                        "[{'name': 'a', 'half_life': 'x.tif', 'decay_rate': 1}]",
                        "at most one of \"half_life\""),
                solute("'concentration': 5", "no \"unit\""),
                solute("'concentration': -5, 'unit': 'mg/L'", "concentration: found -5.0", "0 or more"),
                solute("'concentration': 5, 'unit': 'm'", "the unit of something else"),
                solute("'concentration': 5, 'unit': 'mgl'", "unknown unit \"mgl\""),
                solute("'half_life': 0", "half_life: found 0.0", "more than 0"),
                solute("'decay_rate': -1", "decay_rate: found -1.0"),
                solute("'sorption': {'isotherm': 'linear', 'kd': 1}", "no \"bulk_density\""),
                solute("'bulk_density': 1700, 'sorption': {'isotherm': 'linear'}", "no \"kd\" or \"koc\""),
                solute("'bulk_density': 1700, 'sorption': {'isotherm': 'linear', 'koc': 1}", "no \"foc\""),
                solute("'bulk_density': 1700, 'sorption': {'isotherm': 'linear', 'koc': 1, 'foc': 2}", "from 0 to 1"),
                solute(
                        "'bulk_density': 1700, 'sorption': {'isotherm': 'linear', 'kd': 1, 'foc': 0.1}",
                        "\"foc\" beside \"kd\""),
                solute(
                        "'bulk_density': 1700, 'sorption': {'isotherm': 'freundlich', 'kf': 1, 'kd': 1}",
                        "\"kd\" beside a Freundlich isotherm"),
                solute("'bulk_density': 1700, 'sorption': {'isotherm': 'freundlich', 'kf': 1}", "no \"n\""),
                solute(
                        "'bulk_density': 1700, 'sorption': {'isotherm': 'freundlich', 'kf': 1, 'n': 1, 'unit': 'm3/kg'}",
                        "found \"m3/kg\""),
                solute("'bulk_density': 1700, 'sorption': {'isotherm': 'langmuir', 'affinity': 1}", "no \"capacity\""),
                solute("'parent': 'b', 'yield': 1", "unknown solute \"b\""),
                solute("'parent': 'a', 'yield': 1", "leads back to \"a\""),
                solute("'yield': 1", "a \"parent\" too"),
                solute("'dispersion': {'longitudinal': -1}", "longitudinal: found -1.0"),
                key(
                        "sources",
                        "[{'category': 'rain', 'kind': 'areal', 'rate': 1, 'concentration': {'chlorid': 1}}]",
                        "unknown solute \"chlorid\""),
                key("solutes", "[{'name': 'a', 'half_life': true}]", "half_life: found true"),
                key("sources", AREAL.formatted("{'value': 1, 'unit': 'm3/d'}"), "sources, entry 1, rate:", "\"m/d\""),
                key("sources", "[{'category': '', 'kind': 'areal', 'rate': 0}]", "category: found \"\"", "not empty"),
                key(
                        "sources",
                        "[{'category': 'a', 'kind': 'areal', 'rate': 0, 'uncertainty': {'percent': -1}}]",
                        "sources, entry 1, uncertainty.percent: found -1; expected a number of 0 or more"),
                bad(
                        "times without end",
                        files -> files.with("times", "[0, 1e300]").with("start_date", "'2021-10-01'"),
                        "times:",
                        "start_date"),
                bad(
                        "infinite",
                        files -> files.withText(files.text().replace("\"head\":9", "\"head\":1e999")),
                        "aquifer.json, head: found a number too large"),
                bad("not JSON", files -> files.withText("{\"name\": \"x\",\n  oops}"), "aquifer.json, line 2, column"),
                bad("empty", files -> files.withText(" "), "aquifer.json: found an empty file"),
                bad(
                        "deep JSON",
                        files -> files.withText("[".repeat(100_000)),
                        "aquifer.json: found a fault in the JSON",
                        "64 levels"),
                bad(
                        "a key twice",
                        files -> files.withText("{\"name\": \"x\", \"name\": \"y\"}"),
                        "name",
                        "not repeated"));
    }

    static Stream<Case> data() {
        return Stream.of(
                bad(
                        "file missing",
                        files -> files.with("head", PROFILE.replace("h.csv", "haed.csv"))
                                .file("head.csv", "row,col,h\n"),
                        "aquifer.json, head:",
                        "haed.csv",
                        "Did you mean \"head.csv\"?"),
                key("head", "'../h.tif'", "aquifer.json, head:", "../h.tif", "leads out of the folder"),
                key("head", "'/etc/passwd'", "aquifer.json, head:", "/etc/passwd", "relative"),
                key("head", "'h_{layr}.tif'", "aquifer.json, head:", "with {layr}", "{layer} or {instant}"),
                key("head", "'h_{interval}.tif'", "head:", "with {interval}", "holds at instants"),
                key("flow/x", "'x_{instant}.tif'", "flow.x:", "with {instant}", "holds for intervals"),
                bad(
                        "placeholder for surfaces",
                        files -> files.with("layers", "[{'top': 10, 'bottom': 'b_{interval}.tif'}]"),
                        "layers, entry 1, bottom:",
                        "with {interval}",
                        "does not change"),
                bad(
                        "band words",
                        files -> files.with("head", "{'file': 'h.tif', 'band': 'interval'}")
                                .file("h.tif", raster(3, 4).bytes()),
                        "head:",
                        "the band \"interval\"",
                        "\"layer\" or \"instant\""),
                bad(
                        "column of a raster",
                        files -> files.with("head", "{'file': 'h.tif', 'column': 'h'}")
                                .file("h.tif", raster(3, 4).bytes()),
                        "head:",
                        "\"column\" for the raster"),
                bad(
                        "band of a table",
                        files -> files.with("head", "{'file': 'h.csv', 'band': 1}")
                                .file("h.csv", "row,col,h\n1,1,9\n"),
                        "head:",
                        "the table \"h.csv\" with a band"),
                bad(
                        "shape",
                        files -> files.with("head", "'h.tif'")
                                .file("h.tif", raster(3, 5).bytes()),
                        "h.tif, shape:",
                        "3 rows × 5 columns",
                        "3 rows × 4 columns"),
                bad(
                        "georeference",
                        files -> files.with("head", "'h.tif'")
                                .file("h.tif", raster(3, 4).at(5, 0, 10).bytes()),
                        "h.tif, georeference:",
                        "corner (5, 0)",
                        "corner (0, 0)"),
                bad(
                        "bands missing",
                        files -> files.with("head", "{'file': 'h.tif', 'band': 'instant'}")
                                .file("h.tif", raster(3, 4).bytes()),
                        "head:",
                        "with 1 band",
                        "at least 3 bands"),
                bad(
                        "one raster missing",
                        files -> files.with("head", "'h_{instant}.tif'")
                                .file("h_0.tif", raster(3, 4).bytes())
                                .file("h_2.tif", raster(3, 4).bytes()),
                        "h_1.tif",
                        "head:"),
                bad(
                        "truncated raster",
                        files -> files.with("head", "'h.tif'")
                                .file("h.tif", Arrays.copyOf(raster(3, 4).bytes(), 30)),
                        "h.tif"),
                bad("a text as raster", files -> files.with("head", "'h.tif'").file("h.tif", "no raster"), "h.tif"),
                bad(
                        "column unknown",
                        files -> files.with("head", "{'file': 'h.csv', 'column': 'heads'}")
                                .file("h.csv", "row,col,head\n1,1,9\n"),
                        "h.csv, line 1:",
                        "\"heads\"",
                        "\"head\""),
                bad(
                        "line twice",
                        files -> files.with("head", PROFILE).file("h.csv", "row,col,h\n1,1,9\n1,1,9\n"),
                        "h.csv, line 3"),
                bad(
                        "line beside the grid",
                        files -> files.with("head", PROFILE).file("h.csv", "row,col,h\n4,1,9\n"),
                        "h.csv, line 2"),
                bad(
                        "not a number",
                        files -> files.with("head", PROFILE).file("h.csv", "row,col,h\n1,1,wet\n"),
                        "h.csv, line 2, column \"h\"",
                        "wet"),
                bad(
                        "units twice",
                        files -> files.with("head", "{'file': 'h.csv', 'column': 'h', 'unit': 'ft'}")
                                .file("h.csv", "row,col,h [m]\n1,1,9\n"),
                        "h.csv",
                        "one of the two places"),
                bad(
                        "intervals for heads",
                        files -> files.with("head", PROFILE).file("h.csv", "row,col,interval,h\n1,1,1,9\n"),
                        "h.csv, line 1",
                        "\"instant\""),
                bad(
                        "layers crossing",
                        files -> files.with("layers", "[{'top': 10, 'bottom': 5}, {'bottom': 6}]"),
                        "layer 2, row",
                        "a top of 5.0 below a bottom of 6.0"),
                bad(
                        "layers apart",
                        files -> files.with("layers", "[{'top': 10, 'bottom': 5}, {'top': 4, 'bottom': 0}]"),
                        "layer 2, row",
                        "a top of 4.0 under a layer that ends at 5.0"),
                bad(
                        "well outside",
                        files -> files.with("sources", WELLS).file("wells.csv", "name,x,y,layer,rate\nW,41,5,1,-1\n"),
                        "wells.csv, line 2",
                        "outside the grid"),
                bad(
                        "well in an inactive cell",
                        files -> files.with("sources", WELLS)
                                .file("wells.csv", "name,x,y,layer,rate\nW,15,15,1,-1\n")
                                .with("flow/x", "{'file': 'q.csv'}")
                                .file("q.csv", "row,col,qx\n1,1,0\n2,3,0\n"),
                        "wells.csv, line 2",
                        "well \"W\"",
                        "layer 1, row 2, column 2"),
                bad(
                        "no storage coefficient",
                        files -> files.with("head", PROFILE)
                                .file("h.csv", "instant,h\n0,9\n1,8\n2,7\n")
                                .with("storage", "{'specific_yield': {'file': 'sy.csv'}, 'specific_storage': 0}")
                                .file("sy.csv", "row,col,sy\n1,1,0.2\n"),
                        "specific yield, layer 1, row",
                        "no value in an active cell"));
    }

    static Stream<Case> prisms() {
        return Stream.of(
                bad(
                        "beyond the grid",
                        files -> files.prism("block", "", TURNED_ROUND),
                        "prisms.geojson",
                        "block",
                        "25",
                        "--clip"),
                bad(
                        "name twice",
                        files -> files.prism("a", "", AquiferFiles.BLOCK).prism("a", "", AquiferFiles.BLOCK),
                        "prisms.geojson",
                        "\"a\""),
                bad("name outside", files -> files.prism("outside", "", AquiferFiles.BLOCK), "\"outside\""),
                bad("layer too deep", files -> files.prism("a", "'layers': [1, 3]", AquiferFiles.BLOCK), "layers", "3"),
                new Case("months without start_date", files -> {}, List.of("--every", "month"), List.of("start_date")),
                new Case(
                        "water years without start_date",
                        files -> {},
                        List.of("--every", "water-year"),
                        List.of("start_date")));
    }

    private static TinyTiff raster(int rows, int columns) {
        return new TinyTiff(rows, columns).band((row, column) -> 9);
    }

    @ParameterizedTest
    @MethodSource({"keys", "values", "data", "prisms"})
    void isToldInOneLine(Case given) {
        AquiferFiles files = new AquiferFiles(folder);
        given.change().accept(files);
        Ran ran = files.balance(given.options().toArray(String[]::new));
        assertThat(ran.err()).contains(given.words());
        assertThat(ran.status()).isEqualTo(3);
        assertThat(ran.err().lines()).hasSize(1);
        assertThat(ran.err())
                .matches("(?s).*: found .*; expected .*\\. [A-Z].*[.?]\\R")
                .doesNotContain("Exception", "org.");
        assertThat(ran.out()).isEmpty();
        assertThat(Files.exists(files.out())).isFalse();
        assertThat(files.left()).containsExactly("aquifer", "prisms.geojson");
    }
}
