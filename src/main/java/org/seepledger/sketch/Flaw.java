package org.seepledger.sketch;

import java.util.Locale;

/**
 * Why rings are no polygon.
 *
 * @param part the number of the part that it is in, from 1, or {@link #NO_PART}
 * @param island the number of the island, from 1, 0 for the outer ring, or {@link #NO_RING}
 * @param found what was found
 * @param place where
 * @param expected what could be there
 * @param remedy what to do, as a sentence
 */
public record Flaw(int part, int island, String found, Place place, String expected, String remedy) {

    /** The part of a flaw between parts. */
    public static final int NO_PART = 0;

    /** The island of a flaw that is not in one ring alone. */
    public static final int NO_RING = -1;

    /**
     * {@return sentences for the status line}
     */
    public String sentence() {
        String text = found + " at " + Place.shown(place.x(), place.y()) + ". " + remedy;
        return text.substring(0, 1).toUpperCase(Locale.ROOT) + text.substring(1);
    }
}
