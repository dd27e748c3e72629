package org.seepledger.picture;

/**
 * How wide words come out, near enough to keep labels apart: widths of a common sans-serif face by kind of letter, rounded
 * up, since the face that a page or window uses is not known here.
 */
public final class Lettering {

    private static final double BOLD = 1.1;
    private static final String NARROW = "iIjlt.,:;'|!()[]/ \u202f";
    private static final String WIDE = "mwMW%@—";

    private Lettering() {}

    /**
     * {@return how wide a line of text is, in logical pixels}
     *
     * @param words the text
     * @param size of its letters, in logical pixels
     */
    public static double width(String words, double size) {
        return size
                * words.codePoints()
                        .mapToDouble(letter -> NARROW.indexOf(letter) >= 0
                                ? 0.36
                                : WIDE.indexOf(letter) >= 0 ? 0.95 : Character.isUpperCase(letter) ? 0.72 : 0.61)
                        .sum();
    }

    /**
     * {@return the rectangle that a level text covers}
     *
     * @param text the text; its angle is not looked at
     */
    public static Box box(Mark.Text text) {
        double width = width(text.words(), text.size()) * (text.bold() ? BOLD : 1);
        double left = switch (text.anchor()) {
            case START -> text.x();
            case MIDDLE -> text.x() - width / 2;
            case END -> text.x() - width;
        };
        return new Box(left, text.y() - 0.8 * text.size(), width, 1.05 * text.size());
    }

    /**
     * {@return a text cut to a width, with an ellipsis where something is missing}
     *
     * @param words the text
     * @param size of its letters, in logical pixels
     * @param width the room for it, in logical pixels
     */
    public static String fitted(String words, double size, double width) {
        if (width(words, size) <= width) {
            return words;
        }
        int[] letters = words.codePoints().toArray();
        String cut = "…";
        for (int kept = letters.length - 1; kept > 0 && cut.equals("…"); kept--) {
            String shorter = new String(letters, 0, kept).strip() + "…";
            cut = width(shorter, size) <= width ? shorter : cut;
        }
        return cut;
    }
}
