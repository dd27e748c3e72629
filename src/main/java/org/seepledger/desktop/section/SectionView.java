package org.seepledger.desktop.section;

import java.util.List;
import java.util.Optional;
import java.util.function.Predicate;
import javafx.beans.value.ObservableValue;
import javafx.scene.Node;
import javafx.scene.control.Button;
import javafx.scene.control.Label;
import javafx.scene.control.TextField;
import javafx.scene.control.Tooltip;
import javafx.scene.layout.BorderPane;
import javafx.scene.layout.HBox;
import javafx.scene.layout.Priority;
import javafx.scene.layout.Region;
import javafx.scene.layout.StackPane;
import org.seepledger.desktop.action.Action;
import org.seepledger.desktop.pane.FieldFault;
import org.seepledger.desktop.pane.StatePane;
import org.seepledger.desktop.theme.Theme;
import org.seepledger.desktop.words.Words;
import org.seepledger.sketch.Lid;

/** The pane of the section. */
public final class SectionView extends BorderPane {

    private static final double LEAST_HEIGHT = 236;
    private final SectionModel model;
    private final SectionCanvas canvas;
    private final FieldFault fault = new FieldFault("section-fault");
    private final TextField times = field("section-times", 4);
    private final TextField within = field("section-within", 5);
    private final TextField top = field("section-top", 5);
    private final TextField bottom = field("section-bottom", 5);

    /**
     * Builds the pane.
     *
     * @param model what it shows
     * @param theme light or dark
     */
    public SectionView(SectionModel model, ObservableValue<Theme> theme) {
        this.model = model;
        this.canvas = new SectionCanvas(model, theme);
        setId("section");
        setMinHeight(LEAST_HEIGHT);
        Region ring = new Region();
        ring.getStyleClass().add("sl-ring");
        ring.setMouseTransparent(true);
        ring.visibleProperty().bind(canvas.focusedProperty());
        setCenter(new StatePane(new StackPane(canvas, ring), model.state())
                .withAction(Words.of("section.draw"), model::draw));
        new SectionMouse(model, canvas).begin();
        model.frame()
                .addListener((frame, before, after) -> put(
                        times, after.map(seen -> shorter(seen.exaggeration())).orElse("")));
        model.session().drawing().addListener((drawing, before, after) -> showLids());
        model.session().selected().addListener((selected, before, after) -> showLids());
        showLids();
        model.section()
                .addListener((section, before, after) ->
                        put(within, after.map(shown -> shorter(shown.within())).orElse("")));
    }

    /** {@return what is typed and pressed above the section} */
    public Node bar() {
        Label readout = new Label();
        readout.setId("section-readout");
        readout.getStyleClass().add("sl-belongs");
        readout.textProperty().bind(model.readout());
        HBox.setHgrow(readout, Priority.ALWAYS);
        readout.setMaxWidth(Double.MAX_VALUE);
        readout.setMinWidth(0);
        take(times, model::exaggerate);
        take(within, model::showWellsWithin);
        take(top, text -> model.lids().type(Lid.TOP, text));
        take(bottom, text -> model.lids().type(Lid.BOTTOM, text));
        HBox bar = new HBox(
                6,
                readout,
                fault,
                muted("section.top"),
                top,
                muted("section.bottom"),
                bottom,
                muted("section.times"),
                times,
                button("section-fit", "section.fit", "action.section.fit", model::fit),
                muted("section.within"),
                within,
                button("section-turn", "section.turn", "action.section.turn", model::turn),
                button("section-clear", "section.clear", "action.section.clear", model::clear));
        bar.getStyleClass().add("sl-time");
        bar.disableProperty().bind(model.session().sectionLine().map(line -> line.isEmpty()));
        return bar;
    }

    private static Label muted(String key) {
        Label label = new Label(Words.of(key));
        label.getStyleClass().add("sl-muted");
        label.setMinWidth(USE_PREF_SIZE);
        return label;
    }

    private static Button button(String id, String words, String tip, Runnable does) {
        Button button = new Button(Words.of(words));
        button.setId(id);
        button.getStyleClass().addAll("small", "flat");
        button.setTooltip(new Tooltip(Words.of(tip)));
        button.setMinWidth(USE_PREF_SIZE);
        button.setOnAction(pressed -> does.run());
        return button;
    }

    private static TextField field(String id, int columns) {
        TextField field = new TextField();
        field.setId(id);
        field.setPrefColumnCount(columns);
        field.setMinWidth(USE_PREF_SIZE);
        field.getStyleClass().add("small");
        return field;
    }

    /** A value is taken by Enter, and when the keyboard leaves the field; one that is refused is put back. */
    private void take(TextField field, Predicate<String> taken) {
        field.textProperty().addListener((text, before, after) -> fault.say(""));
        Runnable take = () -> {
            String before = (String) field.getUserData();
            if (!field.getText().equals(before) && !taken.test(field.getText())) {
                field.setText(before);
                fault.say(model.session().status().get());
            }
        };
        field.setOnAction(entered -> take.run());
        field.focusedProperty().addListener((focus, before, now) -> {
            if (!now) {
                take.run();
            }
        });
    }

    private static void put(TextField field, String text) {
        field.setUserData(text);
        field.setText(text);
    }

    private static String shorter(double value) {
        return new java.math.BigDecimal(value)
                .round(new java.math.MathContext(3))
                .stripTrailingZeros()
                .toPlainString();
    }

    private void showLids() {
        put(top, model.lids().text(Lid.TOP));
        put(bottom, model.lids().text(Lid.BOTTOM));
        top.setDisable(model.session().selectedPrism().isEmpty());
        bottom.setDisable(model.session().selectedPrism().isEmpty());
    }

    /** Moves the keyboard to where the chosen lid's elevation is typed. */
    private void focusTyped() {
        boolean isBottom = model.lids().chosen().equals(Optional.of(Lid.BOTTOM));
        (isBottom ? bottom : top).requestFocus();
    }

    /** {@return what can be done with the section} */
    public List<Action> actions() {
        String group = "actions.group.section";
        return List.of(
                new Action(group, "action.section.prism", "Shift+A", model::alongPrism),
                new Action(group, "action.section.turn", "Alt+A", model::turn),
                new Action(group, "action.section.clear", "Shortcut+Shift+A", model::clear),
                new Action(group, "action.section.fit", "Shift+F5", model::fit),
                new Action(group, "action.section.nearer", "Shift+Equals", () -> model.step(1, 1)),
                new Action(group, "action.section.farther", "Shift+Minus", () -> model.step(-1, -1)),
                new Action(group, "action.section.higher", "Shift+Page Up", () -> model.step(0, 1)),
                new Action(group, "action.section.flatter", "Shift+Page Down", () -> model.step(0, -1)),
                new Action(group, "action.lid.choose", "K", model.lids()::chooseNext),
                new Action(group, "action.lid.type", "Shift+K", this::focusTyped),
                new Action(
                        group, "action.lid.raise", "Alt+Up", () -> model.lids().nudge(1)),
                new Action(
                        group,
                        "action.lid.raise.far",
                        "Shift+Alt+Up",
                        () -> model.lids().nudge(10)),
                new Action(
                        group,
                        "action.lid.lower",
                        "Alt+Down",
                        () -> model.lids().nudge(-1)),
                new Action(
                        group,
                        "action.lid.lower.far",
                        "Shift+Alt+Down",
                        () -> model.lids().nudge(-10)));
    }
}
