package org.seepledger.desktop.map;

import java.time.LocalDateTime;
import java.util.Optional;
import javafx.beans.property.BooleanProperty;
import javafx.scene.control.Button;
import javafx.scene.control.CheckMenuItem;
import javafx.scene.control.ComboBox;
import javafx.scene.control.Label;
import javafx.scene.control.MenuButton;
import javafx.scene.layout.HBox;
import org.seepledger.aquifer.Times;
import org.seepledger.desktop.pane.ShortOfRoom;
import org.seepledger.desktop.session.OpenSet;
import org.seepledger.desktop.session.Session;
import org.seepledger.desktop.words.ChoiceWords;
import org.seepledger.desktop.words.NumberForm;
import org.seepledger.desktop.words.Words;
import org.seepledger.job.MapQuantity;
import org.seepledger.unit.Figures;

/** What is shown, as a sentence: this quantity, of this layer, in this interval. */
public final class ShowingBar extends HBox {

    /** Where room is short, the quantity gives way first, whose list has the whole of it. */
    private static final double LEAST_WIDTH = 96;

    private static final double LEAST_LAYER = 72;

    private final MapModel model;
    private final ComboBox<MapQuantity> quantity = new ComboBox<>();
    private final Label layer = new Label();
    private final Label interval = new Label();

    /**
     * Builds the sentence.
     *
     * @param model the map
     */
    public ShowingBar(MapModel model) {
        this.model = model;
        getStyleClass().add("sl-showing");
        quantity.setId("quantity");
        quantity.setMinWidth(LEAST_WIDTH);
        quantity.setItems(model.values().quantities());
        quantity.setConverter(new ChoiceWords<>(MapQuantity::label));
        quantity.setOnAction(chosen -> model.values().quantity().set(Optional.ofNullable(quantity.getValue())));
        model.values().quantity().addListener((shown, before, after) -> quantity.setValue(after.orElse(null)));
        quantity.setValue(model.values().quantity().get().orElse(null));
        layer.getStyleClass().add("sl-strong");
        ShortOfRoom.keep(layer, LEAST_LAYER);
        interval.getStyleClass().addAll("sl-strong", "sl-interval");
        interval.setId("interval");
        Session session = model.session();
        session.set().addListener((set, before, after) -> describe());
        session.layer().addListener((chosen, before, after) -> describe());
        session.interval().addListener((chosen, before, after) -> describe());
        session.numbers().addListener((form, before, after) -> describe());
        getChildren()
                .addAll(
                        muted("map.showing"),
                        quantity,
                        muted("map.showing.of"),
                        layer,
                        muted("map.showing.in"),
                        step("‹", -1, "action.earlier"),
                        interval,
                        step("›", 1, "action.later"),
                        overlays());
        describe();
    }

    private static Label muted(String key) {
        Label label = new Label(Words.of(key));
        label.getStyleClass().add("sl-muted");
        label.setMinWidth(USE_PREF_SIZE);
        return label;
    }

    private Button step(String sign, int by, String tip) {
        Button step = new Button(sign);
        step.getStyleClass().addAll("flat", "sl-step");
        step.setAccessibleText(Words.of(tip));
        step.setTooltip(new javafx.scene.control.Tooltip(Words.of(tip)));
        step.setOnAction(pressed -> model.session().set().get().ifPresent(set -> {
            int last = set.aquifer().times().intervals() - 1;
            int next = model.session().interval().get() + by;
            model.session().interval().set(Math.max(0, Math.min(last, next)));
        }));
        return step;
    }

    private MenuButton overlays() {
        MenuButton menu = new MenuButton(Words.of("map.overlays"));
        menu.setId("overlays");
        menu.getStyleClass().add("flat");
        menu.setMinWidth(USE_PREF_SIZE);
        menu.getItems()
                .addAll(
                        item("map.overlay.contours", model.overlays().contours()),
                        item("map.overlay.arrows", model.overlays().arrows()),
                        item("map.overlay.wells", model.overlays().wells()),
                        item("map.overlay.lines", model.overlays().lines()));
        return menu;
    }

    private static CheckMenuItem item(String key, BooleanProperty shown) {
        CheckMenuItem item = new CheckMenuItem(Words.of(key));
        item.selectedProperty().bindBidirectional(shown);
        return item;
    }

    private void describe() {
        Optional<OpenSet> set = model.session().set().get();
        int shownLayer = model.session().layer().get();
        int shownInterval = model.session().interval().get();
        layer.setText(set.map(open -> Words.of(
                        "map.layer",
                        shownLayer + 1,
                        open.aquifer().layers().get(shownLayer).name()))
                .orElse(""));
        interval.setText(set.map(open -> interval(
                        open.aquifer().times(),
                        shownInterval,
                        model.session().numbers().get()))
                .orElse(""));
        interval.setMinWidth(USE_PREF_SIZE);
    }

    static String interval(Times times, int interval, NumberForm form) {
        String from = times.date(times.instant(interval))
                .map(ShowingBar::day)
                .orElse(form.of(Figures.typeset(times.instant(interval))));
        String to = times.date(times.instant(interval + 1))
                .map(ShowingBar::day)
                .orElse(form.of(Figures.typeset(times.instant(interval + 1))) + "\u00a0" + times.unit());
        return Words.of("map.interval", interval + 1, times.intervals(), from, to);
    }

    private static String day(LocalDateTime date) {
        return date.toLocalTime().toSecondOfDay() == 0
                ? date.toLocalDate().toString()
                : date.toString().replace('T', ' ');
    }
}
