package org.seepledger.desktop;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.io.IOException;
import java.nio.file.Path;
import java.util.List;
import javafx.geometry.Bounds;
import javafx.geometry.Point2D;
import javafx.scene.Node;
import javafx.scene.control.Label;
import javafx.scene.input.KeyCode;
import org.junit.jupiter.api.AfterEach;
import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.seepledger.desktop.map.Camera;
import org.seepledger.sample.SampleCopy;
import org.seepledger.sketch.Drawing;

/** Shapes made of others, by hand in the real window: split, merged, with islands and buffers. */
class ShapesWindowTest {

    @TempDir
    private Path folder;

    private OpenWindow window;

    @BeforeEach
    void open() throws IOException {
        SampleCopy.of("valley", folder);
        window = new OpenWindow(1600, 1000);
        window.openSet(folder);
        window.await(() -> window.assembly().map().values().scale().get().isPresent());
        window.settle();
    }

    @AfterEach
    void close() {
        window.close();
    }

    private Point2D at(double mapX, double mapY) {
        Node canvas = window.robot.lookup("#map-canvas").query();
        Bounds bounds = canvas.localToScreen(canvas.getBoundsInLocal());
        Camera camera = window.assembly().map().camera().get();
        return new Point2D(bounds.getMinX() + camera.x(mapX), bounds.getMinY() + camera.y(mapY));
    }

    private Drawing drawing() {
        return window.assembly().draft().drawing();
    }

    private String status() {
        return window.robot.lookup("#status").queryAs(Label.class).getText();
    }

    private List<String> names() {
        return drawing().shapes().stream().map(shape -> shape.name()).toList();
    }

    @Test
    void aPrismIsSplitByALineAndMergedAgainToTheSameArea() {
        Drawing first = drawing();
        window.robot.clickOn(at(500900, 5200600));
        assertThat(window.assembly().session().selected().get()).isEqualTo("south terrace");
        double area = drawing().shape("south terrace").area();
        window.robot.clickOn("#tool-split");
        window.robot.clickOn(at(500990, 5200140));
        window.robot.doubleClickOn(at(500960, 5201010));
        assertThat(drawing().shapes()).hasSize(first.shapes().size() + 1);
        List<String> parts = names().stream()
                .filter(name -> name.startsWith("south terrace"))
                .toList();
        assertThat(parts).hasSize(2);
        window.robot.clickOn(at(500700, 5200600));
        window.robot.clickOn("#tool-merge");
        window.robot.clickOn(at(501150, 5200600));
        assertThat(names().stream().filter(name -> name.startsWith("south terrace")))
                .hasSize(1);
        assertThat(window.assembly().draft().selected().orElseThrow().area()).isCloseTo(area, within(1e-6 * area));
        for (int step = 0; step < 2; step++) {
            window.robot.press(KeyCode.CONTROL, KeyCode.Z).release(KeyCode.Z, KeyCode.CONTROL);
        }
        assertThat(drawing()).isSameAs(first);
    }

    @Test
    void prismsThatDoNotTouchAreNotMergedAndTheReasonIsGiven() {
        Drawing first = drawing();
        window.robot.clickOn(at(500900, 5200600));
        window.robot.clickOn("#tool-merge");
        window.robot.clickOn(at(502700, 5201000));
        assertThat(drawing()).isSameAs(first);
        assertThat(status()).isNotBlank();
        window.robot.press(KeyCode.ESCAPE).release(KeyCode.ESCAPE);
        assertThat(drawing()).isSameAs(first);
    }

    @Test
    void anIslandThatLeavesThePrismIsRefusedAndStaysToBeMended() {
        Drawing first = drawing();
        window.robot.clickOn(at(500900, 5200600));
        window.robot.clickOn("#tool-island");
        window.robot.clickOn(at(500800, 5200500));
        window.robot.clickOn(at(501000, 5200500));
        window.robot.clickOn(at(502800, 5202300));
        window.robot.press(KeyCode.ENTER).release(KeyCode.ENTER);
        assertThat(drawing()).isSameAs(first);
        assertThat(status()).isNotBlank();
        window.robot.press(KeyCode.BACK_SPACE).release(KeyCode.BACK_SPACE);
        window.robot.clickOn(at(500900, 5200700));
        window.robot.press(KeyCode.ENTER).release(KeyCode.ENTER);
        assertThat(drawing().shape("south terrace").parts().get(0).islands()).hasSize(1);
    }

    @Test
    void aBufferIsTypedIntoTheCard() {
        window.robot.press(KeyCode.F8).release(KeyCode.F8);
        window.robot.clickOn("#card-buffer").write("40");
        window.robot.press(KeyCode.ENTER).release(KeyCode.ENTER);
        assertThat(names()).contains("well field buffer");
        assertThat(window.assembly().session().selected().get()).isEqualTo("well field buffer");
    }

    @Test
    void aFolderDroppedOnTheOpenWindowOpensAfterUnsavedPrismsWereAskedAbout() {
        window.robot.interact(
                () -> window.assembly().draft().step("step.delete", drawing -> drawing.without("well field")));
        window.answers.answers.add(java.util.Optional.of(2));
        drop("#map", Path.of("sample-aquifers/terrace"));
        window.await(() -> window.answers.asked.stream().anyMatch(question -> question.contains("have changed")));
        assertThat(window.assembly().session().set().get().orElseThrow().path()).isEqualTo(folder);
        window.answers.answers.add(java.util.Optional.of(1));
        drop("#map", Path.of("sample-aquifers/terrace"));
        window.await(() ->
                window.assembly().session().set().get().orElseThrow().path().endsWith("terrace"));
    }

    @Test
    void aFolderDroppedOnTheFirstPageOpens() {
        window.robot.press(KeyCode.CONTROL, KeyCode.HOME).release(KeyCode.HOME, KeyCode.CONTROL);
        drop("#welcome", Path.of("sample-aquifers/terrace"));
        window.await(() ->
                window.assembly().session().set().get().orElseThrow().path().endsWith("terrace"));
    }

    private void drop(String pane, Path dropped) {
        window.robot.interact(
                () -> DraggedFolder.dropOn(window.robot.lookup(pane).query(), dropped));
    }
}
