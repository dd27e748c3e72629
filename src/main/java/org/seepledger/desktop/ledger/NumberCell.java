package org.seepledger.desktop.ledger;

import java.util.function.ToDoubleFunction;
import javafx.scene.control.TableCell;
import javafx.scene.control.TableColumn;
import javafx.util.Callback;

/** A number of a row, to four significant digits; nothing where a row of its kind has none. */
final class NumberCell extends TableCell<LedgerRow, LedgerRow> {

    private final Value value;

    /** Which number. */
    @FunctionalInterface
    interface Value extends ToDoubleFunction<LedgerRow> {}

    /** Makes these cells. */
    record Factory(Value value)
            implements Callback<TableColumn<LedgerRow, LedgerRow>, TableCell<LedgerRow, LedgerRow>> {

        @Override
        public TableCell<LedgerRow, LedgerRow> call(TableColumn<LedgerRow, LedgerRow> column) {
            return new NumberCell(value);
        }
    }

    private NumberCell(Value value) {
        this.value = value;
        getStyleClass().add("sl-figure");
    }

    @Override
    protected void updateItem(LedgerRow row, boolean empty) {
        super.updateItem(row, empty);
        setText(empty || row == null ? "" : row.text(value.applyAsDouble(row)));
    }
}
