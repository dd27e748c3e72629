package org.seepledger.picture;

import org.seepledger.picture.Mark.Fill;
import org.seepledger.picture.Mark.Stroke;
import org.seepledger.picture.Mark.Texture;
import org.seepledger.unit.Figures;

/**
 * A net flow through a face of a prism.
 *
 * @param amount in the unit shown, positive into the prism; NaN where it cannot be given
 */
record NetFlow(double amount) {

    /** A paler rim would leave nothing of a thinner shaft. */
    private static final double RIMMED_FROM = 3;

    /** {@return its size; 0 where it cannot be given} */
    double size() {
        return Double.isNaN(amount) ? 0 : Math.abs(amount);
    }

    /** {@return what colour it has} */
    Ink.Token ink() {
        return amount > 0 ? Ink.Token.GAIN : amount < 0 ? Ink.Token.LOSS : Ink.Token.MUTED;
    }

    /** {@return it as it is read} */
    String words() {
        return Double.isNaN(amount)
                ? "–"
                : amount == 0 ? "0" : (amount > 0 ? "in " : "out ") + Figures.typeset(Math.abs(amount));
    }

    /**
     * {@return it as an arrow across its face}
     *
     * @param x the middle of the arrow
     * @param y the middle of the arrow
     * @param outX from the middle to the tip of an arrow that points out
     * @param outY from the middle to the tip of an arrow that points out
     * @param width of the shaft
     */
    Mark.Area arrow(double x, double y, double outX, double outY, double width) {
        boolean gain = amount > 0;
        double sign = gain ? -1 : 1;
        Arrow arrow = new Arrow(x - sign * outX, y - sign * outY, x + sign * outX, y + sign * outY, width);
        Fill fill = new Fill(ink(), 1, gain ? Texture.PLAIN : Texture.FALLING);
        return arrow.mark(fill, Stroke.of(gain && width >= RIMMED_FROM ? Ink.Token.PAPER : ink(), 1));
    }
}
