package org.seepledger.desktop.transect;

import java.util.List;
import java.util.Optional;
import java.util.function.Function;
import javafx.beans.property.SimpleObjectProperty;
import javafx.css.PseudoClass;
import javafx.scene.control.Button;
import javafx.scene.control.ChoiceBox;
import javafx.scene.control.Label;
import javafx.scene.control.TableCell;
import javafx.scene.control.TableColumn;
import javafx.scene.control.TableRow;
import javafx.scene.control.TableView;
import javafx.scene.control.TextField;
import javafx.scene.control.Tooltip;
import javafx.scene.layout.BorderPane;
import javafx.scene.layout.FlowPane;
import javafx.scene.layout.VBox;
import org.seepledger.desktop.pane.StatePane;
import org.seepledger.desktop.words.ChoiceWords;
import org.seepledger.desktop.words.Words;
import org.seepledger.unit.Figures;

/** The table of what crosses the chosen transect, and below it through how little of the area most of it goes. */
public final class TransectView extends BorderPane {

    private static final PseudoClass TOTAL = PseudoClass.getPseudoClass("total");
    private static final double NUMBER = 102;

    /** How the numbers of a row read, in the order of columns. */
    private static final List<Function<TransectRow, String>> NUMBERS = List.of(
            row -> Figures.tabular(row.discharge()),
            row -> Figures.typesetPercent(row.share()),
            row -> Figures.typesetPercent(row.areaShare()),
            row -> Figures.tabular(row.concentration()),
            row -> Figures.tabular(row.low()),
            row -> Figures.tabular(row.high()),
            row -> Figures.tabular(row.area()),
            row -> Figures.tabular(row.flow()));

    private final TransectModel model;
    private final TableView<TransectRow> table = new TableView<>();
    private final ChoiceBox<TransectModel.Choice> choices = new ChoiceBox<>();
    private final Label belongs = words("transect-belongs", "sl-belongs");
    private final Label concentrated = words("transect-shares", "sl-answer");
    private final Label caution = words("transect-caution", "sl-small");

    /**
     * Builds the page.
     *
     * @param model what it shows
     */
    public TransectView(TransectModel model) {
        this.model = model;
        setId("transects");
        getStyleClass().addAll("sl-ledger", "sl-transects");
        table.setId("transect-table");
        table.setPlaceholder(new Label());
        table.setRowFactory(made -> new KindRow());
        buildColumns();
        caution.setText(Words.of("transect.caution"));
        VBox top = new VBox(belongs, choices());
        top.getStyleClass().add("sl-choices");
        VBox below = new VBox(concentrated, caution);
        below.getStyleClass().add("sl-choices");
        setTop(top);
        setCenter(new StatePane(table, model.state()).withAction(Words.of("transect.draw"), model::draw));
        setBottom(below);
        below.visibleProperty().bind(model.table().map(Optional::isPresent));
        model.table().addListener((shown, before, after) -> show(after));
        show(model.table().get());
    }

    private static Label words(String id, String style) {
        Label label = new Label();
        label.setId(id);
        label.setWrapText(true);
        label.setMinHeight(USE_PREF_SIZE);
        label.getStyleClass().add(style);
        return label;
    }

    private FlowPane choices() {
        choices.setId("transect-choice");
        choices.setMinWidth(150);
        choices.setItems(model.choices());
        choices.setConverter(new ChoiceWords<>(TransectModel.Choice::name));
        choices.setOnAction(chosen -> Optional.ofNullable(choices.getValue())
                .ifPresent(choice -> model.chosen().set(Optional.of(choice))));
        model.chosen().addListener((chosen, before, after) -> choices.setValue(after.orElse(null)));
        choices.setValue(model.chosen().get().orElse(null));
        return new FlowPane(
                8,
                6,
                choices,
                name(),
                button("transect-copy", "ledger.copy", "ledger.copy.tip", model::copy),
                button("transect-panels", "transect.panels", "transect.panels.tip", model::openPanels));
    }

    /** The chosen transect's name, to type another. */
    private TextField name() {
        TextField name = new TextField();
        name.setId("transect-name");
        name.getStyleClass().add("small");
        name.setPrefColumnCount(8);
        name.setPromptText(Words.of("transect.name"));
        name.setTooltip(new Tooltip(Words.of("transect.name.tip")));
        name.disableProperty()
                .bind(model.chosen()
                        .map(chosen ->
                                chosen.filter(choice -> choice.measured() < 0).isEmpty()));
        name.setOnAction(entered -> {
            model.rename(name.getText());
            name.clear();
        });
        return name;
    }

    private static Button button(String id, String words, String tip, Runnable does) {
        Button button = new Button(Words.of(words));
        button.setId(id);
        button.setTooltip(new Tooltip(Words.of(tip)));
        button.setOnAction(pressed -> does.run());
        return button;
    }

    private void buildColumns() {
        table.getColumns().add(column(TransectRow::name, 88));
        table.getColumns().add(column(TransectRow::layer, 70));
        for (Function<TransectRow, String> number : NUMBERS) {
            TableColumn<TransectRow, TransectRow> column = column(number, NUMBER);
            column.getStyleClass().add("sl-numbers");
            table.getColumns().add(column);
        }
    }

    private TableColumn<TransectRow, TransectRow> column(Function<TransectRow, String> text, double width) {
        TableColumn<TransectRow, TransectRow> column = new TableColumn<>();
        column.setSortable(false);
        column.setReorderable(false);
        column.setPrefWidth(width);
        column.setCellValueFactory(row -> new SimpleObjectProperty<>(row.getValue()));
        column.setCellFactory(
                made -> new TextCell(width == NUMBER ? row -> model.number(text.apply(row)) : text, width == NUMBER));
        return column;
    }

    private void show(Optional<TransectTable> shown) {
        belongs.setText(shown.map(TransectTable::whose).orElse(""));
        concentrated.setText(
                shown.map(TransectTable::concentrated).map(model::number).orElse(""));
        table.getItems().setAll(shown.map(TransectTable::rows).orElse(List.of()));
        shown.ifPresent(found -> {
            for (int column = 0; column < table.getColumns().size(); column++) {
                Label title = new Label(found.titles().get(column));
                title.getStyleClass().add("sl-small");
                title.setWrapText(true);
                table.getColumns().get(column).setGraphic(title);
            }
        });
    }

    /** One text of a row. */
    private static final class TextCell extends TableCell<TransectRow, TransectRow> {

        private final Function<TransectRow, String> text;

        TextCell(Function<TransectRow, String> text, boolean number) {
            this.text = text;
            if (number) {
                getStyleClass().add("sl-figure");
            }
        }

        @Override
        protected void updateItem(TransectRow row, boolean empty) {
            super.updateItem(row, empty);
            setText(empty || row == null ? "" : text.apply(row));
        }
    }

    /** Tells the row of all together apart. */
    private static final class KindRow extends TableRow<TransectRow> {

        @Override
        protected void updateItem(TransectRow row, boolean empty) {
            super.updateItem(row, empty);
            pseudoClassStateChanged(TOTAL, !empty && row != null && row.total());
        }
    }
}
