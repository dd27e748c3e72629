package org.seepledger.desktop;

import java.nio.file.Path;
import java.util.List;
import java.util.concurrent.Callable;
import java.util.concurrent.TimeUnit;
import java.util.function.BooleanSupplier;
import javafx.application.Platform;
import javafx.geometry.Bounds;
import javafx.geometry.Point2D;
import javafx.scene.Node;
import javafx.scene.control.ChoiceBox;
import javafx.scene.input.KeyCode;
import javafx.stage.Stage;
import org.seepledger.desktop.map.Camera;
import org.seepledger.desktop.port.GivenAnswers;
import org.seepledger.desktop.task.BackgroundTasks;
import org.seepledger.desktop.task.Tasks;
import org.testfx.api.FxRobot;
import org.testfx.api.FxToolkit;
import org.testfx.util.WaitForAsyncUtils;

/** The real window on a screen in memory, with a robot at its mouse and keyboard. */
public final class OpenWindow implements AutoCloseable {

    private static final int PATIENCE_SECONDS = 20;

    /** The mouse and keyboard. */
    public final FxRobot robot = new FxRobot();

    /** What the machine answers. */
    public final GivenAnswers answers;

    private final BackgroundTasks tasks = new BackgroundTasks(Platform::runLater);
    private Assembly assembly;
    private Stage stage;

    /**
     * Opens the window.
     *
     * @param width of the scene, in logical pixels
     * @param height of the scene, in logical pixels
     */
    public OpenWindow(double width, double height) {
        this(width, height, new GivenAnswers());
    }

    /**
     * Opens the window again on the same machine.
     *
     * @param width of the scene, in logical pixels
     * @param height of the scene, in logical pixels
     * @param answers what the machine answers and has kept
     */
    OpenWindow(double width, double height, GivenAnswers answers) {
        this.answers = answers;
        try {
            stage = FxToolkit.registerPrimaryStage();
            FxToolkit.setupFixture(() -> {
                assembly = new Assembly(
                        new Assembly.Outside(tasks, answers, answers, answers, answers, answers, answers),
                        List.of(Path.of("")));
                stage.setScene(assembly.scene());
                stage.setX(0);
                stage.setY(0);
                stage.setWidth(width);
                stage.setHeight(height);
                stage.show();
            });
        } catch (java.util.concurrent.TimeoutException e) {
            throw new IllegalStateException(e);
        }
    }

    /** Opens a set and waits until it is there. */
    public void openSet(Path folder) {
        robot.interact(() -> assembly.welcome().open(folder));
        await(() -> assembly.session()
                .set()
                .get()
                .filter(set -> set.path().equals(folder))
                .isPresent());
    }

    /** Waits until something holds. */
    public void await(BooleanSupplier condition) {
        try {
            WaitForAsyncUtils.waitFor(PATIENCE_SECONDS, TimeUnit.SECONDS, (Callable<Boolean>)
                    () -> WaitForAsyncUtils.asyncFx(condition::getAsBoolean).get());
        } catch (java.util.concurrent.TimeoutException e) {
            throw new AssertionError("waited in vain", e);
        }
        WaitForAsyncUtils.waitForFxEvents();
    }

    /** Chooses a value from a choice box, by click and keys. */
    public <T> void choose(String selector, T value) {
        @SuppressWarnings("unchecked")
        ChoiceBox<T> box = robot.lookup(selector).queryAs(ChoiceBox.class);
        robot.clickOn(box);
        int steps = box.getItems().indexOf(value) - box.getItems().indexOf(box.getValue());
        for (int i = 0; i < Math.abs(steps); i++) {
            robot.type(steps > 0 ? KeyCode.DOWN : KeyCode.UP);
        }
        robot.type(KeyCode.ENTER);
        await(() -> value.equals(box.getValue()));
    }

    /** Where a place of the map is on the screen. */
    Point2D onMap(double mapX, double mapY) {
        Node canvas = robot.lookup("#map-canvas").query();
        Bounds bounds = canvas.localToScreen(canvas.getBoundsInLocal());
        Camera camera = assembly().map().camera().get();
        return new Point2D(bounds.getMinX() + camera.x(mapX), bounds.getMinY() + camera.y(mapY));
    }

    /** Presses keys together, and lets them go. */
    void type(KeyCode... keys) {
        robot.press(keys).release(keys);
    }

    /** Lets the window come to rest. */
    public void settle() {
        WaitForAsyncUtils.sleep(350, TimeUnit.MILLISECONDS);
        WaitForAsyncUtils.waitForFxEvents();
    }

    Assembly assembly() {
        return assembly;
    }

    /** {@return where work is done} */
    Tasks tasks() {
        return tasks;
    }

    Stage stage() {
        return stage;
    }

    @Override
    public void close() {
        robot.interact(() -> stage.hide());
        tasks.close();
    }
}
