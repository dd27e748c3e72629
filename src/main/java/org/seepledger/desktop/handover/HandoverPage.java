package org.seepledger.desktop.handover;

import javafx.animation.Animation;
import javafx.animation.KeyFrame;
import javafx.animation.Timeline;
import javafx.beans.binding.BooleanBinding;
import javafx.geometry.Insets;
import javafx.scene.Node;
import javafx.scene.control.Button;
import javafx.scene.control.Label;
import javafx.scene.control.ProgressBar;
import javafx.scene.control.ScrollPane;
import javafx.scene.control.TextArea;
import javafx.scene.input.KeyCode;
import javafx.scene.input.KeyEvent;
import javafx.scene.layout.BorderPane;
import javafx.scene.layout.HBox;
import javafx.scene.layout.Priority;
import javafx.scene.layout.Region;
import javafx.scene.layout.StackPane;
import javafx.scene.layout.VBox;
import javafx.util.Duration;
import org.seepledger.desktop.handover.HandoverModel.Stage;
import org.seepledger.desktop.pane.WordsLine;
import org.seepledger.desktop.words.Words;

/** The page on which a budget is handed over. */
public final class HandoverPage extends BorderPane {

    private static final Duration LOOK = Duration.millis(100);

    private final HandoverModel model;
    private final Runnable close;
    private final ChoicesView choices;
    private final ProgressBar bar = new ProgressBar(0);
    private final Label doing = new Label();
    private final Timeline looking = new Timeline(new KeyFrame(LOOK, looked -> showAdvance()));

    /**
     * Builds the page.
     *
     * @param model what it shows
     * @param close puts the page away
     */
    public HandoverPage(HandoverModel model, Runnable close) {
        this.model = model;
        this.close = close;
        this.choices = new ChoicesView(model);
        setId("handover-page");
        getStyleClass().addAll("sl-sheet", "sl-handover");
        setMaxSize(1180, 900);
        StackPane.setMargin(this, new Insets(20));
        Label title = new Label(Words.of("handover.heading"));
        title.getStyleClass().add("sl-heading");
        setTop(title);
        setCenter(new HBox(24, left(), right()));
        looking.setCycleCount(Animation.INDEFINITE);
        model.stage().addListener((stage, before, after) -> turn(after));
        addEventFilter(KeyEvent.KEY_PRESSED, key -> {
            if (key.getCode() == KeyCode.ESCAPE) {
                leave();
                key.consume();
            }
        });
    }

    /** Begins with the open set as it is now. */
    public void open() {
        choices.refresh();
        model.chooseAgain();
        lookup("#handover-out").requestFocus();
    }

    /** Puts the page away; work that goes on is stopped first. */
    private void leave() {
        if (model.stage().get() == Stage.WORKING) {
            model.cancel();
        } else {
            close.run();
        }
    }

    private Node left() {
        ScrollPane scroll = new ScrollPane(choices);
        scroll.setFitToWidth(true);
        scroll.getStyleClass().add("sl-handover-choices");
        scroll.setPrefWidth(440);
        scroll.setMinWidth(380);
        scroll.disableProperty().bind(is(Stage.WORKING));
        return scroll;
    }

    private Node right() {
        Fields where = new Fields().heading("where");
        where.path("out", model.choices().out(), model.prospect().outProblem(), model.questions()::folder);
        where.check("overwrite", model.choices().overwrite());
        where.disableProperty().bind(is(Stage.WORKING));
        StackPane below =
                new StackPane(new VBox(8, commands(), problems(), buttons()), working(), new DonePane(model, close));
        VBox.setVgrow(below, Priority.ALWAYS);
        below.getChildren().get(0).visibleProperty().bind(is(Stage.CHOOSING));
        VBox right = new VBox(12, where, below);
        HBox.setHgrow(right, Priority.ALWAYS);
        return right;
    }

    private BooleanBinding is(Stage stage) {
        return model.stage().isEqualTo(stage);
    }

    private Node commands() {
        Label name = new Label(Words.of("handover.commands"));
        name.getStyleClass().add("sl-form-heading");
        Button copy = new Button(Words.of("ledger.copy"));
        copy.setId("handover-copy");
        copy.setOnAction(pressed -> model.copyCommands());
        Region gap = new Region();
        HBox.setHgrow(gap, Priority.ALWAYS);
        TextArea text = new TextArea();
        text.setId("handover-commands");
        text.setEditable(false);
        text.getStyleClass().add("sl-code");
        text.textProperty().bind(model.prospect().commands());
        VBox.setVgrow(text, Priority.ALWAYS);
        Label note = new Label(Words.of("handover.commands.note"));
        note.getStyleClass().add("sl-small");
        note.setWrapText(true);
        note.setMinHeight(USE_PREF_SIZE);
        VBox box = new VBox(6, new HBox(8, name, gap, copy), text, note);
        VBox.setVgrow(box, Priority.ALWAYS);
        return box;
    }

    private Node problems() {
        VBox box = new VBox(4);
        box.getChildren()
                .addAll(
                        new WordsLine("handover-prisms", model.prospect().prismsNote(), "sl-small"),
                        new WordsLine("handover-problem", model.prospect().problem(), "sl-warning"),
                        new WordsLine("handover-fault", model.fault(), "sl-fault"));
        return box;
    }

    private Node buttons() {
        Button go = new Button(Words.of("handover.go"));
        go.setId("handover-go");
        go.getStyleClass().add("accent");
        go.setDefaultButton(true);
        go.setOnAction(pressed -> model.handOver());
        go.disableProperty().bind(model.prospect().problem().isNotEmpty());
        Button away = new Button(Words.of("close"));
        away.setOnAction(pressed -> close.run());
        Region gap = new Region();
        HBox.setHgrow(gap, Priority.ALWAYS);
        return new HBox(8, gap, away, go);
    }

    private Node working() {
        bar.setMaxWidth(Double.MAX_VALUE);
        doing.setId("handover-doing");
        Button stop = new Button(Words.of("handover.stop"));
        stop.setId("handover-stop");
        stop.setOnAction(pressed -> model.cancel());
        VBox box = new VBox(12, doing, bar, stop);
        box.getStyleClass().add("sl-notice");
        box.visibleProperty().bind(is(Stage.WORKING));
        return box;
    }

    private void turn(Stage stage) {
        if (stage == Stage.WORKING) {
            showAdvance();
            looking.play();
        } else {
            looking.stop();
        }
    }

    private void showAdvance() {
        String what = model.doing();
        doing.setText(what.isEmpty() ? Words.of("budget.working") : Words.of("handover.doing", what));
        boolean known = !what.isEmpty() && model.share() < 1;
        bar.setProgress(known ? model.share() : ProgressBar.INDETERMINATE_PROGRESS);
    }
}
