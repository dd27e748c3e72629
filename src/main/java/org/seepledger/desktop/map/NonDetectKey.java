package org.seepledger.desktop.map;

import java.util.List;
import java.util.Optional;
import javafx.beans.value.ObservableValue;
import javafx.geometry.Pos;
import javafx.scene.canvas.Canvas;
import javafx.scene.canvas.GraphicsContext;
import javafx.scene.control.Label;
import javafx.scene.layout.HBox;
import org.seepledger.desktop.paint.MarkPainter;
import org.seepledger.desktop.theme.Theme;
import org.seepledger.desktop.words.Words;
import org.seepledger.picture.Box;
import org.seepledger.picture.Ink;
import org.seepledger.picture.Mark;

/** What hatched cells mean, where there are any. */
final class NonDetectKey extends HBox {

    private static final double WIDTH = 26;
    private static final double HEIGHT = 13;

    private final ObservableValue<Theme> theme;
    private final Canvas swatch = new Canvas(WIDTH, HEIGHT);

    NonDetectKey(ValuesModel model, ObservableValue<Theme> theme) {
        super(7);
        this.theme = theme;
        setId("legend-nondetects");
        setAlignment(Pos.CENTER_LEFT);
        Label words = new Label(Words.of("map.legend.nondetects"));
        words.getStyleClass().add("sl-small");
        getChildren().addAll(swatch, words);
        managedProperty().bind(visibleProperty());
        model.view().addListener((view, before, after) -> show(after));
        theme.addListener((lit, before, after) -> paint());
        show(model.view().get());
        paint();
    }

    private void show(Optional<LayerView> view) {
        setVisible(view.flatMap(LayerView::limits).isPresent());
    }

    private void paint() {
        GraphicsContext canvas = swatch.getGraphicsContext2D();
        canvas.clearRect(0, 0, WIDTH, HEIGHT);
        MarkPainter painter = new MarkPainter(canvas, theme.getValue());
        for (double sum = NonDetectHatch.APART / 2; sum < WIDTH + HEIGHT; sum += NonDetectHatch.APART) {
            double from = Math.max(0, sum - HEIGHT);
            double to = Math.min(WIDTH, sum);
            painter.paint(
                    List.of(new Mark.Line(new double[] {from, sum - from, to, sum - to}, NonDetectHatch.stroke())));
        }
        painter.paint(
                List.of(Mark.Area.of(new Box(0.5, 0.5, WIDTH - 1, HEIGHT - 1), Mark.Stroke.of(Ink.Token.MUTED, 1))));
    }
}
