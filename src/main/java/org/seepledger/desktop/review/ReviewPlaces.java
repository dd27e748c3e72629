package org.seepledger.desktop.review;

import java.util.ArrayList;
import java.util.List;
import javafx.geometry.Insets;
import javafx.scene.Node;
import javafx.scene.control.Button;
import javafx.scene.control.Label;
import javafx.scene.input.KeyCode;
import javafx.scene.input.KeyCombination;
import javafx.scene.input.KeyEvent;
import javafx.scene.layout.BorderPane;
import javafx.scene.layout.HBox;
import javafx.scene.layout.Priority;
import javafx.scene.layout.StackPane;
import javafx.scene.layout.VBox;
import org.seepledger.desktop.action.Action;
import org.seepledger.desktop.words.Words;

/** The two places of the review: below map and ledger of an open aquifer, and by itself on a page over the first one. */
public final class ReviewPlaces {

    private final ReviewView view;
    private final StackPane below = new StackPane();
    private final StackPane barBelow = new StackPane();
    private final BorderPane page = new BorderPane();
    private final Runnable close;

    /**
     * Makes the places; the review is below the map at first.
     *
     * @param model what was found
     * @param writing what is written of it
     * @param close puts the page away
     */
    public ReviewPlaces(ReviewModel model, WritingModel writing, Runnable close) {
        this.view = new ReviewView(model, writing);
        this.close = close;
        buildPage();
        settleBelow();
    }

    private void buildPage() {
        page.setId("review-page");
        page.getStyleClass().add("sl-sheet");
        page.setMaxSize(1180, 760);
        StackPane.setMargin(page, new Insets(20));
        page.addEventFilter(KeyEvent.KEY_PRESSED, key -> {
            if (key.getCode() == KeyCode.ESCAPE) {
                close.run();
                key.consume();
            } else {
                view.actions().stream()
                        .filter(action -> KeyCombination.valueOf(action.keys()).match(key))
                        .findFirst()
                        .ifPresent(action -> {
                            action.perform();
                            key.consume();
                        });
            }
        });
    }

    /** {@return the bar below the map} */
    public Node barBelow() {
        return barBelow;
    }

    /** {@return the pane below the map} */
    public Node below() {
        return below;
    }

    /** Moves the review below the map. */
    public void settleBelow() {
        if (view.getParent() != below) {
            page.setTop(null);
            page.setCenter(null);
            barBelow.getChildren().setAll(view.bar());
            below.getChildren().setAll(view);
        }
    }

    /** {@return the page, with the review moved there} */
    public Node page() {
        barBelow.getChildren().clear();
        below.getChildren().clear();
        Label title = new Label(Words.of("review.heading"));
        title.getStyleClass().add("sl-heading");
        Button away = new Button(Words.of("close"));
        away.setId("review-close");
        away.setMinWidth(Button.USE_PREF_SIZE);
        away.setOnAction(pressed -> close.run());
        HBox.setHgrow(view.bar(), Priority.ALWAYS);
        Label note = new Label(Words.of("review.alone"));
        note.getStyleClass().add("sl-small");
        page.setTop(new VBox(8, title, note, new HBox(8, view.bar(), away)));
        page.setCenter(view);
        return page;
    }

    /** Moves the keyboard to where it goes on. */
    public void focus() {
        view.focus();
    }

    /**
     * {@return what can be done with the review}
     *
     * @param show turns to it
     */
    public List<Action> actions(Runnable show) {
        List<Action> actions = new ArrayList<>();
        actions.add(new Action("actions.group.review", "action.review", "Shortcut+G", show));
        actions.addAll(view.actions());
        return actions;
    }
}
