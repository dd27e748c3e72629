package org.seepledger.cli;

import static org.assertj.core.api.Assertions.assertThat;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

/** What {@code inspect} tells of a set, and what it doubts. */
class InspectTest {

    @TempDir
    Path folder;

    private static String inspected(AquiferFiles files) {
        Ran ran = files.inspect();
        assertThat(ran.err()).isEmpty();
        assertThat(ran.status()).isZero();
        return ran.out();
    }

    private static String warnings(AquiferFiles files) {
        String text = inspected(files);
        String rest = text.substring(text.indexOf("\nWarnings\n") + 10);
        return rest.substring(0, rest.indexOf("\n\n"));
    }

    private AquiferFiles files() {
        return new AquiferFiles(folder);
    }

    @Test
    void tellsWhatTheSetIs() {
        String text = inspected(files().with("start_date", "'2021-10-01'")
                .with("vertical_datum", "'local'")
                .with("sources", "[{'category': 'recharge', 'kind': 'areal', 'rate': {'file': 'r.csv'}}]")
                .file("r.csv", "row,col,rate [mm/yr]\n1,1,365.25\n3,4,0\n"));
        assertThat(text)
                .contains("Aquifer \"Invented test\"")
                .contains("4 columns of 10, 3 rows of 10")
                .contains("2 intervals, 0 to 20 d, 2021-10-01 to 2021-10-21")
                .contains("vertical datum local")
                .contains("1  layer 1 (water table)", "2  layer 2\n")
                .containsPattern("recharge +m/d +0 +0\\.001000 +\\d+ +\\d+")
                .containsPattern("flow x +m/d +0\\.1000 +0\\.1000");
        assertThat(text).contains("How the set balances in itself");
    }

    @Test
    void aFileOfTheFolderLeadsToTheFolder() throws IOException {
        Path file = Files.writeString(folder.resolve("aquifer.json"), "{}");
        Ran ran = Ran.of("inspect", file.toString());
        assertThat(ran.status()).isEqualTo(3);
        assertThat(ran.err()).contains("found a file", "Did you mean \"" + folder + "\"?");
    }

    @Test
    void addsUpPointSourcesByCategory() {
        assertThat(inspected(files().with("sources", "[{'category': 'pumping', 'kind': 'points', 'file': 'w.csv'}]")
                        .file(
                                "w.csv",
                                "name,x,y,layer,from,to,rate\nP,5,5,1,0,20,-4\nQ,15,5,1,0,10,-2\nR,5,5,2,0,20,0\n")))
                .containsPattern(
                        "Point sources, mean rates over the record in m3/d\n +number +idle +least +greatest +all")
                .containsPattern("pumping +3 +1 +-4 +0 +-5");
    }

    @Test
    void hasNoDoubtsAboutAPlainSet() {
        assertThat(warnings(files().with("flow/z", "1e-3"))).isEqualTo("  none");
    }

    @Test
    void tellsOfScheduleLinesForTheSameTime() {
        assertThat(warnings(files().with("sources", "[{'category': 'pumping', 'kind': 'points', 'file': 'w.csv'}]")
                        .file("w.csv", "name,x,y,layer,from,to,rate\nP,5,5,1,0,12,-1\nP,5,5,1,10,20,-2\n")))
                .contains("w.csv, line 3: the well \"P\" has another line for the same time; their rates add.");
    }

    @Test
    void writesNothing() {
        inspected(files());
        assertThat(files().left()).containsExactly("aquifer", "prisms.geojson");
    }

    @ParameterizedTest
    @CsvSource(
            delimiter = '|',
            value = {
                "-9999 | 1 | -9999.0",
                "-999 | 1 | -999.0",
                "1e30 | 1 | E30",
                "-9999 | 0.001 | -9999 in mm",
            })
    void doubtsMarksForNoValue(float mark, double scale, String shown) {
        AquiferFiles files = files().with("head", "{'file': 'h.tif', 'unit': '" + (scale == 1 ? "m" : "mm") + "'}")
                .file(
                        "h.tif",
                        new TinyTiff(3, 4)
                                .band((row, column) -> row == 1 && column == 2 ? mark : 9)
                                .bytes());
        assertThat(warnings(files)).contains("\"head\"", shown, "row 2, column 3", "a mark for \"no value\"");
    }

    @Test
    void doubtsMarksInOtherUnits() {
        AquiferFiles files = files().with(
                        "sources", "[{'category': 'recharge', 'kind': 'areal', 'rate': {'file': 'r.csv'}}]")
                .file("r.csv", "row,col,rate [mm/yr]\n1,1,200\n2,2,-9999\n");
        assertThat(warnings(files)).contains("\"recharge\"", "-9999", "mm/yr", "row 2, column 2", "a mark");
    }

    @ParameterizedTest
    @CsvSource(
            delimiter = '|',
            value = {
                "flow/x | 150 | seepage velocity",
                "flow/x | {'value': 0.002, 'unit': 'm/s'} | seepage velocity",
                "flow/x | 0 | \"flow x\" is 0 everywhere",
                "storage | {'specific_yield': 20, 'specific_storage': 0} | Johnson 1967",
                "storage | {'specific_yield': 0.6, 'specific_storage': 0} | \"specific yield\" is 0.6000 at ",
                "storage | {'specific_yield': 0.2, 'specific_storage': 0.5} | \"specific storage\" is 0.5 1/m at ",
                "storage | {'specific_yield': 0.2, 'specific_storage': 1e-7} | Domenico 1972",
                "flow | {'kind': 'head_gradient', 'conductivity': 1e6, 'vertical_conductivity': 1} | Freeze and Cherry 1979",
                "sources | [{'category': 'rain', 'kind': 'areal', 'rate': 0.1}] | no climate brings so much",
                "sources | [{'category': 'Pumping', 'kind': 'areal', 'rate': 0.001}] | \"Pumping\" adds water in places",
                "sources | [{'category': 'evapotranspiration', 'kind': 'areal', 'rate': 0.001}] | check the sign",
                "layers | [{'top': 1e5, 'bottom': 5}, {'bottom': 0}] | check its unit",
                "solutes | [{'name': 'salt', 'porosity': 0.8}] | \"porosity of salt\" is 0.8000 at ",
                "solutes | [{'name': 'salt', 'porosity': [0.3, 0.75]}] | 0.0 to 0.7 (Freeze and Cherry 1979)",
                "solutes | [{'name': 'salt', 'porosity': 25}] | physically impossible",
                "solutes | [{'name': 'salt', 'porosity': -0.1}] | is -0.1000 at row 1, column 1: physically impossible",
                "solutes | [{'name': 's', 'effective_porosity': 1.2}] | \"effective porosity of s\" is 1.200 at ",
            })
    void doubtsWhatIsHardlyEverSo(String key, String value, String words) {
        assertThat(warnings(files().with(key, value))).contains(words);
    }

    @Test
    void doubtsAnEffectivePorosityGreaterThanTheTotalOne() {
        AquiferFiles files = files().with("flow/z", "1e-3")
                .with("solutes", "[{'name': 'salt', 'porosity': [0.3, 0.2], 'effective_porosity': {'file': 'e.csv'}}]")
                .file("e.csv", "row,col,e\n" + AquiferFiles.everywhere(3, 4, "0.1"));
        assertThat(warnings(files)).isEqualTo("  none");
        files.file("e.csv", ("row,col,e\n" + AquiferFiles.everywhere(3, 4, "0.1")).replace("2,3,0.1", "2,3,0.25"));
        assertThat(warnings(files))
                .contains(
                        "\"effective porosity of salt\" is greater than \"porosity of salt\", most by 0.05000 at layer 2,"
                                + " row 2, column 3");
    }

    /** All that formats.md documents of solutes may stand there; what is not documented may not. */
    @Test
    void takesTheKeysOfSolutes() {
        String whole =
                "[{'name': 'chloride', 'concentration': 5, 'unit': 'mg/L', 'detection_limit': 1, 'censored': false,"
                        + " 'porosity': 0.25, 'effective_porosity': 0.2, 'bulk_density': {'value': 1700, 'unit': 'kg/m3'},"
                        + " 'sorption': {'isotherm': 'linear', 'kd': 0.0, 'unit': 'L/kg'}, 'half_life': null,"
                        + " 'sorbed_half_life': null, 'parent': 'salt', 'yield': 0.5, 'boundary_concentration': 3,"
                        + " 'dispersion': {'longitudinal': 10, 'transverse': 1, 'vertical': 0.1, 'diffusion': 1e-4,"
                        + " 'tortuosity': 0.5}}, {'name': 'salt'}]";
        AquiferFiles files = files().with("flow/z", "1e-3").with("solutes", whole);
        assertThat(warnings(files)).isEqualTo("  none");
        assertThat(inspected(files))
                .containsPattern("porosity of chloride +1 +0\\.25 ")
                .containsPattern("effective porosity of chloride +1 +0\\.2000");
    }

    @ParameterizedTest
    @CsvSource(
            delimiter = '|',
            value = {
                "-3 | 12 of 12 values of \"head\" lie below the lowest layer's bottom, most by 3 m: -3 m at row 1, column 1.",
                "{'value': 9, 'unit': 'ft'} | none",
                "19 | none",
                "21 | values of \"head\" lie above the uppermost layer's top by more than all layers are thick, most by 11 m",
            })
    void doubtsHeadsInAnotherUnitOrDatum(String head, String words) {
        String warned = warnings(files().with("flow/z", "1e-3").with("head", head));
        assertThat(warned).contains(words);
    }

    @Test
    void tellsHowManyHeadsAreDoubted() {
        AquiferFiles files = files().with("flow/z", "1e-3")
                .with("head", "{'file': 'h.csv'}")
                .with("storage", "{'specific_yield': 0.1, 'specific_storage': 1e-5}");
        String heads = "row,col,instant,h\n1,1,0,9\n2,3,2,-8\n1,2,1,-1\n1,2,2,-2\n";
        assertThat(warnings(files.file("h.csv", heads)))
                .contains("3 of 4 values of \"head\" lie below", "most by 8 m: -8 m at row 2, column 3, instant 2.");
        assertThat(warnings(
                        files.file("h.csv", heads.replace("1,2,2,-2", "1,2,2,2").replace("1,2,1,-1", "1,2,1,1"))))
                .doesNotContain("lie below");
    }

    @Test
    void doubtsHeadsAboveConfinedLayersInNoWay() {
        AquiferFiles files = files().with("flow/z", "1e-3")
                .with("layers", "[{'top': 10, 'bottom': 5, 'water_table': false}, {'bottom': 0}]")
                .with("head", "400");
        assertThat(warnings(files)).isEqualTo("  none");
    }

    @Test
    void doubtsAnOpenTopBesideRecharge() {
        AquiferFiles files = files().with("flow/outer_faces", "{'top': 'open'}")
                .with("sources", "[{'category': 'recharge', 'kind': 'areal', 'rate': 0}]");
        assertThat(warnings(files)).contains("recharge may be counted twice");
        assertAtTheTop(files, "recharge may be counted twice");
    }

    @Test
    void doubtsFluxInAWaterTableLayerWithoutHeads() {
        AquiferFiles files = files().without("head");
        assertThat(warnings(files)).contains("No heads are given: the full thickness", "storage is not known");
        assertAtTheTop(files, "No heads are given: the full thickness");
        assertThat(warnings(files.with("layers", "[{'top': 10, 'bottom': 5, 'water_table': false}, {'bottom': 0}]")))
                .doesNotContain("full thickness");
    }

    @Test
    void doubtsSnapshots() {
        assertThat(warnings(files().with("flow/at", "'instant'"))).contains("snapshots");
    }

    @Test
    void tellsWhereGivenFacesDiffer() {
        AquiferFiles files = files().with("flow", "{'kind': 'face_flow', 'east': 1, 'north': 0, 'up': 0, 'west': 3}");
        assertThat(warnings(files)).contains("the greatest difference is 2", "east face of layer 1, row 1, column 1");
    }

    private static void assertAtTheTop(AquiferFiles files, String warning) {
        String report = files.balance().out();
        assertThat(report.indexOf(warning)).isBetween(0, report.indexOf("\nblock\n"));
    }
}
