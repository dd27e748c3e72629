package org.seepledger.desktop;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.Optional;
import javafx.event.Event;
import javafx.event.EventType;
import javafx.geometry.Point2D;
import javafx.scene.Node;
import javafx.scene.control.Label;
import javafx.scene.control.TextField;
import javafx.scene.input.KeyCode;
import javafx.scene.input.KeyEvent;
import javafx.scene.input.MouseButton;
import javafx.scene.paint.Color;
import org.junit.jupiter.api.AfterEach;
import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.seepledger.desktop.ledger.Arrangement;
import org.seepledger.desktop.session.Opening;
import org.seepledger.sample.SampleCopy;
import org.seepledger.sketch.Drawing;
import org.seepledger.sketch.Place;
import org.seepledger.sketch.RingAt;

/** Draws by hand over the sample, with the mouse and keyboard of the real window. */
class DrawingWindowTest {

    @TempDir
    private Path folder;

    private OpenWindow window;

    @BeforeEach
    void open() throws IOException {
        SampleCopy.of("valley", folder);
        window = new OpenWindow(1600, 1000);
        openSet();
    }

    private void openSet() {
        window.openSet(folder);
        window.await(() -> window.assembly().map().values().scale().get().isPresent());
        window.settle();
    }

    @AfterEach
    void close() {
        window.close();
    }

    private Point2D at(double mapX, double mapY) {
        return window.onMap(mapX, mapY);
    }

    private void type(KeyCode... keys) {
        window.type(keys);
    }

    private Drawing drawing() {
        return window.assembly().draft().drawing();
    }

    private void drawPrism() {
        window.robot.clickOn("#tool-polygon");
        window.robot.clickOn(at(501850, 5200250));
        window.robot.clickOn(at(502310, 5200280));
        window.robot.clickOn(at(502290, 5200700));
        window.robot.doubleClickOn(at(501880, 5200660));
    }

    private void key(EventType<KeyEvent> event, String letter, KeyCode code) {
        KeyEvent key = new KeyEvent(event, letter, letter, code, false, false, false, false);
        window.robot.interact(() -> Event.fireEvent(window.stage().getScene().getFocusOwner(), key));
    }

    /** A keyboard sends the letter after the press, to whatever has the keyboard by then. */
    @Test
    void theKeyThatLeadsToTheFieldLeavesNoLetterThereAndWhatIsTypedIsSeenAtOnce() {
        window.robot.clickOn("#tool-polygon");
        key(KeyEvent.KEY_PRESSED, KeyEvent.CHAR_UNDEFINED, KeyCode.T);
        key(KeyEvent.KEY_TYPED, "t", KeyCode.UNDEFINED);
        key(KeyEvent.KEY_RELEASED, KeyEvent.CHAR_UNDEFINED, KeyCode.T);
        TextField typed = window.robot.lookup("#typed").queryAs(TextField.class);
        assertThat(typed.isFocused()).isTrue();
        assertThat(typed.getText()).isEmpty();
        Color before = colour(501850, 5200250);
        window.robot.write("501850, 5200250", 0);
        assertThat(typed.getText()).isEqualTo("501850, 5200250");
        type(KeyCode.ENTER);
        window.settle();
        assertThat(colour(501850, 5200250)).as("a vertex stands there").isNotEqualTo(before);
    }

    private Color colour(double mapX, double mapY) {
        Node canvas = window.robot.lookup("#map-canvas").query();
        Point2D at = canvas.screenToLocal(at(mapX, mapY));
        Color[] seen = new Color[1];
        window.robot.interact(() ->
                seen[0] = canvas.snapshot(null, null).getPixelReader().getColor((int) at.getX(), (int) at.getY()));
        return seen[0];
    }

    @Test
    void aPrismDrawnByHandHasTheBudgetThatTheCommandGivesForItsFileDigitForDigit() throws IOException {
        drawPrism();
        assertThat(drawing().outline(RingAt.outer("prism")).size()).isEqualTo(4);
        assertThat(window.robot.lookup("#status").queryAs(Label.class).getText())
                .contains("Click a prism");
        window.await(() -> window.assembly().session().faceFlows().get().prism().equals("prism"));
        Path file = folder.resolve("drawn.geojson");
        window.answers.paths.add(Optional.of(file));
        type(KeyCode.CONTROL, KeyCode.SHIFT, KeyCode.S);
        window.await(() -> Files.exists(file));
        window.choose("#ledger-arrangement", Arrangement.ITEMS_BY_LAYER);
        window.robot.clickOn("#ledger-copy");
        assertThat(CommandRows.copied(window.answers.copied.get(0)))
                .hasSizeGreaterThan(10)
                .isEqualTo(CommandRows.ofCommand(folder, file, folder.resolve("out"), "prism", "interval 1"));
    }

    @Test
    void aVertexIsDraggedUndoneAndDoneAgain() {
        Drawing before = drawing();
        Place from = before.outline(RingAt.outer("well field")).place(7);
        window.robot
                .drag(at(from.x(), from.y()), MouseButton.PRIMARY)
                .moveTo(at(from.x() - 150, from.y() + 120))
                .drop();
        Place moved = drawing().outline(RingAt.outer("well field")).place(7);
        double pixel = 1 / window.assembly().map().camera().get().scale();
        assertThat(moved.x()).isCloseTo(from.x() - 150, within(13 * pixel));
        assertThat(moved).isNotEqualTo(from);
        long revision = window.assembly().session().drawing().get().revision();
        window.await(() -> window.assembly().session().faceFlows().get().revision() == revision);
        type(KeyCode.CONTROL, KeyCode.Z);
        assertThat(drawing()).isSameAs(before);
        type(KeyCode.CONTROL, KeyCode.SHIFT, KeyCode.Z);
        assertThat(drawing().outline(RingAt.outer("well field")).place(7)).isEqualTo(moved);
    }

    @Test
    void islandAndSplitAreDrawnAndUndoneToTheStart() {
        Drawing first = drawing();
        window.robot.press(KeyCode.I).release(KeyCode.I);
        window.robot.clickOn(at(501380, 5201480));
        window.robot.clickOn(at(501540, 5201480));
        window.robot.clickOn(at(501460, 5201620));
        type(KeyCode.ENTER);
        assertThat(drawing().shape("well field").parts().get(0).islands()).hasSize(2);
        window.robot.clickOn(at(500900, 5200600));
        assertThat(window.assembly().session().selected().get()).isEqualTo("south terrace");
        type(KeyCode.X);
        window.robot.clickOn(at(500990, 5200140));
        window.robot.doubleClickOn(at(500960, 5201010));
        assertThat(drawing().shapes()).hasSize(5);
        type(KeyCode.CONTROL, KeyCode.Z);
        type(KeyCode.CONTROL, KeyCode.Z);
        assertThat(drawing()).isSameAs(first);
        type(KeyCode.CONTROL, KeyCode.SHIFT, KeyCode.Z);
        type(KeyCode.CONTROL, KeyCode.SHIFT, KeyCode.Z);
        assertThat(drawing().shapes()).hasSize(5);
    }

    @Test
    void whatWasDrawnIsThereAgainAfterTheProgramWasKilled() {
        drawPrism();
        window.await(() -> Files.exists(folder.resolve(Opening.UNSAVED)));
        Drawing drawn = drawing();
        window.close();
        window = new OpenWindow(1600, 1000);
        openSet();
        assertThat(drawing()).isEqualTo(drawn);
        assertThat(window.robot.lookup("#status").queryAs(Label.class).getText())
                .contains("are back");
    }

    @Test
    void theCardTakesANameAndLayersByTyping() {
        type(KeyCode.F8);
        window.robot.clickOn("#card-layers").press(KeyCode.CONTROL, KeyCode.A).release(KeyCode.A, KeyCode.CONTROL);
        window.robot.write("1");
        type(KeyCode.ENTER);
        assertThat(window.assembly().draft().selected().orElseThrow().reach())
                .isEqualTo(new org.seepledger.sketch.Reach.Layers(0, 0));
        window.robot.clickOn("#card-name").press(KeyCode.CONTROL, KeyCode.A).release(KeyCode.A, KeyCode.CONTROL);
        window.robot.write("zone");
        type(KeyCode.ENTER);
        assertThat(window.assembly().session().selected().get()).isEqualTo("zone");
    }

    @Test
    void openingAnotherSetAsksAboutUnsavedPrisms() {
        drawPrism();
        window.answers.answers.add(Optional.of(2));
        window.robot.interact(() -> window.assembly().welcome().open(Path.of("sample-aquifers/terrace")));
        assertThat(window.answers.asked).anyMatch(question -> question.contains("have changed"));
        assertThat(window.assembly().session().set().get().orElseThrow().path()).isEqualTo(folder);
    }
}
