package org.seepledger.desktop.chart;

import java.util.Optional;
import javafx.beans.value.ObservableValue;
import javafx.scene.Cursor;
import javafx.scene.Node;
import javafx.scene.control.Label;
import javafx.scene.control.ScrollPane;
import javafx.scene.control.Slider;
import javafx.scene.input.MouseEvent;
import javafx.scene.layout.BorderPane;
import javafx.scene.layout.HBox;
import javafx.scene.layout.Priority;
import org.seepledger.desktop.paint.PictureView;
import org.seepledger.desktop.pane.StatePane;
import org.seepledger.desktop.theme.Theme;
import org.seepledger.desktop.words.Words;
import org.seepledger.picture.Picture;

/** The chart, and for above it the slider of the interval looked at; a click or drag on the chart moves it too. */
public final class ChartView extends BorderPane {

    private static final double LEAST_HEIGHT = 158;
    private static final double TREND_WIDTH = 340;

    private final ChartModel model;
    private final PictureView picture;
    private final Slider slider = new Slider();
    private final Label trend = new Label();
    private Optional<Drawn> drawn = Optional.empty();

    /**
     * Builds the pane.
     *
     * @param model what it shows
     * @param theme light or dark
     */
    public ChartView(ChartModel model, ObservableValue<Theme> theme) {
        this.model = model;
        this.picture = new PictureView((PictureView.ForSize) this::draw, theme);
        setId("chart");
        getStyleClass().add("sl-pane");
        picture.setId("chart-picture");
        picture.setCursor(Cursor.HAND);
        picture.setOnMousePressed(this::look);
        picture.setOnMouseDragged(this::look);
        ScrollPane scroll = new ScrollPane(picture);
        scroll.setFitToWidth(true);
        scroll.setFitToHeight(true);
        scroll.setHbarPolicy(ScrollPane.ScrollBarPolicy.NEVER);
        setMinHeight(LEAST_HEIGHT);
        setCenter(new StatePane(scroll, model.state()).withAction(Words.of("budget.draw"), model::draw));
        setRight(trend());
        model.changes().addListener((changes, before, after) -> show());
        show();
    }

    private void show() {
        picture.redraw();
        trend.setText(model.trend());
    }

    /** What the masses say of a trend, beside them. */
    private ScrollPane trend() {
        trend.setId("chart-trend");
        trend.setWrapText(true);
        trend.setMinHeight(USE_PREF_SIZE);
        trend.getStyleClass().addAll("sl-small", "sl-choices");
        ScrollPane words = new ScrollPane(trend);
        words.setFitToWidth(true);
        words.setHbarPolicy(ScrollPane.ScrollBarPolicy.NEVER);
        words.setPrefWidth(TREND_WIDTH);
        words.visibleProperty().bind(trend.textProperty().isNotEmpty());
        words.managedProperty().bind(words.visibleProperty());
        return words;
    }

    /** {@return the slider of the interval looked at, to be put above the chart} */
    public Node bar() {
        Label when = new Label();
        when.setId("interval-words");
        when.getStyleClass().add("sl-belongs");
        when.setMinWidth(310);
        when.textProperty().bind(model.when());
        slider.setId("interval-slider");
        slider.setMin(0);
        slider.setBlockIncrement(1);
        slider.setMajorTickUnit(1);
        slider.setMinorTickCount(0);
        slider.setSnapToTicks(true);
        slider.maxProperty().bind(model.last());
        slider.disableProperty().bind(model.last().isEqualTo(0));
        slider.setValue(model.interval().get());
        slider.valueProperty().addListener((value, before, after) -> model.look((int) Math.rint(after.doubleValue())));
        model.interval().addListener((interval, before, after) -> slider.setValue(after.intValue()));
        HBox.setHgrow(slider, Priority.ALWAYS);
        HBox time = new HBox(12, when, slider);
        time.getStyleClass().add("sl-time");
        return time;
    }

    private Optional<Picture> draw(double width, double height) {
        drawn = model.drawn(width, height);
        return drawn.map(Drawn::picture);
    }

    private void look(MouseEvent mouse) {
        drawn.ifPresent(chart -> chart.look().accept(mouse.getX()));
    }
}
