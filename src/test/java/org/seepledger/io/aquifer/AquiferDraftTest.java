package org.seepledger.io.aquifer;

import static org.assertj.core.api.Assertions.assertThat;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.seepledger.fault.DataFault;

class AquiferDraftTest {

    private static final String SOUND = """
            {
              "length_unit": "m",
              "time_unit": "d",
              "grid": {"x": {"from": 0, "step": 10, "count": 3}, "y": {"from": 0, "step": 10, "count": 3}},
              "layers": [{"top": 5, "bottom": 0}, {"bottom": "base.tif"}],
              "times": [0, 1],
              "flow": {"kind": "darcy_flux", "x": "qx_l{layer}_{interval}.tif", "y": 0}
            }
            """;

    @TempDir
    private Path folder;

    private List<DataFault> faults(String text) throws IOException {
        return new AquiferDraft(text).faults(Files.writeString(folder.resolve("aquifer.json"), text));
    }

    private static String at(String text, DataFault fault) {
        AquiferDraft.Stretch stretch = new AquiferDraft(text).of(fault).orElseThrow();
        return text.substring(stretch.from(), stretch.to());
    }

    private static DataFault fault(String file, String place) {
        return new DataFault(file, place, "x", "y", "Do z.");
    }

    @Test
    void aSoundTextHasNoFaults() throws IOException {
        assertThat(faults(SOUND)).isEmpty();
    }

    @Test
    void allFaultsAreFoundAndEachLeadsToItsPlace() throws IOException {
        String text = SOUND.replace("\"bottom\": 0", "\"bottom\": true")
                .replace("darcy_flux", "dracy_flux")
                .replace("\"count\": 3}}", "\"count\": 0}}")
                .replace("\"times\": [0, 1]", "\"times\": [0]");
        List<DataFault> faults = faults(text);
        assertThat(faults)
                .extracting(fault -> at(text, fault))
                .containsExactlyInAnyOrder("true", "0", "[0]", "\"dracy_flux\"");
    }

    @Test
    void anUnknownKeyLeadsToWhatHoldsIt() throws IOException {
        String text = SOUND.replace("\"top\"", "\"tpo\"");
        assertThat(at(text, faults(text).get(0))).isEqualTo("{\"tpo\": 5, \"bottom\": 0}");
    }

    @Test
    void aFaultOfTheTextItselfLeadsToItsLine() throws IOException {
        String text = SOUND.replace("\"time_unit\": \"d\",", "\"time_unit\": \"d\"");
        DataFault fault = faults(text).get(0);
        int line = (int)
                text.substring(0, new AquiferDraft(text).of(fault).orElseThrow().to())
                        .lines()
                        .count();
        assertThat(line).isBetween(3, 4);
    }

    @Test
    void aFaultOfAFileLeadsToTheNameOfTheFile() {
        assertThat(at(SOUND, fault("base.tif", "band 1"))).isEqualTo("base.tif");
        assertThat(at(SOUND, fault("qx_l2_13.tif", ""))).isEqualTo("qx_l{layer}_{interval}.tif");
        assertThat(new AquiferDraft(SOUND).of(fault("other.tif", ""))).isEmpty();
    }

    @Test
    void aPlaceThatIsNotThereLeadsToTheNearestAboveIt() {
        assertThat(at(SOUND, fault("aquifer.json", "layers, entry 2, top"))).isEqualTo("{\"bottom\": \"base.tif\"}");
        assertThat(at(SOUND, fault("aquifer.json", "grid.x.step"))).isEqualTo("10");
    }
}
