package org.seepledger.desktop.review;

import javafx.beans.value.ObservableValue;
import javafx.scene.control.Button;
import javafx.scene.control.CheckBox;
import javafx.scene.control.Label;
import javafx.scene.control.TextArea;
import javafx.scene.control.TextField;
import javafx.scene.layout.HBox;
import javafx.scene.layout.Priority;
import javafx.scene.layout.Region;
import javafx.scene.layout.VBox;
import org.seepledger.desktop.words.Words;

/** Where the review is written, and the command that writes the same. */
final class WritePane extends VBox {

    private final WritingModel model;

    WritePane(WritingModel model) {
        this.model = model;
        getStyleClass().add("sl-review-write");
        TextArea command = new TextArea();
        command.setId("review-command");
        command.setEditable(false);
        command.getStyleClass().add("sl-code");
        command.textProperty().bind(model.command());
        setVgrow(command, Priority.ALWAYS);
        getChildren()
                .addAll(
                        where(),
                        command,
                        line("review-problem", model.problem(), "sl-warning"),
                        line("review-told", model.told(), "sl-plain"),
                        buttons());
    }

    private HBox where() {
        TextField out = new TextField();
        out.setId("review-out");
        out.setPromptText(Words.of("handover.out.prompt"));
        out.textProperty().bindBidirectional(model.out());
        HBox.setHgrow(out, Priority.ALWAYS);
        CheckBox overwrite = new CheckBox(Words.of("review.overwrite"));
        overwrite.setId("review-overwrite");
        overwrite.selectedProperty().bindBidirectional(model.overwrite());
        overwrite.setMinWidth(USE_PREF_SIZE);
        Label name = new Label(Words.of("handover.out"));
        name.getStyleClass().add("sl-muted");
        name.setLabelFor(out);
        name.setMinWidth(USE_PREF_SIZE);
        return new HBox(8, name, out, button("review-out-ask", "handover.ask", model::chooseFolder), overwrite);
    }

    private HBox buttons() {
        Button write = button("review-go", "review.write", model::write);
        write.getStyleClass().add("accent");
        write.disableProperty().bind(model.problem().isNotEmpty());
        Button folder = button("review-open-folder", "handover.open.folder", model::openFolder);
        Button page = button("review-open-page", "review.open.page", model::openPage);
        for (Button open : java.util.List.of(folder, page)) {
            open.disableProperty().bind(model.written().map(written -> written.isEmpty()));
        }
        Region gap = new Region();
        HBox.setHgrow(gap, Priority.ALWAYS);
        return new HBox(8, button("review-copy", "review.copy", model::copyCommand), gap, folder, page, write);
    }

    private static Button button(String id, String key, Runnable does) {
        Button button = new Button(Words.of(key));
        button.setId(id);
        button.setMinWidth(USE_PREF_SIZE);
        button.setOnAction(pressed -> does.run());
        return button;
    }

    private static Label line(String id, ObservableValue<String> words, String style) {
        Label line = new Label();
        line.setId(id);
        line.setWrapText(true);
        line.setMinHeight(USE_PREF_SIZE);
        line.getStyleClass().add(style);
        line.textProperty().bind(words);
        line.visibleProperty().bind(line.textProperty().isNotEmpty());
        line.managedProperty().bind(line.visibleProperty());
        return line;
    }
}
