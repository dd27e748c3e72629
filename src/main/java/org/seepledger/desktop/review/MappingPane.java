package org.seepledger.desktop.review;

import java.util.List;
import java.util.function.Function;
import java.util.function.UnaryOperator;
import javafx.beans.property.SimpleObjectProperty;
import javafx.scene.Node;
import javafx.scene.control.Button;
import javafx.scene.control.CheckBox;
import javafx.scene.control.ChoiceBox;
import javafx.scene.control.ComboBox;
import javafx.scene.control.Label;
import javafx.scene.control.TableCell;
import javafx.scene.control.TableColumn;
import javafx.scene.control.TableView;
import javafx.scene.control.TextField;
import javafx.scene.control.Tooltip;
import javafx.scene.layout.BorderPane;
import javafx.scene.layout.HBox;
import javafx.scene.layout.Priority;
import javafx.util.StringConverter;
import org.seepledger.desktop.review.MappingRow.Choice;
import org.seepledger.desktop.task.PaneState;
import org.seepledger.desktop.words.Words;
import org.seepledger.review.mapping.Mapping;

/** How the table was read, to be corrected. It stays when a correction leads nowhere, so that it can be taken back. */
final class MappingPane extends BorderPane {

    private static final double ROW = 32;

    private final ReviewModel model;
    private final TableView<MappingRow> table = new TableView<>();

    MappingPane(ReviewModel model) {
        this.model = model;
        setTop(head());
        setCenter(table);
        buildTable();
        model.answer().addListener((answer, before, after) -> show());
        show();
    }

    private Node head() {
        Label fault = new Label();
        fault.setId("review-mapping-fault");
        fault.getStyleClass().add("sl-warning");
        fault.setWrapText(true);
        fault.setMaxWidth(Double.MAX_VALUE);
        HBox.setHgrow(fault, Priority.ALWAYS);
        fault.textProperty()
                .bind(model.state().map(state -> state.phase() == PaneState.Phase.FAILED ? state.words() : ""));
        CheckBox whole = new CheckBox(Words.of("review.whole"));
        whole.setId("review-whole");
        whole.selectedProperty().bindBidirectional(model.wholeCells());
        HBox head = new HBox(
                8,
                muted("review.tolerance"),
                box(
                        "review-tolerance",
                        List.of(0.1, 0.5, 1.0, 2.0, 5.0, 10.0),
                        percent -> Words.of("review.percent", percent),
                        model.tolerance()),
                muted("review.year"),
                box(
                        "review-year",
                        java.util.stream.IntStream.rangeClosed(1, 12).boxed().toList(),
                        String::valueOf,
                        model.waterYearStart()),
                whole,
                fault,
                button("review-mapping-open", "review.mapping.open", "review.mapping.open.tip", model.mapping()::open),
                button("review-mapping-save", "review.mapping.save", "review.mapping.save.tip", model.mapping()::save),
                button(
                        "review-mapping-guess",
                        "review.mapping.guess",
                        "review.mapping.guess.tip",
                        model.mapping()::forget));
        head.getStyleClass().add("sl-review-head");
        return head;
    }

    private static Label muted(String key) {
        Label label = new Label(Words.of(key));
        label.getStyleClass().add("sl-muted");
        label.setMinWidth(USE_PREF_SIZE);
        return label;
    }

    private static Button button(String id, String key, String tip, Runnable does) {
        Button button = new Button(Words.of(key));
        button.setId(id);
        button.getStyleClass().add("small");
        button.setMinWidth(USE_PREF_SIZE);
        button.setTooltip(new Tooltip(Words.of(tip)));
        button.setOnAction(pressed -> does.run());
        return button;
    }

    private static <T> ChoiceBox<T> box(
            String id, List<T> choices, Function<T, String> words, javafx.beans.property.Property<T> chosen) {
        ChoiceBox<T> box = new ChoiceBox<>();
        box.setId(id);
        box.getItems().setAll(choices);
        box.setConverter(new StringConverter<>() {
            @Override
            public String toString(T choice) {
                return choice == null ? "" : words.apply(choice);
            }

            @Override
            public T fromString(String text) {
                throw new UnsupportedOperationException();
            }
        });
        box.valueProperty().bindBidirectional(chosen);
        return box;
    }

    private void buildTable() {
        table.setId("review-mapping");
        table.setPlaceholder(new Label(Words.of("review.mapping.none")));
        table.setColumnResizePolicy(TableView.CONSTRAINED_RESIZE_POLICY_FLEX_LAST_COLUMN);
        table.setFixedCellSize(ROW);
        table.getColumns().add(column("review.row.what", 90, row -> new Label(Words.of(row.what()))));
        table.getColumns().add(column("review.row.label", 260, row -> label(row.label())));
        table.getColumns().add(column("review.row.is", 300, this::kinds));
        table.getColumns().add(column("review.row.counts", 200, this::senses));
        table.getColumns().add(column("review.unit", 160, this::unit));
    }

    private void show() {
        int intervals = model.session()
                .set()
                .get()
                .map(set -> set.aquifer().times().intervals())
                .orElse(0);
        table.getItems()
                .setAll(model.answer()
                        .get()
                        .map(answer -> MappingRows.of(answer, intervals))
                        .orElse(List.of()));
    }

    private static Label label(String text) {
        Label label = new Label(text.isEmpty() ? Words.of("review.nameless") : text);
        label.setTooltip(new Tooltip(label.getText()));
        return label;
    }

    private Node kinds(MappingRow row) {
        ComboBox<Choice> box = choices(row.kinds(), row.is());
        row.typed().ifPresent(meaning -> {
            box.setEditable(true);
            box.getEditor().setText(row.is());
            box.setConverter(new StringConverter<>() {
                @Override
                public String toString(Choice choice) {
                    return choice == null ? "" : choice.words();
                }

                @Override
                public Choice fromString(String text) {
                    return new Choice(text, text.equals(row.is()) ? said -> said : meaning.apply(text.strip()));
                }
            });
        });
        return box;
    }

    private Node senses(MappingRow row) {
        return row.senses().isEmpty() ? new Label() : choices(row.senses(), row.counts());
    }

    private ComboBox<Choice> choices(List<Choice> choices, String now) {
        ComboBox<Choice> box = new ComboBox<>();
        box.getStyleClass().add("small");
        box.setMaxWidth(Double.MAX_VALUE);
        box.getItems().setAll(choices);
        box.setValue(choices.stream()
                .filter(choice -> choice.words().equals(now))
                .findFirst()
                .orElse(new Choice(now, said -> said)));
        box.valueProperty().addListener((value, before, after) -> {
            if (after != null && !after.words().equals(now)) {
                correct(after.change());
            }
        });
        return box;
    }

    private Node unit(MappingRow row) {
        if (row.united().isEmpty()) {
            return new Label(row.unit());
        }
        TextField field = new TextField(row.unit());
        field.setPromptText(Words.of("review.unit.prompt"));
        field.getStyleClass().add("small");
        Runnable take = () -> {
            if (!field.getText().equals(row.unit())) {
                correct(row.united().get().apply(field.getText().strip()));
            }
        };
        field.setOnAction(entered -> take.run());
        field.focusedProperty().addListener((focus, before, after) -> {
            if (!after) {
                take.run();
            }
        });
        return field;
    }

    private void correct(UnaryOperator<Mapping> change) {
        model.correct(change);
    }

    private static TableColumn<MappingRow, MappingRow> column(
            String key, double width, Function<MappingRow, Node> content) {
        TableColumn<MappingRow, MappingRow> column = new TableColumn<>(Words.of(key));
        column.setSortable(false);
        column.setReorderable(false);
        column.setPrefWidth(width);
        column.setCellValueFactory(row -> new SimpleObjectProperty<>(row.getValue()));
        column.setCellFactory(made -> new TableCell<>() {
            @Override
            protected void updateItem(MappingRow row, boolean empty) {
                if (row == getItem() && !empty && getGraphic() != null) {
                    return;
                }
                super.updateItem(row, empty);
                setGraphic(empty || row == null ? null : content.apply(row));
            }
        });
        return column;
    }
}
