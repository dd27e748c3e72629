package org.seepledger.desktop.map;

import java.util.List;
import javafx.scene.control.Label;
import javafx.scene.control.ToggleButton;
import javafx.scene.control.ToggleGroup;
import javafx.scene.layout.HBox;
import javafx.scene.layout.VBox;
import org.seepledger.aquifer.Layer;
import org.seepledger.desktop.session.OpenSet;
import org.seepledger.desktop.session.Session;
import org.seepledger.desktop.words.Words;

/** The layers from the top down, as a borehole meets them; the one looked at is pressed. */
final class LayerColumn extends VBox {

    private final Session session;

    LayerColumn(Session session) {
        this.session = session;
        setId("layers");
        getStyleClass().addAll("sl-float", "sl-column");
        setMaxSize(USE_PREF_SIZE, USE_PREF_SIZE);
        session.set().addListener((set, before, after) -> fill());
        session.layer().addListener((layer, before, after) -> press());
        fill();
    }

    private void fill() {
        List<Layer> layers = session.set()
                .get()
                .map(OpenSet::aquifer)
                .map(aquifer -> aquifer.layers())
                .orElse(List.of());
        Label title = new Label(Words.of("map.layers"));
        title.getStyleClass().add("sl-small");
        getChildren().setAll(title);
        ToggleGroup group = new ToggleGroup();
        for (int layer = 0; layer < layers.size(); layer++) {
            getChildren().add(button(layer, layers.get(layer), group));
        }
        setVisible(layers.size() > 1);
        press();
    }

    private ToggleButton button(int layer, Layer described, ToggleGroup group) {
        Label number = new Label(Integer.toString(layer + 1));
        number.getStyleClass().add("sl-number");
        HBox row = new HBox(8, number, new Label(described.name()));
        ToggleButton button = new ToggleButton();
        button.setGraphic(row);
        button.setAccessibleText(Words.of("map.layer", layer + 1, described.name()));
        button.setToggleGroup(group);
        button.setMaxWidth(Double.MAX_VALUE);
        button.getStyleClass().setAll("sl-layer", layer % 2 == 0 ? "even" : "odd");
        button.setOnAction(pressed -> {
            session.layer().set(layer);
            press();
        });
        return button;
    }

    /** One of them is always pressed. */
    private void press() {
        for (int place = 1; place < getChildren().size(); place++) {
            ((ToggleButton) getChildren().get(place))
                    .setSelected(place - 1 == session.layer().get());
        }
    }
}
