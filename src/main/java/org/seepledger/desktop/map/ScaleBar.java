package org.seepledger.desktop.map;

import java.util.List;
import org.seepledger.aquifer.Aquifer;
import org.seepledger.picture.Ink;
import org.seepledger.picture.Mark;
import org.seepledger.unit.Figures;

/** A bar of a round length, in the set's length unit. */
final class ScaleBar {

    private static final double MOST = 170;
    private static final double LEFT = 18;
    private static final double UP = 18;

    private ScaleBar() {}

    static List<Mark> of(Aquifer aquifer, Camera camera) {
        double pixelsPerUnit = camera.scale() / aquifer.grid().planUnit();
        double length = round(MOST / pixelsPerUnit);
        double right = LEFT + length * pixelsPerUnit;
        double y = camera.height() - UP;
        String unit = aquifer.lengthUnit().toString();
        boolean kilometres = unit.equals("m") && length >= 1000;
        String words = Figures.typeset(kilometres ? length / 1000 : length) + "\u00a0" + (kilometres ? "km" : unit);
        double[] bar = {LEFT, y - 6, LEFT, y, right, y, right, y - 6};
        return List.of(
                new Mark.Line(bar, Mark.Stroke.of(Ink.Token.PAPER, 5)),
                new Mark.Line(bar, Mark.Stroke.of(Ink.Token.TEXT, 1.6)),
                new Mark.Text(
                        (LEFT + right) / 2, y - 6, words, 12, Mark.Anchor.MIDDLE, Ink.Token.TEXT, false, true, 0));
    }

    /** The greatest of 1, 2 or 5 times a power of ten that is not above a number. */
    static double round(double most) {
        double power = Math.pow(10, Math.floor(Math.log10(most)));
        double digits = most / power;
        return power * (digits >= 5 ? 5 : digits >= 2 ? 2 : 1);
    }
}
