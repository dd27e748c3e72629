package org.seepledger.desktop.pane;

import javafx.animation.PauseTransition;
import javafx.beans.value.ObservableValue;
import javafx.geometry.Pos;
import javafx.scene.Node;
import javafx.scene.control.Button;
import javafx.scene.control.Label;
import javafx.scene.control.ProgressIndicator;
import javafx.scene.layout.StackPane;
import javafx.scene.layout.VBox;
import javafx.util.Duration;
import org.seepledger.desktop.task.PaneState;

/**
 * A pane in one of four states: empty with one clear action, working (shown after 300 ms, the old content dimmed), ready,
 * failed in words.
 */
public final class StatePane extends StackPane {

    private static final Duration PATIENCE = Duration.millis(300);

    private final Node content;
    private final Label words = new Label();
    private final ProgressIndicator turning = new ProgressIndicator();
    private final VBox notice = new VBox(12, turning, words);
    private final PauseTransition patience = new PauseTransition(PATIENCE);
    private final ObservableValue<PaneState> state;
    private Button action;

    /**
     * Frames a pane's content.
     *
     * @param content the content
     * @param state which state the pane is in
     */
    public StatePane(Node content, ObservableValue<PaneState> state) {
        this.content = content;
        this.state = state;
        notice.getStyleClass().add("sl-notice");
        words.getStyleClass().add("sl-notice-words");
        words.setWrapText(true);
        words.setMaxWidth(460);
        words.setAlignment(Pos.CENTER);
        turning.setMaxSize(28, 28);
        getChildren().addAll(content, notice);
        patience.setOnFinished(waited -> showWorking());
        state.addListener((now, before, after) -> show(after));
        show(state.getValue());
    }

    /**
     * Adds the one action of the empty state.
     *
     * @param says what the button says
     * @param does what it does
     * @return this
     */
    public StatePane withAction(String says, Runnable does) {
        action = new Button(says);
        action.getStyleClass().add("accent");
        action.setOnAction(pressed -> does.run());
        notice.getChildren().add(action);
        show(state.getValue());
        return this;
    }

    private void show(PaneState shown) {
        patience.stop();
        if (shown.phase() == PaneState.Phase.WORKING) {
            content.setVisible(true);
            notice(shown, false, false, false);
            patience.playFromStart();
            return;
        }
        boolean empty = shown.phase() == PaneState.Phase.EMPTY;
        content.setOpacity(1);
        content.setVisible(!empty && shown.phase() != PaneState.Phase.FAILED);
        notice(shown, shown.phase() != PaneState.Phase.READY, false, empty);
    }

    private void showWorking() {
        content.setOpacity(0.45);
        notice(state.getValue(), true, true, false);
    }

    private void notice(PaneState shown, boolean visible, boolean working, boolean withAction) {
        words.setText(shown.words());
        turning.setVisible(working);
        turning.setManaged(working);
        notice.setVisible(visible);
        notice.setMouseTransparent(working);
        if (action != null) {
            action.setVisible(withAction);
            action.setManaged(withAction);
        }
    }
}
