package org.seepledger.desktop.ledger;

import java.util.Optional;
import javafx.collections.ListChangeListener;
import javafx.css.PseudoClass;
import javafx.scene.control.Button;
import javafx.scene.control.ContextMenu;
import javafx.scene.control.Label;
import javafx.scene.control.MenuItem;
import javafx.scene.control.TableColumn;
import javafx.scene.control.TableRow;
import javafx.scene.control.TableView;
import javafx.scene.control.Tooltip;
import javafx.scene.input.KeyCode;
import javafx.scene.input.KeyCodeCombination;
import javafx.scene.input.KeyCombination;
import javafx.scene.layout.BorderPane;
import org.seepledger.desktop.pane.StatePane;
import org.seepledger.desktop.words.Words;

/** The ledger as a table. */
public final class LedgerView extends BorderPane {

    private static final KeyCombination COPY = new KeyCodeCombination(KeyCode.C, KeyCombination.SHORTCUT_DOWN);
    private static final PseudoClass HEADING = PseudoClass.getPseudoClass("heading");
    private static final double NUMBER = 86;
    private static final double LONG_NUMBER = 100;
    private static final double NAME = 150;
    private static final double SHORT_NAME = 122;
    private static final PseudoClass TOTAL = PseudoClass.getPseudoClass("total");

    private final LedgerModel model;
    private final TableView<LedgerRow> table = new TableView<>();
    private boolean following;

    /**
     * Builds the table.
     *
     * @param model what it shows
     */
    public LedgerView(LedgerModel model) {
        this.model = model;
        setId("ledger");
        getStyleClass().add("sl-ledger");
        setTop(new LedgerChoices(model));
        buildTable();
        BorderPane sheet = new BorderPane(table);
        sheet.setBottom(new LedgerFoot(model));
        setCenter(new StatePane(sheet, model.state()).withAction(Words.of("budget.draw"), model::draw));
    }

    private void buildTable() {
        table.setId("ledger-table");
        table.setItems(model.rows().filtered(row -> !LedgerFoot.isTotal(row)));
        table.setPlaceholder(new Label());
        table.getColumns().add(nameColumn());
        table.getColumns().add(numbers("ledger.in", Order.LARGEST_IN, LedgerRow::inflow));
        table.getColumns().add(numbers("ledger.out", Order.LARGEST_OUT, LedgerRow::outflow));
        table.getColumns().add(numbers("ledger.net", Order.LARGEST_NET, LedgerRow::net));
        table.getColumns().add(bracket("ledger.zero", "ledger.zero.tip", LedgerRow::low));
        table.getColumns().add(bracket("ledger.limit", "ledger.limit.tip", LedgerRow::high));
        table.getColumns().add(scaleColumn());
        fit(model.solute().get());
        model.solute().addListener((solute, before, after) -> fit(after));
        table.setRowFactory(made -> new KindRow());
        table.getSelectionModel().selectedItemProperty().addListener((row, before, after) -> {
            model.chosen().set(Optional.ofNullable(after));
            if (!following && after != null) {
                model.light(after);
            }
        });
        model.litItem().addListener((item, before, after) -> follow());
        model.pointing().addListener((row, before, after) -> follow());
        model.rows().addListener((ListChangeListener<LedgerRow>) change -> follow());
        MenuItem origin = new MenuItem(Words.of("ledger.origin"));
        origin.setId("ledger-origin-menu");
        origin.setOnAction(pressed -> model.askOrigin());
        table.setContextMenu(new ContextMenu(origin));
        table.setOnKeyPressed(key -> {
            if (COPY.match(key)) {
                model.copy();
                key.consume();
            }
        });
    }

    /** A solute's columns are more than there may be room for, and then scroll; no number is cut short. */
    private void fit(String solute) {
        boolean ofWater = solute.isEmpty();
        table.setColumnResizePolicy(
                ofWater ? TableView.CONSTRAINED_RESIZE_POLICY_FLEX_LAST_COLUMN : TableView.UNCONSTRAINED_RESIZE_POLICY);
        table.getColumns().get(0).setPrefWidth(ofWater ? NAME : SHORT_NAME);
        table.getColumns().stream()
                .filter(column -> column.getStyleClass().contains("sl-numbers"))
                .forEach(column -> column.setPrefWidth(ofWater ? NUMBER : LONG_NUMBER));
    }

    /** Selects the row of the face that is lit up or that another pane points at, and lets go of other faces. */
    private void follow() {
        following = true;
        model.lit()
                .or(model::pointed)
                .ifPresentOrElse(row -> table.getSelectionModel().select(row), this::letGo);
        model.pointed().ifPresent(table::scrollTo);
        following = false;
    }

    private void letGo() {
        LedgerRow selected = table.getSelectionModel().getSelectedItem();
        if (selected == null || selected.isFace()) {
            table.getSelectionModel().clearSelection();
        }
    }

    private TableColumn<LedgerRow, LedgerRow> nameColumn() {
        TableColumn<LedgerRow, LedgerRow> column = new TableColumn<>();
        column.setGraphic(header("ledger.item", Order.AS_DRAWN));
        column.setMinWidth(110);
        column.setPrefWidth(NAME);
        return shown(column, new NameCell.Factory());
    }

    private TableColumn<LedgerRow, LedgerRow> numbers(String words, Order order, NumberCell.Value value) {
        TableColumn<LedgerRow, LedgerRow> column = new TableColumn<>();
        column.setGraphic(header(words, order));
        column.getStyleClass().add("sl-numbers");
        column.setMinWidth(82);
        column.setPrefWidth(NUMBER);
        return shown(column, new NumberCell.Factory(value, model));
    }

    /** The net with non-detects as something else; of solutes alone. */
    private TableColumn<LedgerRow, LedgerRow> bracket(String words, String tip, NumberCell.Value value) {
        TableColumn<LedgerRow, LedgerRow> column = new TableColumn<>();
        Label header = new Label(Words.of(words));
        header.getStyleClass().add("sl-small");
        header.setTooltip(new Tooltip(Words.of(tip)));
        column.setGraphic(header);
        column.getStyleClass().add("sl-numbers");
        column.setMinWidth(NUMBER);
        column.visibleProperty().bind(model.solute().isNotEmpty());
        return shown(column, new NumberCell.Factory(value, model));
    }

    private TableColumn<LedgerRow, LedgerRow> scaleColumn() {
        TableColumn<LedgerRow, LedgerRow> column = new TableColumn<>();
        column.setMinWidth(40);
        column.setPrefWidth(44);
        return shown(column, new ScaleCell.Factory(model));
    }

    private static TableColumn<LedgerRow, LedgerRow> shown(
            TableColumn<LedgerRow, LedgerRow> column,
            javafx.util.Callback<
                            TableColumn<LedgerRow, LedgerRow>, javafx.scene.control.TableCell<LedgerRow, LedgerRow>>
                    cells) {
        column.setSortable(false);
        column.setReorderable(false);
        column.setCellValueFactory(row -> new javafx.beans.property.SimpleObjectProperty<>(row.getValue()));
        column.setCellFactory(cells);
        return column;
    }

    private Button header(String words, Order order) {
        Button button = new Button(Words.of(words));
        button.setId("sort-" + order.name().toLowerCase(java.util.Locale.ROOT).replace('_', '-'));
        button.getStyleClass().add("sl-header");
        button.setFocusTraversable(false);
        button.setOnAction(pressed -> model.sort(order));
        button.pseudoClassStateChanged(
                PseudoClass.getPseudoClass("sorted"), model.order().get() == order);
        model.order()
                .addListener((ordered, before, after) -> button.pseudoClassStateChanged(
                        PseudoClass.getPseudoClass("sorted"), after == order && order != Order.AS_DRAWN));
        return button;
    }

    /** Tells headings and totals apart from other rows. */
    private static final class KindRow extends TableRow<LedgerRow> {

        @Override
        protected void updateItem(LedgerRow row, boolean empty) {
            super.updateItem(row, empty);
            LedgerRow.Kind kind = empty || row == null ? LedgerRow.Kind.ENTRY : row.kind();
            pseudoClassStateChanged(HEADING, kind == LedgerRow.Kind.HEADING);
            pseudoClassStateChanged(TOTAL, kind == LedgerRow.Kind.TOTAL || kind == LedgerRow.Kind.PERCENTAGE);
        }
    }
}
