package org.seepledger.job;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;

import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.Optional;
import java.util.TreeMap;
import java.util.stream.Collectors;
import java.util.stream.Stream;
import org.junit.jupiter.api.AfterEach;
import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.seepledger.fault.UsageFault;
import org.seepledger.progress.Cancelled;
import org.seepledger.progress.Progress;
import org.seepledger.sketch.Drawing;

/** A folder that is handed over appears whole or not at all. */
class HandoverJobTest {

    @TempDir
    private Path folder;

    private Path out;
    private Path set;
    private Workbench bench;
    private Drawing drawing;

    @BeforeEach
    void open() throws IOException {
        set = folder.resolve("set");
        SmallSets.heads(set);
        out = folder.resolve("deep/out");
        bench = Workbench.open(set);
        drawing = bench.drawings().drawing(set.resolve("prisms.geojson")).drawing();
    }

    @AfterEach
    void close() {
        bench.close();
    }

    private HandoverRequest request(Path prisms, boolean overwrite) {
        return new HandoverRequest(
                drawing,
                prisms,
                out,
                overwrite,
                Optional.of(Requests.byInterval(set, prisms, out.resolve("budget"))),
                Optional.empty(),
                Optional.of(new ExtractRequest(set, prisms, out.resolve("extract"), true, false)),
                new HandoverRequest.Pictures(true, true, List.of(), true, true));
    }

    private HandoverOutcome handOver(Path prisms, boolean overwrite) {
        return HandoverJob.run(
                bench,
                request(prisms, overwrite),
                picture -> picture.title().getBytes(StandardCharsets.UTF_8),
                Progress.NONE);
    }

    /** All files below a folder with what they hold. */
    private static TreeMap<String, String> files(Path folder) throws IOException {
        try (Stream<Path> files = Files.walk(folder)) {
            return files.collect(Collectors.toMap(
                    file -> folder.relativize(file).toString(), HandoverJobTest::text, (a, b) -> a, TreeMap::new));
        }
    }

    private static String text(Path file) {
        try {
            return Files.isDirectory(file)
                    ? "folder"
                    : new String(Files.readAllBytes(file), StandardCharsets.ISO_8859_1);
        } catch (IOException e) {
            throw new java.io.UncheckedIOException(e);
        }
    }

    @Test
    void holdsWhatWasWantedAndPrismsThatCanBeReadThere() throws IOException {
        HandoverOutcome outcome = handOver(set.resolve("prisms.geojson"), false);
        assertThat(outcome.files())
                .contains(
                        "budget/report.html",
                        "extract/aquifer.json",
                        "pictures/map a-b.svg",
                        "pictures/section a-b.png",
                        "prisms.geojson",
                        "run.json",
                        "surfaces/lid.tif");
        assertThat(files(out).keySet()).containsAll(outcome.files());
        assertThat(bench.drawings().drawing(out.resolve("prisms.geojson")).drawing())
                .isEqualTo(drawing);
        assertThat(out.resolve("pictures/map a-b.svg"))
                .content()
                .contains("Map of a/b with the flow through its faces", "determination of compliance", "local coordin");
        assertThat(outcome.report().orElseThrow()).exists();
    }

    @Test
    void theFolderOfPrismsThatAreNotSavedIsReadFromItsOwn() throws IOException {
        handOver(HandoverRequest.ownPrisms(out), false);
        Path again = folder.resolve("again");
        BalanceJob.run(Requests.byInterval(set, out.resolve("prisms.geojson"), again), Progress.NONE);
        assertThat(again.resolve("budget.csv")).hasSameBinaryContentAs(out.resolve("budget/budget.csv"));
        assertThat(again.resolve("report.html")).hasSameBinaryContentAs(out.resolve("budget/report.html"));
    }

    /** Wherever the work is stopped, all is as it was. */
    @Test
    void whatIsStoppedLeavesNothing() throws IOException {
        TreeMap<String, String> before = files(folder);
        int steps = 0;
        for (Stopping progress = new Stopping(0); !stops(progress, HandoverRequest.ownPrisms(out)); steps++) {
            assertThat(files(folder)).isEqualTo(before);
            progress = new Stopping(steps + 1);
        }
        assertThat(steps).isGreaterThan(20);
        assertThat(out.resolve("run.json")).exists();
    }

    @Test
    void whatIsStoppedLeavesAnEarlierOneAsItWas() throws IOException {
        handOver(HandoverRequest.ownPrisms(out), false);
        TreeMap<String, String> before = files(folder);
        drawing = drawing.without(drawing.shapes().get(0).name());
        for (int step = 0; step < 30; step += 7) {
            assertThat(stops(new Stopping(step), HandoverRequest.ownPrisms(out)))
                    .isFalse();
            assertThat(files(folder)).isEqualTo(before);
        }
    }

    private boolean stops(Stopping progress, Path prisms) {
        try {
            boolean overwrite = Files.exists(out);
            HandoverJob.run(bench, request(prisms, overwrite), picture -> new byte[0], progress);
            return true;
        } catch (Cancelled stopped) {
            return false;
        }
    }

    @Test
    void anEarlierOneIsReplacedOnlyIfThatIsAskedFor() throws IOException {
        handOver(set.resolve("prisms.geojson"), false);
        assertThatThrownBy(() -> handOver(set.resolve("prisms.geojson"), false))
                .isInstanceOf(UsageFault.class)
                .hasMessageContaining("--overwrite");
        assertThatThrownBy(() -> HandoverJob.mustBeUsable(out, false)).isInstanceOf(UsageFault.class);
        HandoverJob.mustBeUsable(out, true);
        Files.writeString(out.resolve("mine.txt"), "mine");
        handOver(HandoverRequest.ownPrisms(out), true);
        assertThat(out.resolve("mine.txt")).hasContent("mine");
        assertThat(files(folder).keySet()).noneMatch(name -> name.contains("-before-") || name.contains("-building-"));
    }

    @Test
    void aFileOfPrismsThatWasChangedMeanwhileIsNotHandedOverForTheDrawing() throws IOException {
        drawing = drawing.without(drawing.shapes().get(0).name());
        assertThatThrownBy(() -> handOver(set.resolve("prisms.geojson"), false))
                .isInstanceOf(UsageFault.class)
                .hasMessageContaining("Save the drawing");
        assertThat(folder.resolve("deep")).doesNotExist();
    }

    /** Stops after some steps. */
    private static final class Stopping implements Progress {

        private int left;

        Stopping(int steps) {
            this.left = steps;
        }

        @Override
        public void begin(String what, long steps) {
            step();
        }

        @Override
        public synchronized void step() {
            if (left-- <= 0) {
                throw new Cancelled();
            }
        }
    }
}
