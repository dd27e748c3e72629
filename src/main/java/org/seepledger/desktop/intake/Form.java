package org.seepledger.desktop.intake;

import java.util.List;
import java.util.function.Consumer;
import java.util.function.Function;
import javafx.geometry.HPos;
import javafx.scene.Node;
import javafx.scene.control.ComboBox;
import javafx.scene.control.Label;
import javafx.scene.layout.ColumnConstraints;
import javafx.scene.layout.GridPane;
import javafx.scene.layout.Priority;
import javafx.scene.text.TextAlignment;
import org.seepledger.desktop.words.ChoiceWords;
import org.seepledger.desktop.words.Words;

/** Lines of a word and what is chosen or typed for it. */
final class Form extends GridPane {

    private static final double WORDS_WIDTH = 150;

    Form() {
        super(10, 6);
        ColumnConstraints words = new ColumnConstraints(WORDS_WIDTH);
        words.setHalignment(HPos.RIGHT);
        ColumnConstraints fields = new ColumnConstraints();
        fields.setHgrow(Priority.ALWAYS);
        getColumnConstraints().addAll(words, fields);
    }

    void line(String words, Node field) {
        Label label = new Label(words);
        label.getStyleClass().add("sl-muted");
        label.setWrapText(true);
        label.setTextAlignment(TextAlignment.RIGHT);
        label.setLabelFor(field);
        addRow(getRowCount(), label, field);
    }

    void note(Label note) {
        note.setWrapText(true);
        note.getStyleClass().add("sl-small");
        add(note, 1, getRowCount());
    }

    static Label heading(String key) {
        Label heading = new Label(Words.of(key));
        heading.getStyleClass().add("sl-strong");
        return heading;
    }

    /** A choice among values, shown as words. */
    static <T> ComboBox<T> choice(String id, List<T> values, T chosen, Function<T, String> words, Consumer<T> take) {
        ComboBox<T> box = new ComboBox<>();
        box.setId(id);
        box.getItems().setAll(values);
        box.setConverter(new ChoiceWords<>(words));
        box.setValue(chosen);
        box.setOnAction(picked -> {
            if (box.getValue() != null) {
                take.accept(box.getValue());
            }
        });
        return box;
    }
}
