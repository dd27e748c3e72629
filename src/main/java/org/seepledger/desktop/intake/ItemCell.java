package org.seepledger.desktop.intake;

import java.util.Locale;
import javafx.scene.control.Label;
import javafx.scene.control.ListCell;
import javafx.scene.control.OverrunStyle;
import javafx.scene.layout.HBox;
import javafx.scene.layout.Priority;
import javafx.scene.layout.Region;
import javafx.scene.layout.VBox;
import org.seepledger.desktop.words.Words;

/** A line of the list of items. */
final class ItemCell extends ListCell<ItemRow> {

    private final Label title = new Label();
    private final Label lead = new Label();
    private final Label mark = new Label();
    private final HBox line;

    ItemCell() {
        VBox words = new VBox(1, title, lead);
        title.setTextOverrun(OverrunStyle.LEADING_ELLIPSIS);
        lead.getStyleClass().add("sl-small");
        mark.getStyleClass().add("sl-mark-sign");
        mark.setMinWidth(Region.USE_PREF_SIZE);
        words.setMinWidth(0);
        HBox.setHgrow(words, Priority.ALWAYS);
        line = new HBox(8, words, mark);
        setPrefWidth(0);
    }

    @Override
    protected void updateItem(ItemRow row, boolean empty) {
        super.updateItem(row, empty);
        setGraphic(empty ? null : line);
        if (!empty) {
            title.setText(row.title());
            lead.setText(row.lead());
            title.getStyleClass().remove("sl-strong");
            if (row.index() < 0) {
                title.getStyleClass().add("sl-strong");
            }
            mark.getStyleClass().removeAll("fault", "doubt", "fine", "unused");
            String name = row.mark().name().toLowerCase(Locale.ROOT);
            mark.getStyleClass().add(name);
            mark.setText(Words.of("intake.mark." + name));
            line.setOpacity(row.mark() == ItemRow.Mark.UNUSED ? 0.6 : 1);
        }
    }
}
