package org.seepledger.picture;

import java.util.List;
import java.util.Optional;
import org.seepledger.picture.Mark.Anchor;
import org.seepledger.picture.Mark.Fill;
import org.seepledger.picture.Mark.Stroke;

/** Which way is north: a slender kite, one half full, with an N below. */
final class NorthArrow {

    /** How wide it is, in logical pixels. */
    static final double WIDTH = 14;

    /** How high it is, in logical pixels. */
    static final double HEIGHT = 42;

    private NorthArrow() {}

    /**
     * {@return the arrow, for a map with north up}
     *
     * @param x its left edge
     * @param y its upper edge
     */
    static List<Mark> marks(double x, double y) {
        double middle = x + WIDTH / 2;
        double notch = y + 21;
        double foot = y + 27;
        double[] kite = {middle, y + 1, x + WIDTH - 2, foot, middle, notch, x + 2, foot};
        double[] half = {middle, y + 1, x + WIDTH - 2, foot, middle, notch};
        return List.of(
                new Mark.Area(
                        List.of(kite),
                        Optional.of(Fill.of(Ink.Token.PAPER)),
                        Optional.of(Stroke.of(Ink.Token.TEXT, 1.2))),
                new Mark.Area(List.of(half), Optional.of(Fill.of(Ink.Token.TEXT)), Optional.empty()),
                Mark.Text.of(middle, y + HEIGHT - 2, "N", 12, Anchor.MIDDLE)
                        .strong()
                        .haloed());
    }
}
