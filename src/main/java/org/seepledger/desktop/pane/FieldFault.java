package org.seepledger.desktop.pane;

import javafx.scene.control.Label;

/** Why what stands in a field above it was refused; no room is taken while there is nothing to say. */
public final class FieldFault extends Label {

    private static final double WIDTH = 190;

    /**
     * Makes a fault with nothing to say.
     *
     * @param id what it is found by
     */
    public FieldFault(String id) {
        setId(id);
        getStyleClass().addAll("sl-small", "sl-warning");
        setWrapText(true);
        setMaxWidth(WIDTH);
        setMinHeight(USE_PREF_SIZE);
        managedProperty().bind(textProperty().isNotEmpty());
    }

    /**
     * Says why, or nothing more.
     *
     * @param why the reason; empty for nothing
     */
    public void say(String why) {
        setText(why);
    }
}
