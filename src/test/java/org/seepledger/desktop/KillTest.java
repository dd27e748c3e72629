package org.seepledger.desktop;

import static org.assertj.core.api.Assertions.assertThat;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.time.Duration;
import java.util.concurrent.TimeUnit;
import javafx.scene.control.Label;
import javafx.scene.input.KeyCode;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.Timeout;
import org.junit.jupiter.api.io.TempDir;
import org.seepledger.desktop.session.Opening;
import org.seepledger.sample.SampleCopy;
import org.seepledger.sketch.Drawing;

/** Kills the process of a window that has unsaved prisms. */
class KillTest {

    private static final Duration PATIENCE = Duration.ofSeconds(90);

    @TempDir
    private Path folder;

    @TempDir
    private Path logs;

    private void drawAndBeKilled() throws IOException, InterruptedException {
        Path log = logs.resolve("killed.txt");
        Process window = OtherProcess.start(OtherProcess.inMemory(KilledWindow.class, folder.toString()), log);
        try {
            long until = System.nanoTime() + PATIENCE.toNanos();
            while (!Files.readString(log).contains("drawn and not saved")) {
                assertThat(window.isAlive()).as(Files.readString(log)).isTrue();
                assertThat(System.nanoTime()).as(Files.readString(log)).isLessThan(until);
                TimeUnit.MILLISECONDS.sleep(100);
            }
        } finally {
            window.destroyForcibly().waitFor();
        }
        assertThat(window.exitValue()).isNotZero();
    }

    @Test
    @Timeout(180)
    void whatWasDrawnIsBackBitForBitAndCanBeUndone() throws IOException, InterruptedException {
        SampleCopy.of("valley", folder);
        byte[] saved = Files.readAllBytes(folder.resolve(Opening.PRISMS));
        drawAndBeKilled();
        assertThat(Files.readAllBytes(folder.resolve(Opening.PRISMS))).isEqualTo(saved);
        try (OpenWindow window = new OpenWindow(1280, 800)) {
            window.openSet(folder);
            window.settle();
            Drawing restored = window.assembly().draft().drawing();
            assertThat(window.robot.lookup("#status").queryAs(Label.class).getText())
                    .contains("are back");
            assertThat(window.assembly().draft().isUnsaved()).isTrue();
            window.robot.press(KeyCode.CONTROL, KeyCode.Z).release(KeyCode.Z, KeyCode.CONTROL);
            Drawing first = window.assembly().draft().drawing();
            assertThat(window.assembly().draft().isUnsaved()).isFalse();
            assertThat(restored).isEqualTo(KilledWindow.drawnOver(first)).isNotEqualTo(first);
        }
    }
}
