package org.seepledger.desktop.handover;

import java.util.List;
import java.util.function.Function;
import javafx.beans.property.BooleanProperty;
import javafx.beans.property.Property;
import javafx.beans.value.ObservableValue;
import javafx.scene.Node;
import javafx.scene.control.Button;
import javafx.scene.control.CheckBox;
import javafx.scene.control.ChoiceBox;
import javafx.scene.control.Label;
import javafx.scene.control.TextArea;
import javafx.scene.control.TextField;
import javafx.scene.control.TextInputControl;
import javafx.scene.layout.GridPane;
import javafx.scene.layout.HBox;
import javafx.scene.layout.Priority;
import javafx.scene.layout.VBox;
import org.seepledger.desktop.words.ChoiceWords;
import org.seepledger.desktop.words.Words;

/** A form: a name on the left of each field, what is wrong with it below. */
final class Fields extends GridPane {

    private static final double LABELS = 124;
    private static final double LEAST_WIDTH = 150;
    private static final String KEY = "handover.";

    private int row;

    Fields() {
        getStyleClass().add("sl-form");
    }

    /** A heading over what follows. */
    Fields heading(String key) {
        Label heading = new Label(Words.of(KEY + key));
        heading.getStyleClass().add("sl-form-heading");
        add(heading, 0, row++, 2, 1);
        return this;
    }

    /** A thing that is wanted or not. */
    CheckBox check(String key, BooleanProperty chosen) {
        CheckBox box = box(key, chosen);
        add(box, 0, row++, 2, 1);
        return box;
    }

    private static CheckBox box(String key, BooleanProperty chosen) {
        CheckBox box = new CheckBox(Words.of(KEY + key));
        box.setId(id(key));
        box.selectedProperty().bindBidirectional(chosen);
        return box;
    }

    /** Things of a kind that are wanted or not, side by side. */
    void checks(String key, List<String> keys, List<BooleanProperty> chosen) {
        HBox boxes = new HBox(16);
        for (int i = 0; i < keys.size(); i++) {
            boxes.getChildren().add(box(keys.get(i), chosen.get(i)));
        }
        field(key, boxes);
    }

    /** One of several things. */
    <T> ChoiceBox<T> choice(String key, List<T> choices, Function<T, String> words, Property<T> chosen) {
        ChoiceBox<T> box = new ChoiceBox<>();
        box.setId(id(key));
        box.setConverter(new ChoiceWords<>(words));
        box.getItems().setAll(choices);
        box.setValue(chosen.getValue());
        box.valueProperty().addListener((value, before, after) -> {
            if (after != null) {
                chosen.setValue(after);
            }
        });
        chosen.addListener((value, before, after) -> box.setValue(after));
        box.setMaxWidth(Double.MAX_VALUE);
        field(key, box);
        return box;
    }

    /** A line of text; its prompt says what holds where nothing is typed. */
    TextField text(String key, Entry<?> entry) {
        return typed(key, new TextField(), entry);
    }

    /** Several lines of text. */
    void lines(String key, Entry<?> entry) {
        TextArea area = typed(key, new TextArea(), entry);
        area.setPrefRowCount(2);
    }

    private <T extends TextInputControl> T typed(String key, T control, Entry<?> entry) {
        entered(key, control, entry);
        field(key, problem(control, entry.problem()));
        return control;
    }

    private static void entered(String key, TextInputControl control, Entry<?> entry) {
        control.setId(id(key));
        control.setPromptText(Words.of(KEY + key + ".prompt"));
        control.textProperty().bindBidirectional(entry.text());
    }

    /** A path, with a button that asks for it. */
    void path(String key, Entry<?> entry, ObservableValue<String> problem, Runnable asks) {
        TextField field = new TextField();
        entered(key, field, entry);
        field.setMinWidth(LEAST_WIDTH);
        Button ask = new Button(Words.of("handover.ask"));
        ask.setId(id(key) + "-ask");
        ask.setMinWidth(USE_PREF_SIZE);
        ask.setOnAction(pressed -> asks.run());
        HBox.setHgrow(field, Priority.ALWAYS);
        field(key, problem(new HBox(8, field, ask), problem));
    }

    private static VBox problem(Node control, ObservableValue<String> words) {
        Label label = new Label();
        label.getStyleClass().addAll("sl-small", "sl-warning");
        label.setWrapText(true);
        label.textProperty().bind(words);
        label.visibleProperty().bind(label.textProperty().isNotEmpty());
        label.managedProperty().bind(label.visibleProperty());
        return new VBox(2, control, label);
    }

    private void field(String key, Node control) {
        Label name = new Label(Words.of(KEY + key));
        name.getStyleClass().add("sl-muted");
        name.setMinWidth(LABELS);
        name.setLabelFor(control);
        setHgrow(control, Priority.ALWAYS);
        addRow(row++, name, control);
    }

    private static String id(String key) {
        return "handover-" + key.replace('.', '-');
    }
}
