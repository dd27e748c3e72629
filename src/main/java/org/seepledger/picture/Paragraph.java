package org.seepledger.picture;

import java.util.ArrayList;
import java.util.List;

/** Words broken into lines. */
final class Paragraph {

    private static final double LEADING = 1.35;

    private final List<String> lines = new ArrayList<>();
    private final double size;

    /**
     * Breaks words into lines.
     *
     * @param words the words
     * @param size of the letters, in logical pixels
     * @param width the longest line; a word that is longer is cut
     */
    Paragraph(String words, double size, double width) {
        this.size = size;
        String line = "";
        for (String word : words.strip().split(" ")) {
            String longer = line.isEmpty() ? word : line + " " + word;
            if (!line.isEmpty() && Lettering.width(longer, size) > width) {
                lines.add(Lettering.fitted(line, size, width));
                line = word;
            } else {
                line = longer;
            }
        }
        lines.add(Lettering.fitted(line, size, width));
    }

    List<String> lines() {
        return lines;
    }

    double height() {
        return lines.size() * LEADING * size;
    }

    /** {@return the lines as marks, the first just below y} */
    List<Mark.Text> marks(double x, double y, Ink ink) {
        List<Mark.Text> marks = new ArrayList<>();
        for (int i = 0; i < lines.size(); i++) {
            double base = y + i * LEADING * size + size;
            marks.add(
                    Mark.Text.of(x, base, lines.get(i), size, Mark.Anchor.START).in(ink));
        }
        return marks;
    }
}
