package org.seepledger.desktop.ledger;

import javafx.scene.control.TableCell;
import javafx.scene.control.TableColumn;
import javafx.scene.layout.Pane;
import javafx.scene.layout.Region;
import javafx.util.Callback;

/** What comes in and goes out as bars on a common scale, inflow to the right of the middle. */
final class ScaleCell extends TableCell<LedgerRow, LedgerRow> {

    private static final double THICKNESS = 8;

    private final LedgerModel model;
    private final Region in = bar("sl-bar-in");
    private final Region out = bar("sl-bar-out");
    private final Pane bars = new Pane(out, in) {
        @Override
        protected void layoutChildren() {
            place();
        }
    };

    /** Makes these cells. */
    record Factory(LedgerModel model)
            implements Callback<TableColumn<LedgerRow, LedgerRow>, TableCell<LedgerRow, LedgerRow>> {

        @Override
        public TableCell<LedgerRow, LedgerRow> call(TableColumn<LedgerRow, LedgerRow> column) {
            return new ScaleCell(model);
        }
    }

    private ScaleCell(LedgerModel model) {
        this.model = model;
        bars.setMinSize(0, 0);
        bars.setPrefHeight(THICKNESS);
    }

    private static Region bar(String style) {
        Region bar = new Region();
        bar.getStyleClass().add(style);
        return bar;
    }

    @Override
    protected void updateItem(LedgerRow row, boolean empty) {
        super.updateItem(row, empty);
        boolean shown = !empty && row != null && row.kind() == LedgerRow.Kind.ENTRY;
        setGraphic(shown ? bars : null);
        bars.requestLayout();
    }

    private void place() {
        LedgerRow row = getItem();
        if (row == null) {
            return;
        }
        double middle = bars.getWidth() / 2;
        double y = (bars.getHeight() - THICKNESS) / 2;
        double inflow = middle * model.share(row.inflow());
        double outflow = middle * model.share(row.outflow());
        in.resizeRelocate(middle, y, inflow, THICKNESS);
        out.resizeRelocate(middle - outflow, y, outflow, THICKNESS);
    }
}
