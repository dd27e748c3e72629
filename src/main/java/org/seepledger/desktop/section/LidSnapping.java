package org.seepledger.desktop.section;

import java.util.Comparator;
import java.util.OptionalInt;
import java.util.stream.IntStream;
import org.seepledger.picture.Profile;
import org.seepledger.picture.SectionFrame;
import org.seepledger.sketch.Lid;
import org.seepledger.sketch.Limit;
import org.seepledger.sketch.Reach;

/**
 * Which layer's surface holds a lid that is dragged: from 8 pixels on, until it is farther than 12.
 *
 * @param lid the lid
 * @param reach the prism's reach, of which the other lid stays
 * @param layers how many layers there are
 * @param frame which part of the section is seen
 */
record LidSnapping(Lid lid, Reach reach, int layers, SectionFrame frame) {

    private static final double CAPTURE = 8;
    private static final double RELEASE = 12;

    /**
     * {@return the layer that holds the lid, from 0, if one does}
     *
     * @param column what stands where the pointer is
     * @param y where the lid would be
     * @param held the layer that held it before
     */
    OptionalInt at(Profile.Column column, double y, OptionalInt held) {
        if (held.isPresent() && away(held.getAsInt(), column, y) <= RELEASE) {
            return held;
        }
        // Where layers pinch out, of those with the same surface the one that has thickness beyond it.
        return IntStream.rangeClosed(first(), last())
                .filter(layer -> away(layer, column, y) <= CAPTURE)
                .boxed()
                .min(Comparator.<Integer>comparingDouble(layer -> away(layer, column, y))
                        .thenComparing(lid == Lid.TOP ? Comparator.reverseOrder() : Comparator.naturalOrder()))
                .map(OptionalInt::of)
                .orElse(OptionalInt.empty());
    }

    private int first() {
        return lid == Lid.BOTTOM && Lid.TOP.in(reach, layers) instanceof Limit.Layer top ? top.index() : 0;
    }

    private int last() {
        return lid == Lid.TOP && Lid.BOTTOM.in(reach, layers) instanceof Limit.Layer bottom
                ? bottom.index()
                : layers - 1;
    }

    private double away(int layer, Profile.Column column, double y) {
        return Math.abs(frame.y(column.surfaces()[lid == Lid.TOP ? layer : layer + 1]) - y);
    }
}
