package org.seepledger.desktop.ledger;

import java.util.function.ToDoubleFunction;
import javafx.scene.control.TableCell;
import javafx.scene.control.TableColumn;
import javafx.util.Callback;

/** A number of a row, to four significant digits; nothing where a row of its kind has none. */
final class NumberCell extends TableCell<LedgerRow, LedgerRow> {

    private final Value value;
    private final LedgerModel model;

    /** Which number. */
    @FunctionalInterface
    interface Value extends ToDoubleFunction<LedgerRow> {}

    /** Makes these cells. */
    record Factory(Value value, LedgerModel model)
            implements Callback<TableColumn<LedgerRow, LedgerRow>, TableCell<LedgerRow, LedgerRow>> {

        @Override
        public TableCell<LedgerRow, LedgerRow> call(TableColumn<LedgerRow, LedgerRow> column) {
            return new NumberCell(value, model);
        }
    }

    private NumberCell(Value value, LedgerModel model) {
        this.model = model;
        this.value = value;
        getStyleClass().add("sl-figure");
    }

    @Override
    protected void updateItem(LedgerRow row, boolean empty) {
        super.updateItem(row, empty);
        setText(empty || row == null ? "" : model.text(row, value.applyAsDouble(row)));
    }
}
