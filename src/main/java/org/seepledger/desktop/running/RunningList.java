package org.seepledger.desktop.running;

import java.util.List;
import javafx.collections.ListChangeListener;
import javafx.geometry.Pos;
import javafx.scene.control.Button;
import javafx.scene.control.Label;
import javafx.scene.control.ProgressBar;
import javafx.scene.layout.HBox;
import javafx.scene.layout.Priority;
import javafx.scene.layout.Region;
import javafx.scene.layout.VBox;
import org.seepledger.desktop.task.Running;
import org.seepledger.desktop.words.Words;

/** All that runs, each with its own way to stop it. */
public final class RunningList extends VBox {

    private static final double WIDTH = 520;

    private final RunningModel model;
    private final VBox rows = new VBox(8);
    private final Button done = new Button(Words.of("close"));
    private final Label none = new Label(Words.of("running.none"));
    private List<Row> listed = List.of();

    /**
     * Makes the list.
     *
     * @param model what runs
     * @param close puts the list away
     */
    public RunningList(RunningModel model, Runnable close) {
        this.model = model;
        setId("running-list");
        getStyleClass().add("sl-sheet");
        setMaxSize(WIDTH, USE_PREF_SIZE);
        Label title = new Label(Words.of("running.title"));
        title.getStyleClass().add("sl-heading");
        done.setCancelButton(true);
        done.setOnAction(pressed -> close.run());
        getChildren().addAll(title, rows, done);
        model.lines().addListener((ListChangeListener<RunningModel.Line>) change -> show());
        none.getStyleClass().add("sl-muted");
        rows.getChildren().add(none);
        show();
    }

    /** Moves the keyboard to the list. */
    public void open() {
        done.requestFocus();
    }

    /** The row of work that goes on stays, so that the keyboard stays on its button. */
    private void show() {
        List<Row> next = model.lines().stream().map(this::row).toList();
        if (!next.equals(listed)) {
            listed = next;
            rows.getChildren().setAll(next);
            if (next.isEmpty()) {
                rows.getChildren().add(none);
            }
            if (getScene() != null && getScene().getFocusOwner() == null) {
                done.requestFocus();
            }
        }
    }

    private Row row(RunningModel.Line line) {
        Row row = listed.stream()
                .filter(shown -> shown.work.equals(line.work()))
                .findFirst()
                .orElseGet(() -> new Row(line.work()));
        row.show(line);
        return row;
    }

    /** A piece of work. */
    private static final class Row extends HBox {

        private final Running work;
        private final ProgressBar bar = new ProgressBar();
        private final Label words = new Label();
        private final Button stop = new Button(Words.of("running.stop"));

        Row(Running work) {
            super(10);
            this.work = work;
            setAlignment(Pos.CENTER_LEFT);
            Region gap = new Region();
            HBox.setHgrow(gap, Priority.ALWAYS);
            stop.setMinWidth(USE_PREF_SIZE);
            stop.setOnAction(pressed -> work.stop());
            words.setWrapText(true);
            bar.setMinWidth(USE_PREF_SIZE);
            getChildren().addAll(bar, words, gap, stop);
        }

        void show(RunningModel.Line line) {
            bar.setProgress(Double.isNaN(line.share()) ? ProgressBar.INDETERMINATE_PROGRESS : line.share());
            words.setText(line.told());
            stop.setDisable(!work.listens());
        }
    }
}
