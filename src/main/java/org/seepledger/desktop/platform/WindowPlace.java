package org.seepledger.desktop.platform;

import java.util.List;
import java.util.Optional;
import javafx.geometry.Rectangle2D;
import javafx.stage.Screen;
import javafx.stage.Stage;
import org.seepledger.desktop.port.Settings;

/** Where the window stands, kept from run to run. A place that no screen shows any more is left. */
public final class WindowPlace {

    private static final String KEY = "window";

    /** So much of the window's upper edge must be on a screen, or nobody could take hold of it. */
    private static final double HOLD = 80;

    private static final double LEAST = 200;
    private static final double MOST = 100_000;

    private final Settings settings;
    private Rectangle2D bounds = Rectangle2D.EMPTY;

    /**
     * What is kept.
     *
     * @param bounds where it stands when it is not maximised
     * @param maximised whether it fills its screen
     */
    record Kept(Rectangle2D bounds, boolean maximised) {

        static Optional<Kept> of(String text) {
            String[] words = text.split(" ");
            if (words.length != 5) {
                return Optional.empty();
            }
            try {
                double width = Double.parseDouble(words[2]);
                double height = Double.parseDouble(words[3]);
                boolean sound = Math.min(width, height) >= LEAST && Math.max(width, height) <= MOST;
                return sound
                        ? Optional.of(new Kept(
                                new Rectangle2D(
                                        Double.parseDouble(words[0]), Double.parseDouble(words[1]), width, height),
                                Boolean.parseBoolean(words[4])))
                        : Optional.empty();
            } catch (NumberFormatException e) {
                return Optional.empty();
            }
        }

        /** Whether enough of its upper edge is on one of the screens. */
        boolean isOn(List<Rectangle2D> screens) {
            Rectangle2D edge =
                    new Rectangle2D(bounds.getMinX() + HOLD, bounds.getMinY(), bounds.getWidth() - 2 * HOLD, 1);
            return screens.stream().anyMatch(screen -> screen.intersects(edge) && screen.getMinY() <= edge.getMinY());
        }

        String text() {
            return Math.round(bounds.getMinX()) + " " + Math.round(bounds.getMinY()) + " "
                    + Math.round(bounds.getWidth()) + " " + Math.round(bounds.getHeight()) + " " + maximised;
        }
    }

    /**
     * Makes the place.
     *
     * @param settings where it is kept
     */
    public WindowPlace(Settings settings) {
        this.settings = settings;
    }

    /**
     * Puts a window where it stood last time, and keeps where it stands when it is closed.
     *
     * @param stage the window, not yet shown
     */
    public void follow(Stage stage) {
        List<Rectangle2D> screens =
                Screen.getScreens().stream().map(Screen::getVisualBounds).toList();
        settings.get(KEY).flatMap(Kept::of).ifPresent(kept -> put(stage, kept, screens));
        stage.xProperty().addListener(moved -> note(stage));
        stage.yProperty().addListener(moved -> note(stage));
        stage.widthProperty().addListener(moved -> note(stage));
        stage.heightProperty().addListener(moved -> note(stage));
        stage.addEventHandler(javafx.stage.WindowEvent.WINDOW_HIDING, hiding -> keep(stage));
    }

    private void put(Stage stage, Kept kept, List<Rectangle2D> screens) {
        if (kept.isOn(screens)) {
            bounds = kept.bounds();
            stage.setX(bounds.getMinX());
            stage.setY(bounds.getMinY());
            stage.setWidth(bounds.getWidth());
            stage.setHeight(bounds.getHeight());
        }
        stage.setMaximized(kept.maximised());
    }

    private void note(Stage stage) {
        boolean placed = stage.isShowing() && !stage.isMaximized() && !stage.isIconified() && !stage.isFullScreen();
        if (placed && stage.getWidth() >= LEAST && stage.getHeight() >= LEAST) {
            bounds = new Rectangle2D(stage.getX(), stage.getY(), stage.getWidth(), stage.getHeight());
        }
    }

    private void keep(Stage stage) {
        if (bounds.getWidth() > 0) {
            settings.put(KEY, new Kept(bounds, stage.isMaximized()).text());
        }
    }
}
