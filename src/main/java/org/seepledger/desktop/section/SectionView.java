package org.seepledger.desktop.section;

import java.util.List;
import java.util.function.Predicate;
import javafx.beans.value.ObservableValue;
import javafx.scene.Cursor;
import javafx.scene.Node;
import javafx.scene.control.Button;
import javafx.scene.control.Label;
import javafx.scene.control.TextField;
import javafx.scene.control.Tooltip;
import javafx.scene.input.MouseButton;
import javafx.scene.input.MouseEvent;
import javafx.scene.input.ScrollEvent;
import javafx.scene.layout.BorderPane;
import javafx.scene.layout.HBox;
import javafx.scene.layout.Priority;
import javafx.scene.layout.Region;
import javafx.scene.layout.StackPane;
import org.seepledger.desktop.action.Action;
import org.seepledger.desktop.pane.StatePane;
import org.seepledger.desktop.theme.Theme;
import org.seepledger.desktop.words.Words;
import org.seepledger.picture.SectionFrame;

/** The pane of the section. */
public final class SectionView extends BorderPane {

    private static final double LEAST_HEIGHT = 236;
    private static final double NOTCH = 40;
    private static final double PER_NOTCH = 1.2;

    private final SectionModel model;
    private final SectionCanvas canvas;
    private final TextField times = field("section-times", 4);
    private final TextField within = field("section-within", 5);
    private boolean panning;
    private double lastX;
    private double lastY;

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
        canvas.addEventHandler(MouseEvent.MOUSE_PRESSED, this::onPressed);
        canvas.addEventHandler(MouseEvent.MOUSE_DRAGGED, this::onDragged);
        canvas.addEventHandler(MouseEvent.MOUSE_RELEASED, this::onReleased);
        canvas.addEventHandler(MouseEvent.MOUSE_MOVED, move -> model.point(move.getX(), move.getY()));
        canvas.addEventHandler(MouseEvent.MOUSE_EXITED, left -> model.leave());
        canvas.addEventHandler(ScrollEvent.SCROLL, this::onScroll);
        canvas.setCursor(Cursor.CROSSHAIR);
        model.frame().addListener((frame, before, after) -> after.ifPresent(this::show));
        model.section()
                .addListener(
                        (section, before, after) -> after.ifPresent(shown -> put(within, shorter(shown.within()))));
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
        HBox bar = new HBox(
                6,
                readout,
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
    private static void take(TextField field, Predicate<String> taken) {
        Runnable take = () -> {
            String before = (String) field.getUserData();
            if (!field.getText().equals(before) && !taken.test(field.getText())) {
                field.setText(before);
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

    private void show(SectionFrame frame) {
        put(times, shorter(frame.exaggeration()));
    }

    private void onPressed(MouseEvent press) {
        canvas.requestFocus();
        lastX = press.getX();
        lastY = press.getY();
        panning = press.getButton() == MouseButton.PRIMARY || press.getButton() == MouseButton.MIDDLE;
    }

    private void onDragged(MouseEvent drag) {
        if (panning) {
            canvas.setCursor(Cursor.CLOSED_HAND);
            model.drag(drag.getX() - lastX, drag.getY() - lastY);
            lastX = drag.getX();
            lastY = drag.getY();
        }
        model.point(drag.getX(), drag.getY());
    }

    private void onReleased(MouseEvent release) {
        panning = false;
        canvas.setCursor(Cursor.CROSSHAIR);
    }

    /** The wheel goes nearer; with Shift it exaggerates heights, with Ctrl it spreads distances. */
    private void onScroll(ScrollEvent scroll) {
        double turned = scroll.getDeltaY() != 0 ? scroll.getDeltaY() : scroll.getDeltaX();
        if (!scroll.isInertia() && turned != 0) {
            double factor = Math.pow(PER_NOTCH, turned / NOTCH);
            model.zoom(
                    scroll.getX(),
                    scroll.getY(),
                    scroll.isShiftDown() ? 1 : factor,
                    scroll.isShortcutDown() ? 1 : factor);
            model.point(scroll.getX(), scroll.getY());
            scroll.consume();
        }
    }

    /** {@return what can be done with the section} */
    public List<Action> actions() {
        String group = "actions.group.section";
        return List.of(
                new Action(group, "action.section.prism", "Shift+L", model::alongPrism),
                new Action(group, "action.section.turn", "Shortcut+L", model::turn),
                new Action(group, "action.section.clear", "Shortcut+Shift+L", model::clear),
                new Action(group, "action.section.fit", "Shift+F5", model::fit),
                new Action(group, "action.section.nearer", "Shift+Equals", () -> model.step(1, 1)),
                new Action(group, "action.section.farther", "Shift+Minus", () -> model.step(-1, -1)),
                new Action(group, "action.section.higher", "Shift+Page Up", () -> model.step(0, 1)),
                new Action(group, "action.section.flatter", "Shift+Page Down", () -> model.step(0, -1)));
    }
}
