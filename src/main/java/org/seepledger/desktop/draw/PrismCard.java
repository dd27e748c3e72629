package org.seepledger.desktop.draw;

import java.util.List;
import java.util.Optional;
import java.util.function.Consumer;
import javafx.geometry.HPos;
import javafx.geometry.Pos;
import javafx.scene.control.Button;
import javafx.scene.control.Label;
import javafx.scene.control.TextField;
import javafx.scene.control.Tooltip;
import javafx.scene.layout.ColumnConstraints;
import javafx.scene.layout.GridPane;
import javafx.scene.layout.HBox;
import javafx.scene.layout.Priority;
import javafx.scene.layout.VBox;
import org.seepledger.desktop.pane.FieldFault;
import org.seepledger.desktop.words.Words;
import org.seepledger.sketch.Shape;

/** What is typed of the selected prism: its name and note, how far it reaches up and down, its place in the order. */
final class PrismCard extends VBox {

    private final DraftModel model;
    private final TextField name = new TextField();
    private final TextField note = new TextField();
    private final TextField layers = new TextField();
    private final TextField top = new TextField();
    private final TextField bottom = new TextField();
    private final TextField boundary = new TextField();
    private final TextField buffer = new TextField();
    private final CardModel card;

    PrismCard(DraftModel model, DraftHand hand, LidSurfaces surfaces) {
        this.model = model;
        this.card = new CardModel(model, surfaces);
        setId("card");
        getStyleClass().add("sl-float");
        setMaxSize(USE_PREF_SIZE, USE_PREF_SIZE);
        GridPane rows = new GridPane(8, 6);
        ColumnConstraints words = new ColumnConstraints();
        words.setHalignment(HPos.RIGHT);
        ColumnConstraints fields = new ColumnConstraints();
        fields.setHgrow(Priority.ALWAYS);
        rows.getColumnConstraints().addAll(words, fields);
        row(rows, "card.name", "card-name", name, card::rename);
        row(rows, "card.note", "card-note", note, card::note);
        row(rows, "card.layers", "card-layers", layers, card::layers);
        row(rows, "card.top", "card-top", top, text -> card.lids(text, bottom.getText()));
        row(rows, "card.bottom", "card-bottom", bottom, text -> card.lids(top.getText(), text));
        row(rows, "card.boundary", "card-boundary", boundary, hand::nameBoundary);
        boundary.setPromptText(Words.of("card.boundary.prompt"));
        rows.add(chooser("card-top-file", () -> card.chooseTop(bottom.getText())), 2, 3);
        rows.add(chooser("card-bottom-file", () -> card.chooseBottom(top.getText())), 2, 4);
        row(rows, "card.buffer", "card-buffer", buffer, this::takeBuffer);
        buffer.setPromptText(Words.of("card.buffer.prompt"));
        buffer.setTooltip(new Tooltip(Words.of("card.buffer.tip")));
        Label title = new Label(Words.of("card.title"));
        title.getStyleClass().add("sl-strong");
        HBox buttons = new HBox(
                6,
                button("card.up", () -> card.reorder(-1)),
                button("card.down", () -> card.reorder(1)),
                button("card.delete", card::delete));
        buttons.setAlignment(Pos.CENTER_RIGHT);
        getChildren().addAll(title, rows, buttons);
        model.version().addListener((version, before, after) -> show());
        model.session().selected().addListener((selected, before, after) -> show());
        show();
    }

    private static Button chooser(String id, Runnable does) {
        Button button = new Button("…");
        button.setId(id);
        button.getStyleClass().add("small");
        button.setAccessibleText(Words.of("card.lid.file"));
        button.setTooltip(new Tooltip(Words.of("card.lid.file")));
        button.setOnAction(pressed -> does.run());
        return button;
    }

    private void takeBuffer(String distance) {
        if (card.buffer(distance)) {
            buffer.clear();
        }
    }

    /** A value is taken by Enter, and when the keyboard leaves the field. */
    private void row(GridPane rows, String key, String id, TextField field, Consumer<String> take) {
        Label label = new Label(Words.of(key));
        label.getStyleClass().add("sl-muted");
        field.setId(id);
        field.getStyleClass().add("small");
        field.setPrefColumnCount(14);
        FieldFault fault = new FieldFault(id + "-fault");
        field.setOnAction(entered -> take(field, take, fault));
        field.textProperty().addListener((text, before, after) -> fault.say(""));
        field.focusedProperty().addListener((focus, before, now) -> {
            if (!now && field != boundary && field != buffer && !field.getText().equals(field.getUserData())) {
                take(field, take, fault);
            }
        });
        model.session().selected().addListener((selected, before, after) -> fault.say(""));
        label.setLabelFor(field);
        rows.addRow(rows.getRowCount(), label, new VBox(2, field, fault));
    }

    private void take(TextField field, Consumer<String> take, FieldFault fault) {
        model.forgetRefusal();
        take.accept(field.getText());
        fault.say(model.refusal().get());
    }

    /** Moves the keyboard to the name. */
    void focusName() {
        name.requestFocus();
    }

    private static Button button(String key, Runnable does) {
        Button button = new Button(Words.of(key));
        button.getStyleClass().add("small");
        button.setOnAction(pressed -> does.run());
        return button;
    }

    private void show() {
        Optional<Shape> shape = model.selected();
        setDisable(shape.isEmpty());
        put(name, shape.map(Shape::name).orElse(""));
        put(note, shape.map(Shape::note).orElse(""));
        put(layers, card.layersText());
        put(top, card.topText());
        put(bottom, card.bottomText());
        boolean typed = !card.topText().isEmpty() || !card.bottomText().isEmpty();
        layers.setPromptText(typed ? "" : Words.of("card.layers.all"));
        for (TextField lid : List.of(top, bottom)) {
            lid.setPromptText(Words.of("card.lid.grid"));
        }
    }

    private static void put(TextField field, String text) {
        field.setUserData(text);
        if (!field.isFocused() || !field.getText().equals(text)) {
            field.setText(text);
        }
    }
}
