package org.seepledger.desktop.map;

import java.util.List;
import java.util.Optional;
import javafx.beans.value.ObservableValue;
import javafx.geometry.Pos;
import javafx.scene.canvas.GraphicsContext;
import javafx.scene.control.Button;
import javafx.scene.control.Label;
import javafx.scene.control.TextField;
import javafx.scene.control.ToggleButton;
import javafx.scene.control.Tooltip;
import javafx.scene.layout.HBox;
import javafx.scene.layout.Priority;
import javafx.scene.layout.Region;
import javafx.scene.layout.VBox;
import org.seepledger.desktop.paint.MarkPainter;
import org.seepledger.desktop.paint.SharpCanvas;
import org.seepledger.desktop.pane.FieldFault;
import org.seepledger.desktop.theme.Theme;
import org.seepledger.desktop.words.NumberForm;
import org.seepledger.desktop.words.Words;
import org.seepledger.job.MapQuantity;
import org.seepledger.picture.Ink;
import org.seepledger.picture.Mark;
import org.seepledger.picture.RoundValues;
import org.seepledger.picture.ValueScale;

/** Which colour stands for which value; a click opens fields to type the ends of the range, or to fit them to what is shown. */
final class Legend extends VBox {

    private static final double WIDTH = 196;
    private static final double BAR = 10;
    private static final double SIDE = 14;

    private final ValuesModel model;
    private final ObservableValue<Theme> theme;
    private final Button title = new Button();
    private final SharpCanvas bar = new SharpCanvas(this::show);
    private final TextField from = field("range-from");
    private final TextField to = field("range-to");
    private final FieldFault fault = new FieldFault("range-fault");
    private final HBox ends = new HBox(5);

    Legend(ValuesModel model, ObservableValue<Theme> theme) {
        this.model = model;
        this.theme = theme;
        setId("legend");
        getStyleClass().addAll("sl-float", "sl-legend");
        bar.size(WIDTH, BAR + 16);
        title.setId("legend-title");
        title.getStyleClass().setAll("sl-legend-title");
        title.setTooltip(new Tooltip(Words.of("action.legend")));
        title.setOnAction(pressed -> turn());
        title.setMaxWidth(WIDTH);
        title.setWrapText(true);
        bar.setOnMouseClicked(click -> turn());
        Region gap = new Region();
        HBox.setHgrow(gap, Priority.ALWAYS);
        Button fit = new Button(Words.of("map.range.fit"));
        fit.setId("range-fit");
        fit.getStyleClass().addAll("small", "flat");
        fit.setOnAction(pressed -> model.fitRange());
        ends.getChildren().addAll(from, new Label(Words.of("map.range.to")), to, gap, logarithmic(), fit);
        ends.setAlignment(Pos.CENTER_LEFT);
        ends.setVisible(false);
        ends.managedProperty().bind(ends.visibleProperty());
        fault.visibleProperty().bind(ends.visibleProperty());
        getChildren().addAll(title, bar, new NonDetectKey(model, theme), ends, fault);
        setMaxSize(USE_PREF_SIZE, USE_PREF_SIZE);
        for (TextField field : List.of(from, to)) {
            field.setOnAction(entered -> take());
            field.focusedProperty().addListener((focus, before, now) -> {
                if (!now) {
                    take();
                }
            });
        }
        model.scale().addListener((scale, before, after) -> show());
        model.view().addListener((view, before, after) -> show());
        theme.addListener((lit, before, after) -> show());
        model.numbers().addListener((form, before, after) -> show());
        show();
    }

    /** Equal ratios in place of equal differences, where that makes sense. */
    private ToggleButton logarithmic() {
        ToggleButton log = new ToggleButton(Words.of("map.range.logarithmic"));
        log.setId("range-log");
        log.getStyleClass().addAll("small", "flat");
        log.setTooltip(new Tooltip(Words.of("map.range.logarithmic.tip")));
        log.managedProperty().bind(log.visibleProperty());
        log.setOnAction(pressed -> model.logarithmic(log.isSelected()));
        Runnable follow = () -> {
            log.setVisible(model.mayBeLogarithmic());
            log.setSelected(model.isLogarithmic());
        };
        model.scale().addListener((scale, before, after) -> follow.run());
        model.view().addListener((view, before, after) -> follow.run());
        follow.run();
        return log;
    }

    /** Opens the fields for another range, or folds them away. */
    void turn() {
        ends.setVisible(!ends.isVisible());
    }

    private static TextField field(String id) {
        TextField field = new TextField();
        field.setId(id);
        field.setPrefColumnCount(5);
        field.getStyleClass().add("small");
        return field;
    }

    /** What cannot be taken stays as it was typed, with the reason below. */
    private void take() {
        Optional<ValueScale> scale = model.scale().get();
        if (scale.isEmpty()) {
            return;
        }
        String[] now = {shown(scale.get().from()), shown(scale.get().to())};
        if (from.getText().equals(now[0]) && to.getText().equals(now[1])) {
            return;
        }
        if (!model.range(number(from.getText()), number(to.getText()))) {
            fault.say(Words.of(model.isLogarithmic() ? "map.range.log" : "map.range.refused"));
        }
    }

    private static double number(String text) {
        try {
            return Double.parseDouble(NumberForm.plain(text));
        } catch (NumberFormatException e) {
            return Double.NaN;
        }
    }

    /** Enough digits for the eye; the range itself keeps all. */
    private static String text(double value) {
        String text = new java.math.BigDecimal(value)
                .round(new java.math.MathContext(5))
                .stripTrailingZeros()
                .toPlainString();
        return text.length() > 9 ? String.format(java.util.Locale.ROOT, "%.3e", value) : text;
    }

    private String shown(double value) {
        return model.numbers().get().of(text(value));
    }

    private void show() {
        fault.say("");
        Optional<ValueScale> scale = model.scale().get();
        setVisible(scale.isPresent() && model.view().get().isPresent());
        if (isVisible()) {
            MapQuantity quantity = model.view().get().orElseThrow().request().quantity();
            title.setText(Words.of("map.legend", quantity.label(), quantity.unit()));
            from.setText(shown(scale.get().from()));
            to.setText(shown(scale.get().to()));
            paint(scale.get());
        }
    }

    private void paint(ValueScale scale) {
        GraphicsContext canvas = bar.context();
        canvas.clearRect(0, 0, bar.getWidth(), bar.getHeight());
        MarkPainter painter = new MarkPainter(canvas, theme.getValue());
        double length = WIDTH - 2 * SIDE;
        int[] colours = new int[256];
        for (int i = 0; i < colours.length; i++) {
            colours[i] = 0xff000000 | scale.ramp().rgb(i / 255.0);
        }
        double[] placement = {length / colours.length, 0, 0, BAR, SIDE, 0};
        painter.paint(List.of(new Mark.Image(colours.length, 1, colours, placement)));
        RoundValues ticks = scale.ticks(4);
        for (int i = 0; i < ticks.count(); i++) {
            double x = SIDE + length * scale.share(ticks.values().get(i));
            double[] tick = {x, BAR, x, BAR + 4};
            painter.paint(List.of(
                    new Mark.Line(tick, Mark.Stroke.of(Ink.Token.MUTED, 1)),
                    Mark.Text.of(x, BAR + 15, model.numbers().get().of(ticks.label(i)), 11, Mark.Anchor.MIDDLE)
                            .in(Ink.Token.MUTED)));
        }
    }
}
