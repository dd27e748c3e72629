package org.seepledger.desktop.notice;

import javafx.animation.PauseTransition;
import javafx.beans.value.ObservableValue;
import javafx.css.PseudoClass;
import javafx.scene.control.Button;
import javafx.scene.control.Hyperlink;
import javafx.scene.control.Label;
import javafx.scene.control.Tooltip;
import javafx.scene.layout.HBox;
import javafx.util.Duration;
import org.seepledger.desktop.words.Words;

/**
 * The latest notice for a while, then again the hint on what can be done; before it, how many warnings are unread. A new hint
 * takes the place of a notice at once.
 */
public final class NoticeLine extends HBox {

    private static final PseudoClass REFUSED = PseudoClass.getPseudoClass("refused");
    private static final Duration STAY = Duration.seconds(9);

    private final Notices notices;
    private final Button list = new Button();
    private final Label words = new Label();
    private final Hyperlink offer = new Hyperlink();
    private final PauseTransition stay = new PauseTransition(STAY);
    private final ObservableValue<String> hint;

    /**
     * Builds the line.
     *
     * @param notices what is shown
     * @param hint what can be done now
     * @param open opens the list of all notices
     */
    public NoticeLine(Notices notices, ObservableValue<String> hint, Runnable open) {
        this.notices = notices;
        this.hint = hint;
        getStyleClass().add("sl-notice-line");
        list.setId("notices");
        list.getStyleClass().addAll("flat", "sl-notice-count");
        list.setMinWidth(USE_PREF_SIZE);
        list.setTooltip(new Tooltip(Words.of("action.notices")));
        list.setOnAction(pressed -> open.run());
        words.setId("status");
        words.getStyleClass().add("sl-status");
        words.setMinWidth(0);
        offer.setId("notice-offer");
        offer.getStyleClass().add("sl-caution");
        offer.setMinWidth(USE_PREF_SIZE);
        getChildren().addAll(list, words, offer);
        stay.setOnFinished(passed -> notices.pass());
        notices.latest().addListener((latest, before, after) -> show());
        notices.unread().addListener((unread, before, after) -> count());
        hint.addListener((now, before, after) -> {
            notices.pass();
            show();
        });
        count();
        show();
    }

    private void count() {
        int unread = notices.unread().get();
        list.setText(unread == 0 ? Words.of("notices.open") : Words.of("notices.unread", unread));
        list.pseudoClassStateChanged(REFUSED, unread > 0);
    }

    private void show() {
        stay.stop();
        notices.latest().get().ifPresentOrElse(this::show, () -> say(hint.getValue(), false));
        offer.setVisible(notices.latest().get().flatMap(Notice::offer).isPresent());
        offer.setManaged(offer.isVisible());
    }

    private void show(Notice notice) {
        say(notice.words(), notice.kind() != Notice.Kind.DONE);
        notice.offer().ifPresent(made -> {
            offer.setText(made.words());
            offer.setOnAction(pressed -> {
                notices.pass();
                made.run().run();
            });
        });
        stay.playFromStart();
    }

    private void say(String text, boolean refused) {
        words.setText(text);
        words.setTooltip(text.isEmpty() ? null : new Tooltip(text));
        words.pseudoClassStateChanged(REFUSED, refused);
    }
}
