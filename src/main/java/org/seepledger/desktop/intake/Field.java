package org.seepledger.desktop.intake;

import java.util.function.Consumer;
import javafx.scene.control.TextField;

/** A field whose text is taken by Enter, and when the keyboard leaves it. */
final class Field extends TextField {

    private String taken = "";

    Field(String id, Consumer<String> take) {
        setId(id);
        setOnAction(entered -> take(take));
        focusedProperty().addListener((focus, before, now) -> {
            if (!now) {
                take(take);
            }
        });
    }

    private void take(Consumer<String> take) {
        if (!getText().equals(taken)) {
            taken = getText();
            take.accept(taken);
        }
    }

    /** Shows a text, unless somebody is typing another. */
    Field show(String text) {
        if (!isFocused()) {
            taken = text;
            setText(text);
        }
        return this;
    }
}
