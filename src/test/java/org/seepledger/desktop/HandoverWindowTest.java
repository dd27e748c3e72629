package org.seepledger.desktop;

import static org.assertj.core.api.Assertions.assertThat;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.Set;
import java.util.concurrent.TimeUnit;
import java.util.stream.Collectors;
import java.util.stream.Stream;
import javafx.scene.control.CheckBox;
import javafx.scene.control.Label;
import javafx.scene.control.Labeled;
import javafx.scene.control.TextField;
import javafx.scene.input.KeyCode;
import org.junit.jupiter.api.AfterEach;
import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.seepledger.job.ShownPicture;
import org.testfx.util.WaitForAsyncUtils;

/** The page of handing over in the real window. */
class HandoverWindowTest {

    @TempDir
    private Path folder;

    private OpenWindow window;

    @BeforeEach
    void open() {
        window = new OpenWindow(1280, 800);
        window.openSet(Path.of("sample-aquifers/terrace"));
        window.settle();
        window.robot.clickOn("#hand-over");
        TextField out = window.robot.lookup("#handover-out").queryAs(TextField.class);
        window.robot.interact(() -> out.setText(folder.resolve("out").toString()));
    }

    @AfterEach
    void close() {
        window.close();
    }

    private Set<String> files() {
        try (Stream<Path> files = Files.walk(folder)) {
            return files.map(Path::toString).collect(Collectors.toSet());
        } catch (IOException e) {
            return Set.of("changing");
        }
    }

    private String text(String selector) {
        return window.robot.lookup(selector).queryAs(Label.class).getText();
    }

    @Test
    void stoppingLeavesNothingBehindAndTheNextTrySucceeds() {
        Set<String> before = files();
        window.robot.interact(() -> {
            window.assembly().session().pictures().put("endless", new ShownPicture("endless", progress -> {
                while (true) {
                    progress.step();
                    WaitForAsyncUtils.sleep(5, TimeUnit.MILLISECONDS);
                }
            }));
            window.robot.lookup("#handover-shown").queryAs(CheckBox.class).fire();
        });
        window.robot.clickOn("#handover-go");
        window.await(() -> text("#handover-doing").startsWith("drawing pictures"));
        assertThat(files()).hasSizeGreaterThan(before.size());
        window.robot.clickOn("#handover-stop");
        window.await(() -> files().equals(before));
        window.robot.interact(() -> window.assembly().session().pictures().remove("endless"));
        window.robot.clickOn("#handover-go");
        window.await(() -> text("#handover-done").contains("Handed over"));
        assertThat(folder.resolve("out/pictures/map as shown.png")).exists();
        window.robot.press(KeyCode.ESCAPE).release(KeyCode.ESCAPE);
        assertThat(window.robot.lookup("#handover-page").tryQuery()).isEmpty();
    }

    @Test
    void aFolderInUseIsSaidBesideTheFieldWhileItIsTyped() throws IOException {
        Files.writeString(folder.resolve("mine.txt"), "mine");
        TextField out = window.robot.lookup("#handover-out").queryAs(TextField.class);
        window.robot.interact(() -> out.setText(folder.toString()));
        window.await(() -> window.robot
                .lookup(".sl-warning")
                .match(node -> node.isVisible() && ((Labeled) node).getText().contains("is not empty"))
                .tryQuery()
                .isPresent());
        window.robot.interact(() -> out.setText(folder.resolve("mine.txt").toString()));
        window.await(() -> window.robot
                .lookup(".sl-warning")
                .match(node -> node.isVisible() && ((Labeled) node).getText().contains("is a file"))
                .tryQuery()
                .isPresent());
        assertThat(List.of(folder.toFile().list())).containsExactly("mine.txt");
    }
}
