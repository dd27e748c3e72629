package org.seepledger.job;

import static org.assertj.core.api.Assertions.assertThat;
import static org.junit.jupiter.api.Assumptions.assumeTrue;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import org.junit.jupiter.api.BeforeAll;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.seepledger.intake.Composition;
import org.seepledger.intake.Item;
import org.seepledger.intake.LooseValley;
import org.seepledger.intake.Means;
import org.seepledger.intake.Plan;
import org.seepledger.intake.Proposal;
import org.seepledger.intake.Wishes;
import org.seepledger.progress.Progress;

/** The valley as GDAL writes it, in other layouts, goes through the assistant to the same budget; skipped without GDAL. */
class GdalIntakeTest {

    private static final Path VALLEY = Path.of("sample-aquifers/valley");

    @TempDir
    private Path folder;

    @BeforeAll
    static void needsGdal() throws InterruptedException {
        boolean installed = false;
        try {
            installed = new ProcessBuilder("gdalinfo", "--version").start().waitFor() == 0;
        } catch (IOException e) {
            // Not installed.
        }
        assumeTrue(installed, "GDAL is not on the path");
    }

    private static void run(List<String> command) throws IOException, InterruptedException {
        Process process = new ProcessBuilder(command)
                .redirectErrorStream(true)
                .redirectOutput(ProcessBuilder.Redirect.DISCARD)
                .start();
        assertThat(process.waitFor()).as(String.join(" ", command)).isZero();
    }

    /** Packs rasters into one, a band for each, with a number for no value. */
    private void pack(List<String> names, String to, String... options) throws IOException, InterruptedException {
        Path target = folder.resolve("loose").resolve(to);
        Files.createDirectories(target.getParent());
        Path stack = folder.resolve("stack.vrt");
        List<String> build =
                new ArrayList<>(List.of("gdalbuildvrt", "-q", "-overwrite", "-separate", stack.toString()));
        names.forEach(name -> build.add(VALLEY.resolve(name).toAbsolutePath().toString()));
        run(build);
        List<String> translate = new ArrayList<>(List.of("gdalwarp", "-q", "-ot", "Float64", "-dstnodata", "-9999"));
        for (String option : options) {
            translate.addAll(List.of("-co", option));
        }
        translate.addAll(List.of(stack.toString(), target.toString()));
        run(translate);
    }

    private static List<String> counted(String pattern, int first, int last) {
        List<String> names = new ArrayList<>();
        for (int i = first; i <= last; i++) {
            names.add(pattern.formatted(i));
        }
        return names;
    }

    @Test
    void theValleyInBandsAsGdalWritesThemGivesTheSameBudget() throws IOException, InterruptedException {
        pack(counted("head_l1_%d.tif", 0, 24), "heads_layer1.tif", "COMPRESS=LZW", "TILED=YES", "PREDICTOR=3");
        pack(counted("head_l2_%d.tif", 0, 24), "heads_layer2.tif", "COMPRESS=DEFLATE", "INTERLEAVE=BAND");
        pack(counted("head_l3_%d.tif", 0, 24), "heads_layer3.tif", "COMPRESS=ZSTD", "ENDIANNESS=BIG", "BIGTIFF=YES");
        pack(counted("conductivity_l%d.tif", 1, 3), "hydraulic conductivity.tif", "COMPRESS=PACKBITS");
        pack(counted("recharge_%d.tif", 1, 24), "recharge.tif", "INTERLEAVE=PIXEL", "COMPRESS=LZW");
        pack(List.of("loam_base.tif", "gravel_base.tif", "clay_base.tif", "rock.tif"), "surfaces.tif");
        pack(List.of("specific_yield.tif"), "specific yield.tif");
        Path loose = folder.resolve("loose");
        Files.copy(VALLEY.resolve("river.csv"), loose.resolve("river exchange.csv"));
        Files.copy(VALLEY.resolve("wells.csv"), loose.resolve("wells.csv"));
        Plan plan = LooseValley.corrected(Proposal.of(IntakeJob.look(List.of(loose), Progress.NONE)));
        plan = plan.with(plan.wishes().with(Wishes.Topic.TIMES, "monthly").with(Wishes.Topic.START, "2021-10-01"));
        Path target = folder.resolve("made");
        Composition composition = Composition.of(plan, false);
        assertThat(plan.items())
                .filteredOn(Item.Rasters.class::isInstance)
                .extracting(item -> ((Item.Rasters) item).bands())
                .contains(Means.LAYER, Means.TIME);
        assertThat(composition.findings()).isEmpty();
        IntakeJob.write(composition, target, 2, Progress.NONE);
        assertThat(budget(target)).isEqualTo(budget(VALLEY));
    }

    private List<String> budget(Path set) throws IOException {
        Path out = folder.resolve("budget of " + set.getFileName());
        BalanceJob.run(Requests.byInterval(set, VALLEY.resolve("prisms.geojson"), out), Progress.NONE);
        return Rows.text(out.resolve("budget.csv"));
    }

    @Test
    void descriptionsOfBandsSayWhatTheyAre() throws IOException, InterruptedException {
        List<String> described = List.of("ground surface", "base of gravel", "hydraulic conductivity", "head");
        List<String> names = List.of("loam_base.tif", "rock.tif", "conductivity_l1.tif", "head_l1_0.tif");
        Path stack = folder.resolve("stack.vrt");
        List<String> build = new ArrayList<>(List.of("gdalbuildvrt", "-q", "-separate", stack.toString()));
        names.forEach(name -> build.add(VALLEY.resolve(name).toAbsolutePath().toString()));
        run(build);
        String vrt = Files.readString(stack);
        for (int band = 1; band <= described.size(); band++) {
            String begin = "band=\"" + band + "\">";
            vrt = vrt.replace(begin, begin + "<Description>" + described.get(band - 1) + "</Description>");
        }
        Files.writeString(stack, vrt);
        Path loose = Files.createDirectories(folder.resolve("loose"));
        run(List.of(
                "gdal_translate",
                "-q",
                stack.toString(),
                loose.resolve("all.tif").toString()));
        Plan plan = Proposal.of(IntakeJob.look(List.of(loose), Progress.NONE));
        assertThat(plan.items().get(0).uses())
                .extracting(use -> use.role().name())
                .containsExactly("TOP", "BOTTOM", "CONDUCTIVITY", "HEAD");
        Composition composition = Composition.of(plan, false);
        assertThat(composition.isSound()).isTrue();
        assertThat(IntakeJob.check(composition, 2, Progress.NONE).text()).contains("heads and hydraulic conductivity");
    }
}
