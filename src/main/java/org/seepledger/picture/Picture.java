package org.seepledger.picture;

import java.util.List;

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
}
