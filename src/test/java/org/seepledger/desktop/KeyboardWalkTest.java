package org.seepledger.desktop;

import static org.assertj.core.api.Assertions.assertThat;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.Optional;
import javafx.scene.Node;
import javafx.scene.control.ChoiceBox;
import javafx.scene.control.Label;
import javafx.scene.control.TableView;
import javafx.scene.input.KeyCode;
import org.junit.jupiter.api.AfterEach;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.seepledger.balance.Periods;
import org.seepledger.desktop.draw.Tool;
import org.seepledger.desktop.session.Opening;
import org.seepledger.sample.SampleCopy;
import org.seepledger.sketch.Drawing;
import org.seepledger.sketch.Reach;

/** The whole job, from the first page to the folder that is handed over, by keys alone. */
class KeyboardWalkTest {

    private static final int MOST_TABS = 120;

    @TempDir
    private Path folder;

    private OpenWindow window;

    @AfterEach
    void close() {
        window.close();
    }

    private void type(KeyCode... keys) {
        window.robot.press(keys).release(keys);
    }

    private void write(String text) {
        window.robot.write(text, 0);
    }

    private Node owner() {
        return window.assembly().scene().getFocusOwner();
    }

    /** Goes on by Tab until a node has the keyboard; whatever has it on the way is to be seen. */
    private void tabTo(String selector) {
        for (int i = 0; i < MOST_TABS; i++) {
            Node sought = window.robot.lookup(selector).tryQuery().orElse(null);
            if (sought != null && sought.equals(owner())) {
                return;
            }
            type(KeyCode.TAB);
            assertThat(owner()).as("after %d tabs to %s", i, selector).isNotNull();
            assertThat(owner().isVisible()).isTrue();
        }
        throw new AssertionError("Tab does not lead to " + selector + "; it is at " + owner());
    }

    private Drawing drawing() {
        return window.assembly().draft().drawing();
    }

    private String text(String selector) {
        return window.robot.lookup(selector).queryAs(Label.class).getText();
    }

    @Test
    void theWholeJobIsDoneByKeys() throws IOException {
        SampleCopy.of("valley", folder);
        openWindow();
        openTheCard();
        drawAPrism();
        nameItAndSetLayers();
        readTheLedger();
        readTheAnswers();
        save();
        handOver();
    }

    private void openWindow() {
        window = new OpenWindow(1600, 1000);
        window.answers.remember(folder);
        window.robot.interact(() -> window.assembly().welcome().look(List.of()));
        window.await(() -> !window.assembly().welcome().recent().isEmpty());
        window.settle();
    }

    private void openTheCard() {
        tabTo("#welcome-recent > .sl-card");
        type(KeyCode.ENTER);
        window.await(() -> window.assembly().session().set().get().isPresent());
        window.await(() -> window.assembly().map().values().scale().get().isPresent());
        window.settle();
        assertThat(owner().getId()).isEqualTo("map-canvas");
    }

    private void drawAPrism() {
        type(KeyCode.P);
        assertThat(window.assembly().draft().tool().get()).isEqualTo(Tool.POLYGON);
        type(KeyCode.T);
        write("here");
        type(KeyCode.ENTER);
        assertThat(text("#typed-fault")).isNotEmpty();
        type(KeyCode.CONTROL, KeyCode.A);
        for (String place : List.of("501850, 5200250", "502310, 5200280", "502290, 5200700", "501880, 5200660")) {
            write(place);
            assertThat(text("#typed-fault")).isEmpty();
            type(KeyCode.ENTER);
        }
        type(KeyCode.ENTER);
        assertThat(drawing().shapes()).hasSize(5);
        assertThat(window.assembly().session().selected().get()).isEqualTo("prism");
        assertThat(owner().getId()).isEqualTo("map-canvas");
    }

    private void nameItAndSetLayers() {
        type(KeyCode.F8);
        assertThat(owner().getId()).isEqualTo("card-name");
        type(KeyCode.CONTROL, KeyCode.A);
        write("meadow");
        type(KeyCode.ENTER);
        assertThat(drawing().find("meadow")).isPresent();
        tabTo("#card-layers");
        write("2 to 9");
        type(KeyCode.ENTER);
        assertThat(text("#card-layers-fault")).contains("Layers count from 1 to 3");
        type(KeyCode.CONTROL, KeyCode.A);
        write("1 to 2");
        type(KeyCode.ENTER);
        assertThat(text("#card-layers-fault")).isEmpty();
        assertThat(drawing().shape("meadow").reach()).isEqualTo(new Reach.Layers(0, 1));
        type(KeyCode.ESCAPE);
        assertThat(owner().getId()).isEqualTo("map-canvas");
    }

    private void readTheLedger() {
        window.await(() -> text("#ledger-belongs").startsWith("meadow, layers 1 to 2"));
        type(KeyCode.F6);
        tabTo("#ledger-period");
        type(KeyCode.SPACE);
        type(KeyCode.DOWN);
        type(KeyCode.ENTER);
        ChoiceBox<?> periods = window.robot.lookup("#ledger-period").queryAs(ChoiceBox.class);
        window.await(() -> periods.getValue() != Periods.Every.INTERVAL);
        window.await(() -> text("#ledger-belongs").contains("2021-10"));
        tabTo("#ledger-table");
        TableView<?> table = window.robot.lookup("#ledger-table").queryTableView();
        type(KeyCode.DOWN);
        type(KeyCode.DOWN);
        assertThat(table.getSelectionModel().getSelectedIndex()).isPositive();
        type(KeyCode.CONTROL, KeyCode.SHIFT, KeyCode.C);
        assertThat(window.answers.copied.get(0)).startsWith("meadow");
    }

    private void readTheAnswers() {
        type(KeyCode.CONTROL, KeyCode.DIGIT2);
        window.await(() -> text("#closure-belongs").startsWith("meadow"));
    }

    private void save() {
        type(KeyCode.CONTROL, KeyCode.S);
        window.await(
                () -> window.assembly().session().notices().all().get(0).words().matches("Saved in .*; prisms: 5\\."));
        assertThat(folder.resolve(Opening.PRISMS)).content().contains("meadow");
        assertThat(folder.resolve(Opening.UNSAVED)).doesNotExist();
    }

    private void handOver() {
        type(KeyCode.CONTROL, KeyCode.E);
        assertThat(owner().getId()).isEqualTo("handover-out");
        type(KeyCode.CONTROL, KeyCode.A);
        Path out = folder.resolve("handed");
        write(out.toString());
        tabTo("#handover-go");
        type(KeyCode.ENTER);
        window.await(() -> Files.exists(out.resolve("run.json")));
        tabTo("#handover-open-folder");
        type(KeyCode.ENTER);
        assertThat(window.answers.opened).contains(out);
        type(KeyCode.ESCAPE);
        assertThat(window.robot.lookup("#handover-page").tryQuery()).isEqualTo(Optional.empty());
        assertThat(out.resolve("budget/budget.csv")).content().contains("meadow");
    }
}
