package org.seepledger.desktop;

import static org.assertj.core.api.Assertions.assertThat;

import java.nio.file.Path;
import javafx.geometry.Bounds;
import javafx.scene.Node;
import javafx.scene.Scene;
import javafx.scene.control.Label;
import javafx.scene.control.ScrollBar;
import javafx.scene.control.TableView;
import javafx.scene.input.KeyCode;
import org.junit.jupiter.api.AfterEach;
import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.Test;
import org.seepledger.desktop.ledger.LedgerRow;
import org.seepledger.desktop.theme.Theme;
import org.seepledger.desktop.words.NumberForm;

/** Preferences are taken up at once, by the keyboard alone, and the window stays usable at every size. */
class PreferencesWindowTest {

    private OpenWindow window;

    @BeforeEach
    void open() {
        window = new OpenWindow(1280, 800);
        window.openSet(Path.of("sample-aquifers/valley"));
        window.await(() -> !text("#ledger-belongs").isEmpty());
    }

    @AfterEach
    void close() {
        window.close();
    }

    private String text(String selector) {
        return window.robot.lookup(selector).queryAs(Label.class).getText();
    }

    private void type(KeyCode... keys) {
        window.robot.press(keys).release(keys);
    }

    private void choose(int further) {
        type(KeyCode.SPACE);
        for (int i = 0; i < further; i++) {
            type(KeyCode.DOWN);
        }
        type(KeyCode.ENTER);
    }

    private Scene scene() {
        return window.assembly().scene();
    }

    private String shownInLedger() {
        TableView<LedgerRow> table = window.robot.lookup("#ledger-table").queryTableView();
        return window.robot.from(table).lookup(".sl-figure").queryAllAs(javafx.scene.control.Labeled.class).stream()
                .map(javafx.scene.control.Labeled::getText)
                .reduce("", (all, each) -> all + " " + each);
    }

    @Test
    void themeNumbersAndUnitsAreChosenByKeys() {
        assertThat(shownInLedger()).contains(".").doesNotContain(",");
        type(KeyCode.CONTROL, KeyCode.COMMA);
        choose(1);
        type(KeyCode.TAB);
        type(KeyCode.TAB);
        choose(1);
        type(KeyCode.TAB);
        choose(2);
        type(KeyCode.ESCAPE);
        assertThat(window.robot.lookup("#preferences-page").tryQuery()).isEmpty();
        assertThat(window.assembly().preferences().theme().get()).isEqualTo(Theme.DARK);
        assertThat(window.assembly().preferences().numbers().get()).isEqualTo(NumberForm.SPACE_COMMA);
        assertThat(window.assembly().preferences().rateUnit().get()).isEqualTo("L/s");
        window.await(() -> shownInLedger().contains(",") && !shownInLedger().contains("."));
        window.robot.clickOn("#ledger-copy");
        assertThat(window.answers.copied.get(0))
                .contains("L/s")
                .containsPattern("\\d\\.\\d{6}")
                .doesNotContainPattern("\\d,\\d");
        assertThat(window.answers.settings).containsEntry("preference.theme", "dark");
    }

    /** The node lies within the window, as it is seen. */
    private boolean isSeen(Node node) {
        Bounds place = node.localToScene(node.getBoundsInLocal());
        return place.getMinX() > -1
                && place.getMinY() > -1
                && place.getMaxX() < scene().getWidth() + 1
                && place.getMaxY() < scene().getHeight() + 1;
    }

    @Test
    void atTwiceTheSizeTheKeyboardStillReachesAll() {
        for (int i = 0; i < 4; i++) {
            type(KeyCode.CONTROL, KeyCode.EQUALS);
        }
        assertThat(window.assembly().preferences().size().get()).isEqualTo(200);
        window.settle();
        Node canvas = window.robot.lookup("#map-canvas").query();
        assertThat(canvas.getLocalToSceneTransform().getMxx()).isEqualTo(2);
        assertThat(scene().getRoot().getChildrenUnmodifiable())
                .filteredOn(ScrollBar.class::isInstance)
                .allMatch(Node::isVisible);
        window.robot.interact(window.robot.lookup("#ledger-copy").query()::requestFocus);
        window.settle();
        assertThat(isSeen(window.robot.lookup("#ledger-copy").query())).isTrue();
        window.robot.clickOn("#ledger-copy");
        assertThat(window.answers.copied).isNotEmpty();
        window.robot.interact(window.robot.lookup("#set-name").query()::requestFocus);
        window.settle();
        assertThat(isSeen(window.robot.lookup("#set-name").query())).isTrue();
        for (int i = 0; i < 4; i++) {
            type(KeyCode.CONTROL, KeyCode.MINUS);
        }
        window.settle();
        assertThat(scene().getRoot().getChildrenUnmodifiable())
                .filteredOn(ScrollBar.class::isInstance)
                .noneMatch(Node::isVisible);
    }
}
