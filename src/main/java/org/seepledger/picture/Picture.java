package org.seepledger.picture;

import java.util.List;
import java.util.function.UnaryOperator;

/**
 * A picture as marks.
 *
 * @param width in logical pixels
 * @param height in logical pixels
 * @param title what it shows, in a line
 * @param description what is to be seen in it, for those who cannot see it
 * @param marks what it is made of, the lowermost first
 */
public record Picture(double width, double height, String title, String description, List<Mark> marks) {

    /** Copies the list. */
    public Picture {
        marks = List.copyOf(marks);
    }

    /**
     * {@return the same with its letters written otherwise}
     *
     * @param form turns words into what is written
     */
    public Picture written(UnaryOperator<String> form) {
        return new Picture(
                width,
                height,
                title,
                description,
                marks.stream().map(mark -> mark.written(form)).toList());
    }
}
