package org.seepledger.desktop.pane;

import javafx.beans.value.ObservableValue;
import javafx.scene.control.Label;

/** Words that come and go; no room is taken while there are none. */
public final class WordsLine extends Label {

    /**
     * Makes a line.
     *
     * @param id what it is found by
     * @param words what it says; empty for nothing
     * @param style its style class
     */
    public WordsLine(String id, ObservableValue<String> words, String style) {
        setId(id);
        setWrapText(true);
        setMinHeight(USE_PREF_SIZE);
        getStyleClass().add(style);
        textProperty().bind(words);
        visibleProperty().bind(textProperty().isNotEmpty());
        managedProperty().bind(visibleProperty());
    }
}
