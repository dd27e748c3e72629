package org.seepledger.sketch;

/** The top or bottom of a prism, as it was typed. */
public sealed interface Limit {

    /**
     * The same height everywhere.
     *
     * @param height in length units
     */
    record Elevation(double height) implements Limit {

        /** Refuses what is no height. */
        public Elevation {
            if (!Double.isFinite(height)) {
                throw new Refusal("An elevation is a number.");
            }
        }
    }

    /**
     * A surface raster.
     *
     * @param path its path, relative to the folder of the file that the drawing is kept in, with {@code /}; whether there
     *     is such a raster shows when the prism is made
     */
    record Surface(String path) implements Limit {}
}
