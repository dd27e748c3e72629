package org.seepledger.picture;

import java.util.List;
import java.util.Optional;
import org.seepledger.picture.Mark.Anchor;
import org.seepledger.picture.Mark.Fill;
import org.seepledger.picture.Mark.Stroke;
import org.seepledger.unit.Figures;

/**
 * How long a round distance is on a map: 1, 2 or 5 times a power of ten.
 *
 * @param distance in the unit of the label
 * @param unit as it is written
 * @param length of the bar, in logical pixels
 */
public record ScaleBar(double distance, String unit, double length) {

    /** How high a bar with its label is, in logical pixels. */
    public static final double HEIGHT = 24;

    private static final double SIZE = 11;
    private static final double THICK = 5;

    /**
     * {@return the longest bar that has room}
     *
     * @param scale logical pixels per plan unit, positive
     * @param unit the plan unit; metres are given in km from 1000 on
     * @param most how long the bar may be, in logical pixels
     */
    public static ScaleBar within(double scale, String unit, double most) {
        double room = most / scale;
        double power = Math.pow(10, Math.floor(Math.log10(room)));
        double distance = power;
        for (int digit : new int[] {2, 5, 10}) {
            distance = digit * power <= room * (1 + 1e-9) ? digit * power : distance;
        }
        boolean kilometres = unit.equals("m") && distance >= 1000;
        return new ScaleBar(kilometres ? distance / 1000 : distance, kilometres ? "km" : unit, distance * scale);
    }

    /** {@return what is written over it} */
    public String label() {
        return Figures.typeset(distance) + "\u202f" + unit;
    }

    /** {@return how wide it is with its label, in logical pixels} */
    public double width() {
        return Math.max(length, Lettering.width(label(), SIZE));
    }

    /**
     * {@return the bar, half of it full and half empty}
     *
     * @param x its left edge
     * @param y its upper edge
     */
    public List<Mark> marks(double x, double y) {
        Box whole = new Box(x, y + HEIGHT - THICK - 2, length, THICK);
        Box half = new Box(x, whole.y(), length / 2, THICK);
        return List.of(
                Mark.Text.of(x, y + SIZE, label(), SIZE, Anchor.START).haloed(),
                new Mark.Area(
                        List.of(whole.ring()),
                        Optional.of(Fill.of(Ink.Token.PAPER)),
                        Optional.of(Stroke.of(Ink.Token.TEXT, 1.2))),
                Mark.Area.of(half, Fill.of(Ink.Token.TEXT)));
    }
}
