package org.seepledger.picture;

import java.util.ArrayList;
import java.util.List;

/**
 * Places labels one after another so that none covers another: whoever asks first has the choice, so ask in order of
 * weight. The same requests in the same order give the same places.
 */
public final class Labels {

    private static final double GAP = 1.5;

    private final Box frame;
    private final double gap;
    private final List<Box> taken = new ArrayList<>();

    /**
     * Begins with an empty page.
     *
     * @param frame what labels must not reach beyond
     */
    public Labels(Box frame) {
        this(frame, GAP);
    }

    /**
     * Begins with an empty page.
     *
     * @param frame what labels must not reach beyond
     * @param gap how far they keep from each other and from what is kept free, in logical pixels
     */
    public Labels(Box frame, double gap) {
        this.frame = frame;
        this.gap = gap;
    }

    /**
     * Keeps a place free of labels.
     *
     * @param box the place
     */
    public void keepFree(Box box) {
        taken.add(box);
    }

    /**
     * Places a label in the first of some places that is free.
     *
     * @param choices the label at each of its places, the best first
     * @param marks receives it
     * @return whether there was room
     */
    public boolean place(List<Mark.Text> choices, List<Mark> marks) {
        for (Mark.Text choice : choices) {
            Box box = Lettering.box(choice).inset(-gap);
            if (frame.holds(box) && taken.stream().noneMatch(box::meets)) {
                taken.add(box);
                marks.add(choice);
                return true;
            }
        }
        return false;
    }

    /**
     * {@return a label at the eight sides of a place, the upper right first}
     *
     * @param x the place
     * @param y the place
     * @param gap how far the label keeps from it, in logical pixels
     * @param words what it says
     * @param size of its letters
     */
    public static List<Mark.Text> around(double x, double y, double gap, String words, double size) {
        double high = y - gap;
        double low = y + gap + 0.75 * size;
        double level = y + 0.3 * size;
        return List.of(
                Mark.Text.of(x + gap, high, words, size, Mark.Anchor.START),
                Mark.Text.of(x + gap, low, words, size, Mark.Anchor.START),
                Mark.Text.of(x - gap, high, words, size, Mark.Anchor.END),
                Mark.Text.of(x - gap, low, words, size, Mark.Anchor.END),
                Mark.Text.of(x + gap, level, words, size, Mark.Anchor.START),
                Mark.Text.of(x - gap, level, words, size, Mark.Anchor.END),
                Mark.Text.of(x, high, words, size, Mark.Anchor.MIDDLE),
                Mark.Text.of(x, low, words, size, Mark.Anchor.MIDDLE));
    }
}
