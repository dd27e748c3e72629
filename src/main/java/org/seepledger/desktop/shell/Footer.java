package org.seepledger.desktop.shell;

import javafx.scene.control.Hyperlink;
import javafx.scene.control.Label;
import javafx.scene.layout.HBox;
import javafx.scene.layout.Priority;
import javafx.scene.layout.Region;
import org.seepledger.desktop.words.Words;

/** The line below: what has just happened or was refused, and the caution. */
final class Footer extends HBox {

    Footer(ShellModel model, Runnable caution) {
        getStyleClass().add("sl-footer");
        Label status = new Label();
        status.setId("status");
        status.getStyleClass().add("sl-status");
        status.textProperty().bind(model.session().status());
        status.setMinWidth(0);
        Region gap = new Region();
        setHgrow(gap, Priority.ALWAYS);
        Hyperlink words = new Hyperlink(Words.of("caution.short"));
        words.setId("caution");
        words.getStyleClass().add("sl-caution");
        words.setMinWidth(USE_PREF_SIZE);
        words.setOnAction(pressed -> caution.run());
        getChildren().addAll(status, gap, words);
    }
}
