package org.seepledger.desktop.shell;

import javafx.beans.binding.Bindings;
import javafx.scene.Node;
import javafx.scene.control.Button;
import javafx.scene.control.Label;
import javafx.scene.control.Tooltip;
import javafx.scene.layout.HBox;
import javafx.scene.layout.Priority;
import javafx.scene.layout.Region;
import org.seepledger.desktop.pane.ShortOfRoom;
import org.seepledger.desktop.theme.Theme;
import org.seepledger.desktop.words.Words;

/** The line on top: which aquifer, and as a sentence what of it is shown. */
final class Caption extends HBox {

    /** What is left of a long name where room is short. */
    private static final double LEAST_NAME = 156;

    /** Where there is less, the review is turned to by its mark below the map alone. */
    private static final double ROOM_FOR_ALL = 1400;

    Caption(ShellModel model, Node showing, Runnable actions, Runnable review, Runnable handOver) {
        getStyleClass().add("sl-caption");
        Button name = button("", model::turnPage, "caption.name.tip");
        name.setId("set-name");
        name.getStyleClass().addAll("flat", "sl-name");
        model.session()
                .set()
                .addListener((set, before, after) -> name.setText(model.name().orElse("")));
        name.setText(model.name().orElse(""));
        ShortOfRoom.keep(name, LEAST_NAME);
        Region gap = new Region();
        setHgrow(gap, Priority.ALWAYS);
        Label mark = new Label("≋");
        mark.getStyleClass().add("sl-mark");
        Button over = button(Words.of("caption.handover"), handOver, "action.handover");
        over.setId("hand-over");
        Button submitted = button(Words.of("caption.review"), review, "action.review");
        submitted.setId("open-review");
        submitted.visibleProperty().bind(widthProperty().greaterThanOrEqualTo(ROOM_FOR_ALL));
        submitted.managedProperty().bind(submitted.visibleProperty());
        getChildren()
                .addAll(
                        mark,
                        name,
                        showing,
                        gap,
                        submitted,
                        over,
                        theme(model),
                        button(Words.of("caption.actions"), actions, ""));
    }

    /** Adds a button before the last two. */
    void add(Node button) {
        getChildren().add(getChildren().size() - 2, button);
    }

    private static Button theme(ShellModel model) {
        Button theme = button("", model::switchTheme, "caption.theme.tip");
        theme.setId("theme");
        theme.textProperty()
                .bind(Bindings.createStringBinding(
                        () -> Words.of(model.theme().get() == Theme.LIGHT ? "caption.dark" : "caption.light"),
                        model.theme()));
        return theme;
    }

    private static Button button(String words, Runnable does, String tip) {
        Button button = new Button(words);
        button.getStyleClass().add("flat");
        button.setMinWidth(USE_PREF_SIZE);
        button.setOnAction(pressed -> does.run());
        if (!tip.isEmpty()) {
            button.setTooltip(new Tooltip(Words.of(tip)));
        }
        return button;
    }
}
