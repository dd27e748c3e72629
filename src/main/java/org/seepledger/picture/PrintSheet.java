package org.seepledger.picture;

import java.util.ArrayList;
import java.util.List;

/** A picture as it is handed over by itself: on paper's ground, with its title and a caption below. */
public final class PrintSheet {

    private static final double MARGIN = 14;
    private static final double TITLE = 14;
    private static final double SMALL = 10;
    private static final double GAP = 5;

    private PrintSheet() {}

    /**
     * {@return the picture with its title and a caption below it}
     *
     * @param picture the picture
     * @param caption paragraphs: what it belongs to, what the reader must know
     */
    public static Picture of(Picture picture, List<String> caption) {
        double room = picture.width() - 2 * MARGIN;
        List<Mark> marks = new ArrayList<>(picture.marks());
        double y = picture.height() + GAP;
        Paragraph title = new Paragraph(picture.title(), TITLE, room);
        title.marks(MARGIN, y, Ink.Token.TEXT).stream().map(Mark.Text::strong).forEach(marks::add);
        y += title.height() + GAP;
        List<String> words = new ArrayList<>(List.of(picture.description()));
        words.addAll(caption);
        for (String part : words) {
            Paragraph paragraph = new Paragraph(part, SMALL, room);
            marks.addAll(paragraph.marks(MARGIN, y, Ink.Token.MUTED));
            y += paragraph.height() + GAP;
        }
        return new Picture(picture.width(), y + MARGIN, picture.title(), picture.description(), marks);
    }
}
