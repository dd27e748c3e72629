package org.seepledger.desktop;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.nio.file.Path;
import java.util.Optional;
import javafx.geometry.Bounds;
import javafx.geometry.Point2D;
import javafx.scene.Node;
import javafx.scene.control.Label;
import javafx.scene.control.TextField;
import javafx.scene.image.Image;
import javafx.scene.input.KeyCode;
import javafx.scene.input.MouseButton;
import javafx.scene.paint.Color;
import org.junit.jupiter.api.AfterEach;
import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.Test;
import org.seepledger.desktop.map.Camera;
import org.seepledger.desktop.theme.Theme;
import org.seepledger.picture.ValueScale;

class MapWindowTest {

    private OpenWindow window;

    @BeforeEach
    void open() {
        window = new OpenWindow(1280, 800);
        window.openSet(Path.of("sample-aquifers/valley"));
        window.await(() -> window.assembly().map().values().scale().get().isPresent());
        window.settle();
    }

    @AfterEach
    void close() {
        window.close();
    }

    private Camera camera() {
        return window.assembly().map().camera().get();
    }

    private Node canvas() {
        return window.robot.lookup("#map-canvas").query();
    }

    private Point2D onScreen(double x, double y) {
        Bounds bounds = canvas().localToScreen(canvas().getBoundsInLocal());
        return new Point2D(bounds.getMinX() + x, bounds.getMinY() + y);
    }

    private Color pixel(double x, double y) {
        Image[] taken = new Image[1];
        Point2D[] place = new Point2D[1];
        window.robot.interact(() -> {
            place[0] = canvas().localToScene(x, y);
            taken[0] = window.assembly().scene().snapshot(null);
        });
        return taken[0].getPixelReader().getColor((int) place[0].getX(), (int) place[0].getY());
    }

    private static Color colour(ValueScale scale, double value) {
        int argb = scale.argb(value, 1);
        return Color.rgb(argb >> 16 & 0xff, argb >> 8 & 0xff, argb & 0xff);
    }

    @Test
    void theWheelKeepsThePointUnderTheCursorAndADragMovesTheMap() {
        Camera before = camera();
        window.robot.moveTo(onScreen(300, 200));
        window.robot.scroll(5, javafx.geometry.VerticalDirection.UP);
        window.settle();
        Camera near = camera();
        assertThat(near.scale()).isNotCloseTo(before.scale(), within(1e-3));
        double mapX = before.centreX() + (300 - before.width() / 2) / before.scale();
        assertThat(near.width() / 2 + (mapX - near.centreX()) * near.scale()).isCloseTo(300, within(0.5));
        window.robot.drag(onScreen(20, 400), MouseButton.PRIMARY).moveBy(60, 25).drop();
        assertThat(camera().centreX()).isCloseTo(near.centreX() - 60 / near.scale(), within(2 / near.scale()));
        assertThat(camera().centreY()).isCloseTo(near.centreY() + 25 / near.scale(), within(2 / near.scale()));
    }

    @Test
    void theMapHasTheColoursThatItsLegendTells() {
        window.robot.interact(() -> {
            window.assembly().map().overlays().arrows().set(false);
            window.assembly().map().overlays().contours().set(false);
        });
        window.settle();
        Camera camera = camera();
        double x = Math.floor(camera.width() / 2 + (500275 - camera.centreX()) * camera.scale());
        double y = Math.floor(camera.height() / 2 - (5200275 - camera.centreY()) * camera.scale());
        double[] head = new double[1];
        var set = window.assembly().session().set().get().orElseThrow();
        set.aquifer().head().orElseThrow().read(0, 1, new org.seepledger.aquifer.Window(42, 5, 1, 1), head, 0);
        Color expected = colour(window.assembly().map().values().scale().get().orElseThrow(), head[0]);
        Color found = pixel(x, y);
        assertThat(found.getRed()).isCloseTo(expected.getRed(), within(0.02));
        assertThat(found.getGreen()).isCloseTo(expected.getGreen(), within(0.02));
        assertThat(found.getBlue()).isCloseTo(expected.getBlue(), within(0.02));
    }

    @Test
    void theCursorsPlaceAndValueAreReadOutAndNothingJumps() {
        window.robot.moveTo(onScreen(330, 260));
        Label value = window.robot.lookup("#readout-value").queryAs(Label.class);
        window.await(() -> value.getText().startsWith("head "));
        double left = value.getLayoutX();
        window.robot.moveTo(onScreen(3, 3));
        window.await(() -> value.getText().isEmpty());
        assertThat(value.getLayoutX()).isEqualTo(left);
        assertThat(window.robot.lookup("#readout-cell").queryAs(Label.class).getText())
                .isEqualTo("off the grid");
    }

    @Test
    void aLayerIsChosenByAClickAndARangeIsTyped() {
        window.robot.clickOn("Old gravel");
        assertThat(window.assembly().session().layer().get()).isEqualTo(2);
        window.robot.clickOn("Old gravel");
        assertThat(window.assembly().session().layer().get()).isEqualTo(2);
        window.settle();
        window.robot.press(KeyCode.L).release(KeyCode.L);
        TextField from = window.robot.lookup("#range-from").queryAs(TextField.class);
        window.robot.doubleClickOn(from).press(KeyCode.SHORTCUT, KeyCode.A).release(KeyCode.A, KeyCode.SHORTCUT);
        window.robot.write("90");
        window.robot.press(KeyCode.ENTER).release(KeyCode.ENTER);
        assertThat(window.assembly().map().values().scale().get().map(ValueScale::from))
                .isEqualTo(Optional.of(90.0));
        window.robot.clickOn("#range-fit");
        assertThat(window.assembly().map().values().scale().get().orElseThrow().from())
                .isGreaterThan(91);
    }

    @Test
    void theGroundFollowsTheThemeAtOnce() {
        assertThat(pixel(4, 300).getBrightness()).isGreaterThan(0.85);
        window.robot.press(KeyCode.F9).release(KeyCode.F9);
        assertThat(window.assembly().shell().theme().get()).isEqualTo(Theme.DARK);
        window.settle();
        assertThat(pixel(4, 300).getBrightness()).isLessThan(0.25);
    }
}
