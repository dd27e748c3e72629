package org.seepledger.picture;

import java.util.List;
import org.seepledger.picture.Mark.Stroke;

/** An upright axis of values with ticks at round ones. */
final class ValueAxis {

    private static final double SIZE = 11;

    private final double upper;
    private final double high;
    private final double least;
    private final double greatest;
    private final Ticks ticks;

    /**
     * Makes an axis that has 0 on it.
     *
     * @param least the least value shown
     * @param greatest the greatest
     * @param upper the y of its upper end
     * @param high how high it is, in logical pixels
     */
    ValueAxis(double least, double greatest, double upper, double high) {
        double from = Math.min(0, least);
        double to = Math.max(0, greatest);
        this.least = from;
        this.greatest = to > from ? to : 1;
        this.upper = upper;
        this.high = high;
        this.ticks = Ticks.within(this.least, this.greatest, most(high));
    }

    /** Room enough to read them, and as few as will do where there is little. */
    private static int most(double high) {
        return Math.max((int) (high / 26), Math.max(3, Math.min(5, (int) (high / 13))));
    }

    double y(double value) {
        return upper + (greatest - value) / (greatest - least) * high;
    }

    /** {@return how much room its labels need} */
    double labelWidth(boolean signed) {
        double widest = 0;
        for (int i = 0; i < ticks.count(); i++) {
            widest = Math.max(widest, Lettering.width(label(i, signed), SIZE));
        }
        return widest;
    }

    private String label(int index, boolean signed) {
        return signed ? ticks.label(index) : ticks.label(index).replace("−", "");
    }

    /** Draws guides and labels. */
    void draw(double left, double right, boolean signed, List<Mark> marks) {
        for (int i = 0; i < ticks.count(); i++) {
            double y = y(ticks.values().get(i));
            marks.add(new Mark.Line(new double[] {left, y, right, y}, Stroke.of(Ink.Token.GUIDE, 1)));
            marks.add(Mark.Text.of(left - 6, y + 0.35 * SIZE, label(i, signed), SIZE, Mark.Anchor.END)
                    .in(Ink.Token.MUTED));
        }
    }

    /** Draws the line of zero. */
    void zero(double left, double right, List<Mark> marks) {
        marks.add(new Mark.Line(new double[] {left, y(0), right, y(0)}, Stroke.of(Ink.Token.TEXT, 1.2)));
    }
}
