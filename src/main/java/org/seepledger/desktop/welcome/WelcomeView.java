package org.seepledger.desktop.welcome;

import java.nio.file.Path;
import javafx.collections.ListChangeListener;
import javafx.collections.ObservableList;
import javafx.geometry.Pos;
import javafx.scene.Node;
import javafx.scene.control.Button;
import javafx.scene.control.Label;
import javafx.scene.control.ScrollPane;
import javafx.scene.control.Tooltip;
import javafx.scene.layout.HBox;
import javafx.scene.layout.Priority;
import javafx.scene.layout.StackPane;
import javafx.scene.layout.VBox;
import org.seepledger.desktop.task.PaneState;
import org.seepledger.desktop.words.Words;

/** The first page. */
public final class WelcomeView extends StackPane {

    private static final double WIDTH = 1000;
    private static final double CARD_WIDTH = 420;

    private final WelcomeModel model;
    private final VBox drop = new VBox();
    private final Label fault = new Label();
    private final Button mend = new Button();
    private final HBox failure = new HBox(12, fault, mend);

    /**
     * Builds the page.
     *
     * @param model what can be opened
     */
    public WelcomeView(WelcomeModel model) {
        this.model = model;
        setId("welcome");
        getStyleClass().add("sl-pane");
        VBox page = new VBox(title(), fault(), columns());
        page.getStyleClass().add("sl-welcome");
        page.setMaxWidth(WIDTH + 96);
        StackPane centred = new StackPane(page);
        centred.setAlignment(Pos.TOP_CENTER);
        ScrollPane scroll = new ScrollPane(centred);
        scroll.setFitToWidth(true);
        scroll.setFitToHeight(true);
        getChildren().add(scroll);
        FolderDrop.on(this, model, this::mark);
    }

    private static Node title() {
        Label name = new Label(Words.of("program"));
        name.getStyleClass().add("sl-title");
        Label lead = new Label(Words.of("welcome.lead"));
        lead.getStyleClass().add("sl-lead");
        lead.setWrapText(true);
        VBox title = new VBox(6, name, lead);
        title.setMaxWidth(WIDTH);
        return title;
    }

    private Node fault() {
        fault.setId("open-fault");
        fault.setWrapText(true);
        fault.setMaxWidth(WIDTH);
        HBox.setHgrow(fault, Priority.ALWAYS);
        mend.setId("mend-folder");
        mend.setMinWidth(USE_PREF_SIZE);
        mend.setOnAction(pressed -> model.mendFailed());
        failure.getStyleClass().add("sl-fault");
        failure.setAlignment(Pos.CENTER_LEFT);
        failure.setMaxWidth(WIDTH);
        model.state().addListener((state, before, after) -> showFault(after));
        showFault(model.state().get());
        return failure;
    }

    private void showFault(PaneState state) {
        boolean failed = state.phase() == PaneState.Phase.FAILED;
        fault.setText(failed ? Words.of("open.failed", state.words()) : "");
        failure.setVisible(failed);
        failure.setManaged(failed);
        mend.setVisible(model.failed().get().isPresent());
        boolean described = model.failed().get().filter(Broken::described).isPresent();
        mend.setText(described ? Words.of("welcome.mend") : Words.of("welcome.files"));
    }

    private Node columns() {
        VBox left = new VBox(24, section("welcome.samples", model.samples(), "welcome.samples.none"), dropPlace());
        VBox right = section("welcome.recent", model.recent(), "welcome.recent.none");
        HBox columns = new HBox(left, right);
        columns.getStyleClass().add("sl-welcome-columns");
        columns.setMaxWidth(WIDTH);
        for (VBox column : java.util.List.of(left, right)) {
            HBox.setHgrow(column, Priority.ALWAYS);
            column.setPrefWidth(WIDTH / 2);
            column.setMinWidth(300);
        }
        return columns;
    }

    private VBox section(String heading, ObservableList<Place> places, String none) {
        Label title = new Label(Words.of(heading));
        title.getStyleClass().add("sl-heading");
        VBox cards = new VBox(10);
        cards.setId(heading.replace('.', '-'));
        Runnable fill = () -> {
            Label nothing = new Label(Words.of(none));
            nothing.getStyleClass().add("sl-muted");
            nothing.setWrapText(true);
            cards.getChildren().setAll(places.stream().map(this::card).toList());
            if (places.isEmpty()) {
                cards.getChildren().setAll(nothing);
            }
        };
        places.addListener((ListChangeListener<Place>) change -> fill.run());
        fill.run();
        return new VBox(12, title, cards);
    }

    private Button card(Place place) {
        Button card = new Button();
        Label title = new Label(place.title());
        title.getStyleClass().add("sl-name");
        VBox words = new VBox(3, title);
        if (!place.lead().isEmpty()) {
            Label lead = new Label(place.lead());
            lead.setMaxWidth(CARD_WIDTH);
            card.setTooltip(new Tooltip(place.lead()));
            words.getChildren().add(lead);
        }
        Label where = new Label(where(place.folder()));
        where.getStyleClass().add("sl-small");
        words.getChildren().add(where);
        card.setGraphic(words);
        card.setAccessibleText(place.title());
        card.getStyleClass().setAll("sl-card");
        card.setMaxWidth(Double.MAX_VALUE);
        words.setPrefWidth(CARD_WIDTH);
        card.setOnAction(pressed -> model.open(place.folder()));
        return card;
    }

    /** A folder below the one where the program was started is named from there. */
    private static String where(Path folder) {
        Path here = Path.of("").toAbsolutePath();
        return folder.startsWith(here) ? here.relativize(folder).toString() : folder.toString();
    }

    private Node dropPlace() {
        Label words = new Label(Words.of("welcome.drop"));
        words.getStyleClass().add("sl-muted");
        Button choose = new Button(Words.of("welcome.choose"));
        choose.setId("choose-folder");
        choose.setDefaultButton(true);
        choose.setOnAction(pressed -> model.choose());
        drop.getStyleClass().add("sl-drop");
        Button bring = new Button(Words.of("welcome.loose"));
        bring.setId("bring-loose");
        bring.setOnAction(pressed -> model.bringLoose());
        Button review = new Button(Words.of("welcome.review"));
        review.setId("welcome-review");
        review.setOnAction(pressed -> model.review());
        HBox buttons = new HBox(10, choose, bring);
        buttons.setAlignment(Pos.CENTER);
        drop.getChildren().addAll(words, buttons, review);
        return drop;
    }

    private void mark(boolean over) {
        drop.getStyleClass().remove("over");
        if (over) {
            drop.getStyleClass().add("over");
        }
    }
}
