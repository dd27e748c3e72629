package org.seepledger.desktop.paint;

import javafx.scene.canvas.GraphicsContext;
import javafx.scene.paint.Color;
import org.seepledger.picture.Box;
import org.seepledger.picture.Mark;

/** Fills what the canvas is clipped to with lines or dots. */
final class TexturePainter {

    private static final double APART = 6;
    private static final double DOT = 1.1;

    private final GraphicsContext canvas;

    TexturePainter(GraphicsContext canvas, Color colour) {
        this.canvas = canvas;
        canvas.setStroke(colour);
        canvas.setFill(colour);
        canvas.setLineWidth(1.2);
        canvas.setLineDashes();
    }

    void paint(Mark.Texture texture, Box box) {
        switch (texture) {
            case RISING -> lines(box, true);
            case FALLING -> lines(box, false);
            case CROSSED -> {
                lines(box, true);
                lines(box, false);
            }
            case DOTS -> dots(box);
            case PLAIN -> canvas.fillRect(box.x(), box.y(), box.width(), box.height());
        }
    }

    private void lines(Box box, boolean rising) {
        for (double x = box.x() - box.height(); x < box.right() + box.height(); x += APART) {
            double across = rising ? -box.height() : box.height();
            canvas.strokeLine(x, box.y(), x + across, box.bottom());
        }
    }

    private void dots(Box box) {
        double half = APART / 2;
        int row = 0;
        for (double y = box.y(); y < box.bottom() + half; y += half, row++) {
            for (double x = box.x() + (row % 2) * half; x < box.right() + half; x += APART) {
                canvas.fillOval(x - DOT, y - DOT, 2 * DOT, 2 * DOT);
            }
        }
    }
}
