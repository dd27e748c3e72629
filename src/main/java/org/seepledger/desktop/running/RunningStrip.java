package org.seepledger.desktop.running;

import java.time.Duration;
import javafx.animation.Animation;
import javafx.animation.KeyFrame;
import javafx.animation.Timeline;
import javafx.collections.ListChangeListener;
import javafx.scene.Scene;
import javafx.scene.control.Button;
import javafx.scene.control.Hyperlink;
import javafx.scene.control.ProgressBar;
import javafx.scene.control.Tooltip;
import javafx.scene.layout.HBox;
import javafx.stage.Window;
import org.seepledger.desktop.words.Words;

/** The work that has run longest, in the line below; a click lists all. */
public final class RunningStrip extends HBox {

    private static final double LOOKS_PER_SECOND = 4;

    private final RunningModel model;
    private final ProgressBar bar = new ProgressBar();
    private final Hyperlink words = new Hyperlink();
    private final Button stop = new Button(Words.of("running.stop"));

    /**
     * Builds the strip, which looks at the work while its window is open.
     *
     * @param model what runs
     * @param list lists all that runs
     */
    public RunningStrip(RunningModel model, Runnable list) {
        this.model = model;
        setId("running");
        getStyleClass().add("sl-running");
        words.setId("running-words");
        words.getStyleClass().add("sl-caution");
        words.setMinWidth(USE_PREF_SIZE);
        words.setTooltip(new Tooltip(Words.of("action.running")));
        words.setOnAction(pressed -> list.run());
        stop.setId("running-stop");
        stop.getStyleClass().add("small");
        stop.setMinWidth(USE_PREF_SIZE);
        stop.setTooltip(new Tooltip(Words.of("action.stop")));
        stop.setOnAction(pressed -> model.stop());
        bar.setMinWidth(USE_PREF_SIZE);
        getChildren().addAll(bar, words, stop);
        managedProperty().bind(visibleProperty());
        model.lines().addListener((ListChangeListener<RunningModel.Line>) change -> show());
        show();
        look();
    }

    private void look() {
        Timeline looks = new Timeline(new KeyFrame(
                javafx.util.Duration.seconds(1 / LOOKS_PER_SECOND),
                tick -> model.look(Duration.ofNanos(System.nanoTime()))));
        looks.setCycleCount(Animation.INDEFINITE);
        sceneProperty()
                .flatMap(Scene::windowProperty)
                .flatMap(Window::showingProperty)
                .subscribe(showing -> {
                    if (Boolean.TRUE.equals(showing)) {
                        looks.play();
                    } else {
                        looks.stop();
                    }
                });
    }

    private void show() {
        setVisible(!model.lines().isEmpty());
        if (isVisible()) {
            RunningModel.Line first = model.lines().get(0);
            bar.setProgress(Double.isNaN(first.share()) ? ProgressBar.INDETERMINATE_PROGRESS : first.share());
            int more = model.lines().size() - 1;
            words.setText(more == 0 ? first.told() : Words.of("running.more", first.told(), more));
            stop.setDisable(!model.canStop());
        }
    }
}
