package org.seepledger.desktop;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.catchThrowable;

import java.nio.file.Path;
import java.util.Optional;
import javafx.scene.Node;
import javafx.scene.control.Button;
import javafx.scene.control.Label;
import javafx.scene.input.KeyCode;
import org.junit.jupiter.api.AfterEach;
import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.seepledger.desktop.task.EntryGuard;
import org.seepledger.desktop.theme.Theme;
import org.seepledger.ledger.Disclaimer;

class WindowTest {

    private OpenWindow window;

    @BeforeEach
    void open() {
        window = new OpenWindow(1280, 800);
    }

    @AfterEach
    void close() {
        window.close();
    }

    private boolean isShown(String selector) {
        return window.robot.lookup(selector).tryQuery().isPresent();
    }

    @Test
    void aClickOnASampleOpensIt() {
        window.await(() -> window.assembly().welcome().samples().size() == 3);
        window.robot.clickOn("Invented valley");
        window.await(() -> window.assembly().session().set().get().isPresent());
        assertThat(window.robot.lookup("#set-name").queryAs(Button.class).getText())
                .isEqualTo("Invented valley");
        assertThat(window.robot.lookup("#status").queryAs(Label.class).getText())
                .isEqualTo("Opened Invented valley. Rows: 48, columns: 60, layers: 3, intervals: 24.");
    }

    @Test
    void aFolderThatCannotBeOpenedIsSaidInWords(@TempDir Path empty) {
        window.answers.paths.add(Optional.of(empty));
        window.robot.clickOn("#choose-folder");
        window.await(
                () -> window.robot.lookup("#open-fault").queryAs(Label.class).isVisible());
        assertThat(window.robot.lookup("#open-fault").queryAs(Label.class).getText())
                .contains("aquifer.json");
    }

    @Test
    void theCautionStandsInTheWindowAndOpensInFull() {
        window.openSet(Path.of("sample-aquifers/terrace"));
        window.robot.clickOn("#caution");
        assertThat(window.robot.lookup(Disclaimer.sentences().get(0)).tryQuery())
                .isPresent();
        window.robot.press(KeyCode.ESCAPE).release(KeyCode.ESCAPE);
        assertThat(isShown("#caution-page")).isFalse();
    }

    @Test
    void anActionIsFoundByTypingAndDoneByEnter() {
        window.openSet(Path.of("sample-aquifers/terrace"));
        window.robot.press(KeyCode.F1).release(KeyCode.F1);
        assertThat(isShown("#actions-page")).isTrue();
        window.robot.clickOn("#actions-sought").write("dark");
        window.robot.press(KeyCode.ENTER).release(KeyCode.ENTER);
        assertThat(isShown("#actions-page")).isFalse();
        assertThat(window.assembly().shell().theme().get()).isEqualTo(Theme.DARK);
        assertThat(window.assembly().scene().getRoot().getStyleClass())
                .contains("sl-dark")
                .doesNotContain("sl-light");
    }

    @Test
    void keysMoveThroughTimeAndLayersAndStopAtTheEnds() {
        window.openSet(Path.of("sample-aquifers/valley"));
        window.robot.press(KeyCode.COMMA).release(KeyCode.COMMA);
        assertThat(window.assembly().session().interval().get()).isZero();
        window.robot.press(KeyCode.PERIOD).release(KeyCode.PERIOD);
        assertThat(window.assembly().session().interval().get()).isEqualTo(1);
        for (int i = 0; i < 4; i++) {
            window.robot.press(KeyCode.PAGE_DOWN).release(KeyCode.PAGE_DOWN);
        }
        assertThat(window.assembly().session().layer().get()).isEqualTo(2);
    }

    private boolean isFocusIn(String selector) {
        Node owner = window.assembly().scene().getFocusOwner();
        while (owner != null && !owner.equals(window.robot.lookup(selector).query())) {
            owner = owner.getParent();
        }
        return owner != null;
    }

    @Test
    void theKeyboardGoesFromPaneToPane() {
        window.openSet(Path.of("sample-aquifers/valley"));
        window.settle();
        assertThat(isFocusIn("#map")).isTrue();
        for (int i = 0; i < 2; i++) {
            window.robot.press(KeyCode.F6).release(KeyCode.F6);
            assertThat(isFocusIn("#map")).isFalse();
        }
        window.robot.press(KeyCode.F6).release(KeyCode.F6);
        assertThat(isFocusIn("#map")).isTrue();
    }

    @Test
    void theGuardThrowsWhenTheHandWouldHaveToWait() {
        Throwable[] thrown = new Throwable[1];
        window.robot.interact(() -> thrown[0] = catchThrowable(EntryGuard::enter));
        assertThat(thrown[0]).hasMessageContaining("window's own thread");
    }
}
