package org.seepledger.desktop;

import java.nio.file.Path;
import java.util.List;
import java.util.Optional;
import java.util.concurrent.atomic.AtomicInteger;
import javafx.animation.KeyFrame;
import javafx.animation.Timeline;
import javafx.application.Platform;
import javafx.scene.image.Image;
import javafx.stage.Window;
import javafx.util.Duration;

/** Opens the program's own window on a real screen, and ends it once the map of the folder given is painted. */
public final class ShownOnce {

    private static final int MOST_LOOKS = 240;

    private ShownOnce() {}

    /**
     * Opens the window.
     *
     * @param arguments the folder
     */
    public static void main(String[] arguments) {
        AtomicInteger looks = new AtomicInteger();
        Thread watch = new Thread(() -> waitForToolkit(looks));
        watch.setDaemon(true);
        watch.start();
        Desktop.open(Optional.of(Path.of(arguments[0])));
        System.exit(looks.get() < MOST_LOOKS ? 0 : 1);
    }

    private static void waitForToolkit(AtomicInteger looks) {
        try {
            while (true) {
                Thread.sleep(250);
                try {
                    Platform.runLater(() -> look(looks));
                    return;
                } catch (IllegalStateException notYetStarted) {
                    continue;
                }
            }
        } catch (InterruptedException e) {
            Thread.currentThread().interrupt();
        }
    }

    private static void look(AtomicInteger looks) {
        Timeline again = new Timeline();
        again.getKeyFrames().add(new KeyFrame(Duration.millis(250), tick -> {
            if (looks.incrementAndGet() >= MOST_LOOKS || isMapPainted()) {
                again.stop();
                List.copyOf(Window.getWindows()).forEach(Window::hide);
            }
        }));
        again.setCycleCount(MOST_LOOKS);
        again.play();
    }

    private static boolean isMapPainted() {
        Optional<Window> shown =
                Window.getWindows().stream().filter(Window::isShowing).findFirst();
        if (shown.isEmpty() || shown.get().getScene().lookup("#legend") == null) {
            return false;
        }
        boolean painted = shown.get().getScene().lookup("#legend").isVisible();
        Image picture = shown.get().getScene().snapshot(null);
        return painted && picture.getWidth() > 800;
    }
}
