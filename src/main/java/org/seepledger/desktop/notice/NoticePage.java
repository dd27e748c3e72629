package org.seepledger.desktop.notice;

import javafx.collections.ListChangeListener;
import javafx.scene.Node;
import javafx.scene.control.Button;
import javafx.scene.control.Label;
import javafx.scene.control.ScrollPane;
import javafx.scene.layout.HBox;
import javafx.scene.layout.Priority;
import javafx.scene.layout.VBox;
import org.seepledger.desktop.words.Words;

/** The page of all notices, the latest first. */
public final class NoticePage extends VBox {

    private static final double WIDTH = 640;

    private final Notices notices;
    private final Runnable close;
    private final VBox rows = new VBox(10);
    private final Button done = new Button(Words.of("close"));

    /**
     * Makes the page.
     *
     * @param notices what is listed
     * @param close puts the page away
     */
    public NoticePage(Notices notices, Runnable close) {
        this.notices = notices;
        this.close = close;
        setId("notices-page");
        getStyleClass().add("sl-sheet");
        setMaxSize(WIDTH, USE_PREF_SIZE);
        Label title = new Label(Words.of("notices.title"));
        title.getStyleClass().add("sl-heading");
        ScrollPane scroll = new ScrollPane(rows);
        scroll.setFitToWidth(true);
        setVgrow(scroll, Priority.ALWAYS);
        done.setDefaultButton(true);
        done.setCancelButton(true);
        done.setOnAction(pressed -> close.run());
        getChildren().addAll(title, scroll, done);
        notices.all().addListener((ListChangeListener<Notice>) change -> fill());
        fill();
    }

    /** Shows what there is, with the keyboard on the way back. */
    public void open() {
        notices.read();
        done.requestFocus();
    }

    private void fill() {
        rows.getChildren().setAll(notices.all().stream().map(this::row).toList());
        if (rows.getChildren().isEmpty()) {
            rows.getChildren().add(styled(Words.of("notices.none"), "sl-muted"));
        }
    }

    private Node row(Notice notice) {
        Label kind = styled(Words.of(kind(notice.kind())), "sl-small");
        kind.setMinWidth(USE_PREF_SIZE);
        if (notice.kind() != Notice.Kind.DONE) {
            kind.getStyleClass().add("sl-warning");
        }
        Label words = new Label(notice.words());
        words.setWrapText(true);
        words.setMinHeight(USE_PREF_SIZE);
        VBox text = new VBox(kind, words);
        HBox.setHgrow(text, Priority.ALWAYS);
        HBox row = new HBox(10, text);
        notice.offer().ifPresent(offer -> {
            Button does = new Button(offer.words());
            does.setMinWidth(USE_PREF_SIZE);
            does.setOnAction(pressed -> {
                close.run();
                offer.run().run();
            });
            row.getChildren().add(does);
        });
        return row;
    }

    private static String kind(Notice.Kind kind) {
        return switch (kind) {
            case DONE -> "notices.done";
            case WARNING -> "notices.warning";
            case REFUSED -> "notices.refused";
        };
    }

    private static Label styled(String text, String style) {
        Label label = new Label(text);
        label.getStyleClass().add(style);
        return label;
    }
}
