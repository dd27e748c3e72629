package org.seepledger.desktop.shell;

import javafx.scene.Node;
import javafx.scene.control.Hyperlink;
import javafx.scene.layout.HBox;
import javafx.scene.layout.Priority;
import org.seepledger.desktop.words.Words;

/** The line below: what has just happened or can be done, what runs, and the caution. */
final class Footer extends HBox {

    Footer(Node notices, Node running, Runnable caution) {
        getStyleClass().add("sl-footer");
        setHgrow(notices, Priority.ALWAYS);
        Hyperlink words = new Hyperlink(Words.of("caution.short"));
        words.setId("caution");
        words.getStyleClass().add("sl-caution");
        words.setMinWidth(USE_PREF_SIZE);
        words.setOnAction(pressed -> caution.run());
        getChildren().addAll(notices, running, words);
    }
}
