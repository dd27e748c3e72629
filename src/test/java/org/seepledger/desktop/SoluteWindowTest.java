package org.seepledger.desktop;

import static org.assertj.core.api.Assertions.assertThat;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.Optional;
import javafx.scene.Node;
import javafx.scene.input.KeyCode;
import javafx.scene.input.MouseButton;
import org.junit.jupiter.api.AfterEach;
import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.seepledger.balance.Periods;
import org.seepledger.desktop.ledger.Arrangement;
import org.seepledger.desktop.session.Opening;
import org.seepledger.job.PlumeJob;
import org.seepledger.job.Requests;
import org.seepledger.progress.Progress;
import org.seepledger.sample.SampleCopy;
import org.seepledger.sketch.ControlLine;
import org.seepledger.sketch.Place;
import org.seepledger.sketch.RingAt;

/** Looks at solutes over the sample, with the mouse and keyboard of the real window. */
class SoluteWindowTest {

    @TempDir
    private Path folder;

    private OpenWindow window;

    @BeforeEach
    void open() throws IOException {
        SampleCopy.of("depot", folder);
        window = new OpenWindow(1600, 1000);
        show(folder);
    }

    private void show(Path set) {
        window.openSet(set);
        window.await(() -> window.assembly().map().values().scale().get().isPresent());
        window.settle();
    }

    @AfterEach
    void close() {
        window.close();
    }

    private boolean isThere(String selector) {
        return window.robot.lookup(selector).queryAll().stream().anyMatch(SoluteWindowTest::isSeen);
    }

    private static boolean isSeen(Node node) {
        return node.isVisible() && (node.getParent() == null || isSeen(node.getParent()));
    }

    private void drag(double fromX, double fromY, double toX, double toY) {
        window.robot
                .drag(window.onMap(fromX, fromY), MouseButton.PRIMARY)
                .moveTo(window.onMap(toX, toY))
                .drop();
    }

    private Path exported(KeyCode... keys) {
        Path file = folder.resolve("exported" + keys.length + keys[keys.length - 1] + ".geojson");
        window.answers.paths.add(Optional.of(file));
        window.type(keys);
        window.await(() -> Files.exists(file));
        return file;
    }

    @Test
    void afterADragTheLedgerIsTheCommandsTableForTheExportedPrisms() throws IOException {
        window.choose("#subject", "solvent");
        window.choose("#ledger-arrangement", Arrangement.ITEMS_BY_LAYER);
        window.robot.clickOn("#ledger-amounts").type(KeyCode.DOWN).type(KeyCode.ENTER);
        drag(120, 110, 133, 101);
        window.settle();
        assertThat(window.assembly()
                        .draft()
                        .drawing()
                        .outline(RingAt.outer("yard"))
                        .place(2)
                        .x())
                .isGreaterThan(128);
        window.robot.clickOn("#ledger-copy");
        Path prisms = exported(KeyCode.CONTROL, KeyCode.SHIFT, KeyCode.S);
        assertThat(copied())
                .hasSizeGreaterThan(15)
                .containsExactlyInAnyOrderElementsOf(ofCommand(prisms, "plume.csv", 21, "yard", 13, 14, 15, 18, 20));
    }

    private List<String> copied() {
        return window.answers
                .copied
                .get(window.answers.copied.size() - 2)
                .lines()
                .map(line -> line.split("\t", -1))
                .filter(cells -> cells.length == 7 && cells[6].equals("kg"))
                .filter(cells -> !cells[0].equals("both together"))
                .map(cells -> String.join(" ", List.of(cells).subList(1, 6)).strip())
                .toList();
    }

    private List<String> ofCommand(Path prisms, String table, int columns, String of, int... numbers)
            throws IOException {
        Path out = folder.resolve("out");
        Optional<Path> transects = Optional.of(prisms).filter(file -> table.equals("transect.csv"));
        Path drawn = transects.isPresent() ? folder.resolve("prisms.geojson") : prisms;
        PlumeJob.run(Requests.plume(folder, drawn, out, Periods.Every.INTERVAL, false, transects), Progress.NONE);
        return Files.readAllLines(out.resolve(table)).stream()
                .map(line -> line.split(",", -1))
                .filter(cells -> cells.length == columns && cells[0].equals(of) && cells[1].equals("solvent"))
                .filter(cells ->
                        cells[2].equals("interval 1") && !List.of(cells).contains("%"))
                .map(cells -> {
                    StringBuilder row = new StringBuilder();
                    for (int number : numbers) {
                        row.append(cells[number]).append(' ');
                    }
                    return row.toString().strip();
                })
                .toList();
    }

    @Test
    void aTransectDrawnByHandIsTheCommandsTableForTheExportedOnes() throws IOException {
        window.type(KeyCode.D);
        window.robot.clickOn(window.onMap(63, 25));
        window.robot.clickOn(window.onMap(71, 58));
        window.robot.doubleClickOn(window.onMap(60, 97));
        assertThat(window.assembly().session().transect().get()).isEqualTo("transect");
        assertThat(line().places()).hasSize(3);
        window.robot.clickOn("#folio-transects");
        window.choose("#subject", "solvent");
        Place middle = line().places().get(1);
        drag(middle.x(), middle.y(), 78, 52);
        window.settle();
        window.robot.clickOn("#transect-copy");
        Path lines = exported(KeyCode.CONTROL, KeyCode.SHIFT, KeyCode.L);
        List<String> rows = window.answers
                .copied
                .get(window.answers.copied.size() - 2)
                .lines()
                .map(line -> line.split("\t", -1))
                .filter(cells -> cells.length == 10 && (cells[0].startsWith("segment") || cells[0].equals("all")))
                .map(cells -> String.join(" ", List.of(cells[8], cells[9], cells[2], cells[6], cells[7], cells[5])))
                .toList();
        assertThat(rows).hasSize(3).isEqualTo(ofCommand(lines, "transect.csv", 23, "transect", 9, 10, 11, 13, 14, 15));
    }

    private ControlLine line() {
        return window.assembly().draft().drawing().line("transect").orElseThrow();
    }

    @Test
    void aTransectIsUndoneAndThereAgainAfterTheProgramWasKilled() {
        assertThat(window.assembly().draft().drawing().lines())
                .extracting(ControlLine::name)
                .containsExactly("fence", "brook");
        drag(96, 62, 104, 58);
        ControlLine moved = window.assembly().draft().drawing().line("fence").orElseThrow();
        assertThat(moved.places().get(1).x()).isGreaterThan(100);
        window.type(KeyCode.CONTROL, KeyCode.Z);
        assertThat(window.assembly()
                        .draft()
                        .drawing()
                        .line("fence")
                        .orElseThrow()
                        .places()
                        .get(1)
                        .x())
                .isEqualTo(96);
        window.type(KeyCode.CONTROL, KeyCode.SHIFT, KeyCode.Z);
        window.await(() -> Files.exists(folder.resolve(Opening.UNSAVED_TRANSECTS)));
        window.settle();
        window.close();
        window = new OpenWindow(1600, 1000);
        show(folder);
        assertThat(window.assembly().draft().drawing().line("fence")).contains(moved);
        window.type(KeyCode.CONTROL, KeyCode.S);
        window.await(() -> !Files.exists(folder.resolve(Opening.UNSAVED_TRANSECTS)));
        assertThat(window.assembly().draft().isUnsaved()).isFalse();
    }

    @Test
    void aSetWithoutSolutesShowsNoneOfIt() {
        List<String> all = List.of("#subject", "#folio-transects", "#tool-transect");
        assertThat(all).allMatch(this::isThere);
        window.robot.clickOn("#folio-transects");
        show(Path.of("sample-aquifers/terrace"));
        assertThat(all).noneMatch(this::isThere);
        assertThat(isThere("#ledger-table")).isTrue();
        window.type(KeyCode.D);
        assertThat(window.assembly().draft().tool().get()).isEqualTo(org.seepledger.desktop.draw.Tool.SELECT);
    }
}
