package org.seepledger.desktop;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.nio.file.Path;
import javafx.geometry.Bounds;
import javafx.geometry.Point2D;
import javafx.scene.Node;
import javafx.scene.control.SplitPane;
import javafx.scene.input.KeyCode;
import javafx.scene.input.MouseButton;
import org.junit.jupiter.api.AfterEach;
import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.Test;

/** The room that panes take of each other. */
class PanesTest {

    private OpenWindow window;

    @BeforeEach
    void open() {
        window = new OpenWindow(1280, 800);
        window.openSet(Path.of("sample-aquifers/valley"));
        window.await(() -> isShown("#ledger-foot"));
        window.settle();
    }

    @AfterEach
    void close() {
        window.close();
    }

    private boolean isShown(String selector) {
        return window.robot.lookup(selector).match(Node::isVisible).tryQuery().isPresent();
    }

    private double width(String selector) {
        return window.robot.lookup(selector).query().getLayoutBounds().getWidth();
    }

    private double height(String selector) {
        return window.robot.lookup(selector).query().getLayoutBounds().getHeight();
    }

    @Test
    void theMapHasMostOfTheRoomAndTotalsAreInSightWithoutScrolling() {
        assertThat(width("#map-canvas") * height("#map-canvas")).isGreaterThan(0.38 * 1280 * 800);
        Bounds foot = window.robot
                .lookup("#ledger-foot")
                .query()
                .localToScene(window.robot.lookup("#ledger-foot").query().getBoundsInLocal());
        assertThat(foot.getMaxY()).isLessThan(800);
        for (String total : new String[] {"inflow", "outflow", "storage change", "residual", "closure error"}) {
            assertThat(isShown(total)).as(total).isTrue();
        }
    }

    @Test
    void panesFoldAwayByKeyAndByClickAndTheMapGetsTheirRoom() {
        double width = width("#map-canvas");
        double height = height("#map-canvas");
        window.robot.press(KeyCode.SHIFT, KeyCode.F6).release(KeyCode.F6, KeyCode.SHIFT);
        window.settle();
        assertThat(width("#map-canvas")).isGreaterThan(1200);
        window.robot.clickOn("#fold-below");
        window.settle();
        assertThat(height("#map-canvas")).isGreaterThan(height + 150);
        window.robot.clickOn("#fold-side").clickOn("#fold-below");
        window.settle();
        assertThat(width("#map-canvas")).isCloseTo(width, within(2.0));
        assertThat(height("#map-canvas")).isCloseTo(height, within(2.0));
    }

    @Test
    void aDividerThatWasDraggedIsWhereItWasWhenTheWindowOpensAgain() {
        double before = width("#folio");
        Node divider = window.robot
                .lookup(".split-pane-divider")
                .match(node ->
                        ((SplitPane) node.getParent()).getOrientation() == javafx.geometry.Orientation.HORIZONTAL)
                .query();
        Bounds place = divider.localToScreen(divider.getBoundsInLocal());
        window.robot
                .drag(new Point2D(place.getCenterX(), place.getCenterY()), MouseButton.PRIMARY)
                .moveBy(-80, 0)
                .drop();
        window.settle();
        double dragged = width("#folio");
        assertThat(dragged).isCloseTo(before + 80, within(4.0));
        OpenWindow first = window;
        first.close();
        window = new OpenWindow(1280, 800, first.answers);
        window.openSet(Path.of("sample-aquifers/valley"));
        window.settle();
        assertThat(width("#folio")).isCloseTo(dragged, within(2.0));
    }

    @Test
    void theLegendIsSmallUntilAClickOrAKeyOpensIt() {
        double small = height("#legend");
        assertThat(small).isLessThan(70);
        window.robot.clickOn("#legend-title");
        window.settle();
        assertThat(height("#legend")).isGreaterThan(small + 20);
        window.robot.press(KeyCode.L).release(KeyCode.L);
        window.settle();
        assertThat(height("#legend")).isEqualTo(small);
    }
}
