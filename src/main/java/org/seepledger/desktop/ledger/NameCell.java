package org.seepledger.desktop.ledger;

import javafx.scene.control.TableCell;
import javafx.scene.control.TableColumn;
import javafx.util.Callback;

/** What a row is called. */
final class NameCell extends TableCell<LedgerRow, LedgerRow> {

    /** Makes these cells. */
    record Factory() implements Callback<TableColumn<LedgerRow, LedgerRow>, TableCell<LedgerRow, LedgerRow>> {

        @Override
        public TableCell<LedgerRow, LedgerRow> call(TableColumn<LedgerRow, LedgerRow> column) {
            return new NameCell();
        }
    }

    @Override
    protected void updateItem(LedgerRow row, boolean empty) {
        super.updateItem(row, empty);
        setText(empty || row == null ? "" : row.label());
    }
}
