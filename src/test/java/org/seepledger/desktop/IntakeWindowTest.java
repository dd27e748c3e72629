package org.seepledger.desktop;

import static org.assertj.core.api.Assertions.assertThat;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.Optional;
import javafx.scene.Node;
import javafx.scene.control.Button;
import javafx.scene.control.ComboBox;
import javafx.scene.control.Label;
import javafx.scene.control.ListView;
import javafx.scene.control.TextArea;
import javafx.scene.control.TextField;
import javafx.scene.input.KeyCode;
import org.junit.jupiter.api.AfterEach;
import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.seepledger.intake.LooseValley;
import org.seepledger.job.BalanceJob;
import org.seepledger.job.Requests;
import org.seepledger.progress.Progress;
import org.seepledger.sample.SampleCopy;

/** The import assistant in the real window. */
class IntakeWindowTest {

    private static final Path VALLEY = Path.of("sample-aquifers/valley");

    @TempDir
    private Path folder;

    private OpenWindow window;

    @BeforeEach
    void open() {
        window = new OpenWindow(1280, 800);
    }

    @AfterEach
    void close() {
        window.close();
    }

    private <T extends Node> T find(String selector, Class<T> type) {
        return window.robot.lookup(selector).queryAs(type);
    }

    private String text(String selector) {
        return find(selector, Label.class).getText();
    }

    private boolean isShown(String selector) {
        return window.robot.lookup(selector).match(Node::isVisible).tryQuery().isPresent();
    }

    private void type(String selector, String text) {
        window.robot.interact(() -> find(selector, TextField.class).requestFocus());
        window.robot.interact(() -> find(selector, TextField.class).setText(text));
        window.robot.press(KeyCode.ENTER).release(KeyCode.ENTER);
    }

    private void select(String title) {
        window.robot.interact(() -> {
            ListView<?> list = find("#intake-items", ListView.class);
            for (int row = 0; row < list.getItems().size(); row++) {
                if (list.getItems().get(row).toString().contains(title)) {
                    list.getSelectionModel().select(row);
                }
            }
        });
    }

    private void bringLooseValley() throws IOException {
        Path loose = folder.resolve("loose");
        LooseValley.scatter(loose);
        window.answers.paths.add(Optional.of(loose));
        window.robot.clickOn("#bring-loose");
        window.robot.clickOn("#intake-add-folder");
        window.await(() -> window.assembly().intake().plan().get().isPresent());
        window.await(() -> text("#intake-verdict").startsWith("One thing"));
    }

    @Test
    void theValleysLooseFilesBecomeTheShippedFolder() throws IOException {
        bringLooseValley();
        window.robot.clickOn(".sl-finding");
        window.await(() -> find("#intake-vertical-share", TextField.class).isFocused());
        window.robot.write("0.1, 0.05, 0.1");
        window.robot.press(KeyCode.ENTER).release(KeyCode.ENTER);
        type("#intake-specific-storage", "0.00008, 0.0001, 0.00002");
        type("#intake-name", "Invented valley");
        type("#intake-layers", "Gravel, Clay, Old gravel");
        select("abstraction wells");
        assertThat(find("#intake-name-0", TextField.class).getText()).isEqualTo("pumping");
        type("#intake-name-0", "public supply");
        window.await(() -> text("#intake-verdict").startsWith("Checked"));
        Path target = folder.resolve("made");
        type("#intake-target", target.toString());
        window.robot.clickOn("#intake-write");
        window.await(() -> window.assembly().session().set().get().isPresent());
        assertThat(isShown("#intake")).isFalse();
        assertThat(window.robot.lookup("#set-name").queryAs(Button.class).getText())
                .isEqualTo("Invented valley");
        assertThat(budget(target, "one")).isEqualTo(budget(VALLEY, "other"));
    }

    private List<String> budget(Path set, String out) throws IOException {
        BalanceJob.run(Requests.byInterval(set, VALLEY.resolve("prisms.geojson"), folder.resolve(out)), Progress.NONE);
        return Files.readAllLines(folder.resolve(out).resolve("budget.csv")).stream()
                .filter(line -> !line.startsWith("#"))
                .toList();
    }

    @Test
    void aRoleIsCorrectedAndTheConsequencesAreSaid() throws IOException {
        bringLooseValley();
        select("bedrock");
        window.await(() -> isShown("#intake-preview"));
        @SuppressWarnings("unchecked")
        ComboBox<Object> role = find("#intake-role-0", ComboBox.class);
        window.robot.interact(() -> role.setValue(role.getItems().get(0)));
        window.await(() -> text("#intake-verdict").startsWith("2 things"));
        assertThat(window.robot.lookup(".sl-finding").queryAllAs(Button.class))
                .extracting(Button::getText)
                .anyMatch(words -> words.contains("bottom of layer 3"));
    }

    @Test
    void theShortcutGoesThereAndBack() {
        window.robot
                .press(KeyCode.CONTROL, KeyCode.SHIFT, KeyCode.O)
                .release(KeyCode.O, KeyCode.SHIFT, KeyCode.CONTROL);
        assertThat(isShown("#intake")).isTrue();
        assertThat(isShown("#welcome")).isFalse();
        window.robot
                .press(KeyCode.CONTROL, KeyCode.SHIFT, KeyCode.O)
                .release(KeyCode.O, KeyCode.SHIFT, KeyCode.CONTROL);
        assertThat(isShown("#intake")).isFalse();
        assertThat(isShown("#welcome")).isTrue();
    }

    @Test
    void looseFilesThatAreDroppedOnTheFirstPageComeIn() throws IOException {
        Path file = folder.resolve("head_m.csv");
        Files.writeString(file, "row,col,head_m\n1,1,3\n");
        window.robot.interact(() -> window.assembly().welcome().drop(List.of(file)));
        window.await(() -> window.assembly().intake().plan().get().isPresent());
        assertThat(isShown("#intake")).isTrue();
    }

    @Test
    void aFolderWithoutADescriptionLeadsToTheAssistant() throws IOException {
        Files.writeString(folder.resolve("head_m.csv"), "row,col,head_m\n1,1,3\n");
        window.answers.paths.add(Optional.of(folder));
        window.robot.clickOn("#choose-folder");
        window.await(() -> isShown("#mend-folder"));
        window.robot.clickOn("#mend-folder");
        window.await(() -> window.assembly().intake().plan().get().isPresent());
        assertThat(isShown("#intake")).isTrue();
    }

    @Test
    void aFolderWithAWrongDescriptionIsMendedAndOpened() throws IOException {
        Path set = folder.resolve("valley");
        SampleCopy.of("valley", set);
        String sound = Files.readString(set.resolve("aquifer.json"));
        String wrong =
                sound.replace("\"rock.tif\"", "\"rok.tif\"").replace("\"kind\": \"areal\"", "\"kind\": \"aerial\"");
        Files.writeString(set.resolve("aquifer.json"), wrong);
        window.answers.paths.add(Optional.of(set));
        window.robot.clickOn("#choose-folder");
        window.await(() -> isShown("#mend-folder"));
        window.robot.clickOn("#mend-folder");
        window.await(() -> isShown("#mend-text")
                && window.robot.lookup(".sl-finding").tryQuery().isPresent());
        window.robot.clickOn(".sl-finding");
        TextArea text = find("#mend-text", TextArea.class);
        assertThat(text.getSelectedText()).isEqualTo("\"aerial\"");
        window.robot.interact(() -> text.replaceSelection("\"areal\""));
        window.await(() -> window.robot.lookup(".sl-finding").queryAllAs(Button.class).stream()
                .anyMatch(line -> line.getText().contains("rok.tif")));
        window.robot.clickOn(".sl-finding");
        assertThat(text.getSelectedText()).isEqualTo("\"rok.tif\"");
        assertThat(find("#mend-save", Button.class).isDisabled()).isTrue();
        window.robot.interact(() -> text.replaceSelection("\"rock.tif\""));
        window.await(() -> !find("#mend-save", Button.class).isDisabled());
        window.robot.clickOn("#mend-save");
        window.await(() -> window.assembly().session().set().get().isPresent());
        assertThat(Files.readString(set.resolve("aquifer.json"))).isEqualTo(sound);
        assertThat(Files.readString(set.resolve("aquifer-before.json"))).isEqualTo(wrong);
        assertThat(isShown("#mend")).isFalse();
    }
}
