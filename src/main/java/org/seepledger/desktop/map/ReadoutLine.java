package org.seepledger.desktop.map;

import java.util.Optional;
import javafx.scene.control.Label;
import javafx.scene.layout.HBox;

/** Where the cursor is; each part has a place of its own width, so that nothing jumps. */
final class ReadoutLine extends HBox {

    private final Label place = part("readout-place", 230);
    private final Label cell = part("readout-cell", 210);
    private final Label value = part("readout-value", 240);
    private final Label well = part("readout-well", 0);

    ReadoutLine(MapModel model) {
        getStyleClass().add("sl-readout");
        getChildren().addAll(place, cell, value, well);
        well.setPrefWidth(USE_COMPUTED_SIZE);
        well.textProperty().bind(model.well());
        model.readout().addListener((readout, before, after) -> show(after));
    }

    private static Label part(String id, double width) {
        Label label = new Label();
        label.setId(id);
        label.setMinWidth(width);
        label.setPrefWidth(width);
        return label;
    }

    private void show(Optional<Readout> shown) {
        place.setText(shown.map(Readout::place).orElse(""));
        cell.setText(shown.map(Readout::cell).orElse(""));
        value.setText(shown.map(Readout::value).orElse(""));
    }
}
