package org.seepledger.desktop.ledger;

import javafx.collections.ListChangeListener;
import javafx.geometry.HPos;
import javafx.scene.control.Hyperlink;
import javafx.scene.control.Label;
import javafx.scene.control.Tooltip;
import javafx.scene.layout.ColumnConstraints;
import javafx.scene.layout.GridPane;
import javafx.scene.layout.Priority;
import org.seepledger.desktop.words.Words;
import org.seepledger.ledger.Group;

/** The totals below the table, always in sight: those of water on the left, how it closes on the right. */
final class LedgerFoot extends GridPane {

    private static final int HIGH = 3;

    private final LedgerModel model;

    LedgerFoot(LedgerModel model) {
        this.model = model;
        setId("ledger-foot");
        getStyleClass().add("sl-foot");
        for (int column = 0; column < 4; column++) {
            ColumnConstraints constraints = new ColumnConstraints();
            constraints.setHgrow(column % 2 == 0 ? Priority.NEVER : Priority.ALWAYS);
            constraints.setHalignment(column % 2 == 0 ? HPos.LEFT : HPos.RIGHT);
            getColumnConstraints().add(constraints);
        }
        managedProperty().bind(visibleProperty());
        model.rows().addListener((ListChangeListener<LedgerRow>) change -> fill());
        fill();
    }

    static boolean isTotal(LedgerRow row) {
        return row.group() == Group.TOTAL;
    }

    private void fill() {
        getChildren().clear();
        model.rows().stream()
                .filter(row -> isTotal(row) && row.kind() != LedgerRow.Kind.HEADING)
                .forEach(this::add);
        setVisible(!getChildren().isEmpty());
    }

    private void add(LedgerRow row) {
        int place = getChildren().size() / 2;
        Label name = new Label(row.label());
        name.getStyleClass().add("sl-muted");
        name.setMinWidth(USE_PREF_SIZE);
        Hyperlink figure = new Hyperlink(model.text(row, row.net()));
        figure.setId("total-" + row.item().replaceAll("[ ,]+", "-"));
        figure.getStyleClass().addAll("sl-figure", "sl-strong", "sl-total");
        figure.setTooltip(new Tooltip(Words.of("ledger.origin")));
        figure.setOnAction(pressed -> model.askOrigin(row));
        figure.setMinWidth(USE_PREF_SIZE);
        if (!Double.isNaN(row.low())) {
            String bracket = Words.of("ledger.bracket", model.text(row, row.low()), model.text(row, row.high()));
            figure.setTooltip(new Tooltip(bracket));
        }
        add(name, place / HIGH * 2, place % HIGH);
        add(figure, place / HIGH * 2 + 1, place % HIGH);
    }
}
