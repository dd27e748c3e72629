package org.seepledger.picture;

import java.util.List;
import java.util.Optional;
import org.seepledger.picture.Mark.Fill;
import org.seepledger.picture.Mark.Stroke;

/**
 * A row that says which filling or line stands for what.
 *
 * <p>Entries are put one after another, and wrap where the row is full.
 */
final class Key {

    private static final double SIZE = 12;
    private static final double LINE = 18;
    private static final double SWATCH = 16;

    private final double left;
    private final double right;
    private final List<Mark> marks;
    private double x;
    private double y;

    Key(double left, double right, double y, List<Mark> marks) {
        this.left = left;
        this.right = right;
        this.x = left;
        this.y = y;
        this.marks = marks;
    }

    Key filled(Fill fill, String words) {
        room(words);
        Box box = new Box(x, y + 3, SWATCH, 11);
        marks.add(new Mark.Area(List.of(box.ring()), Optional.of(fill), Optional.of(Stroke.of(Ink.Token.TEXT, 0.8))));
        return write(words);
    }

    Key line(Stroke stroke, String words) {
        room(words);
        marks.add(new Mark.Line(new double[] {x, y + 9, x + SWATCH, y + 9}, stroke));
        return write(words);
    }

    private void room(String words) {
        if (x > left && x + SWATCH + 5 + Lettering.width(words, SIZE) > right) {
            x = left;
            y += LINE;
        }
    }

    private Key write(String words) {
        double at = x + SWATCH + 5;
        String fitted = Lettering.fitted(words, SIZE, right - at);
        marks.add(Mark.Text.of(at, y + 13, fitted, SIZE, Mark.Anchor.START));
        x = at + Lettering.width(fitted, SIZE) + 14;
        return this;
    }

    /** {@return the y below the last row} */
    double end() {
        return y + LINE;
    }
}
