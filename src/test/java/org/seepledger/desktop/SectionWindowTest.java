package org.seepledger.desktop;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.Optional;
import javafx.geometry.Point2D;
import javafx.scene.Node;
import javafx.scene.control.Label;
import javafx.scene.input.KeyCode;
import javafx.scene.input.MouseButton;
import org.junit.jupiter.api.AfterEach;
import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.seepledger.desktop.ledger.Arrangement;
import org.seepledger.picture.Body;
import org.seepledger.picture.Section;
import org.seepledger.picture.SectionFrame;
import org.seepledger.sample.SampleCopy;
import org.seepledger.sketch.Drawing;
import org.seepledger.sketch.Lid;
import org.seepledger.sketch.Limit;
import org.seepledger.sketch.Reach;

/** Draws a section over the sample and moves lids in it, with the mouse and keyboard of the real window. */
class SectionWindowTest {

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

    private Section section() {
        return window.assembly().session().section().get().orElseThrow();
    }

    private SectionFrame frame() {
        return window.assembly().section().frame().get().orElseThrow();
    }

    private Point2D inSection(double along, double elevation) {
        Node canvas = window.robot.lookup("#section-canvas").query();
        return canvas.localToScreen(frame().x(along), frame().y(elevation));
    }

    private Body.Spot spot() {
        return section().body().orElseThrow().spot(frame(), 0.25).orElseThrow();
    }

    private void type(KeyCode... keys) {
        window.type(keys);
    }

    private Drawing drawing() {
        return window.assembly().draft().drawing();
    }

    private Reach reach() {
        return window.assembly().draft().selected().orElseThrow().reach();
    }

    private void drawLine() {
        type(KeyCode.A);
        window.robot.clickOn(window.onMap(500300, 5201350));
        window.robot.clickOn(window.onMap(501300, 5201500));
        window.robot.doubleClickOn(window.onMap(502800, 5200950));
        window.await(() -> window.assembly().section().frame().get().isPresent()
                && section().body().isPresent());
        window.settle();
    }

    private void dragTop(double elevation, KeyCode... held) {
        Body.Spot spot = spot();
        Point2D from = inSection(spot.along(), spot.slab().top());
        window.robot.press(held);
        window.robot
                .drag(from, MouseButton.PRIMARY)
                .moveTo(from.add(0, 10))
                .moveTo(inSection(spot.along(), elevation))
                .drop();
        window.robot.release(held);
        window.settle();
    }

    private void compareWithCommand(String prism) throws IOException {
        long revision = window.assembly().session().drawing().get().revision();
        window.await(() -> window.assembly().session().faceFlows().get().revision() == revision);
        Path file = folder.resolve("drawn.geojson");
        window.answers.paths.add(Optional.of(file));
        type(KeyCode.CONTROL, KeyCode.SHIFT, KeyCode.S);
        window.await(() -> Files.exists(file));
        window.choose("#ledger-arrangement", Arrangement.ITEMS_BY_LAYER);
        window.robot.clickOn("#ledger-copy");
        assertThat(CommandRows.copied(window.answers.copied.get(0)))
                .hasSizeGreaterThan(10)
                .isEqualTo(CommandRows.ofCommand(folder, file, folder.resolve("out"), prism, "interval 1"));
    }

    @Test
    void aTopDraggedToAFreeElevationHasTheCommandsBudgetAndIsUndoneToTheLastBit() throws IOException {
        drawLine();
        Drawing before = drawing();
        assertThat(window.assembly().shelf().page().get()).isEqualTo(1);
        dragTop(97);
        Reach.Between moved = (Reach.Between) reach();
        double height = ((Limit.Elevation) moved.top().orElseThrow()).height();
        assertThat(height).isCloseTo(97, within(2 * frame().pixel()));
        assertThat(moved.bottom()).isEmpty();
        assertThat(window.assembly().session().lit().get()).isEqualTo("top");
        Drawing after = drawing();
        type(KeyCode.CONTROL, KeyCode.Z);
        assertThat(drawing()).isSameAs(before);
        assertThat(window.robot.lookup("#status").queryAs(Label.class).getText())
                .contains("Move top");
        type(KeyCode.CONTROL, KeyCode.SHIFT, KeyCode.Z);
        assertThat(drawing()).isEqualTo(after);
        compareWithCommand("well field");
    }

    @Test
    void aTopSnapsToALayerUnlessAltIsDown() {
        drawLine();
        double clay =
                section().profile().at(spot().along()).orElseThrow().column().surfaces()[1];
        dragTop(clay + 5 * frame().pixel());
        assertThat(reach()).isEqualTo(new Reach.Layers(1, 2));
        type(KeyCode.CONTROL, KeyCode.Z);
        window.settle();
        dragTop(clay + 5 * frame().pixel(), KeyCode.ALT);
        Limit top = Lid.TOP.in(reach(), 3);
        assertThat(((Limit.Elevation) top).height()).isCloseTo(clay + 5 * frame().pixel(), within(2 * frame().pixel()));
    }

    @Test
    void escRestoresWhatADragHasChanged() {
        drawLine();
        Drawing before = drawing();
        Body.Spot spot = spot();
        window.robot
                .drag(inSection(spot.along(), spot.slab().top()), MouseButton.PRIMARY)
                .moveTo(inSection(spot.along(), 99))
                .moveTo(inSection(spot.along(), 97));
        assertThat(drawing()).isNotEqualTo(before);
        type(KeyCode.ESCAPE);
        assertThat(drawing()).isSameAs(before);
        window.robot.drop();
        assertThat(drawing()).isSameAs(before);
        assertThat(window.assembly().draft().undoable()).isEmpty();
    }

    @Test
    void aLidBetweenLayersKeepsTheOtherOnItsLayerAndHasTheCommandsBudget() throws IOException {
        drawLine();
        window.robot.interact(() -> window.assembly().session().selected().set("river meadow"));
        window.settle();
        assertThat(reach()).isEqualTo(new Reach.Layers(0, 0));
        dragTop(95);
        assertThat(((Reach.Between) reach()).bottom()).contains(new Limit.Layer(0));
        compareWithCommand("river meadow");
    }

    @Test
    void lidsAreTypedAndNudgedByKeys() {
        drawLine();
        Drawing before = drawing();
        window.robot.clickOn("#section-top").press(KeyCode.CONTROL, KeyCode.A).release(KeyCode.A, KeyCode.CONTROL);
        window.robot.write("97.5");
        type(KeyCode.ENTER);
        assertThat(Lid.TOP.in(reach(), 3)).isEqualTo(new Limit.Elevation(97.5));
        window.robot
                .clickOn("#section-bottom")
                .press(KeyCode.CONTROL, KeyCode.A)
                .release(KeyCode.A, KeyCode.CONTROL);
        window.robot.write("layer 2");
        type(KeyCode.ENTER);
        assertThat(Lid.BOTTOM.in(reach(), 3)).isEqualTo(new Limit.Layer(1));
        window.robot.interact(
                () -> window.robot.lookup("#section-canvas").query().requestFocus());
        type(KeyCode.K);
        assertThat(window.assembly().session().lit().get()).isEqualTo("top");
        type(KeyCode.UP);
        type(KeyCode.SHIFT, KeyCode.DOWN);
        double height = ((Limit.Elevation) Lid.TOP.in(reach(), 3)).height();
        assertThat(height).isLessThan(97.5).isGreaterThan(97.5 - 10 * frame().pixel());
        for (int i = 0; i < 4; i++) {
            type(KeyCode.CONTROL, KeyCode.Z);
        }
        assertThat(drawing()).isSameAs(before);
    }

    @Test
    void theRowAndTheLidLightEachOtherUpAndPointersMeet() {
        drawLine();
        Body.Spot spot = spot();
        window.robot.clickOn(inSection(spot.along(), spot.slab().bottom()));
        assertThat(window.assembly().session().lit().get()).isEqualTo("bottom");
        window.await(() -> section().light().lid().equals("bottom"));
        window.robot.moveTo(inSection(1000, 90));
        assertThat(window.assembly().session().along().get().orElseThrow()).isCloseTo(1000, within(3.0));
        assertThat(window.robot.lookup("#section-readout").queryAs(Label.class).getText())
                .contains("from A")
                .contains("elevation")
                .contains("head");
        window.robot.moveTo(window.onMap(500300, 5201350));
        assertThat(window.assembly().session().along().get().orElseThrow()).isCloseTo(0, within(40.0));
        window.robot.moveTo(window.onMap(500300, 5200350));
        assertThat(window.assembly().session().along().get()).isEmpty();
    }
}
