package org.seepledger.job;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.nio.file.StandardCopyOption;
import java.util.List;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.seepledger.fault.UsageFault;
import org.seepledger.progress.Progress;

/** An extract gives the same budget as the whole, to the last digit. */
class ExtractJobTest {

    @TempDir
    private Path folder;

    private final Path sample = Path.of("sample-aquifers/terrace");

    @Test
    void givesTheSamplesBudget() throws IOException {
        assertSameBudget(sample);
        List<String> whole = Rows.text(sample.resolve("flux.csv"));
        List<String> kept = Rows.text(folder.resolve("extract/flux.csv"));
        assertThat(kept.size()).isLessThan(whole.size() / 2);
        assertThat(whole.containsAll(kept)).isTrue();
    }

    @Test
    void givesTheBudgetOfHeadsAndStorage() throws IOException {
        SmallSets.heads(folder.resolve("set"));
        assertSameBudget(folder.resolve("set"));
        assertThat(folder.resolve("extract/surfaces/lid.tif")).exists();
        assertThat(folder.resolve("extract/wells.csv")).content().contains("far", "near", "deep");
        assertThat(folder.resolve("extract/drain.csv"))
                .content()
                .startsWith("# where ditches run")
                .doesNotContain("1,11");
    }

    @Test
    void givesTheBudgetOfFluxAtOpenFaces() throws IOException {
        SmallSets.flux(folder.resolve("set"));
        assertSameBudget(folder.resolve("set"));
    }

    @Test
    void givesTheBudgetOfFaceFlows() throws IOException {
        SmallSets.faces(folder.resolve("set"));
        assertSameBudget(folder.resolve("set"));
        assertThat(Rows.of(folder.resolve("extract/faces.csv")))
                .hasSizeLessThan(Rows.of(folder.resolve("set/faces.csv")).size());
    }

    /** What is read of solutes goes along, with its files, values below a limit as they are written. */
    @Test
    void keepsSolutes() throws IOException {
        Path set = folder.resolve("set");
        SmallSets.heads(set);
        Files.writeString(set.resolve("pores.csv"), "layer,n\n1,0.3\n2,0.2\n");
        Path description = set.resolve("aquifer.json");
        String solutes = "{\"solutes\": [{\"name\": \"salt\", \"porosity\": {\"file\": \"pores.csv\"},"
                + " \"concentration\": {\"file\": \"salt.csv\"}, \"unit\": \"mg/L\"}], ";
        Files.writeString(set.resolve("salt.csv"), "instant,c\n0,5\n1,<2\n");
        Files.writeString(description, Files.readString(description).replaceFirst("\\{", solutes));
        assertSameBudget(set);
        assertThat(folder.resolve("extract/pores.csv")).exists();
        assertThat(folder.resolve("extract/aquifer.json")).content().contains("salt", "pores.csv", "mg/L");
        assertThat(folder.resolve("extract/salt.csv")).content().contains("1,<2");
    }

    @Test
    void replacesAnEarlierExtractAlone() throws IOException {
        SmallSets.heads(folder.resolve("set"));
        Path extract = extract(folder.resolve("set"), false);
        assertThatThrownBy(() -> extract(folder.resolve("set"), false)).isInstanceOf(UsageFault.class);
        extract(folder.resolve("set"), true);
        Files.writeString(extract.resolve("surfaces/lid.tif"), "mine");
        assertThatThrownBy(() -> extract(folder.resolve("set"), true)).isInstanceOf(UsageFault.class);
        assertThat(extract.resolve("surfaces/lid.tif")).hasContent("mine");
    }

    @Test
    void keepsPrismsApartWhoseSurfacesHaveNamesOfTheSets() throws IOException {
        SmallSets.heads(folder.resolve("set"));
        SmallSets.heads(folder.resolve("drawn"));
        Files.copy(
                folder.resolve("set/surfaces/lid.tif"),
                folder.resolve("drawn/ground.tif"),
                StandardCopyOption.REPLACE_EXISTING);
        Path prisms = folder.resolve("drawn/prisms.geojson");
        Files.writeString(prisms, Files.readString(prisms).replace("surfaces/lid.tif", "ground.tif"));
        Path out = folder.resolve("extract");
        ExtractJob.run(new ExtractRequest(folder.resolve("set"), prisms, out, true, false), Progress.NONE);
        assertThat(out.resolve("prisms/ground.tif")).exists();
        assertThat(budget(out, out.resolve("prisms/prisms.geojson"), "after"))
                .isEqualTo(budget(folder.resolve("set"), prisms, "before"));
    }

    private void assertSameBudget(Path set) throws IOException {
        Path extract = extract(set, false);
        List<String> before = budget(set, set.resolve("prisms.geojson"), "before");
        List<String> after = budget(extract, extract.resolve("prisms.geojson"), "after");
        assertThat(before).hasSizeGreaterThan(20);
        assertThat(after).isEqualTo(before);
    }

    private Path extract(Path set, boolean overwrite) throws IOException {
        Path out = folder.resolve("extract");
        ExtractJob.run(new ExtractRequest(set, set.resolve("prisms.geojson"), out, true, overwrite), Progress.NONE);
        return out;
    }

    private List<String> budget(Path set, Path prisms, String name) throws IOException {
        Path out = folder.resolve(name);
        BalanceJob.run(Requests.byInterval(set, prisms, out), Progress.NONE);
        return Rows.text(out.resolve("budget.csv"));
    }
}
