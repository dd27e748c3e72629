package org.seepledger.desktop.action;

import javafx.geometry.Pos;
import javafx.scene.control.Label;
import javafx.scene.control.ListCell;
import javafx.scene.control.ListView;
import javafx.scene.control.TextField;
import javafx.scene.input.KeyCode;
import javafx.scene.input.KeyCombination;
import javafx.scene.input.KeyEvent;
import javafx.scene.layout.HBox;
import javafx.scene.layout.Priority;
import javafx.scene.layout.Region;
import javafx.scene.layout.VBox;
import org.seepledger.desktop.words.Words;

/** The page of all actions with their shortcuts; type to find one, Enter does it. */
public final class ActionsPage extends VBox {

    private final Actions actions;
    private final Runnable close;
    private final TextField sought = new TextField();
    private final ListView<Action> list = new ListView<>();

    /**
     * Makes the page.
     *
     * @param actions what is listed
     * @param close puts the page away
     */
    public ActionsPage(Actions actions, Runnable close) {
        this.actions = actions;
        this.close = close;
        setId("actions-page");
        getStyleClass().add("sl-sheet");
        setMaxSize(620, 640);
        sought.setId("actions-sought");
        sought.setPromptText(Words.of("actions.sought"));
        sought.textProperty().addListener((text, before, now) -> fill());
        sought.addEventFilter(KeyEvent.KEY_PRESSED, this::onKey);
        list.setCellFactory(made -> new ActionCell());
        list.setOnMouseClicked(click -> perform());
        list.addEventFilter(KeyEvent.KEY_PRESSED, this::onKey);
        setVgrow(list, Priority.ALWAYS);
        Label title = new Label(Words.of("actions.title"));
        title.getStyleClass().add("sl-heading");
        getChildren().addAll(title, sought, list);
        fill();
    }

    /** Begins anew, with the keyboard on the field. */
    public void open() {
        sought.clear();
        fill();
        sought.requestFocus();
    }

    private void fill() {
        list.getItems().setAll(actions.matching(sought.getText()));
        list.getSelectionModel().selectFirst();
    }

    private void onKey(KeyEvent key) {
        if (key.getCode() == KeyCode.ENTER) {
            perform();
            key.consume();
        } else if (key.getCode() == KeyCode.ESCAPE) {
            close.run();
            key.consume();
        } else if (key.getTarget() == sought && key.getCode() == KeyCode.DOWN) {
            list.requestFocus();
        }
    }

    private void perform() {
        Action chosen = list.getSelectionModel().getSelectedItem();
        if (chosen != null) {
            close.run();
            chosen.perform();
        }
    }

    /** Words on the left, shortcut on the right. */
    private static final class ActionCell extends ListCell<Action> {

        /** As wide as the list and no wider, so that keys are never cut off. */
        ActionCell() {
            setPrefWidth(0);
        }

        @Override
        protected void updateItem(Action action, boolean empty) {
            super.updateItem(action, empty);
            setGraphic(empty ? null : row(action));
        }

        private static HBox row(Action action) {
            Label group = new Label(action.groupWords());
            group.getStyleClass().add("sl-muted");
            group.setMinWidth(110);
            Region gap = new Region();
            HBox.setHgrow(gap, Priority.ALWAYS);
            Label keys = new Label(KeyCombination.valueOf(action.keys()).getDisplayText());
            keys.getStyleClass().add("sl-key");
            keys.setMinWidth(USE_PREF_SIZE);
            HBox row = new HBox(10, group, new Label(action.words()), gap, keys);
            row.setAlignment(Pos.CENTER_LEFT);
            row.setDisable(!action.possible().getAsBoolean());
            return row;
        }
    }
}
