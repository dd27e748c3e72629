package org.seepledger.sketch;

/**
 * Which ring of a drawing is meant.
 *
 * @param shape the shape's name
 * @param part the number of the part in it, from 1
 * @param island the number of the island in the part, from 1; 0 for the outer ring
 */
public record RingAt(String shape, int part, int island) {

    /**
     * {@return the outer ring of a shape's first part}
     *
     * @param shape the shape's name
     */
    public static RingAt outer(String shape) {
        return new RingAt(shape, 1, 0);
    }
}
