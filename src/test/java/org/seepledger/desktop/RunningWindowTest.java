package org.seepledger.desktop;

import static org.assertj.core.api.Assertions.assertThat;

import java.nio.file.Path;
import java.util.List;
import java.util.concurrent.CopyOnWriteArrayList;
import java.util.concurrent.TimeUnit;
import java.util.concurrent.atomic.AtomicBoolean;
import javafx.scene.Node;
import javafx.scene.control.Button;
import javafx.scene.control.Hyperlink;
import javafx.scene.control.Label;
import javafx.scene.input.KeyCode;
import org.junit.jupiter.api.AfterEach;
import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.Test;
import org.seepledger.progress.Cancelled;

/** Long work and notices in the line below. */
class RunningWindowTest {

    private final List<Throwable> told = new CopyOnWriteArrayList<>();
    private OpenWindow window;

    @BeforeEach
    void open() {
        window = new OpenWindow(1280, 800);
        window.openSet(Path.of("sample-aquifers/valley"));
        window.settle();
    }

    @AfterEach
    void close() {
        window.close();
    }

    /** Work that takes half a minute, unless it is stopped. */
    private AtomicBoolean slowJob(String name) {
        AtomicBoolean ended = new AtomicBoolean();
        window.robot.interact(() -> window.tasks()
                .latest(name)
                .run(
                        progress -> {
                            try {
                                progress.begin("counting", 600);
                                for (int i = 0; i < 600; i++) {
                                    TimeUnit.MILLISECONDS.sleep(50);
                                    progress.step();
                                }
                                return true;
                            } finally {
                                ended.set(true);
                            }
                        },
                        done -> {},
                        told::add));
        return ended;
    }

    private Node node(String selector) {
        return window.robot.lookup(selector).query();
    }

    private String strip() {
        return ((Hyperlink) node("#running-words")).getText();
    }

    private void type(KeyCode... keys) {
        window.robot.press(keys).release(keys);
    }

    @Test
    void longWorkSaysWhatHowFarAndHowLongAndIsStoppedByKeys() {
        window.await(() -> !node("#running").isVisible());
        AtomicBoolean ended = slowJob("task.files");
        window.await(() -> strip().matches("File of prisms · \\d+ % · about \\d+ s left"));
        assertThat(node("#running").isVisible()).isTrue();
        type(KeyCode.SHIFT, KeyCode.ESCAPE);
        window.await(ended::get);
        assertThat(told).hasSize(1).first().isInstanceOf(Cancelled.class);
        window.await(() -> !node("#running").isVisible());
    }

    private List<Button> stops() {
        return window.robot.from(node("#running-list")).lookup(".button").<Button>queryAll().stream()
                .filter(button -> button.getText().equals("Stop"))
                .toList();
    }

    @Test
    void severalWorksAreListedEachWithItsOwnStop() {
        AtomicBoolean first = slowJob("task.files");
        window.await(() -> node("#running").isVisible());
        AtomicBoolean second = slowJob("task.opening");
        window.await(() -> strip().endsWith("and 1 more"));
        type(KeyCode.F10);
        assertThat(stops()).hasSize(2);
        window.robot.clickOn(stops().get(1));
        window.await(second::get);
        assertThat(first).isFalse();
        window.await(() -> stops().size() == 1);
        window.robot.clickOn(stops().get(0));
        window.await(first::get);
        window.await(() ->
                window.robot.lookup("Nothing is being worked on.").tryQuery().isPresent());
        type(KeyCode.ESCAPE);
        assertThat(window.robot.lookup("#running-list").tryQuery()).isEmpty();
    }

    @Test
    void noticesAreListedAndWarningsStayUntilRead() {
        window.robot.interact(() -> {
            window.assembly().session().notices().warn("The well lies outside.");
            window.assembly().session().notices().done("Saved.");
        });
        assertThat(((Label) node("#status")).getText()).isEqualTo("Saved.");
        assertThat(((Button) node("#notices")).getText()).isEqualTo("Warnings: 1");
        type(KeyCode.F7);
        assertThat(window.robot.lookup("The well lies outside.").tryQuery()).isPresent();
        type(KeyCode.ENTER);
        assertThat(window.robot.lookup("#notices-page").tryQuery()).isEmpty();
        assertThat(((Button) node("#notices")).getText()).isEqualTo("Messages");
    }
}
