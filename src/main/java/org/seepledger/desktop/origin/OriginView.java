package org.seepledger.desktop.origin;

import java.math.BigDecimal;
import java.math.MathContext;
import java.util.Comparator;
import java.util.List;
import java.util.function.DoubleFunction;
import java.util.function.Function;
import javafx.beans.property.SimpleObjectProperty;
import javafx.collections.ListChangeListener;
import javafx.collections.transformation.SortedList;
import javafx.scene.Node;
import javafx.scene.control.Button;
import javafx.scene.control.Label;
import javafx.scene.control.OverrunStyle;
import javafx.scene.control.SelectionMode;
import javafx.scene.control.TableCell;
import javafx.scene.control.TableColumn;
import javafx.scene.control.TableView;
import javafx.scene.control.TextField;
import javafx.scene.control.Tooltip;
import javafx.scene.layout.BorderPane;
import javafx.scene.layout.HBox;
import javafx.scene.layout.VBox;
import org.seepledger.desktop.pane.StatePane;
import org.seepledger.desktop.pane.WordsLine;
import org.seepledger.desktop.words.Words;
import org.seepledger.job.TracedNumber.Line;
import org.seepledger.unit.Figures;

/** The values that a number rests on, as a table; what is selected lights up on the map. */
public final class OriginView extends BorderPane {

    private final OriginModel model;
    private final TableView<Line> table = new TableView<>();

    /**
     * Builds the pane.
     *
     * @param model what it shows
     */
    public OriginView(OriginModel model) {
        this.model = model;
        setId("origin");
        getStyleClass().addAll("sl-ledger", "sl-origin");
        setTop(head());
        buildTable();
        setCenter(new StatePane(table, model.state()));
    }

    private Node head() {
        TextField sought = new TextField();
        sought.setId("origin-sought");
        sought.setPromptText(Words.of("origin.sought"));
        sought.textProperty().bindBidirectional(model.sought());
        Button export = button("origin.export", "origin-export", model::export);
        Button copy = button("origin.copy", "origin-copy", model::copyCommand);
        Tooltip command = new Tooltip();
        command.setId("origin-command");
        command.textProperty().bind(model.command());
        copy.setTooltip(command);
        Button again = button("origin.again", "origin-again", model::again);
        again.visibleProperty().bind(model.changed());
        again.managedProperty().bind(model.changed());
        HBox tools = new HBox(8, export, copy, again);
        VBox head = new VBox(
                new WordsLine("origin-belongs", model.belongs(), "sl-strong"),
                new WordsLine("origin-sum", model.sum(), "sl-answer"),
                new WordsLine("origin-remark", model.remark(), "sl-warning"),
                tools,
                new WordsLine("origin-shown", model.shown(), "sl-small"),
                sought);
        head.getStyleClass().add("sl-choices");
        return head;
    }

    private static Button button(String words, String id, Runnable does) {
        Button button = new Button(Words.of(words));
        button.setId(id);
        button.setMinWidth(USE_PREF_SIZE);
        button.setOnAction(pressed -> does.run());
        return button;
    }

    private void buildTable() {
        table.setId("origin-table");
        SortedList<Line> sorted = new SortedList<>(model.lines());
        sorted.comparatorProperty().bind(table.comparatorProperty());
        table.setItems(sorted);
        table.setColumnResizePolicy(TableView.CONSTRAINED_RESIZE_POLICY_FLEX_LAST_COLUMN);
        table.setPlaceholder(new Label(Words.of("origin.none")));
        table.getSelectionModel().setSelectionMode(SelectionMode.MULTIPLE);
        table.getColumns().add(places());
        table.getColumns().add(number("origin.value", Line::value, Comparator.naturalOrder(), OriginView::stored));
        Comparator<Double> bySize = Comparator.comparing(Math::abs);
        table.getColumns().add(number("origin.weight", Line::weight, bySize, Figures::tabular));
        table.getColumns().add(number("origin.product", Line::contribution, bySize, Figures::tabular));
        table.getSelectionModel().getSelectedItems().addListener((ListChangeListener<Line>)
                change -> model.light(List.copyOf(table.getSelectionModel().getSelectedItems())));
        table.setOnMouseClicked(click -> {
            Line chosen = table.getSelectionModel().getSelectedItem();
            if (click.getClickCount() == 2 && chosen != null) {
                model.goTo(chosen);
            }
        });
    }

    private static TableColumn<Line, Line> places() {
        TableColumn<Line, Line> column = new TableColumn<>(Words.of("origin.place"));
        column.setCellValueFactory(line -> new SimpleObjectProperty<>(line.getValue()));
        column.setCellFactory(made -> new PlaceCell());
        column.setComparator(Comparator.comparing(Line::file).thenComparing(Line::place));
        column.setMinWidth(150);
        column.setPrefWidth(190);
        return column;
    }

    private static TableColumn<Line, Double> number(
            String words, Function<Line, Double> number, Comparator<Double> order, DoubleFunction<String> text) {
        TableColumn<Line, Double> column = new TableColumn<>(Words.of(words));
        column.getStyleClass().add("sl-numbers");
        column.setCellValueFactory(line -> new SimpleObjectProperty<>(number.apply(line.getValue())));
        column.setCellFactory(made -> new FigureCell(text));
        column.setComparator(order);
        column.setPrefWidth(86);
        return column;
    }

    /** File and place, one below the other. */
    private static final class PlaceCell extends TableCell<Line, Line> {

        private final Label file = new Label();
        private final Label place = new Label();
        private final VBox both = new VBox(file, place);

        PlaceCell() {
            // Neighbouring values differ in what comes last.
            place.setTextOverrun(OverrunStyle.LEADING_ELLIPSIS);
            place.getStyleClass().add("sl-small");
        }

        @Override
        protected void updateItem(Line line, boolean empty) {
            super.updateItem(line, empty);
            boolean shown = !empty && line != null;
            setGraphic(shown ? both : null);
            if (shown) {
                file.setText(line.file());
                place.setText(line.place());
            }
        }
    }

    /** A value as it stands in the file, to seven digits: neighbouring heads differ in the fifth. */
    private static String stored(double value) {
        return value == 0 || !Double.isFinite(value)
                ? String.valueOf(value)
                : new BigDecimal(value)
                        .round(new MathContext(7))
                        .stripTrailingZeros()
                        .toString();
    }

    /** A number with the digits that a person reads. */
    private static final class FigureCell extends TableCell<Line, Double> {

        private final DoubleFunction<String> text;

        FigureCell(DoubleFunction<String> text) {
            this.text = text;
            getStyleClass().add("sl-figure");
        }

        @Override
        protected void updateItem(Double number, boolean empty) {
            super.updateItem(number, empty);
            setText(empty || number == null ? "" : text.apply(number));
        }
    }
}
