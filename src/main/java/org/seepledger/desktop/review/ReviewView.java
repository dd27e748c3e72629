package org.seepledger.desktop.review;

import java.io.File;
import java.nio.file.Path;
import java.util.List;
import java.util.Optional;
import javafx.scene.Node;
import javafx.scene.control.Button;
import javafx.scene.control.Label;
import javafx.scene.control.OverrunStyle;
import javafx.scene.control.ToggleButton;
import javafx.scene.control.ToggleGroup;
import javafx.scene.control.Tooltip;
import javafx.scene.input.DragEvent;
import javafx.scene.input.TransferMode;
import javafx.scene.layout.BorderPane;
import javafx.scene.layout.HBox;
import javafx.scene.layout.Priority;
import org.seepledger.desktop.action.Action;
import org.seepledger.desktop.pane.StatePane;
import org.seepledger.desktop.words.Words;

/** The pane of the review, in three parts: what was found, how the table was read, and what is written of it. */
final class ReviewView extends BorderPane {

    private static final double LEAST_HEIGHT = 236;

    private final ReviewModel model;
    private final WritingModel writing;
    private final ToggleGroup parts = new ToggleGroup();
    private final HBox marks = new HBox();
    private final HBox bar;

    ReviewView(ReviewModel model, WritingModel writing) {
        this.model = model;
        this.writing = writing;
        setId("review");
        getStyleClass().add("sl-review");
        setMinHeight(LEAST_HEIGHT);
        Node findings = new StatePane(new FindingsPane(model), model.state())
                .withAction(Words.of("review.choose"), model::choose);
        marks.getStyleClass().add("sl-marks");
        part("review.part.findings", findings);
        part("review.part.mapping", new MappingPane(model));
        part("review.part.write", new WritePane(writing));
        open(0);
        this.bar = buildBar();
        setOnDragOver(ReviewView::hold);
        setOnDragDropped(this::take);
        sceneProperty().addListener((scene, before, after) -> model.show(after != null));
    }

    private void part(String key, Node content) {
        ToggleButton mark = new ToggleButton(Words.of(key));
        mark.setId(key.replace('.', '-'));
        mark.getStyleClass().add("sl-mark-page");
        mark.setToggleGroup(parts);
        mark.setMinWidth(USE_PREF_SIZE);
        int number = marks.getChildren().size();
        mark.setUserData(content);
        mark.setOnAction(pressed -> open(number));
        marks.getChildren().add(mark);
    }

    private void open(int number) {
        parts.selectToggle(parts.getToggles().get(number));
        setCenter((Node) parts.getToggles().get(number).getUserData());
    }

    private HBox buildBar() {
        Label file = new Label();
        file.setId("review-file");
        file.getStyleClass().add("sl-belongs");
        file.setTextOverrun(OverrunStyle.CENTER_ELLIPSIS);
        file.textProperty().bind(model.submitted().map(ReviewView::name));
        file.setMaxWidth(Double.MAX_VALUE);
        file.setMinWidth(0);
        HBox.setHgrow(file, Priority.ALWAYS);
        HBox built = new HBox(
                6,
                marks,
                file,
                button("review-again", "review.again", "action.review.again", model::readAgain),
                button("review-choose", "review.choose", "action.review.choose", model::choose));
        built.getStyleClass().add("sl-review-bar");
        return built;
    }

    private static String name(Optional<Path> file) {
        return file.map(path -> path.getFileName().toString()).orElse("");
    }

    private static Button button(String id, String words, String tip, Runnable does) {
        Button button = new Button(Words.of(words));
        button.setId(id);
        button.getStyleClass().addAll("small", "flat");
        button.setTooltip(new Tooltip(Words.of(tip)));
        button.setMinWidth(USE_PREF_SIZE);
        button.setOnAction(pressed -> does.run());
        return button;
    }

    /** {@return its three parts and what is submitted} */
    Node bar() {
        return bar;
    }

    /** Moves the keyboard to where it goes on. */
    void focus() {
        boolean begun = model.submitted().get().isPresent();
        Node target = lookup(begun ? "#review-findings" : ".accent");
        (target == null ? marks.getChildren().get(0) : target).requestFocus();
    }

    private static void hold(DragEvent drag) {
        if (drag.getDragboard().hasFiles()) {
            drag.acceptTransferModes(TransferMode.COPY, TransferMode.LINK);
        }
        drag.consume();
    }

    private void take(DragEvent drag) {
        drag.getDragboard().getFiles().stream().map(File::toPath).findFirst().ifPresent(model::bring);
        drag.setDropCompleted(true);
        drag.consume();
    }

    private boolean isOpen() {
        return getScene() != null;
    }

    /** {@return what can be done with the review} */
    List<Action> actions() {
        String group = "actions.group.review";
        return List.of(
                new Action(group, "action.review.choose", "Shortcut+Shift+G", this::isOpen, model::choose),
                new Action(group, "action.review.again", "Shortcut+Shift+R", this::isOpen, model::readAgain),
                new Action(group, "action.review.findings", "Alt+1", this::isOpen, () -> open(0)),
                new Action(group, "action.review.mapping", "Alt+2", this::isOpen, () -> open(1)),
                new Action(group, "action.review.write", "Alt+3", this::isOpen, () -> open(2)),
                new Action(group, "action.review.mapping.open", "Alt+O", this::isOpen, model.mapping()::open),
                new Action(group, "action.review.mapping.save", "Alt+S", this::isOpen, model.mapping()::save),
                new Action(group, "action.review.go", "Alt+W", this::isOpen, writing::write));
    }
}
