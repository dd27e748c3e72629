package org.seepledger.cli;

import static org.assertj.core.api.Assertions.assertThat;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.Map;
import java.util.TreeMap;
import java.util.stream.Stream;
import javafx.scene.control.Label;
import javafx.scene.control.TextArea;
import javafx.scene.control.TextField;
import javafx.scene.input.KeyCode;
import org.junit.jupiter.api.AfterEach;
import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.seepledger.desktop.OpenWindow;
import org.seepledger.sample.SampleCopy;

/** What is handed over from the window is what the commands make that it shows, byte for byte. */
class HandoverTest {

    @TempDir
    private Path folder;

    private OpenWindow window;

    @BeforeEach
    void open() {
        window = new OpenWindow(1600, 1000);
    }

    @AfterEach
    void close() {
        window.close();
    }

    /** A copy whose name must be quoted. */
    private Path copied(String sample) throws IOException {
        Path set = folder.resolve(sample + " of Anna's");
        SampleCopy.of(sample, set);
        return set;
    }

    private void type(KeyCode... keys) {
        window.robot.press(keys).release(keys);
    }

    private void write(String field, String text) {
        TextField box = window.robot.lookup(field).queryAs(TextField.class);
        window.robot.interact(() -> box.setText(text));
    }

    private void click(String box) {
        window.robot.interact(() -> window.robot
                .lookup(box)
                .queryAs(javafx.scene.control.CheckBox.class)
                .fire());
    }

    private String shown(String area) {
        return window.robot.lookup(area).queryAs(TextArea.class).getText();
    }

    private void handOver(Path out) {
        write("#handover-out", out.toString());
        window.robot.clickOn("#handover-go");
        window.await(() -> window.robot
                        .lookup("#handover-done")
                        .match((Label label) ->
                                label.isVisible() && label.getText().contains(out.toString()))
                        .tryQuery()
                        .isPresent()
                || !window.robot
                        .lookup("#handover-fault")
                        .queryAs(Label.class)
                        .getText()
                        .isEmpty());
        assertThat(window.robot.lookup("#handover-fault").queryAs(Label.class).getText())
                .isEmpty();
    }

    /** Runs commands with their results put elsewhere, and holds them against what was handed over. */
    private void assertSame(Path out, String script) throws IOException {
        for (List<String> command : ShellWords.of(folder, script)) {
            int place = command.indexOf("--out") + 1;
            Path handed = Path.of(command.get(place));
            assertThat(handed.getParent()).isEqualTo(out);
            Path again = folder.resolve("again " + handed.getFileName());
            command.set(place, again.toString());
            Ran ran = Ran.of(command.toArray(String[]::new));
            assertThat(ran.status()).as(ran.err()).isZero();
            Map<String, String> made = contents(handed);
            assertThat(made).hasSizeGreaterThan(3).isEqualTo(contents(again));
        }
    }

    /** Files as texts, byte for byte; of the run record all but timings. */
    private static Map<String, String> contents(Path folder) throws IOException {
        Map<String, String> contents = new TreeMap<>();
        try (Stream<Path> files = Files.walk(folder)) {
            for (Path file : files.filter(Files::isRegularFile).toList()) {
                String name = folder.relativize(file).toString();
                String text = new String(Files.readAllBytes(file), java.nio.charset.StandardCharsets.ISO_8859_1);
                contents.put(name, name.equals("run.json") ? text.replaceAll("(?s)\"seconds\" : \\{.*?}", "") : text);
            }
        }
        return contents;
    }

    @Test
    void theFilesOfAnUnsavedDrawingAreThoseOfTheCommandsShown() throws IOException {
        Path set = copied("valley");
        window.openSet(set);
        window.settle();
        type(KeyCode.DELETE);
        type(KeyCode.CONTROL, KeyCode.E);
        write("#handover-rate", "L/s");
        write("#handover-title", "Anna's $valley `quoted` \"budget\"");
        write("#handover-date", "2024-02-29");
        window.choose("#handover-every", org.seepledger.balance.Periods.Every.MONTH);
        click("#handover-extract");
        click("#handover-sections");
        click("#handover-shown");
        Path out = folder.resolve("for the client");
        handOver(out);
        assertThat(out.resolve("prisms.geojson")).exists().content().doesNotContain("\"well field\"");
        assertThat(set.resolve("prisms.geojson")).content().contains("\"well field\"");
        try (Stream<Path> pictures = Files.list(out.resolve("pictures"))) {
            assertThat(pictures.map(file -> file.getFileName().toString()))
                    .contains(
                            "map north fields.svg",
                            "map north fields.png",
                            "section north fields.svg",
                            "map as shown.svg",
                            "map as shown.png");
        }
        window.robot.clickOn("#handover-open-report").clickOn("#handover-open-folder");
        assertThat(window.answers.opened).containsExactly(out.resolve("budget/report.html"), out);
        window.robot.clickOn("#handover-again");
        window.robot.clickOn("#handover-copy");
        assertThat(window.answers.copied.get(0)).isEqualTo(shown("#handover-commands"));
        assertSame(out, shown("#handover-commands"));
    }

    @Test
    void theFilesOfSolutesAreThoseOfTheCommandShown() throws IOException {
        Path set = copied("depot");
        window.openSet(set);
        window.settle();
        type(KeyCode.CONTROL, KeyCode.E);
        click("#handover-dispersion");
        write("#handover-above", "0.1 mg/L");
        write("#handover-massrate", "kg/yr");
        assertThat(shown("#handover-commands")).contains("--transects");
        click("#handover-water");
        Path out = folder.resolve("handed");
        handOver(out);
        assertSame(out, shown("#handover-commands"));
        window.robot.clickOn("#handover-open-report");
        assertThat(window.answers.opened).containsExactly(out.resolve("solutes/report.html"));
        assertThat(out.resolve("solutes/transect.csv")).exists();
        assertThat(shown("#handover-commands"))
                .doesNotContain("balance")
                .contains(set.toString().replace("'", "'\\''") + "/prisms.geojson");
    }
}
