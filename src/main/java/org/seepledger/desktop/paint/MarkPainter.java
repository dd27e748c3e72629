package org.seepledger.desktop.paint;

import java.util.List;
import javafx.scene.canvas.GraphicsContext;
import javafx.scene.image.PixelFormat;
import javafx.scene.image.WritableImage;
import javafx.scene.shape.FillRule;
import javafx.scene.shape.StrokeLineCap;
import javafx.scene.shape.StrokeLineJoin;
import javafx.scene.text.Font;
import javafx.scene.text.FontWeight;
import javafx.scene.text.TextAlignment;
import javafx.scene.transform.Affine;
import org.seepledger.desktop.theme.Theme;
import org.seepledger.picture.Box;
import org.seepledger.picture.Ink;
import org.seepledger.picture.Mark;

/** Replays marks on a canvas. */
public final class MarkPainter {

    private static final double HALO = 3;

    private final GraphicsContext canvas;
    private final Theme theme;

    /**
     * Makes a painter.
     *
     * @param canvas where marks go
     * @param theme gives inks their colours
     */
    public MarkPainter(GraphicsContext canvas, Theme theme) {
        this.canvas = canvas;
        this.theme = theme;
    }

    /**
     * Paints marks, the lowermost first.
     *
     * @param marks the marks
     */
    public void paint(List<? extends Mark> marks) {
        marks.forEach(this::paint);
    }

    private void paint(Mark mark) {
        if (mark instanceof Mark.Line line) {
            stroke(line.xy(), false, line.stroke());
        } else if (mark instanceof Mark.Area area) {
            paint(area);
        } else if (mark instanceof Mark.Text text) {
            paint(text);
        } else if (mark instanceof Mark.Image image) {
            paint(image);
        } else if (mark instanceof Mark.Group group) {
            paint(group);
        }
    }

    private void stroke(double[] xy, boolean closed, Mark.Stroke stroke) {
        take(stroke);
        canvas.beginPath();
        path(xy, closed);
        canvas.stroke();
    }

    private void take(Mark.Stroke stroke) {
        canvas.setStroke(Paints.of(stroke.ink(), 1, theme));
        canvas.setLineWidth(stroke.width());
        canvas.setLineJoin(StrokeLineJoin.ROUND);
        canvas.setLineCap(StrokeLineCap.BUTT);
        canvas.setLineDashes(
                stroke.dash().stream().mapToDouble(Double::doubleValue).toArray());
    }

    private void path(double[] xy, boolean closed) {
        for (int i = 0; i + 1 < xy.length; i += 2) {
            if (i == 0) {
                canvas.moveTo(xy[0], xy[1]);
            } else {
                canvas.lineTo(xy[i], xy[i + 1]);
            }
        }
        if (closed) {
            canvas.closePath();
        }
    }

    private void paint(Mark.Area area) {
        area.fill().ifPresent(fill -> fill(area.rings(), fill));
        area.stroke().ifPresent(stroke -> area.rings().forEach(ring -> stroke(ring, true, stroke)));
    }

    private void rings(List<double[]> rings) {
        canvas.beginPath();
        rings.forEach(ring -> path(ring, true));
        canvas.setFillRule(FillRule.EVEN_ODD);
    }

    private void fill(List<double[]> rings, Mark.Fill fill) {
        boolean plain = fill.texture() == Mark.Texture.PLAIN;
        canvas.setFill(Paints.of(fill.ink(), plain ? fill.opacity() : 0.22 * fill.opacity(), theme));
        rings(rings);
        canvas.fill();
        if (!plain) {
            canvas.save();
            rings(rings);
            canvas.clip();
            new TexturePainter(canvas, Paints.of(fill.ink(), fill.opacity(), theme))
                    .paint(fill.texture(), around(rings));
            canvas.restore();
        }
    }

    private static Box around(List<double[]> rings) {
        double west = Double.POSITIVE_INFINITY;
        double north = Double.POSITIVE_INFINITY;
        double east = Double.NEGATIVE_INFINITY;
        double south = Double.NEGATIVE_INFINITY;
        for (double[] ring : rings) {
            for (int i = 0; i + 1 < ring.length; i += 2) {
                west = Math.min(west, ring[i]);
                east = Math.max(east, ring[i]);
                north = Math.min(north, ring[i + 1]);
                south = Math.max(south, ring[i + 1]);
            }
        }
        return new Box(west, north, east - west, south - north);
    }

    private void paint(Mark.Text text) {
        canvas.save();
        canvas.translate(text.x(), text.y());
        canvas.rotate(text.angle());
        canvas.setFont(Font.font(null, text.bold() ? FontWeight.BOLD : FontWeight.NORMAL, text.size()));
        canvas.setTextAlign(
                switch (text.anchor()) {
                    case START -> TextAlignment.LEFT;
                    case MIDDLE -> TextAlignment.CENTER;
                    case END -> TextAlignment.RIGHT;
                });
        if (text.halo()) {
            take(Mark.Stroke.of(Ink.Token.PAPER, HALO));
            canvas.strokeText(text.words(), 0, 0);
        }
        canvas.setFill(Paints.of(text.ink(), 1, theme));
        canvas.fillText(text.words(), 0, 0);
        canvas.restore();
    }

    private void paint(Mark.Image image) {
        WritableImage pixels = new WritableImage(image.columns(), image.rows());
        pixels.getPixelWriter()
                .setPixels(
                        0,
                        0,
                        image.columns(),
                        image.rows(),
                        PixelFormat.getIntArgbInstance(),
                        image.argb(),
                        0,
                        image.columns());
        double[] place = image.placement();
        canvas.save();
        canvas.setImageSmoothing(false);
        canvas.transform(new Affine(place[0], place[2], place[4], place[1], place[3], place[5]));
        canvas.drawImage(pixels, 0, 0);
        canvas.restore();
    }

    private void paint(Mark.Group group) {
        Box clip = group.clip();
        canvas.save();
        canvas.beginPath();
        canvas.rect(clip.x(), clip.y(), clip.width(), clip.height());
        canvas.clip();
        paint(group.marks());
        canvas.restore();
    }
}
